/** What a page that comes alive adds has its room already, on a phone too. */
import { expect, type Page, test } from '@playwright/test'

const FOUR = '/?s=h0:70,matter:0.3&s=h0:70,matter:0.25,eos:cpl,w0:-0.9,wa:0.2&s=h0:73.04&s=matter:1.2,dark:0'

const heights = (page: Page) =>
  page
    .locator('form .field, .take-away tr:has(th:text-is("Table"), th:text-is("Link as QR code"))')
    .evaluateAll((all) =>
      all.map((one) => [one.textContent?.slice(0, 20), Math.round(one.getBoundingClientRect().height)]),
    )

for (const width of [390, 768, 1280]) {
  test(`fields and rows keep their heights: ${width} pixels`, async ({ page }) => {
    await page.setViewportSize({ width, height: 900 })
    await page.goto(FOUR)
    const resting = await heights(page)
    expect(await page.locator('.reset.absent').count()).toBeGreaterThan(1)
    expect(resting.length).toBeGreaterThan(5)
    await page.evaluate(() => dispatchEvent(new Event('pointermove')))
    await expect(page.getByRole('button', { name: /^Reset Hubble/ })).toBeVisible()
    await expect(page.getByRole('link', { name: 'Link as QR code as SVG' })).toHaveCount(1)
    const alive = await heights(page)
    expect(alive.map(([, height]) => height)).toEqual(resting.map(([, height]) => height))
  })
}

test('without scripts no room is kept', async ({ browser, baseURL }) => {
  const page = await browser.newPage({ javaScriptEnabled: false, baseURL })
  await page.goto(FOUR)
  await expect(page.getByRole('button', { name: /^Reset Hubble/ })).toBeHidden()
  const kept = page.locator('.take-away tr.absent, .unit .reset')
  for (const one of await kept.all()) expect(await one.boundingBox()).toBeNull()
  await page.close()
})
