/** The content policy: it stops what was not meant, and nothing that was. */
import { gzipSync } from 'node:zlib'
import { expect, test } from '@playwright/test'
import { complaints } from './live'

for (const path of ['/', '/?s=matter:0.3,eos:constant,w:-1.2', '/?s=matter:none', '/nothing-here']) {
  test(`${path} runs its own scripts and is refused nothing`, async ({ page }) => {
    const heard = await complaints(page)
    await page.goto(path, { waitUntil: 'networkidle' })
    expect(await page.locator('h1').count()).toBe(1)
    const rests = () => page.evaluate(() => !('next' in window))
    expect(await rests()).toBe(true)
    // The framework's scripts run when a hand comes near.
    await page.mouse.move(1, 1)
    await expect.poll(rests).toBe(false)
    await page.waitForLoadState('networkidle')
    const expected = path === '/nothing-here' ? [expect.stringContaining('404')] : []
    expect(heard).toEqual(expected)
  })
}

test('a page that nobody touches comes alive by itself', async ({ page }) => {
  await page.goto('/')
  const fetched = page.locator('head link[rel=preload][as=script]')
  await expect.poll(() => fetched.count()).toBeGreaterThan(4)
  expect(await page.evaluate(() => 'next' in window)).toBe(false)
  await expect(page.getByRole('button', { name: 'Copy link' })).toBeVisible()
})

/** Without a hand: whatever a page fetches that only lies there, by itself alive. Compressed as servers do, in bytes. */
test('before there is a hand the scripts are at most 185 kB', async ({ page }) => {
  const sizes = new Map<string, Promise<number>>()
  page.on('response', (response) => {
    const url = response.url()
    if (response.request().resourceType() === 'script')
      sizes.set(
        url,
        response.body().then((body) => gzipSync(body).length),
      )
  })
  await page.goto('/', { waitUntil: 'networkidle' })
  // What it loads once it is alive comes last.
  const waiting = sizes.size
  expect(waiting).toBeGreaterThan(7)
  await expect.poll(() => sizes.size).toBeGreaterThan(waiting)
  await page.waitForTimeout(1500)
  const found = await Promise.all(sizes.values())
  expect(found.reduce((sum, one) => sum + one, 0)).toBeLessThanOrEqual(185_000)
})

test('a script without the nonce does not run', async ({ page }) => {
  const heard = await complaints(page)
  await page.goto('/', { waitUntil: 'networkidle' })
  await page.evaluate(() => document.body.insertAdjacentHTML('beforeend', '<img src="x:" onerror="window.ran = true">'))
  await expect.poll(() => heard.join()).toContain('script-src')
  expect(await page.evaluate(() => 'ran' in window)).toBe(false)
})

test('the nonce is new in each answer, and the one that a visitor sends is not taken', async ({ request }) => {
  const sent = "script-src 'nonce-mine'"
  const seen = new Set<string>()
  for (let i = 0; i < 3; i++) {
    const response = await request.get('/', { headers: { 'Content-Security-Policy': sent } })
    const [, nonce] = /'nonce-([^']+)'/.exec(response.headers()['content-security-policy']) ?? []
    const html = await response.text()
    const scripts = html.match(/<script[^>]*>/g) ?? []
    expect(scripts.length).toBeGreaterThan(0)
    expect(scripts.filter((tag) => !tag.includes(`nonce="${nonce}"`))).toEqual([])
    seen.add(nonce)
  }
  expect(seen.size).toBe(3)
  expect(seen).not.toContain('mine')
})
