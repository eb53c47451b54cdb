/** The views: chosen, zoomed, shared, and complete without scripts. */
import { expect, type Page, test } from '@playwright/test'
import { cursor, open, settled } from './live'

/** Many pages each, and machines that have other things to do. */
test.describe.configure({ timeout: 180_000 })

const VIEWS = {
  Reach: /^Horizons and light paths/,
  Contents: /^Density of each/,
  Rate: /^Expansion speed/,
  Distances: /^Comoving distance/,
}
const panel = (page: Page) => page.locator('.views')
const caption = (page: Page) => panel(page).locator('figcaption p').first()
const picture = (page: Page) => panel(page).locator('.drawn:visible')
const option = (page: Page, group: string, name: string) =>
  panel(page).getByRole('navigation', { name: group }).getByRole('link', { name, exact: true })

/** Both figures as they are drawn. */
async function pictures(page: Page): Promise<readonly string[]> {
  const drawn = page.locator('.drawn:visible')
  await expect(drawn).toHaveCount(2)
  return drawn.evaluateAll((all) => all.map((one) => one.innerHTML))
}

/** The address of the page is the one that is shown. */
async function arrived(page: Page, address: RegExp): Promise<void> {
  await expect(page).toHaveURL(address)
  await expect(page.locator('main')).not.toHaveAttribute('aria-busy', 'true', { timeout: 30_000 })
}

test('three futures are compared on a slide, and whoever gets the link sees the same', async ({
  page,
  browser,
  baseURL,
}) => {
  await page.context().grantPermissions(['clipboard-read', 'clipboard-write'])
  await open(page, '/')
  await expect(page.locator('.verdict')).toHaveCount(3)
  await option(page, 'Views', 'Distances').click()
  await arrived(page, /view=distances/)
  await expect(caption(page)).toHaveText(VIEWS.Distances)
  await option(page, 'Show', 'luminosity').click()
  await arrived(page, /show=luminosity/)
  await option(page, 'Against', 'redshift, logarithmic in 1 + z').click()
  await arrived(page, /by=logredshift/)
  await option(page, 'As', 'ratio to Steady light').click()
  await arrived(page, /compare=ratio/)
  await expect(caption(page)).toHaveText(
    'Luminosity distance DL, as a ratio to Steady light, against redshift, logarithmic.',
  )
  for (const name of ['Steady light', 'Fading light', 'Gathering light'])
    await expect(picture(page).getByText(name, { exact: true })).toBeVisible()
  await page.locator('.long-view').getByRole('link', { name: 'logarithmic' }).click()
  await arrived(page, /time=log/)

  await page.getByRole('button', { name: 'Copy link' }).click()
  const link = await page.evaluate(() => navigator.clipboard.readText())
  expect(link).toBe(page.url())
  const mine = await pictures(page)
  for (const javaScriptEnabled of [true, false]) {
    const fresh = await browser.newContext({ baseURL, javaScriptEnabled, viewport: page.viewportSize() })
    const other = await fresh.newPage()
    await other.goto(link)
    expect(await pictures(other)).toEqual(mine)
    await fresh.close()
  }
})

test('a choice does not move the page', async ({ page }) => {
  await open(page, '/')
  await panel(page).evaluate((section) => section.scrollIntoView({ block: 'end' }))
  for (const [group, name, key] of [
    ['Views', 'Rate', /view=rate/],
    ['Show', 'deceleration q', /show=q/],
    ['Views', 'Contents', /view=contents/],
    ['Views', 'Reach', /\?s=[^&]*&s=[^&]*&s=[^&]*$/],
  ] as const) {
    const link = option(page, group, name)
    const before = await link.boundingBox()
    await link.click()
    await arrived(page, key)
    await expect.poll(async () => (await option(page, group, name).boundingBox())?.y).toBeCloseTo(before?.y ?? 0, 0)
  }
})

test('a drag across the long view selects a range, and a link leads back', async ({ page }) => {
  await open(page, '/')
  const box = await cursor(page).boundingBox()
  if (!box) throw new Error('no figure')
  const y = box.y + 0.4 * box.height
  await page.mouse.move(box.x + 0.2 * box.width, y)
  await expect(page.locator('.recharts-surface')).toBeVisible()
  await page.mouse.down()
  await page.mouse.move(box.x + 0.3 * box.width, y, { steps: 6 })
  await expect(page.locator('.brush')).toBeVisible()
  await page.mouse.up()
  await arrived(page, /from=[\d.-]+&to=[\d.-]+/)
  const { searchParams } = new URL(page.url())
  const [from, to] = [Number(searchParams.get('from')), Number(searchParams.get('to'))]
  // A tenth of the width of a figure that spans about 140 Gyr.
  expect(to - from).toBeGreaterThan(8)
  expect(to - from).toBeLessThan(30)
  await page.locator('.long-view').getByRole('link', { name: 'Whole range' }).click()
  await expect(page).not.toHaveURL(/from=/)
})

test('keys zoom and say so', async ({ page }) => {
  await open(page, '/')
  await cursor(page).focus()
  await page.keyboard.press('+')
  await arrived(page, /from=.*&to=/)
  await expect(page.locator('.frame').getByRole('status').last()).toHaveText(/^Range: −\d.* Gyr to \+\d.* Gyr\.$/)
  const closer = page.url()
  await page.keyboard.press('Shift+ArrowRight')
  await expect(page).not.toHaveURL(closer)
  await settled(page)
  await page.keyboard.press('0')
  await expect(page).not.toHaveURL(/from=/)
})

test('the cursor of a view reads it', async ({ page, request }) => {
  await open(page, '/?s=h0:70,matter:0.3,as:One&view=distances')
  const slider = page.getByRole('slider', { name: 'Cursor: redshift' })
  await slider.focus()
  await page.keyboard.press('End')
  const row = page.locator('.readout tbody tr')
  await expect(row).toContainText('One')
  // z = 6 is the end of the axis; the read-out has four digits.
  const answer = await (await request.get('/api/at?s=h0:70,matter:0.3&z=6&columns=comoving')).json()
  const [distance] = answer.scenarios[0].rows[0]
  expect(
    Math.abs(Number((await row.locator('td').first().textContent())?.replace(/\s/g, '')) / distance - 1),
  ).toBeLessThan(1e-3)
})

test('a galaxy is followed to its last light', async ({ page }) => {
  // A cosmological constant alone: the last light of a galaxy at z leaves at t = −ln(z)/H₀, for z = 2 9.68 Gyr ago at 70 km/s/Mpc.
  await open(page, '/?s=h0:70,matter:0,cmb:0,as:Constant')
  const galaxy = page.getByRole('textbox', { name: 'Galaxy seen at z' })
  await galaxy.fill('2')
  await page.keyboard.press('Enter')
  await arrived(page, /galaxy=2/)
  await expect(panel(page)).toContainText('until 9.68 Gyr ago')
})

test.describe('without JavaScript', () => {
  test.use({ javaScriptEnabled: false })

  test('links lead to every view', async ({ page }) => {
    await page.goto('/?s=h0:70,matter:0.3,as:One&s=h0:70,matter:0.4,as:Two')
    for (const [name, words] of Object.entries(VIEWS)) {
      await option(page, 'Views', name).click()
      await expect(caption(page)).toHaveText(words)
      await expect(picture(page).locator('.curve')).not.toHaveCount(0)
      await expect(option(page, 'Views', name)).toHaveAttribute('aria-current', 'page')
    }
  })

  test('links lead to all that a view shows, and to a part of it', async ({ page }) => {
    await page.goto('/?s=h0:70,matter:0.3,as:One&s=h0:70,matter:0.4,as:Two&view=distances')
    const choices = panel(page).getByRole('navigation', { name: 'Show' }).getByRole('link')
    for (const [i, word] of (await choices.allTextContents()).entries()) {
      await choices.nth(i).click()
      await expect(option(page, 'Show', word)).toHaveAttribute('aria-current', 'true')
      await expect(picture(page).locator('.curve')).toHaveCount(2)
    }
    await option(page, 'Range', 'Closer').click()
    await expect(page).toHaveURL(/left=.*right=/)
    await option(page, 'Range', 'Whole range').click()
    await expect(page).not.toHaveURL(/left=/)
  })

  test('the galaxy of a form, and the view through the form of the scenario', async ({ page }) => {
    await page.goto('/?s=h0:70,matter:0.3,as:One&show=comoving')
    await page.getByRole('textbox', { name: 'Galaxy seen at z' }).fill('3')
    await page.getByRole('button', { name: 'Follow' }).click()
    await expect(panel(page)).toContainText('A galaxy seen at z = 3')
    await page.getByRole('button', { name: 'Apply' }).click()
    await expect(page).toHaveURL(/show=comoving&galaxy=3/)
  })
})

for (const width of [390, 1280, 1920]) {
  test(`no view runs over the edge at ${width} px`, async ({ page }) => {
    await page.setViewportSize({ width, height: 900 })
    for (const view of Object.keys(VIEWS)) {
      await page.goto(`/?s=h0:70,as:${'W'.repeat(60)}&s=matter:1,cmb:0,as:Two&view=${view.toLowerCase()}`)
      expect(await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth)).toBeLessThanOrEqual(0)
    }
  })
}

test('the gallery has every figure in both themes, and is not for search engines', async ({ page }) => {
  await page.goto('/gallery?set=one&width=narrow')
  await expect(page.locator('meta[name=robots]')).toHaveAttribute('content', /noindex/)
  const [paper, night] = [page.locator('.plate.paper svg'), page.locator('.plate.night svg')]
  expect(await paper.count()).toBeGreaterThan(40)
  expect(await night.count()).toBe(await paper.count())
})

test('on paper there are figures and tables, and nothing to click', async ({ page }) => {
  await open(page, '/')
  await page.emulateMedia({ media: 'print' })
  for (const seen of ['.long-view .drawn:visible', '.views .drawn:visible'])
    await expect(page.locator(seen)).toHaveCount(1)
  await expect(page.locator('.moments')).toBeVisible()
  for (const gone of ['.ways', '.choices', '.ingredients', '.acts-of-page', '.galaxy', '.downloads', '.figure-table'])
    await expect(page.locator(gone).first()).toBeHidden()
  await expect(page.getByRole('heading', { name: 'Take away' })).toBeHidden()
  // What stands in the address of a page stands on paper too.
  await expect(page.locator('.colophon')).toContainText('h0:67.66,matter:0.3111,as:Steady light; h0:67.66,matter:0.4')
  await expect(page.locator('.colophon .codes')).toBeVisible()
  await page.goto('/words')
  await expect(page.locator('pre').first()).toBeVisible()
})

test('in a low window nothing lies over the words', async ({ page }) => {
  await page.setViewportSize({ width: 844, height: 390 })
  await page.goto('/')
  const frame = page.locator('.frame:visible')
  // What is placed within the figure is placed by the figure, not by the window.
  expect(await frame.evaluate((one) => getComputedStyle(one).position)).toBe('relative')
  expect(await frame.evaluate((one) => getComputedStyle(one, '::after').content)).toBe('none')
})

test('at four times its size a page has its words beside its fields, and figures that can be read', async ({
  page,
}) => {
  // 1280 × 1024 pixels at 400 percent.
  await page.setViewportSize({ width: 320, height: 256 })
  await page.goto('/')
  expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(320)
  for (const name of ['matter', 'curvature', 'Hubble constant']) {
    const label = page.locator('.field label', { hasText: name }).first()
    const [words, control] = await Promise.all([
      label.evaluate((one) => one.getBoundingClientRect().left + one.scrollWidth),
      label.locator('xpath=ancestor::div[1]').locator('.entry').boundingBox(),
    ])
    expect(words, name).toBeLessThanOrEqual(control?.x ?? 0)
  }
  const figures = await page.locator('.drawn:visible').all()
  expect(figures.length).toBeGreaterThan(0)
  for (const figure of figures) expect((await figure.boundingBox())?.width).toBeGreaterThan(270)
})
