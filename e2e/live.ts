/** The live page: its parts by the names that people see, and hands that drag. */
import { expect, type Locator, type Page } from '@playwright/test'

/** The page, once its scripts have taken over, as they do when a hand comes near. */
export async function open(page: Page, path: string): Promise<void> {
  await page.goto(path)
  await stir(page)
  await expect(page.getByRole('button', { name: 'Copy link' })).toBeVisible()
  await stir(page)
}

/** By a hand that is neither a mouse nor a finger, whose tests come later. */
const stir = (page: Page) => page.evaluate(() => void dispatchEvent(new Event('pointermove')))

export const slider = (page: Page, name: string) => page.getByRole('slider', { name, exact: true })
export const field = (page: Page, name: string) => page.getByRole('textbox', { name })
export const said = (page: Page, name: string) => page.locator('.verdict', { hasText: name }).locator('.said')
export const measure = (page: Page, key: string) => page.locator(`[data-measure="${key}"] .value`)
export const readout = (page: Page) => page.locator('.readout')
export const cursor = (page: Page) => page.getByRole('slider', { name: 'Time at the cursor' })

/** All that the page tells in numbers. */
export async function numbers(page: Page): Promise<readonly string[]> {
  const texts = await page.locator('.said, [data-measure], .moments tr').allTextContents()
  return texts.map((text) => text.replace(/\s+/g, ' '))
}

/** Settled: the view is that of the address. */
export async function settled(page: Page): Promise<void> {
  await expect(page.locator('main')).not.toHaveAttribute('aria-busy', 'true')
}

/** From one part of its length to another, as a hand does it. */
export async function drag(page: Page, what: Locator, from: number, to: number, steps = 12): Promise<void> {
  const { x, y, width, height } = await clear(what)
  const at = (part: number) => [x + part * width, y + height / 2] as const
  await page.mouse.move(...at(from))
  await page.mouse.down()
  for (let i = 1; i <= steps; i++) await page.mouse.move(...at(from + ((to - from) * i) / steps))
  await page.mouse.up()
}

/** Scrolled to where the figure, which stays in sight, does not cover it. */
export async function clear(what: Locator) {
  await what.evaluate((element) => element.scrollIntoView({ block: 'end' }))
  const box = await what.boundingBox()
  if (!box) throw new Error('nothing to see')
  return box
}

/** Our own setting of the tests. */
const BLOCKED = 'Service Worker registration blocked by Playwright'

/** Whatever the browser refuses, reports as an error, or moves without being asked. */
export async function complaints(page: Page): Promise<string[]> {
  const heard: string[] = []
  page.on('console', (message) => {
    if (['error', 'warning'].includes(message.type()) && message.text() !== BLOCKED) heard.push(message.text())
  })
  page.on('pageerror', (error) => heard.push(error.message))
  await page.exposeFunction('refused', (what: string) => heard.push(what))
  await page.addInitScript(() => {
    document.addEventListener('securitypolicyviolation', ({ violatedDirective, blockedURI }) =>
      (globalThis as unknown as { refused(what: string): void }).refused(`${violatedDirective} ${blockedURI}`),
    )
  })
  return heard
}
