/** The live page as a person works with it. */
import { expect, type Page, test } from '@playwright/test'
import { clear, complaints, cursor, drag, field, measure, numbers, open, readout, said, settled, slider } from './live'

/** Long pieces of work, and machines that have other things to do. */
test.describe.configure({ timeout: 90_000 })

const ONE = '/?s=h0:70,matter:0.3,as:One'

test('set by mouse and by keyboard, undone and redone, handed over by a link', async ({ page, browser, baseURL }) => {
  const heard = await complaints(page)
  await page.context().grantPermissions(['clipboard-read', 'clipboard-write'])
  await open(page, ONE)
  const [first, entries] = [await numbers(page), await page.evaluate(() => history.length)]

  await drag(page, slider(page, 'matter'), 0.3, 0.5)
  await settled(page)
  const matter = await field(page, 'matter').inputValue()
  expect(Math.abs(Number(matter) - 0.5)).toBeLessThan(0.03)
  await expect(page).toHaveURL(new RegExp(`matter:${matter},as:One$`))
  const dragged = await numbers(page)
  expect(dragged).not.toEqual(first)

  await slider(page, 'Hubble constant').focus()
  // In one go: presses a second apart would be changes of their own.
  await Promise.all(Array.from({ length: 5 }, () => page.keyboard.press('ArrowLeft')))
  await settled(page)
  await expect(field(page, 'Hubble constant')).toHaveValue('69')
  await expect(slider(page, 'Hubble constant')).toHaveAttribute('aria-valuetext', '69 km/s/Mpc')
  const turned = await numbers(page)
  expect(turned.length).toBeGreaterThan(20)
  expect(turned).not.toEqual(dragged)
  // One entry for the drag, one for the presses.
  expect(await page.evaluate(() => history.length)).toBe(entries + 2)

  await page.goBack()
  await settled(page)
  expect(await numbers(page)).toEqual(dragged)
  await page.getByRole('button', { name: 'Undo' }).click()
  await expect(page).toHaveURL(/matter:0.3,as:One$/)
  await settled(page)
  expect(await numbers(page)).toEqual(first)
  await expect(page.getByRole('button', { name: 'Undo' })).toBeHidden()
  await page.goForward()
  await page.goForward()
  await expect(field(page, 'Hubble constant')).toHaveValue('69')
  await settled(page)
  expect(await numbers(page)).toEqual(turned)

  await page.getByRole('button', { name: 'Copy link' }).click()
  await expect(page.getByText('Copied')).toBeVisible()
  const link = await page.evaluate(() => navigator.clipboard.readText())
  expect(link).toBe(page.url())
  const fresh = await browser.newContext({ baseURL, javaScriptEnabled: false })
  const other = await fresh.newPage()
  await other.goto(link)
  expect(await numbers(other)).toEqual(turned)
  await fresh.close()
  expect(heard).toEqual([])
})

test('a hand that rests before it lets go has the words of what it sees', async ({ page }) => {
  // High enough for slider and words: what is out of sight waits.
  await page.setViewportSize({ width: 1280, height: 1500 })
  await open(page, ONE)
  const words = () => said(page, 'One').textContent()
  const first = await words()
  const { x, y, width, height } = await clear(slider(page, 'matter'))
  const to = (part: number) => page.mouse.move(x + part * width, y + height / 2)
  await to(0.3)
  await page.mouse.down()
  for (let i = 1; i <= 60; i++) await to(0.3 + i / 300)
  await page.waitForTimeout(2000)
  const resting = await words()
  expect(resting).not.toBe(first)
  await page.mouse.up()
  await settled(page)
  expect(await words()).toBe(resting)
})

test('the number on the page is the cell of the table', async ({ page, request }) => {
  await open(page, ONE)
  await drag(page, slider(page, 'matter'), 0.3, 0.42)
  await settled(page)
  const link = await page.getByRole('banner').getByRole('link', { name: 'Table as CSV' }).getAttribute('href')
  const lines = (await (await request.get(`${link}`)).text())
    .split('\r\n')
    .filter((line) => line && !line.startsWith('#'))
  const [header, ...rows] = lines.map((line) => line.split(','))
  const today = rows.find((row) => row[header.indexOf('scale')] === '1') ?? []
  const cell = (column: string) => Number(today[header.indexOf(column)])
  await expect(measure(page, 'age')).toHaveText(`${cell('age').toFixed(2)} Gyr`)
  await expect(measure(page, 'particleHorizon')).toHaveText(`${cell('particleHorizon').toFixed(2)} Gly`)
  await expect(measure(page, 'eventHorizon')).toHaveText(`${cell('eventHorizon').toFixed(2)} Gly`)
  const json = await page.getByRole('banner').getByRole('link', { name: 'Table as JSON' }).getAttribute('href')
  const { scenarios } = await (await request.get(`${json}`)).json()
  expect(scenarios).toHaveLength(1)
})

test.describe('typed numbers', () => {
  test.beforeEach(({ page }) => open(page, ONE))

  test('understand the decimal comma, and are taken over on Enter and on leaving', async ({ page }) => {
    await field(page, 'matter').fill('0,25')
    await expect(page).toHaveURL(/matter:0.3,/)
    await page.keyboard.press('Enter')
    await expect(page).toHaveURL(/matter:0.25,/)
    await expect(field(page, 'matter')).toHaveValue('0.25')
    // What closes the budget follows at once: 1 − 0.25 less the radiation.
    await expect(page.getByRole('status', { name: 'dark energy, closes' })).toHaveText('0.7499')
    await field(page, 'curvature').fill('−0,1')
    await page.keyboard.press('Tab')
    await expect(page).toHaveURL(/curvature:-0.1,/)
  })

  test('that are refused stay, with the reason beside them', async ({ page }) => {
    await field(page, 'Hubble constant').fill('7o')
    await page.keyboard.press('Tab')
    const complaint = page.getByRole('alert').filter({ hasText: 'Hubble constant' })
    await expect(complaint).toHaveText(
      'Hubble constant is not a plain decimal number. Allowed: a number from 1 to 1000 km/s/Mpc.',
    )
    await expect(field(page, 'Hubble constant')).toHaveValue('7o')
    await expect(page).toHaveURL(/h0:70,/)
    // Another field is not held up by it.
    await field(page, 'matter').fill('0.4')
    await page.keyboard.press('Enter')
    await expect(page).toHaveURL(/h0:70,matter:0.4/)
    await expect(complaint).toBeVisible()
    await field(page, 'Hubble constant').fill('71')
    await page.keyboard.press('Enter')
    await expect(page).toHaveURL(/h0:71,matter:0.4/)
    await expect(complaint).toHaveCount(0)
  })

  test('Escape takes back what was typed', async ({ page }) => {
    await field(page, 'matter').fill('9')
    await page.keyboard.press('Escape')
    await expect(field(page, 'matter')).toHaveValue('0.3')
  })
})

test('another law shows its parameters at once, before the server has answered', async ({ page }) => {
  await open(page, ONE)
  await page.route('**/api/explorer**', async (route) => {
    await new Promise((resolve) => setTimeout(resolve, 1500))
    await route.continue()
  })
  await page.getByLabel('law of dark energy').selectOption('cpl')
  await expect(field(page, 'w today')).toHaveValue('-1', { timeout: 1000 })
  await expect(slider(page, 'slope of w')).toBeVisible()
  await expect(page).toHaveURL(/eos:cpl,as:One/)
})

test('a scenario without a solution keeps the last picture and says why', async ({ page }) => {
  await open(page, '/?s=h0:70,matter:0.3,eos:field,v:linear,as:Field')
  const before = await said(page, 'Field').textContent()
  const slope = field(page, 'slope')
  await slope.fill('5')
  await page.keyboard.press('Enter')
  await expect(page.getByRole('alert').filter({ hasText: 'at most' })).toContainText('Shown is the last picture')
  await expect(said(page, 'Field')).toHaveText(`${before}`)
  await expect(slope).toHaveValue('5')
  await slope.fill('0.9')
  await page.keyboard.press('Enter')
  await expect(page.getByRole('alert').filter({ hasText: 'at most' })).toHaveCount(0)
  await expect(said(page, 'Field')).not.toHaveText(`${before}`)
})

test('scenarios are added, copied, renamed, chosen and removed without a new page', async ({ page }) => {
  await open(page, ONE)
  await page.evaluate(() => Object.assign(window, { same: true }))
  const names = page.locator('.verdict h2')
  await page.getByRole('link', { name: 'Copy', exact: true }).click()
  await page.getByRole('link', { name: 'Add' }).click()
  await expect(names).toHaveText(['One', 'One 2', 'Scenario 3'])
  await field(page, 'name').fill('Heavy: 3, 14')
  await page.keyboard.press('Enter')
  await expect(names).toHaveText(['One', 'One 2', 'Heavy: 3, 14'])
  await expect(page).toHaveTitle('One, One 2 and Heavy: 3, 14 · Longhence')
  await page.locator('.tab', { hasText: 'One 2' }).click()
  await expect(page.locator('#moments')).toHaveText('Moments of One 2')
  await expect(field(page, 'name')).toHaveValue('One 2')
  for (let i = 0; i < 3; i++) await page.getByRole('link', { name: 'Add' }).click()
  await expect(names).toHaveCount(6)
  await expect(page.getByRole('link', { name: 'Add' })).toHaveCount(0)
  await page.getByRole('link', { name: 'Remove' }).click()
  await expect(names).toHaveCount(5)
  await page.getByRole('link', { name: 'Night' }).click()
  await expect(page.locator('[data-theme="night"]')).toBeVisible()
  await expect(page).toHaveURL(/theme=night/)
  expect(await page.evaluate(() => 'same' in window)).toBe(true)
})

interface Counting {
  flights: { now: number; most: number }
}

/** Counts the questions under way as the page sees them: one that it has given up is none. */
function countFlights() {
  const flights = { now: 0, most: 0 }
  Object.assign(window, { flights })
  const real = window.fetch
  window.fetch = (input, init) => {
    if (!String(input).includes('/api/explorer')) return real(input, init)
    flights.most = Math.max(flights.most, ++flights.now)
    let landed = false
    const land = () => {
      if (!landed) flights.now--
      landed = true
    }
    init?.signal?.addEventListener('abort', land)
    return real(input, init).finally(land)
  }
}

test.describe('slow and broken lines', () => {
  test('dragging asks one question at a time, and nothing old is drawn over something newer', async ({ page }) => {
    await page.addInitScript(countFlights)
    await open(page, ONE)
    let asked = 0
    await page.route('**/api/explorer**', async (route) => {
      // The first ones take longest: without care they would come last.
      await new Promise((resolve) => setTimeout(resolve, Math.max(50, 700 - 200 * asked++)))
      await route.continue().catch(() => undefined)
    })
    await page.evaluate(() => {
      const ages: string[] = []
      Object.assign(window, { ages })
      const age = document.querySelector('[data-measure="age"] .value') as Element
      new MutationObserver(() => ages.push(age.textContent)).observe(age, {
        subtree: true,
        childList: true,
        characterData: true,
      })
    })
    await drag(page, slider(page, 'matter'), 0.3, 0.95, 24)
    await settled(page)
    expect(await page.evaluate(() => (window as unknown as Counting).flights)).toEqual({ now: 0, most: 1 })
    const matter = await field(page, 'matter').inputValue()
    await expect(page).toHaveURL(new RegExp(`matter:${matter}`))
    // More matter, younger universe: the ages that were shown never rise.
    const ages = (await page.evaluate(() => (window as unknown as { ages: string[] }).ages)).map(Number.parseFloat)
    expect(ages.length).toBeGreaterThan(0)
    expect(ages).toEqual(ages.toSorted((one, other) => other - one))
    const last = await numbers(page)
    await page.unroute('**/api/explorer**')
    await page.reload()
    expect(await numbers(page)).toEqual(last)
  })

  test('a change that is made drops the question before it', async ({ page }) => {
    await open(page, ONE)
    await page.route(/explorer.*matter%3A0.9/, async (route) => {
      await new Promise((resolve) => setTimeout(resolve, 2000))
      await route.continue().catch(() => undefined)
    })
    const matter = field(page, 'matter')
    await matter.fill('0.9')
    await page.keyboard.press('Enter')
    await matter.fill('0.2')
    await page.keyboard.press('Enter')
    await expect(measure(page, 'age')).toHaveText('15.02 Gyr', { timeout: 1500 })
    await page.waitForTimeout(1500)
    await expect(measure(page, 'age')).toHaveText('15.02 Gyr')
  })

  test('only what takes long is said to be under way', async ({ page }) => {
    await page.clock.install()
    await open(page, ONE)
    const news = page.getByText('Calculating')
    let answer = () => {}
    const held = new Promise<void>((resolve) => {
      answer = resolve
    })
    await page.route('**/api/explorer**', async (route) => {
      await held
      await route.continue()
    })
    await page.clock.pauseAt(Date.now() + 60_000)
    await field(page, 'matter').fill('0.32')
    await page.keyboard.press('Enter')
    await expect(page.locator('main[aria-busy=true]')).toHaveCount(1)
    await page.clock.runFor(290)
    await expect(news).toHaveCount(0)
    await page.clock.runFor(20)
    await expect(news).toBeVisible()
    await page.clock.resume()
    await expect(page.locator('.chart:visible')).toHaveCount(1)
    answer()
    await expect(news).toHaveCount(0)
    await expect(measure(page, 'age')).not.toHaveText('13.46 Gyr')
  })

  for (const [name, breakIt] of [
    ['fails', 'status'],
    ['cannot be reached', 'abort'],
  ] as const) {
    const breakServer = (page: Page) =>
      page.route('**/api/explorer**', (route) =>
        breakIt === 'abort' ? route.abort() : route.fulfill({ status: 500, body: '' }),
      )

    test(`where the server ${name} the page computes by itself and says so`, async ({ page }) => {
      await open(page, ONE)
      const before = await numbers(page)
      await breakServer(page)
      await field(page, 'matter').fill('0.4')
      await page.keyboard.press('Enter')
      const note = page.getByRole('status').filter({ hasText: 'This page computes in your browser' })
      await expect(note).toContainText('The server', { timeout: 15_000 })
      await expect.poll(() => numbers(page)).not.toEqual(before)
      const here = await numbers(page)
      await page.unroute('**/api/explorer**')
      await note.getByRole('button', { name: 'Try again' }).click()
      await expect(note).toHaveCount(0)
      await settled(page)
      expect(await numbers(page)).toEqual(here)
    })

    test(`where the server ${name} and nothing can be computed, the last picture stays`, async ({ page }) => {
      await open(page, ONE)
      const before = await numbers(page)
      await breakServer(page)
      await page.route('**/turbopack-worker*', (route) => route.abort())
      await field(page, 'matter').fill('0.4')
      await page.keyboard.press('Enter')
      const alert = page.getByRole('alert').filter({ hasText: 'The server' })
      await expect(alert).toContainText('Shown is the last picture', { timeout: 15_000 })
      expect(await numbers(page)).toEqual(before)
      await expect(field(page, 'matter')).toHaveValue('0.4')
      await page.unroute('**/turbopack-worker*')
      await page.unroute('**/api/explorer**')
      await alert.getByRole('button', { name: 'Try again' }).click()
      await expect(alert).toHaveCount(0)
      await settled(page)
      expect(await numbers(page)).not.toEqual(before)
    })
  }
})

test('a link is shown for copying by hand where the clipboard is closed', async ({ page }) => {
  await page.addInitScript(() => Object.defineProperty(navigator, 'clipboard', { value: undefined }))
  await open(page, ONE)
  await page.getByRole('button', { name: 'Copy link' }).click()
  const input = page.getByRole('textbox', { name: 'Copy from here' })
  await expect(input).toHaveValue(page.url())
  expect(await page.evaluate(() => getSelection()?.toString())).toBe(page.url())
  await page.keyboard.press('Escape')
  await expect(input).toHaveCount(0)
})

test.describe('the cursor over the figure', () => {
  test('the page comes without the chart library, and with it nothing moves', async ({ page }) => {
    const heard = await complaints(page)
    const scripts: string[] = []
    page.on('response', (response) => response.url().endsWith('.js') && scripts.push(response.url()))
    await page.goto('/', { waitUntil: 'networkidle' })
    const [initial, shift] = [scripts.length, await shifts(page)]
    const picture = () =>
      page.locator('.chart:visible').evaluate((svg) => [svg.outerHTML, JSON.stringify(svg.getBoundingClientRect())])
    const before = await picture()
    await page.mouse.move(640, 500)
    await expect(page.locator('.recharts-surface')).toBeVisible()
    expect(scripts.length).toBeGreaterThan(initial)
    expect(await picture()).toEqual(before)
    expect(shift).toBeLessThan(0.01)
    expect(await shifts(page)).toBeLessThan(0.01)
    expect(heard).toEqual([])
  })

  test('reads all scenarios at once, as the interface has them', async ({ page, request }) => {
    await open(page, '/')
    await pointAt(page, 0.4, 0.7)
    await expect(readout(page)).toBeVisible()
    const time = Number.parseFloat((await readout(page).locator('thead th').first().textContent()) ?? '')
    const [row] = await readout(page).locator('tbody tr').allTextContents()
    const { s } = await page.evaluate(() => ({
      s: document.querySelector<HTMLInputElement>('input[name=s]')?.value ?? '',
    }))
    const answer = await (await request.get('/api/at', { params: { s, time, columns: 'scale,redshift' } })).json()
    const [scale, redshift] = answer.scenarios[0].rows[0]
    // The read-out rounds the time to 0.01 Gyr and the values to three digits.
    expect(row).toContain('Steady light')
    const [a, z] = (await readout(page).locator('tbody tr').first().locator('td').allTextContents()).map((text) =>
      Number(text.replace('−', '-')),
    )
    expect(Math.abs(a / scale - 1)).toBeLessThan(6e-3)
    expect(Math.abs(z - redshift)).toBeLessThan(6e-3 * Math.max(1, Math.abs(redshift)))
    await expect(readout(page).locator('tbody tr')).toHaveCount(3)
  })

  test('a curve under the pointer stands out, and a click chooses its scenario', async ({ page }) => {
    await open(page, '/')
    await pointAt(page, 0.5, 0.9)
    await expect(page.locator('.recharts-surface')).toBeVisible()
    const spot = await page
      .locator('.touchable path')
      .nth(1)
      .evaluate((path: SVGPathElement) => {
        const { x, y } = path.getPointAtLength(0.6 * path.getTotalLength())
        const { a, d, e, f } = path.getScreenCTM() as DOMMatrix
        return [x * a + e, y * d + f] as const
      })
    await page.mouse.move(...spot)
    const frame = page.locator('.frame:visible')
    await expect(frame).toHaveAttribute('data-lit', '1')
    await page.mouse.click(...spot)
    await expect(page.locator('#moments')).toHaveText('Moments of Fading light')
    await page.mouse.move(5, 5)
    await expect(frame).not.toHaveAttribute('data-lit')
    await expect(readout(page)).toHaveCount(0)
  })

  test('keys move it, and it says what it reads', async ({ page }) => {
    await open(page, '/')
    await cursor(page).focus()
    await page.keyboard.press('ArrowRight')
    await expect(readout(page)).toBeVisible()
    await expect(cursor(page)).toHaveAttribute('aria-valuetext', /^\+\d\.\d\d Gyr$/)
    const voice = page.locator('.frame').getByRole('status').first()
    await expect(voice).toContainText(/Steady light: a 1\.0\d, z −0\.0\d; Fading light: a 1\.0\d/)
    await page.keyboard.press('End')
    await expect(voice).toContainText('Fading light: nothing')
    await page.keyboard.press('Home')
    await page.keyboard.press('PageUp')
    await page.keyboard.press('ArrowDown')
    await page.keyboard.press('ArrowDown')
    await expect(page.locator('.frame:visible')).toHaveAttribute('data-lit', '1')
    await page.keyboard.press('Enter')
    await expect(page.locator('#moments')).toHaveText('Moments of Fading light')
    await page.keyboard.press('Escape')
    await expect(readout(page)).toHaveCount(0)
  })
})

test('only a keyboard', async ({ page }) => {
  await open(page, ONE)
  const press = async (key: string, times = 1) => {
    for (let i = 0; i < times; i++) await page.keyboard.press(key)
  }
  const focused = () =>
    page.evaluate(() => `${document.activeElement?.getAttribute('type') ?? ''} ${document.activeElement?.id}`)
  const reach = async (what: string) => {
    for (let i = 0; i < 40 && !(await focused()).includes(what); i++) await press('Tab')
    expect(await focused()).toContain(what)
  }
  await reach('field-matter')
  await reach('range')
  // What has the focus is not hidden behind the figure that stays.
  const covered = await page.evaluate(() => {
    const { left, top, width, height } = (document.activeElement as Element).getBoundingClientRect()
    return document.elementFromPoint(left + width / 2, top + height / 2) !== document.activeElement
  })
  expect(covered).toBe(false)
  await press('ArrowRight', 3)
  await expect(page).toHaveURL(/matter:0.315,/)
  await reach('field-eos')
  await press('ArrowDown')
  await expect(page).toHaveURL(/eos:constant/)
  await reach('field-w')
  await page.keyboard.type('-1.2')
  await press('Enter')
  await expect(said(page, 'One')).toContainText('Big Rip')
})

test.describe('on a phone', () => {
  test.use({ viewport: { width: 390, height: 844 }, hasTouch: true, isMobile: true })

  test('fingers set parameters, read the figure and choose scenarios', async ({ page }) => {
    await open(page, '/')
    const { x, y, width, height } = await clear(slider(page, 'matter'))
    await page.touchscreen.tap(x + 0.6 * width, y + height / 2)
    await settled(page)
    await expect(page).toHaveURL(/matter:0\.[56]\d*,as:Steady/)
    await expect(page.getByRole('button', { name: 'Undo' })).toBeVisible()
    await page.locator('.tab', { hasText: 'Fading light' }).tap()
    await expect(page.locator('#moments')).toHaveText('Moments of Fading light')
    const box = await cursor(page).boundingBox()
    if (!box) throw new Error('no figure')
    const spot = [box.x + 0.7 * box.width, box.y + 0.3 * box.height] as const
    await page.touchscreen.tap(...spot)
    await expect(page.locator('.recharts-surface')).toBeVisible()
    await page.touchscreen.tap(...spot)
    await expect(readout(page)).toBeVisible()
    const wide = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth)
    expect(wide).toBeLessThanOrEqual(0)
  })
})

async function pointAt(page: Page, across: number, down: number): Promise<void> {
  const box = await cursor(page).boundingBox()
  if (!box) throw new Error('no figure')
  const [x, y] = [box.x + across * box.width, box.y + down * box.height]
  await page.mouse.move(x - 20, y)
  await expect(page.locator('.recharts-surface')).toBeVisible()
  await page.mouse.move(x, y)
}

/** Sum of the layout shifts that nobody asked for. */
function shifts(page: Page): Promise<number> {
  return page.evaluate(
    () =>
      new Promise<number>((resolve) => {
        let sum = 0
        new PerformanceObserver((list) => {
          for (const entry of list.getEntries()) sum += (entry as unknown as { value: number }).value
        }).observe({ type: 'layout-shift', buffered: true })
        setTimeout(() => resolve(sum), 200)
      }),
  )
}
