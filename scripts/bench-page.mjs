/**
 * `npm run bench:page`: how soon the figure follows a hand on a slider, far from the server. Three scenarios, every request
 * takes 150 ms longer; once as fast as the machine is, once slowed down four times. From the event of an input to the paint
 * that shows it or a newer one, and the longest task of the page's thread. Of a few runs the best counts, since whatever else the
 * machine does only makes a page slower.
 */
import { availableParallelism, loadavg } from 'node:os'
import { setTimeout as wait } from 'node:timers/promises'
import { chromium } from '@playwright/test'
import { record, results } from './bench/drag-record.mjs'
import { withServer } from './bench/server.mjs'
import { ensureChromium } from './setup/browsers.mjs'
import { ensureBuilt } from './setup/build.mjs'
import { ensureInstalled } from './setup/install.mjs'
import { fail, Refusal } from './setup/project.mjs'

/** Milliseconds, but for the number of moves. */
const [ROUND_TRIP, MOVES, BETWEEN] = [150, 150, 16]
const SIZES = [
  { width: 1280, height: 800 },
  { width: 390, height: 844 },
]
const AIMS = { paint: 50, task: 100 }
const RUNS = 3
const FLAGS = ['--no-sandbox', '--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking']

/**
 * @param {import('@playwright/test').Browser} browser
 * @param {string} url
 * @param {{width: number, height: number}} viewport
 * @param {number} slowdown
 */
async function measure(browser, url, viewport, slowdown) {
  const context = await browser.newContext({ viewport, baseURL: url, serviceWorkers: 'block' })
  await context.route('**/*', async (route) => {
    await wait(ROUND_TRIP)
    await route.continue().catch(() => undefined)
  })
  const page = await context.newPage()
  await page.addInitScript(record)
  await page.goto('/', { waitUntil: 'networkidle' })
  const session = await context.newCDPSession(page)
  await session.send('Emulation.setCPUThrottlingRate', { rate: slowdown })
  // The first drag loads and warms up what the second one, which counts, uses.
  await drag(page, 40)
  await page.waitForFunction(() => !document.querySelector('main')?.ariaBusy)
  await wait(1500)
  await page.evaluate(() => Reflect.get(globalThis, 'startRecord')())
  await drag(page, MOVES)
  await wait(600)
  const found = results(await page.evaluate(() => Reflect.get(globalThis, 'stopRecord')()))
  await context.close()
  return found
}

/** @param {import('@playwright/test').Page} page @param {number} moves */
async function drag(page, moves) {
  const slider = page.getByRole('slider', { name: 'matter', exact: true })
  await slider.evaluate((element) => element.scrollIntoView({ block: 'end' }))
  const box = await slider.boundingBox()
  if (!box) throw new Refusal('There is no slider to drag.')
  const y = box.y + box.height / 2
  await page.mouse.move(box.x + 0.15 * box.width, y)
  await page.mouse.down()
  for (let i = 1; i <= moves; i++) {
    const next = wait(BETWEEN)
    await page.mouse.move(box.x + (0.15 + (0.5 * i) / moves) * box.width, y)
    await next
  }
  await page.mouse.up()
}

/** @param {number} value @param {number} aim */
const judged = (value, aim) => `${ms(value)} (aim ${aim}, ${value <= aim ? 'met' : 'missed'})`

/** @param {number} value */
const ms = (value) => `${value.toFixed(0)} ms`

/** @param {import('@playwright/test').Browser} browser @param {string} url */
async function measureAll(browser, url) {
  console.log(`Three scenarios, ${MOVES} moves of a slider, ${ROUND_TRIP} ms of added round trip.`)
  // Times by the clock: other programs are in them.
  console.log(`Load of the machine: ${loadavg()[0].toFixed(1)} on ${availableParallelism()} processors.`)
  for (const size of SIZES) {
    for (const slowdown of [1, 4]) {
      console.log(`${size.width} px, slowed down ${slowdown} times`)
      let [paint, task] = [Number.POSITIVE_INFINITY, Number.POSITIVE_INFINITY]
      for (let run = 0; run < RUNS; run++) {
        const { count, half, most, longest } = await measure(browser, url, size, slowdown)
        console.log(`  ${count} inputs: to paint p50 ${ms(half)}, p95 ${ms(most)}; longest task ${ms(longest)}`)
        paint = Math.min(paint, most)
        task = Math.min(task, longest)
      }
      console.log(slowdown === 1 ? `  p95 ${judged(paint, AIMS.paint)}` : `  longest task ${judged(task, AIMS.task)}`)
    }
  }
}

try {
  ensureInstalled()
  const executablePath = ensureChromium()
  ensureBuilt()
  const browser = await chromium.launch({ executablePath, args: FLAGS })
  try {
    await withServer(({ url }) => measureAll(browser, url))
  } finally {
    await browser.close()
  }
} catch (error) {
  fail(error)
}
