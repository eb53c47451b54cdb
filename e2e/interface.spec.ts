/** The interface as its own page and README show it: every example is run as it stands there. */
import { execFileSync, spawnSync } from 'node:child_process'
import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import { expect, test } from '@playwright/test'
import { ROOT } from '../scripts/setup/project.mjs'

const HERE = 'http://localhost:3000'
const README = readFileSync(join(ROOT, 'README.md'), 'utf8')
const LINES = { 'Content-Type': 'application/x-ndjson' }

const present = (program: string) => spawnSync(program, ['--version']).error === undefined

test('every example of the page answers', async ({ page, baseURL }) => {
  test.skip(!present('curl'), 'curl is not installed here')
  // Every example twice, some of them figures.
  test.setTimeout(240_000)
  await page.goto('/api')
  const commands = await page.locator('.example code').allTextContents()
  expect(commands.length).toBeGreaterThan(5)
  for (const command of commands) {
    expect(command).toContain(HERE)
    const shown = command
      .replace(HERE, `${baseURL}`)
      .replace('curl ', "curl -s --output /dev/null --write-out '%{http_code}' ")
    expect(execFileSync('bash', ['-c', shown], { encoding: 'utf8' }), command).toBe('200')
  }
  // The links beside them, too.
  for (const link of await page.locator('.example a').all()) {
    const target = `${await link.getAttribute('href')}`
    expect((await page.request.get(target)).status(), target).toBe(200)
  }
})

test('the page names every key, and stands on a phone', async ({ page }) => {
  await page.setViewportSize({ width: 390, height: 800 })
  await page.goto('/api')
  for (const key of ['masses', 'excess', 'columns', 'rows']) {
    await expect(page.locator(`th code:text-is("${key}")`).first()).toBeVisible()
  }
  expect(await page.evaluate(() => document.documentElement.scrollWidth <= innerWidth)).toBe(true)
})

test('curl as in the README', ({ baseURL }) => {
  test.skip(!present('curl'), 'curl is not installed here')
  const commands = README.match(/^curl '[^']+'/gm) ?? []
  expect(commands.length).toBeGreaterThan(1)
  for (const command of commands) {
    const answer = execFileSync('bash', ['-c', command.replace(HERE, `${baseURL}`).replace('curl', 'curl -sf')])
    expect(answer.length, command).toBeGreaterThan(100)
  }
})

test("Python's standard library as in the README, with what it prints there", ({ baseURL }) => {
  test.skip(!present('python3'), 'python3 is not installed here')
  const [, program, printed] = /```python\n(.*?)```\n\n```\n(.*?)```/s.exec(README) ?? []
  const said = execFileSync('python3', ['-c', program.replace(HERE, `${baseURL}`)], { encoding: 'utf8' })
  expect(said).toBe(printed)
})

test('the document is served', async ({ request }) => {
  const response = await request.get('/api/openapi.json')
  expect(response.headers()['content-type']).toBe('application/json')
  expect(await response.json()).toMatchObject({ openapi: '3.1.0' })
  expect((await request.get('/api/openapi.json?s=h0:70')).status()).toBe(400)
})

test('and its types, as text', async ({ request }) => {
  const response = await request.get('/longhence.d.ts')
  expect(response.headers()['content-type']).toBe('text/plain; charset=utf-8')
  expect(await response.text()).toContain('export interface Routes')
})

test.describe('the batch', () => {
  const post = (data: string | Buffer, headers: Record<string, string> = LINES) => ({ data, headers })

  test('answers line by line as the history does', async ({ request }) => {
    const response = await request.post('/api/batch', post('"h0:70"\n\nno\n{"s":"h0:60"}'))
    expect(response.headers()['content-type']).toBe('application/x-ndjson')
    const lines = (await response.text())
      .trimEnd()
      .split('\n')
      .map((line) => JSON.parse(line))
    expect(lines.map(({ index }) => index)).toEqual([0, 2, 3])
    expect(lines[1].problem).toMatchObject({ status: 400, instance: '/api/batch' })
    const history = await (await request.get('/api/history?s=h0:60')).json()
    expect(lines[2]).toEqual({ index: 3, ...history.scenarios[0] })
  })
  test('refuses what is too much, of another type, or no text', async ({ request }) => {
    const status = async (options: ReturnType<typeof post>) => (await request.post('/api/batch', options)).status()
    expect(await status(post('"h0:70"\n'.repeat(10_001)))).toBe(413)
    expect(await status(post(' '.repeat(9 * 2 ** 20)))).toBe(413)
    expect(await status(post('"h0:70"', { 'Content-Type': 'application/json' }))).toBe(415)
    expect(await status(post('"h0:70"', { ...LINES, 'Content-Encoding': 'gzip' }))).toBe(415)
    expect(await status(post(Buffer.from([0x22, 0xff, 0x22])))).toBe(400)
    expect(await status(post('\n'))).toBe(400)
  })
  test('is made no faster than it is read, and stops with its reader', async ({ baseURL, request }) => {
    const controller = new AbortController()
    const body = '"h0:70"\n'.repeat(10_000)
    const answer = await fetch(`${baseURL}/api/batch`, {
      method: 'POST',
      body,
      headers: LINES,
      signal: controller.signal,
    })
    const reader = answer.body?.getReader()
    expect((await reader?.read())?.value?.length).toBeGreaterThan(0)
    const begin = performance.now()
    expect((await request.get('/api/at?s=h0:71&z=1')).status()).toBe(200)
    // All of it takes many seconds.
    expect(performance.now() - begin).toBeLessThan(2000)
    controller.abort()
  })
})
