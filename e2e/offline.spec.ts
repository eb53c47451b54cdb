/** What was visited once works with the server gone. */
import { expect, type Page, test } from '@playwright/test'
import { complaints, drag, measure, numbers, open, said, settled, slider } from './live'
import { npmStart, stop } from './server'

test.use({ serviceWorkers: 'allow' })
test.describe.configure({ timeout: 120_000 })

const note = (page: Page) => page.getByRole('status').filter({ hasText: 'This page computes in your browser' })

/** Settled: the files of the page are kept, and its windows are served from them. */
const isKept = (page: Page) =>
  expect
    .poll(() => page.evaluate(() => navigator.serviceWorker.controller?.state ?? 'none'), { timeout: 30_000 })
    .toBe('activated')

test('the explorer opens and computes with the server killed, says so, and finds it again', async ({ browser }) => {
  const server = await npmStart()
  const context = await browser.newContext({ baseURL: server.url, serviceWorkers: 'allow' })
  const page = await context.newPage()
  const heard = await complaints(page)
  await open(page, '/?s=h0:70,matter:0.25,as:Visited')
  await isKept(page)
  const visited = await numbers(page)
  await open(page, '/')
  const demo = await numbers(page)
  await stop(server, 'SIGTERM')

  // As it was seen, without a question.
  await page.reload()
  await expect(note(page)).toContainText('The server cannot be reached.')
  expect(await numbers(page)).toEqual(demo)

  // Scenarios that the server never saw. 13.462 Gyr: flat, h0 = 70, matter 0.3, standard radiation.
  await open(page, '/?s=h0:70,matter:0.3,as:One&s=h0:70,matter:0.3,eos:constant,w:-1.3,as:Two')
  await expect(measure(page, 'age')).toHaveText('13.46 Gyr')
  await expect(said(page, 'Two')).toContainText('Big Rip')
  await expect(note(page)).toBeVisible()
  const before = await numbers(page)
  await drag(page, slider(page, 'matter'), 0.3, 0.5)
  await expect.poll(() => numbers(page)).not.toEqual(before)

  // The ruler and the words as well. In flat dust the distance to z = 3 is 2 (1 − 1/√4) c/H₀, whatever H₀.
  await open(page, '/?s=h0:50,matter:1,cmb:0,as:Dust&at=1&read=comoving&units=h')
  await expect(page.getByRole('button', { name: 'Read', exact: true, includeHidden: true })).toHaveCount(0)
  await page.getByRole('textbox', { name: 'redshift' }).fill('3')
  await expect(page.locator('[data-reading="comoving"] .value')).toHaveText(['2997.92'])
  await page.locator('.take-away summary').click()
  await expect(page.locator('.take-away pre', { hasText: '\\newcommand{\\lhAge}' })).toContainText('Longhence')

  // What the server had told of another page is computed here, to the same digits.
  await page.goto('/?s=h0:70,matter:0.25,as:Visited')
  await expect.poll(() => numbers(page)).toEqual(visited)
  await expect(note(page)).toBeVisible()

  const again = await npmStart(Number(new URL(server.url).port))
  await expect(note(page)).toHaveCount(0, { timeout: 20_000 })
  await settled(page)
  expect(await numbers(page)).toEqual(visited)
  await page.goto('/not-there')
  await expect(page.getByRole('heading', { name: 'There is no such page' })).toBeVisible()
  await stop(again, 'SIGTERM')
  expect(heard.filter((one) => !/ERR_CONNECTION_REFUSED|status of 404/.test(one))).toEqual([])
  await context.close()
})

test('files of another build are not kept', async ({ page }) => {
  await page.addInitScript(() => caches.open('longhence-another'))
  await open(page, '/')
  await isKept(page)
  await expect
    .poll(() => page.evaluate(() => caches.keys()))
    .toEqual([expect.stringMatching(/^longhence-[0-9a-f]{12}$/)])
})
