/** The ruler as an observer uses it: age, distances, scale and survey volume at a redshift for two cosmologies, and the table. */
import { readFileSync } from 'node:fs'
import { expect, type Page, test } from '@playwright/test'

const TWO = '/?s=h0:70,matter:0.3,cmb:0,as:One&s=h0:67.66,matter:0.3111,as:Two'

const cells = (page: Page, key: string) => page.locator(`[data-reading="${key}"] .value`)
const alive = (page: Page) => expect(page.getByRole('button', { name: 'Copy link' })).toBeVisible({ timeout: 15_000 })
/** The live ruler has taken over, as it does when a hand is there. */
const live = (page: Page) =>
  expect(async () => {
    for (const at of [1, 2]) await page.mouse.move(at, at)
    const read = page.getByRole('button', { name: 'Read', exact: true, includeHidden: true })
    await expect(read).toHaveCount(0, { timeout: 500 })
  }).toPass({ timeout: 15_000 })

/** Rows of a downloaded table by the names of its columns; the first cell is quoted. */
function rowsOf(csv: string): Readonly<Record<string, string>>[] {
  const lines = csv.split('\r\n').filter((line) => line !== '' && !line.startsWith('#'))
  const [head = [], ...rows] = lines.map((line) => line.replace(/^"[^"]*"/, 'code').split(','))
  return rows.map((row) => Object.fromEntries(head.map((name, i) => [name, row[i] ?? ''])))
}

/** Every number on the page is the rounded one of the file. */
async function agrees(page: Page): Promise<void> {
  const waiting = page.waitForEvent('download')
  await page.getByRole('link', { name: 'Readings as CSV' }).click()
  const download = await waiting
  expect(download.suggestedFilename()).toMatch(/^longhence-.*\.csv$/)
  const rows = rowsOf(readFileSync(await download.path(), 'utf8'))
  const shown = page.locator('[data-reading]')
  expect(await shown.count()).toBeGreaterThan(5)
  for (const line of await shown.all()) {
    const key = (await line.getAttribute('data-reading')) ?? ''
    const texts = await line.locator('.value').allTextContents()
    texts.forEach((text, slot) => {
      const plain = text.replace(/\s/g, '').replace('−', '-')
      const decimals = (plain.split('.')[1] ?? '').length
      const full = Number(rows[slot]?.[key])
      expect(Math.abs(Number(plain) - full), `${key} ${text} ${full}`).toBeLessThanOrEqual(0.51 * 10 ** -decimals)
    })
  }
}

test('reads at z = 1.9 for two cosmologies, and downloads the same numbers', async ({ page }) => {
  await page.goto(TWO)
  await live(page)
  await page.getByRole('textbox', { name: 'redshift' }).fill('1.9')
  await page.getByRole('textbox', { name: 'sky area' }).fill('14000')
  await expect(page).toHaveURL(/&at=1\.9&sky=14000$/)
  await page.getByText('Choose the readings').click()
  await page.getByRole('checkbox', { name: 'distance modulus' }).check()
  await expect(page).toHaveURL(/read=[a-zA-Z,]*modulus/)
  await expect(cells(page, 'modulus')).toHaveCount(2)
  // Flat, Ω_m = 0.3, no radiation: the age there is 2/(3√0.7) asinh(√(0.7/0.3) 2.9^(−3/2))/H₀, 3.390 Gyr (closed form).
  await expect(cells(page, 'age').first()).toHaveText('3.3900')
  await expect(page.locator('[data-reading="age"] th')).toContainText('age')
  await agrees(page)
})

test('by keyboard alone, with a second epoch, and the link opens the same', async ({ page }) => {
  await page.goto(TWO)
  await live(page)
  await page.getByRole('combobox', { name: 'epoch given by' }).focus()
  await page.keyboard.press('Tab')
  await page.keyboard.type('0.5')
  await page.keyboard.press('Tab')
  await page.keyboard.type('2')
  await page.keyboard.press('Enter')
  await expect(page).toHaveURL(/&at=0\.5&until=2$/)
  await expect(cells(page, 'criticalSurfaceDensity')).toHaveCount(2)
  await expect(page.getByText('Between redshift 0.5 and 2')).toBeVisible()
  const told = () => page.locator('.readings table').allTextContents()
  const before = await told()
  await page.goto(page.url())
  await live(page)
  expect(await told()).toEqual(before)
  await agrees(page)
})

test('what cannot be read is said beside its field, and Escape takes it back', async ({ page }) => {
  await page.goto(TWO)
  await live(page)
  const field = page.getByRole('textbox', { name: 'redshift' })
  await field.fill('-1')
  await expect(page.locator('#ruler-at-complaint')).toContainText('Allowed: a number above −1')
  await expect(field).toHaveAttribute('aria-invalid', 'true')
  await expect(cells(page, 'age').first()).not.toHaveText('–')
  await field.press('Escape')
  await expect(field).toHaveValue('1')
  await expect(page.locator('#ruler-at-complaint')).toBeEmpty()
})

test('follows the scenarios, and has lengths in units with h', async ({ page }) => {
  await page.goto('/?s=h0:50,matter:1,cmb:0,as:Dust&at=3&read=comoving')
  await live(page)
  await page.getByRole('checkbox', { name: 'lengths in units with h⁻¹' }).check()
  // Flat dust: 2 (1 − 1/√4) c/H₀ is 2997.92458 h⁻¹ Mpc, whatever H₀.
  await expect(cells(page, 'comoving')).toHaveText('2997.92')
  await expect(page.locator('[data-reading="comoving"] td.unit')).toHaveText('h⁻¹ Mpc')
  await page.getByRole('textbox', { name: 'Hubble constant' }).fill('100')
  await page.keyboard.press('Enter')
  await page.getByRole('checkbox', { name: 'lengths in units with h⁻¹' }).uncheck()
  await expect(cells(page, 'comoving')).toHaveText('2997.92')
  await expect(page.locator('[data-reading="comoving"] td.unit')).toHaveText('Mpc')
})

test.describe('without JavaScript', () => {
  test.use({ javaScriptEnabled: false })

  test('the form reads, complains, and keeps what else the address says', async ({ page }) => {
    await page.goto(`${TWO}&focus=2&theme=night`)
    await page.getByRole('textbox', { name: 'redshift' }).fill('1,9')
    await page.getByRole('textbox', { name: 'second epoch' }).fill('2.1')
    await page.getByText('Choose the readings').click()
    await page.getByRole('checkbox', { name: 'redshift drift' }).check()
    await page.getByRole('button', { name: 'Read', exact: true }).click()
    await expect(page).toHaveURL(/&focus=2&theme=night&at=1,9&until=2\.1&read=[a-zA-Z,]*drift/)
    await expect(cells(page, 'drift')).toHaveCount(2)
    await expect(cells(page, 'age').first()).toHaveText('3.3900')
    await agrees(page)
    await page.getByRole('textbox', { name: 'sky area' }).fill('much')
    await page.getByRole('button', { name: 'Read', exact: true }).click()
    await expect(page.locator('.complaint', { hasText: 'square degrees' })).toBeVisible()
    await page.getByRole('button', { name: 'Apply' }).click()
    await expect(page).toHaveURL(/until=2\.1/)
  })

  test('published sets and retuning are links', async ({ page }) => {
    await page.goto(`${TWO}&focus=2`)
    await page.getByText('Published parameter sets').click()
    await page.getByRole('link', { name: 'Planck 2018 TT,TE,EE+lowE+lensing', exact: true }).first().click()
    await expect(page).toHaveURL(/s=h0:67\.36,matter:0\.3153,baryons:0\.02237,nu:3\.046,as:Planck%202018&focus=2$/)
    await expect(page.getByText('As published: Planck 2018')).toBeVisible()
    await page.getByText('Retune').click()
    await page.locator('.retune p', { hasText: 'the age of' }).getByRole('link', { name: 'One' }).click()
    await expect(page).toHaveURL(/&s=h0:69\.0\d+,matter:0\.3153/)
    await page.getByText('Retune').click()
    // Without photons there is no acoustic angle: the reason, and the way back.
    await page.locator('.retune p', { hasText: 'acoustic angle' }).getByRole('link', { name: 'One' }).click()
    await expect(page.getByRole('main')).toContainText('there is no recombination to compute')
    await page.getByRole('link', { name: 'Back to the scenarios' }).click()
    await expect(page).toHaveURL(/&s=h0:69\.0\d+,matter:0\.3153/)
  })
})

test('live, a retuned H₀ is one change that Undo takes back', async ({ page }) => {
  await page.goto('/?s=h0:67.66,matter:0.3111,as:One&s=h0:67.66,matter:0.3111,eos:constant,w:-1.1,as:Two&focus=2')
  await alive(page)
  await page.getByText('Retune').click()
  await page.locator('.retune p', { hasText: 'acoustic angle' }).getByRole('link', { name: 'One' }).click()
  const h0 = page.getByRole('textbox', { name: 'Hubble constant' })
  await expect(h0).toHaveValue(/^68\.79\d+$/)
  const angle = page.locator('[data-measure="acousticAngle"] .value')
  await expect(angle).toHaveText('0.010413 rad')
  await page.getByRole('button', { name: 'Reset Hubble constant to 67.66' }).click()
  await expect(h0).toHaveValue('67.66')
  await page.getByRole('button', { name: 'Undo' }).click()
  await expect(h0).toHaveValue(/^68\.79\d+$/)
})

test('a name shows its entry on hover and focus, and is a link to it', async ({ page }) => {
  await page.goto(TWO)
  await alive(page)
  const name = page.locator('[data-measure="soundHorizonDrag"] th a')
  await name.hover()
  const entry = page.getByRole('tooltip')
  await expect(entry).toContainText('Eisenstein & Hu 1998')
  await expect(entry.locator('math')).toBeVisible()
  await page.keyboard.press('Escape')
  await expect(entry).toBeHidden()
  await page.locator('[data-measure="acousticAngle"] th a').focus()
  await page.keyboard.press('Shift+Tab')
  await expect(entry).toContainText('Eisenstein & Hu 1998')
  await page.keyboard.press('Enter')
  await expect(page).toHaveURL(/\/method#measure-soundHorizonDrag$/)
  await expect(page.locator('#measure-soundHorizonDrag')).toBeInViewport()
})

for (const width of [390, 1280, 1920]) {
  test(`nothing runs over the edge at ${width} px`, async ({ page }) => {
    await page.setViewportSize({ width, height: 900 })
    const six = Array.from({ length: 6 }, (_, i) => `s=h0:70,matter:0.${i + 1},as:${'W'.repeat(60)}`).join('&')
    for (const path of ['/method', `/?${six}&at=1.9&until=2.1`, '/retune']) {
      await page.goto(path)
      expect(await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth)).toBeLessThanOrEqual(0)
    }
  })
}
