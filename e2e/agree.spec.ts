/** What this browser computes is what the server answers. */
import { type APIRequestContext, expect, type Page, test } from '@playwright/test'
import fc from 'fast-check'
import { open, slider } from './live'

/** More of them by COUNT=10000. */
const COUNT = Number(process.env.COUNT ?? 200)
const TOGETHER = 20

/** As people type them: four decimals. */
const between = (min: number, max: number) =>
  fc.integer({ min: Math.ceil(min * 1e4), max: Math.floor(max * 1e4) }).map((one) => one / 1e4)
const law = fc.oneof(
  fc.constant(''),
  between(-1.6, 0.2).map((w) => `,eos:constant,w:${w}`),
  fc
    .tuple(fc.constantFrom('cpl', 'jbp', 'ba', 'log'), between(-1.5, -0.3), between(-1.5, 1))
    .map(([eos, w0, wa]) => `,eos:${eos},w0:${w0},wa:${wa}`),
  fc
    .tuple(between(-0.5, 0.5), between(0, 2))
    .map(([excess, alpha]) => `,eos:barotropic,excess:${excess},alpha:${alpha}`),
  fc.tuple(between(0.1, 1), between(-0.5, 2)).map(([b, alpha]) => `,eos:chaplygin,b:${b},alpha:${alpha}`),
  between(0, 1.2).map((slope) => `,eos:field,v:exponential,slope:${slope}`),
)
const code = fc
  .tuple(between(50, 90), between(0.05, 1.2), between(-0.3, 0.3), fc.constantFrom('', ',masses:0', ',cmb:0'), law)
  .map(([h0, matter, k, light, eos]) => `h0:${h0},matter:${matter},curvature:${k}${light}${eos}`)

type Route = '/api/explorer' | '/api/history'

test('what is shown agrees to the last digit', async ({ page, request }) => {
  await agree(page, request, '/api/explorer', asShown)
})

test('every measure agrees to 1e-13, or to its own error bound where that is wider', async ({ page, request }) => {
  await agree(page, request, '/api/history', (one, other, path, bound) =>
    path.endsWith('.value') ? far(one, other, 1e-13) && Math.abs(one - other) > bound : false,
  )
})

/** Numbers that are not the same. `bound` is the error that stands beside them. */
type Unlike = (one: number, other: number, path: string, bound: number) => boolean

async function agree(page: Page, request: APIRequestContext, route: Route, unlike: Unlike): Promise<void> {
  test.setTimeout(120_000 + 200 * COUNT)
  await page.addInitScript(() => {
    const Plain = window.Worker
    window.Worker = class extends Plain {
      constructor(url: string | URL, options?: WorkerOptions) {
        super(url, options)
        Object.assign(window, { worker: this })
      }
    }
  })
  await open(page, '/')
  const awake = page.waitForEvent('worker')
  await slider(page, 'matter').hover()
  await awake
  const codes = fc.sample(code, { numRuns: COUNT, seed: Number(process.env.SEED ?? 1) })
  const different: string[] = []
  let compared = 0
  for (let i = 0; i < codes.length; i += TOGETHER) {
    const questions = codes.slice(i, i + TOGETHER).map((one) => new URLSearchParams([['s', one]]).toString())
    const here = await page.evaluate(compute, { route, questions })
    const there = await Promise.all(
      questions.map(async (one) => {
        const response = await request.get(`${route}?${one}`, { maxRetries: 2 })
        // A refusal, with its reason.
        return response.ok() ? response.text() : 'null'
      }),
    )
    questions.forEach((question, k) => {
      const found = differences(JSON.parse(here[k] ?? 'null'), JSON.parse(there[k] ?? 'null'), unlike)
      different.push(...found.map((one) => `${question} ${one}`.slice(0, 300)))
      compared++
    })
  }
  expect(different).toEqual([])
  expect(compared).toBe(COUNT)
}

/** In the page. The worker was made by the page itself. */
async function compute({ route, questions }: { readonly route: Route; readonly questions: readonly string[] }) {
  const { worker } = window as unknown as { worker: Worker }
  const answers: (string | null)[] = []
  for (const question of questions) {
    answers.push(
      await new Promise<string | null>((resolve) => {
        const heard = ({ data }: MessageEvent<{ asked: string; text: string | null } | null>) => {
          if (data?.asked !== question) return
          worker.removeEventListener('message', heard)
          resolve(data.text)
        }
        worker.addEventListener('message', heard)
        worker.postMessage({ route, asked: question })
      }),
    )
  }
  return answers
}

/** Where two answers differ. Texts, and the numbers in drawings, have to be equal: they are what is shown. */
function differences(one: unknown, other: unknown, unlike: Unlike, path = '', bound = 0): string[] {
  if (typeof one === 'number' && typeof other === 'number')
    return unlike(one, other, path, bound) ? [`${path}: ${one} ${other}`] : []
  if (typeof one !== 'object' || typeof other !== 'object' || one === null || other === null) {
    return one === other || path.includes('.series.rows.') || sameDrawing(one, other)
      ? []
      : [`${path}: ${one} ${other}`]
  }
  const keys = new Set([...Object.keys(one), ...Object.keys(other)])
  const error = Number(Reflect.get(one, 'error') ?? 0)
  return [...keys].flatMap((key) =>
    differences(Reflect.get(one, key), Reflect.get(other, key), unlike, `${path}.${key}`, error),
  )
}

const far = (one: number, other: number, part: number) =>
  Math.abs(one - other) > part * Math.max(Math.abs(one), Math.abs(other))

/** Two that differ by 1e-13 may be rounded to neighbours: places for cursors have seven digits, and values there five. */
const asShown: Unlike = (one, other, path) =>
  Math.abs(one - other) > 1.01 * lastPlace(one, path.includes('.readings.values.') ? 5 : 7)

const lastPlace = (value: number, digits: number) => 10 ** (Math.floor(Math.log10(Math.abs(value))) + 1 - digits)

/** Places in drawings have two decimals: they may be rounded to neighbours. */
function sameDrawing(one: unknown, other: unknown): boolean {
  if (typeof one !== 'string' || typeof other !== 'string' || !one.startsWith('<svg')) return false
  const [ours, theirs] = [one.split(NUMBER), other.split(NUMBER)]
  return ours.length === theirs.length && ours.every((part, i) => part === theirs[i] || near(part, theirs[i] ?? ''))
}

const NUMBER = /(-?\d+(?:\.\d+)?)/
const near = (one: string, other: string) => Math.abs(Number(one) - Number(other)) < 0.021
