/** For everyone: what axe finds, keys, zoom, forced colours, still pictures, fingers. WCAG 2.2 AA. */
import AxeBuilder from '@axe-core/playwright'
import { expect, type Page, test } from '@playwright/test'
import { open } from './live'

test.describe.configure({ timeout: 120_000 })

const EVERY = [390, 1280, 1920].flatMap((width) => [
  { width, theme: 'light' } as const,
  { width, theme: 'dark' } as const,
])
/** Each width and each theme once: pages that share their styles with the explorer. */
const PAIRS = [EVERY[0], EVERY[3], EVERY[4]]

/** Every page, and in what it is looked at. One line for each that is new. */
const PAGES = {
  '/': EVERY,
  '/?s=matter:none&s=h0:70': PAIRS,
  '/?s=h0:70,matter:0.3&engine=0': PAIRS,
  '/retune': PAIRS,
  '/not-there': PAIRS,
  '/method': PAIRS,
  '/words': PAIRS,
  '/embed': PAIRS,
  '/api': PAIRS,
  // Shows both themes by itself, and hundreds of figures.
  '/gallery': [EVERY[2]],
}
const RULES = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice']

async function faults(page: Page): Promise<readonly string[]> {
  const axe = new AxeBuilder({ page }).options({ resultTypes: ['violations'] }).withTags(RULES)
  const { violations } = await axe.analyze()
  return violations.flatMap(({ id, nodes }) =>
    nodes.map(({ target, failureSummary }) => `${id}: ${target} ${failureSummary}`),
  )
}

for (const [path, looks] of Object.entries(PAGES)) {
  test(`axe finds nothing at ${path}`, async ({ page }) => {
    for (const { width, theme } of looks) {
      await page.emulateMedia({ colorScheme: theme })
      await page.setViewportSize({ width, height: 900 })
      await page.goto(path, { waitUntil: 'networkidle' })
      expect(await faults(page), `${width} px, ${theme}`).toEqual([])
    }
  })

  test(`headings go down in steps at ${path}`, async ({ page }) => {
    await page.goto(path)
    const levels = await page
      .locator('h1, h2, h3, h4')
      .evaluateAll((all) => all.map(({ tagName }) => Number(tagName[1])))
    expect(levels.filter((level) => level === 1)).toHaveLength(1)
    expect(levels.filter((level, i) => level > (levels[i - 1] ?? 0) + 1)).toEqual([])
  })

  test(`nothing is cut off or scrolled sideways at 400% zoom at ${path}`, async ({ page }) => {
    // 1280 px at 400%: WCAG 1.4.10.
    await page.setViewportSize({ width: 320, height: 256 })
    await page.goto(path, { waitUntil: 'networkidle' })
    expect(await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth)).toBeLessThanOrEqual(0)
  })
}

for (const width of [320, 1280]) {
  test(`text that a reader has spaced out is not cut off: ${width} px`, async ({ page }) => {
    // WCAG 1.4.12.
    await page.setViewportSize({ width, height: 800 })
    await open(page, '/')
    const over = await page.evaluate(() => {
      for (const element of document.querySelectorAll<HTMLElement>('body *:not(svg *, math *)')) {
        const { style } = element
        style.setProperty('content-visibility', 'visible', 'important')
        style.setProperty('line-height', '1.5', 'important')
        style.setProperty('letter-spacing', '0.12em', 'important')
        style.setProperty('word-spacing', '0.16em', 'important')
        if (element.tagName === 'P') style.setProperty('margin-bottom', '2em', 'important')
      }
      // Parts of the page are painted as far beyond their edges as its own margin goes.
      const margin = 16
      const scrolls = (element: Element) => ['auto', 'scroll'].includes(getComputedStyle(element).overflowX)
      const parts = [...document.querySelectorAll('html, main, main section, main div, .said, .value, button, a')]
      const cut = parts.filter((one) => {
        const { scrollWidth, clientWidth } = one
        return clientWidth > 1 && scrollWidth > clientWidth + margin && !scrolls(one)
      })
      return cut.map(({ className, textContent }) => `${className}: ${textContent?.slice(0, 40)}`)
    })
    expect(over).toEqual([])
  })
}

test('the first key leads past the masthead', async ({ page }) => {
  await open(page, '/')
  await page.keyboard.press('Tab')
  const skip = page.getByRole('link', { name: 'Skip to the scenarios' })
  await expect(skip).toBeFocused()
  await expect(skip).toBeInViewport()
  await page.keyboard.press('Enter')
  await expect(page.locator('main')).toBeFocused()
})

for (const colorScheme of ['light', 'dark'] as const) {
  test(`what has the focus is marked, in ${colorScheme}`, async ({ page }) => {
    await page.emulateMedia({ colorScheme })
    await open(page, '/')
    for (let i = 0; i < 30; i++) {
      await page.keyboard.press('Tab')
      const marked = await page.evaluate(() => {
        const element = document.activeElement as HTMLElement
        if (element === document.body) return 'nothing has it'
        const { outlineStyle, outlineWidth } = getComputedStyle(element)
        const thumb = element.matches('input[type=range]')
        return thumb || (outlineStyle !== 'none' && Number.parseFloat(outlineWidth) >= 2)
          ? ''
          : element.outerHTML.slice(0, 120)
      })
      expect(marked).toBe('')
    }
  })
}

const focused = (page: Page) => page.locator(':focus')

test('what takes the place of something that had the focus gets it', async ({ page }) => {
  await open(page, '/')
  const tabs = page.getByRole('navigation', { name: 'Scenarios' })
  await tabs.getByRole('link', { name: 'Copy' }).press('Enter')
  await expect(tabs.getByRole('link')).toHaveCount(8)
  await expect(focused(page)).toHaveText('Copy')
  await tabs.getByRole('link', { name: 'Fading light' }).first().press('Enter')
  await expect(page).toHaveURL(/focus=3/)
  await expect(focused(page)).toHaveText('Fading light')

  await page.locator('.field .reset').first().press('Enter')
  await expect(focused(page)).toHaveRole('textbox')

  const zoom = page.locator('.long-view').getByRole('navigation', { name: 'Range of the long view' })
  await zoom.getByRole('link', { name: 'Closer' }).press('Enter')
  await zoom.getByRole('link', { name: 'Whole range' }).press('Enter')
  await expect(zoom.getByRole('link', { name: 'Whole range' })).toHaveCount(0)
  await expect(focused(page)).toHaveText('Closer')
})

test('the galaxy that cannot be followed is told beside its field', async ({ page }) => {
  await open(page, '/?view=reach')
  const field = page.getByRole('textbox', { name: 'Galaxy seen at z' })
  await field.fill('abc')
  await field.press('Enter')
  await expect(field).toHaveAttribute('aria-invalid', 'true')
  await expect(field).toHaveAccessibleDescription(/above 0/)
  await expect(field).toHaveValue('abc')
  await field.fill('2')
  await field.press('Enter')
  await expect(page).toHaveURL(/galaxy=2/)
  await expect(field).toBeFocused()
})

for (const [width, height] of [
  [1280, 900],
  [390, 844],
] as const) {
  test(`what has the focus is not hidden under the figure: ${width} px`, async ({ page }) => {
    await page.setViewportSize({ width, height })
    await open(page, '/')
    await page.locator('.ingredients summary').first().focus()
    for (let i = 0; i < 24; i++) {
      await page.keyboard.press('Shift+Tab')
      // WCAG 2.4.11: not entirely hidden.
      const hidden = await page.evaluate(() => {
        const element = document.activeElement as HTMLElement
        if (element === document.body) return ''
        const { left, top, width, height } = element.getBoundingClientRect()
        const seen = [0.1, 0.5, 0.9].some((part) => {
          const at = document.elementFromPoint(left + width / 2, top + part * height)
          return at !== null && (element.contains(at) || at.contains(element))
        })
        return seen ? '' : element.outerHTML.slice(0, 120)
      })
      expect(hidden).toBe('')
    }
  })
}

test('forced colours leave lines and marks', async ({ page }) => {
  await page.emulateMedia({ forcedColors: 'active' })
  await open(page, '/')
  const ground = await page.evaluate(() => getComputedStyle(document.body).backgroundColor)
  const strokes = await page
    .locator('.frame:visible .curve')
    .evaluateAll((curves) => curves.map((curve) => getComputedStyle(curve).stroke))
  expect(strokes.length).toBeGreaterThan(2)
  for (const stroke of strokes) expect([ground, 'none', 'rgba(0, 0, 0, 0)']).not.toContain(stroke)
  await expect(page.getByRole('slider', { name: 'matter', exact: true })).toBeVisible()
})

test('nothing moves by itself where that is not wanted', async ({ page }) => {
  await page.emulateMedia({ reducedMotion: 'reduce' })
  await open(page, '/')
  const moving = await page.evaluate(
    () =>
      [...document.querySelectorAll('*')].filter((element) => {
        const { transitionDuration, animationName } = getComputedStyle(element)
        return animationName !== 'none' || Number.parseFloat(transitionDuration) > 0.01
      }).length,
  )
  expect(moving).toBe(0)
})

test('targets are 24 px high and wide, or stand apart', async ({ page }) => {
  await page.setViewportSize({ width: 390, height: 844 })
  await open(page, '/')
  // WCAG 2.5.8: smaller ones where a circle of 24 px around each meets no other target; those in a sentence are exempt.
  const small = await page.evaluate(() => {
    const seen = [
      ...document.querySelectorAll<HTMLElement>('a, button, input:not([type=hidden]), select, summary'),
    ].filter((one) => one.checkVisibility({ visibilityProperty: true }) && !one.closest('p'))
    const boxes = seen.map((one) => one.getBoundingClientRect())
    const centre = (box: DOMRect) => [box.x + box.width / 2, box.y + box.height / 2] as const
    return seen
      .filter((_, i) => {
        const box = boxes[i] as DOMRect
        if (box.width === 0 || (box.width >= 24 && box.height >= 24)) return false
        const [x, y] = centre(box)
        return boxes.some((other, j) => {
          if (i === j || other.width === 0) return false
          const dx = Math.max(other.left - x, 0, x - other.right)
          const dy = Math.max(other.top - y, 0, y - other.bottom)
          return Math.hypot(dx, dy) < 12
        })
      })
      .map((one) => one.outerHTML.slice(0, 140))
  })
  expect(small).toEqual([])
})

test('a slider says its value with its unit, and every figure has its sentence and its table', async ({ page }) => {
  await open(page, '/')
  const [sliders, figures] = [await page.getByRole('slider').all(), await page.locator('figure').all()]
  expect(Math.min(sliders.length, figures.length)).toBeGreaterThan(0)
  for (const one of sliders) await expect(one).toHaveAttribute('aria-valuetext', /\S/)
  for (const figure of figures) {
    expect((await figure.locator('[aria-label]:visible').first().getAttribute('aria-label'))?.length).toBeGreaterThan(
      10,
    )
    const table = figure.locator('details table')
    await figure.locator('details summary').first().click()
    await expect(table.first().locator('caption')).not.toBeEmpty()
    expect(await table.first().locator('th[scope=col]').count()).toBeGreaterThan(1)
    expect(await table.first().locator('tbody tr').count()).toBeGreaterThan(5)
  }
})
