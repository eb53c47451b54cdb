/** The explorer as a person uses it. */
import { expect, type Page, test } from '@playwright/test'

const verdict = (page: Page, name: string) => page.locator('.verdict', { hasText: name }).locator('.said')
const ingredients = (page: Page) => page.locator('.ingredients')
const measure = (page: Page, key: string) => page.locator(`[data-measure="${key}"] .value`)

test.describe('without JavaScript', () => {
  test.use({ javaScriptEnabled: false })

  test('the page is complete', async ({ page }) => {
    expect((await page.goto('/'))?.status()).toBe(200)
    await expect(page.locator('.verdict')).toHaveCount(3)
    await expect(verdict(page, 'Steady light')).toContainText('Begins in a Big Bang 13.79 Gyr ago')
    await expect(verdict(page, 'Fading light')).toContainText('Big Crunch')
    await expect(verdict(page, 'Gathering light')).toContainText('Big Rip')
    await expect(page.locator('.chart:visible')).toHaveCount(1)
    await expect(page.locator('.chart:visible .curve')).not.toHaveCount(0)
    await expect(page.getByRole('img', { name: /scale factor.*Steady light: begins in a Big Bang/ })).toBeVisible()
    await expect(measure(page, 'age')).toHaveText('13.79 Gyr')
    await expect(page.locator('.moments')).toContainText('acceleration begins')
  })

  test('parameters are set by the form and the verdict changes', async ({ page }) => {
    await page.goto('/?s=h0:70,matter:0.3')
    await expect(verdict(page, 'Scenario 1')).toContainText('expands for ever')
    await ingredients(page).getByRole('textbox', { name: 'matter' }).fill('1,5')
    await ingredients(page).getByLabel('law of dark energy').selectOption('constant')
    await page.getByRole('button', { name: 'Apply' }).click()
    await ingredients(page).getByRole('textbox', { name: 'equation of state' }).fill('−0,9')
    await ingredients(page).getByLabel('name').fill('Heavy, and sinking')
    await page.getByRole('button', { name: 'Apply' }).click()
    await expect(page).toHaveURL(/[?]s=h0:70,matter:1.5,eos:constant,w:-0.9,as:Heavy%2C%20and%20sinking$/)
    await expect(verdict(page, 'Heavy, and sinking')).toContainText('ends in a Big Crunch')
    await expect(page.getByRole('alert')).toHaveCount(0)
  })

  test('scenarios are added, copied, chosen and removed by links', async ({ page }) => {
    await page.goto('/?s=h0:70,as:One')
    await page.getByRole('link', { name: 'Copy' }).click()
    await page.getByRole('link', { name: 'Add' }).click()
    await expect(page.locator('.verdict h2')).toHaveText(['One', 'One 2', 'Scenario 3'])
    await page.locator('.tab', { hasText: 'One 2' }).click()
    await expect(page.locator('#moments')).toHaveText('Moments of One 2')
    await ingredients(page).getByRole('textbox', { name: 'Hubble constant' }).fill('60')
    await page.getByRole('button', { name: 'Apply' }).click()
    await expect(page.locator('.verdict h2')).toHaveText(['One', 'One 2', 'Scenario 3'])
    await expect(page.locator('#moments')).toHaveText('Moments of One 2')
    await page.getByRole('link', { name: 'Remove' }).click()
    await expect(page.locator('.verdict h2')).toHaveText(['One', 'Scenario 2'])
  })

  test('the theme is chosen by a link and stays', async ({ page }) => {
    const root = page.locator('html')
    const ground = () => root.evaluate((one) => getComputedStyle(one).backgroundColor)
    await page.goto('/')
    const paper = await ground()
    await page.getByRole('link', { name: 'Night' }).click()
    await expect(page).toHaveURL(/theme=night/)
    await expect(root).not.toHaveCSS('background-color', paper)
    const night = await ground()
    await page.getByRole('button', { name: 'Apply' }).click()
    await expect(page).toHaveURL(/s=.*theme=night/)
    await expect(root).toHaveCSS('background-color', night)
  })
})

test('a bad link opens with a notice and the nearest good reading', async ({ page }) => {
  expect((await page.goto('/?s=h0:70,matter:0.3x&s=h0:5000'))?.status()).toBe(200)
  const notice = page.getByRole('alert').filter({ hasText: 'cannot be shown' })
  await expect(notice).toContainText('matter')
  await expect(notice).toContainText('0.3x')
  await expect(notice).toContainText('h0')
  await expect(page.locator('.verdict')).toHaveCount(2)
  await notice.getByRole('link', { name: 'Open that reading' }).click()
  await expect(notice).toHaveCount(0)
  await expect(page.locator('.verdict')).toHaveCount(2)
})

test('a link of which nothing can be kept still opens', async ({ page }) => {
  expect((await page.goto('/?s='))?.status()).toBe(200)
  await expect(page.getByRole('alert').filter({ hasText: 'cannot be shown' })).toBeVisible()
  await expect(page.locator('.verdict')).not.toHaveCount(0)
})

test('what does not exist is a page of ours with status 404', async ({ page }) => {
  expect((await page.goto('/nothing-here'))?.status()).toBe(404)
  await expect(page.getByRole('heading', { name: 'There is no such page' })).toBeVisible()
  await page.getByRole('link', { name: 'explorer' }).click()
  await expect(page.locator('.verdict')).toHaveCount(3)
})

for (const width of [390, 1280, 1920]) {
  test(`nothing runs over the edge at ${width} px`, async ({ page }) => {
    await page.setViewportSize({ width, height: 900 })
    for (const path of ['/', `/?s=h0:70,as:${'W'.repeat(60)}&s=matter:1,cmb:0,as:Two`]) {
      await page.goto(path)
      expect(await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth)).toBeLessThanOrEqual(0)
      await expect(page.locator('.chart:visible')).toHaveCount(1)
    }
  })
}
