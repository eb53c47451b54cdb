/** The explorer in Firefox, where it can be had: it opens, follows a number and a slider, and works by keyboard. */
import { expect, test } from '@playwright/test'
import puppeteer, { type Page } from 'puppeteer-core'
import { FIREFOX, find } from '../scripts/setup/browsers.mjs'

const executablePath = find(FIREFOX, process.env)

test.describe.configure({ timeout: 180_000 })
test.skip(!executablePath, 'Firefox was not found (on Debian: apt-get install firefox-esr, or set FIREFOX_PATH)')

const text = (page: Page, selector: string) => page.$eval(selector, (element) => element.textContent?.trim() ?? '')
const age = (page: Page) => text(page, '[data-measure="age"] .value')

test('the explorer opens, follows numbers, keys and views, and reports no error', async ({ baseURL }) => {
  const browser = await puppeteer.launch({ browser: 'firefox', executablePath, headless: true })
  try {
    const page = await browser.newPage()
    const heard: string[] = []
    page.on('pageerror', (error) => void heard.push(String(error)))
    page.on('console', (message) => void (message.type() === 'error' && heard.push(message.text())))
    await page.setViewport({ width: 1280, height: 900 })
    await page.goto(`${baseURL}/?s=h0:70,matter:0.3,cmb:0`, { waitUntil: 'load' })
    await page.waitForFunction(() => document.body.textContent?.includes('Copy link'))
    // Flat, Ω_m = 0.3, no radiation: 2/(3√0.7) asinh √(0.7/0.3)/H₀ is 13.467 Gyr (closed form).
    expect(await age(page)).toBe('13.47 Gyr')

    const field = await page.waitForSelector('input[name="matter"]:not([type=range])')
    await field?.focus()
    await field?.evaluate((element) => (element as HTMLInputElement).select())
    await page.keyboard.type('1')
    await page.keyboard.press('Enter')
    // Einstein and de Sitter: 2/(3 H₀) is 9.312 Gyr.
    await expect.poll(() => age(page)).toBe('9.31 Gyr')
    expect(page.url()).toContain('matter:1,')

    await page.focus('input[type=range][aria-label="matter"]')
    await page.keyboard.press('ArrowLeft')
    await expect.poll(() => page.url()).not.toContain('matter:1,')
    await page.goBack()
    await expect.poll(() => age(page)).toBe('9.31 Gyr')

    await page.goto(`${baseURL}/?view=distances`, { waitUntil: 'load' })
    expect(await page.$$eval('figure svg', (drawings) => drawings.some(({ clientWidth }) => clientWidth > 300))).toBe(
      true,
    )
    // All but the stand-in until ours have come, which is a font of the system.
    const refused = await page.evaluate(() =>
      [...document.fonts].flatMap(({ status, family, weight }) => (status === 'error' ? [`${family} ${weight}`] : [])),
    )
    expect(refused.filter((one) => !one.includes('Fallback'))).toEqual([])
    expect(heard).toEqual([])
  } finally {
    await browser.close()
  }
})
