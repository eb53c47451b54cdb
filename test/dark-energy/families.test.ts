/** What holds for every law, by its own mathematics: conservation of energy, differences without cancellation, bounds, far ends. */
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import type { Law } from '../../lib/dark-energy/law'
import { readScenario } from '../../lib/scenario/read'
import { writeScenario } from '../../lib/scenario/write'
import { EXPLICIT, gentleLaws, isSmooth, wildLaws } from './sample'

const place = fc.double({ min: -4, max: 2, noNaN: true })
const derivatives = (law: Law, N: number) => {
  const out = new Float64Array(3)
  law.derivativesInto(out, N)
  return out
}

/** Central difference of eighth order (Fornberg 1988, Math. Comp. 51, 699, table 1). */
function slope(f: (N: number) => number, N: number, h: number): number {
  const weights = [4 / 5, -1 / 5, 4 / 105, -1 / 280]
  return weights.reduce((sum, c, k) => sum + c * (f(N + (k + 1) * h) - f(N - (k + 1) * h)), 0) / h
}

describe.each(EXPLICIT)('eos:$key', (family) => {
  const laws = gentleLaws(family)
  const holds = (check: (law: Law, N: number) => void, r = 0.05) =>
    fc.assert(
      fc.property(laws, place, (law, N) => {
        fc.pre(isSmooth(law, N, r))
        check(law, N)
      }),
      { numRuns: 300, seed: 5 },
    )

  test('is described', () => {
    for (const text of [family.label, family.formula, family.meaning, family.source, family.caution]) {
      expect(text.length).toBeGreaterThan(5)
    }
    expect(family.source).toMatch(/\b(?:19|20)\d\d\b/)
    for (const one of family.parameters) {
      expect(one.meaning.endsWith('.')).toBe(true)
      if (one.kind !== 'number') continue
      expect(one.slider.min).toBeGreaterThanOrEqual(one.min)
      expect(one.slider.max).toBeLessThanOrEqual(one.max)
      expect(one.slider.min < one.fallback || one.slider.max > one.fallback).toBe(true)
    }
  })
  test('the density today is 1', () => {
    fc.assert(
      fc.property(fc.oneof(laws, wildLaws(family)), (law) => {
        // B + (1 − B) of a Chaplygin gas and the like may round.
        expect(Math.abs(law.density(0) - 1)).toBeLessThanOrEqual(2 * Number.EPSILON)
        expect(Math.abs(law.logDensity(0))).toBeLessThanOrEqual(2 * Number.EPSILON)
      }),
    )
  })
  test('dρ/dN = −3(1 + w)ρ', () =>
    holds((law, N) => {
      const n = 3 * (1 + law.w(N))
      // The difference errs by h⁸f⁽⁹⁾/630 and by 20 eps f/h.
      const scale = Math.abs(law.density(N)) * (1 + Math.abs(n)) ** 3
      expect(Math.abs(slope(law.density, N, 0.01) + n * law.density(N))).toBeLessThan(1e-8 * scale)
    }))
  test('f, f′ and f″ belong together', () =>
    holds((law, N) => {
      const [f, first, second] = derivatives(law, N)
      expect(f).toBeCloseTo(law.density(N), 12)
      const scale = Math.abs(law.density(N)) * (1 + Math.abs(law.w(N))) ** 4 * 100
      const firstAt = (x: number) => derivatives(law, x)[1]
      expect(Math.abs(first + 3 * (1 + law.w(N)) * f)).toBeLessThan(1e-14 * scale)
      // w of nodes has a bend in every piece that is as sharp as the piece is short.
      expect(Math.abs(slope(firstAt, N, 0.01) - second)).toBeLessThan((family.key === 'nodes' ? 1e-5 : 1e-8) * scale)
    }))
  test('differences near and far', () =>
    holds((law, N) => {
      for (const d of [0.3, -0.3, 2]) {
        const direct = law.density(N + d) - law.density(N)
        const size = Math.abs(law.density(N)) + Math.abs(law.density(N + d))
        // Rounding of ln f moves f by eps |ln f|.
        const rounding = 1e-15 * (20 + Math.abs(law.logDensity(N)) + Math.abs(law.logDensity(N + d)))
        expect(Math.abs(law.change(N, d) - direct)).toBeLessThanOrEqual(rounding * size)
      }
    }))
  test('small differences keep their digits', () =>
    holds((law, N) => {
      const [f, first, second] = derivatives(law, N)
      const d = 1e-7
      const scale = Math.abs(f) * (1 + Math.abs(law.w(N))) ** 3 * 100
      expect(Math.abs(law.change(N, d) - d * first - (d * d * second) / 2)).toBeLessThan(
        1e-7 * d * d * scale + 1e-14 * d * scale,
      )
      expect(Math.abs(law.bend(N, d) - (d * d * second) / 2)).toBeLessThan(1e-4 * d * d * scale)
      const wide = law.change(N, 0.3) - 0.3 * first
      const size = Math.abs(law.density(N + 0.3)) + Math.abs(f) + Math.abs(first)
      expect(Math.abs(law.bend(N, 0.3) - wide)).toBeLessThanOrEqual((family.key === 'nodes' ? 1e-4 : 1e-12) * size)
    }, 0.3))
  test('every exponent lies within its bounds, to infinity too', () => {
    const bound = fc.oneof(fc.double({ min: -30, max: 30, noNaN: true }), fc.constantFrom(-Infinity, Infinity))
    const share = fc.double({ min: 0, max: 1, noNaN: true })
    fc.assert(
      fc.property(fc.oneof(laws, wildLaws(family)), bound, bound, share, (law, one, other, part) => {
        const [from, to] = one < other ? [one, other] : [other, one]
        const [a, b] = [Math.max(from, -40), Math.min(to, 40)]
        fc.pre(a <= b)
        const [low, high] = law.exponentRange(from, to)
        expect(low).toBeLessThanOrEqual(high)
        const n = 3 * (1 + law.w(a + part * (b - a)))
        fc.pre(!Number.isNaN(n))
        const rounding = 1e-13 * Math.max(1, Math.abs(n))
        expect(n).toBeGreaterThanOrEqual(low - rounding)
        expect(n).toBeLessThanOrEqual(high + rounding)
      }),
      { numRuns: 500, seed: 7 },
    )
  })
  test('far ends', () => {
    fc.assert(
      fc.property(laws, fc.double({ min: 0, max: 20, noNaN: true }), (law, farther) => {
        for (const [direction, end] of [
          [-1, law.past],
          [1, law.future],
        ] as const) {
          if (end.kind === 'power') {
            const N = direction * (Math.max(0, direction * end.settled) + farther)
            const expected = end.logCoefficient - end.exponent * N
            const size = Math.abs(end.logCoefficient) + Math.abs(end.exponent * N) + 1
            // A Chaplygin gas of small α settles far out, where rounding of k N counts.
            expect(Math.abs(law.logDensity(N) - expected)).toBeLessThan(1e-14 * size * Math.max(1, Math.abs(N)))
          } else if (end.kind === 'logarithmic') {
            const u = 1 + end.rate * direction * farther
            if (u > 0) expect(law.density(direction * farther)).toBeCloseTo(u ** end.power, 9)
          } else {
            // Where w_a is small, only so far out; e^N is a double up to 709.
            fc.pre(Math.abs(law.w(700) - law.w(0)) > 3)
            const n = law.exponentRange(direction * 700, direction * 700)[0]
            expect(Math.sign(direction * n)).toBe(end.kind === 'exploding' ? -1 : 1)
          }
        }
      }),
    )
  })
  test('a code goes both ways', () => {
    const typed =
      family.key === 'nodes'
        ? ',at:0.25_0.5_1,w:-0.9_-1.1_-1'
        : family.parameters.map(({ key }) => `,${key}:0.9`).join('')
    const reading = readScenario(`dark:0.6,eos:${family.key}${typed}`, 0)
    if (!reading.ok) throw new Error(JSON.stringify(reading.problems))
    expect(readScenario(writeScenario(reading.value), 0)).toEqual(reading)
    expect(reading.value.eos).toBe(family.key)
  })
})
