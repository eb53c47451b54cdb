/** How high a figure is: expected values follow from the rule that each test names. */
import { describe, expect, it } from 'vitest'
import { opened } from '../../lib/answers/opened'
import { viewChart } from '../../lib/answers/panel'
import { fractionOf, type Range } from '../../lib/figures/scale'
import { spanOf } from '../../lib/figures/span'
import { PLAIN_PLACE, type Place } from '../../lib/words/place'

const VALUE = { steady: [], kind: 'value' } as const
const DIFFERENCE = { steady: [0], kind: 'difference' } as const
const along = (form: (part: number) => number | null, count = 161) =>
  Array.from({ length: count }, (_, i) => form(i / (count - 1)))

/** The part of the values that lies within the figure. */
function seen(range: Range, values: readonly (number | null)[]): number {
  const known = values.filter((value) => value !== null)
  return known.filter((value) => fractionOf(range, value) >= 0 && fractionOf(range, value) <= 1).length / known.length
}

describe('the height of a figure', () => {
  it('has room about values that are all equal', () => {
    expect(spanOf([[0, 0]], { ...VALUE, steady: [0] })).toMatchObject({ from: -1, to: 1 })
    const { from, to } = spanOf([[1, 1 + Number.EPSILON]], VALUE)
    expect(from).toBeCloseTo(0.94, 12)
    expect(to).toBeCloseTo(1.06, 12)
  })

  it('holds a curve that is short beside a long one', () => {
    const short = along((part) => (part < 0.07 ? 1 + 10 * part : null))
    for (const kind of ['value', 'ratio', 'difference'] as const) {
      expect(seen(spanOf([along(() => 1), short], { steady: [1], kind }), short)).toBe(1)
    }
  })

  it('cuts what runs away, but neither what is steady nor most of the rest', () => {
    const away = along((part) => 1 / (1.001 - part))
    const range = spanOf([along(() => 1), away], { steady: [1], kind: 'value' })
    expect(range.to).toBeLessThan(15)
    expect(seen(range, away)).toBeGreaterThan(0.75)
    expect(range.from).toBeLessThanOrEqual(1)
  })

  it('is not squeezed by differences of today that are next to nothing', () => {
    const values = along((part) => 30 * part + 1e-13)
    expect(seen(spanOf([along(() => 0), values], { ...DIFFERENCE, steady: [0, 1e-13] }), values)).toBe(1)
  })

  it('is logarithmic for sizes that begin at 0 and grow a thousandfold, not for those that grow less', () => {
    const size = { steady: [0], kind: 'size' } as const
    expect(spanOf([along((part) => part ** 3)], size).scaling).toBe('log')
    expect(spanOf([along((part) => part)], size).scaling).toBe('linear')
    expect(spanOf([along((part) => part - 0.5)], size).scaling).toBe('linear')
  })

  it('is logarithmic for ratios that span more than thirty, however far on either side', () => {
    const ratio = { steady: [1], kind: 'ratio' } as const
    const range = spanOf([along((part) => 0.1 ** (2 * part)), along((part) => 10 ** part)], ratio)
    expect(range.scaling).toBe('log')
    expect(range.from).toBeLessThan(0.02)
    expect(spanOf([along((part) => 1 + part)], ratio).scaling).toBe('linear')
  })
})

describe('what is compared', () => {
  const chart = (codes: readonly string[], place: Partial<Place>) =>
    viewChart({ solutions: opened(codes).solutions, place: { ...PLAIN_PLACE, ...place } })

  it.each(['comoving', 'luminosity', 'lookback', 'volume'])('a bounce, as a ratio of the %s', (show) => {
    const codes = ['h0:70,matter:0.3', 'h0:70,matter:0.1,dark:2,cmb:0']
    const { y, readings } = chart(codes, { view: 'distances', show, compare: 'ratio' })
    // All but the last twelfth of what there is.
    expect(seen(y, readings.values[1] ?? [])).toBeGreaterThan(0.9)
  })

  it('the same universe in other words does not differ', () => {
    const codes = ['h0:70,matter:0.3', 'h0:70,matter:0.3,eos:constant,w:-1']
    for (const show of ['pace', 'q']) {
      const { y, readings } = chart(codes, { view: 'rate', show, by: 'time', compare: 'difference' })
      expect([y.from, y.to]).toEqual([-1, 1])
      expect(new Set(readings.values[1]?.filter((value) => value !== null))).toEqual(new Set([0]))
    }
  })

  it('keeps the digits that can be seen where a ratio hardly leaves 1', () => {
    const { curves, y } = chart(['h0:70,matter:0.3', 'h0:70,matter:0.3001'], { view: 'rate', compare: 'ratio' })
    const values = curves[1]?.segments.flat().map(([, value]) => fractionOf(y, value)) ?? []
    // A curve that rises ever more slowly does so in ever smaller steps, to rounding of a part in 1e5 of the figure.
    expect(values.length).toBeGreaterThan(10)
    for (const [i, value] of values.entries()) if (i > 0) expect(value).toBeGreaterThan((values[i - 1] ?? 0) - 2e-5)
  })
})
