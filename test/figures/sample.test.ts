/** What is drawn of a curve, against the curve. */
import { expect, test } from 'vitest'
import { EVEN, placesAlong, sampleCurve } from '../../lib/figures/sample'
import { linearRange } from '../../lib/figures/scale'

const x = linearRange(0, 1)
const drawn = (f: (at: number) => number, low = -1.1, high = 1.1) =>
  sampleCurve({ places: placesAlong(x, []), values: (places) => places.map(f) }, { x, y: linearRange(low, high) })

test('crests are as high as they are, with some eight steps to a swing', () => {
  const wave = (at: number) => Math.sin((2 * Math.PI * EVEN * at) / 8.3 + 0.4)
  const [line = [], ...rest] = drawn(wave)
  expect(rest).toEqual([])
  for (const crest of [1, -1]) {
    const passed = line.filter(
      ([, y], i) => crest * y > crest * (line[i - 1]?.[1] ?? 0) && crest * y > crest * (line[i + 1]?.[1] ?? 0),
    )
    expect(passed.length).toBeGreaterThan(EVEN / 8.3 - 2)
    // A thirteenth of a step away at most from the top, and dropped by thinning where it is hardly off.
    for (const [, y] of passed.slice(1, -1)) expect(crest * y).toBeGreaterThan(0.995)
  }
})

test('a straight line needs its ends alone', () => {
  expect(drawn((at) => 0.3 + at / 2)).toEqual([
    [
      [0, 0.3],
      [1, 0.8],
    ],
  ])
})

test('what leaves the figure ends upon its edge, where it does', () => {
  const lines = drawn((at) => 4 * at * at - 1, -1, 0)
  expect(lines).toHaveLength(1)
  const [at, y] = lines[0]?.at(-1) ?? []
  expect(y).toBe(0)
  // Straight between points a thirteenth of a step apart: off by 2f'/f'' of the square of half of that.
  expect(Math.abs((at ?? 0) - 0.5)).toBeLessThan(1e-6)
})

test('where it has no value it is in two parts', () => {
  const lines = sampleCurve(
    { places: placesAlong(x, []), values: (places) => places.map((at) => (at > 0.4 && at < 0.6 ? null : 0)) },
    { x, y: linearRange(-1, 1) },
  )
  expect(lines.map((line) => [line[0]?.[0], line.at(-1)?.[0]])).toEqual([
    [0, 0.4],
    [0.6, 1],
  ])
})
