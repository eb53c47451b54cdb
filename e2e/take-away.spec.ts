/** Taking away: files, words, frames, codes, and the card of a pasted link. */
import { expect, test } from '@playwright/test'
import { complaints } from './live'

const SCENARIOS = '/?s=h0:70,matter:0.3,as:Steady&s=h0:70,matter:0.3,eos:constant,w:-1.2,as:Gathering'

test('every file of the page can be had', async ({ page, request }) => {
  // Some forty files, each made for this request.
  test.setTimeout(240_000)
  await page.goto(SCENARIOS)
  const names = {
    svg: /^<\?xml|^<svg/,
    pdf: /^%PDF/,
    png: /^.PNG/,
    csv: /^#/,
    json: /^\{/,
    votable: /^<\?xml/,
    latex: /^%/,
  }
  const links = await page.locator('.take-away a[download]').all()
  expect(links.length).toBeGreaterThan(30)
  for (const link of links) {
    const target = `${await link.getAttribute('href')}`
    const response = await request.get(target)
    expect(response.status(), target).toBe(200)
    const format = /format=(\w+)/.exec(target)?.[1] as keyof typeof names
    expect((await response.body()).toString('latin1', 0, 200), target).toMatch(names[format])
    expect(response.headers()['content-disposition']).toMatch(/filename="longhence-[a-z0-9-]+\.[a-z]+"/)
  }
})

test('the files show what the page shows', async ({ page }) => {
  await page.goto(`${SCENARIOS}&view=distances&show=luminosity&theme=night`)
  const link = page.getByRole('link', { name: /^Distances, .*one column as PDF/i })
  await expect(link).toHaveAttribute('href', /view=distances&show=luminosity&size=column&format=pdf&theme=night/)
})

test('words come when they are opened, and one click copies each', async ({ page, context }) => {
  await context.grantPermissions(['clipboard-read', 'clipboard-write'])
  const heard = await complaints(page)
  await page.goto(SCENARIOS, { waitUntil: 'networkidle' })
  // The ruler above is another one then, and what stands below moves no more.
  for (const at of [1, 2]) {
    await page.mouse.move(at, at)
    await expect(page.getByRole('button', { name: 'Copy link' })).toBeVisible()
  }
  await expect(page.getByRole('button', { name: 'Read', exact: true, includeHidden: true })).toHaveCount(0)
  await page.locator('.take-away summary').click()
  await page.getByRole('button', { name: 'Copy: LaTeX macros' }).click()
  await expect(page.getByText('Copied', { exact: true })).toBeVisible()
  expect(await page.evaluate(() => navigator.clipboard.readText())).toContain('\\newcommand{\\lhAgeB}')
  expect(heard).toEqual([])
})

test('words that were opened before the page came alive come when it does', async ({ page }) => {
  let release = () => {}
  const released = new Promise<void>((resolve) => {
    release = resolve
  })
  await page.route('**/*.js', async (route) => {
    await released
    await route.continue()
  })
  await page.goto(SCENARIOS, { waitUntil: 'commit' })
  await page.locator('.take-away summary').click()
  await expect(page.getByRole('link', { name: 'All of them on a page of their own' })).toBeVisible()
  release()
  await expect(page.getByRole('button', { name: 'Copy: LaTeX macros' })).toBeVisible()
})

test.describe('without scripts', () => {
  test.use({ javaScriptEnabled: false })
  test('the words stand on a page of their own', async ({ page }) => {
    await page.goto(SCENARIOS)
    await page.locator('.take-away summary').click()
    await page.getByRole('link', { name: 'All of them on a page of their own' }).click()
    await expect(page.locator('pre', { hasText: '@software{longhence' })).toBeVisible()
    await expect(page.locator('pre', { hasText: /^This universe began 13\.5 billion years ago/ })).toBeVisible()
    await expect(page.getByRole('button', { name: /^Copy/ })).toHaveCount(0)
  })
  test('the figure for frames is complete, and may be framed by anyone', async ({ page }) => {
    const response = await page.goto('/embed?s=h0:70,matter:0.3,as:Steady')
    expect(response?.headers()['content-security-policy']).toContain('frame-ancestors *')
    expect(response?.headers()['x-frame-options']).toBeUndefined()
    for (const width of [320, 700, 1400]) {
      await page.setViewportSize({ width, height: 480 })
      await expect(page.locator('svg:visible')).toHaveCount(1)
      expect(await page.evaluate(() => document.documentElement.scrollWidth <= innerWidth)).toBe(true)
    }
    await expect(page.getByRole('link', { name: 'Longhence' })).toHaveAttribute(
      'href',
      /^\/\?s=h0:70,matter:0\.3,as:Steady/,
    )
  })
})

test('no other page may be framed', async ({ request }) => {
  for (const path of ['/', '/words', '/api', '/embedded']) {
    expect((await request.get(path)).headers()['content-security-policy'], path).toContain("frame-ancestors 'self'")
  }
})

test('a damaged link opens a figure for frames, and the words, with a notice', async ({ page }) => {
  await page.goto('/embed?s=h0:0')
  await expect(page.getByText('could not be read as written')).toBeVisible()
  await page.goto('/words?s=h0:0')
  await expect(page.getByText('could not be read as written')).toBeVisible()
})

test('a link of another engine says so, one of today’s does not', async ({ page }) => {
  await page.goto('/?s=h0:70&engine=0')
  await expect(page.locator('.older-engine')).toContainText('made with engine 0')
  const { engine } = await (await page.request.get('/api/history?s=h0:70')).json()
  await page.goto(`/?s=h0:70&engine=${engine}`)
  await expect(page.locator('.older-engine')).toHaveCount(0)
  await page.goto(`/?s=h0:70&engine=${encodeURIComponent('<b>')}`)
  await expect(page.locator('.older-engine')).toHaveCount(0)
})

test('an SVG that is opened by itself runs nothing', async ({ request }) => {
  const { 'content-security-policy': policy } = (await request.get('/api/figure?s=h0:70')).headers()
  expect(policy).toContain("default-src 'none'")
})
