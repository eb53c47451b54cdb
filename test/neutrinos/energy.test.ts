import { describe, expect, it } from 'vitest'
import {
  energyDerivatives,
  energyExcess,
  energyRatio,
  energyRatioChange,
  logSlope,
  logSlopeDerivative,
} from '../../lib/neutrinos/energy'
import reference from './reference.json'

const EPS = Number.EPSILON
/** Where the two forms of the functions meet, and the joins of the panels above: e = 4/(y + 4) a multiple of 1/20. */
const SMALL_JOIN = 0.75
const JOINS = [SMALL_JOIN, ...Array.from({ length: 16 }, (_, i) => 4 * (20 / (i + 1) - 1))]

const geometric = (from: number, to: number, count: number) =>
  Array.from({ length: count }, (_, i) => from * (to / from) ** (i / (count - 1)))

// Expected values: the defining integrals by mpmath at 50 digits, see generate_reference.py.
describe('against multiprecision quadrature', () => {
  it.each(reference.values)('y = $y', ({ y, ratio, slope, slopeDerivative }) => {
    const [R, s, ds] = [Number(ratio), Number(slope), Number(slopeDerivative)]
    // y + 4, 4/(y + 4), the polynomial (its first term dominates) and the product round once or twice each.
    expect(Math.abs(energyRatio(y) / R - 1)).toBeLessThanOrEqual(4 * EPS)
    // Above the join s is 1 less a number below 1, so its error is one of 1.
    const scale = y < SMALL_JOIN ? 4 * s : 3
    expect(Math.abs(logSlope(y) - s)).toBeLessThanOrEqual(scale * EPS)
    // Below the join the tables' remainder adds up to 3 eps to the rounding.
    expect(Math.abs(logSlopeDerivative(y) / ds - 1)).toBeLessThanOrEqual(8 * EPS)
    const excess = R - 1
    if (y >= 0.01) expect(Math.abs(energyExcess(y) - excess)).toBeLessThanOrEqual(4 * EPS * R)
  })

  it.each(reference.changes)('change by d = $d at y = $y', ({ y, d, change }) => {
    // Relative error of s (10 eps near the join) and of the rule; a difference of two R beyond |d| = 1 loses a factor 8 at most.
    expect(Math.abs(energyRatioChange(y, d) / Number(change) - 1)).toBeLessThanOrEqual(1e-14)
  })
})

describe('limits', () => {
  it('is massless at y = 0', () => {
    expect([energyRatio(0), logSlope(0), logSlopeDerivative(0), energyRatioChange(0, 0.3)]).toEqual([1, 0, 0, 0])
  })

  it('starts as 5y²/(7π²), the ratio of ∫ x f/2 = π²/24 to F(0)', () => {
    // At y = 1e-5 the next term is y² ln y · 0.15, below 2e-10 of the first.
    expect(energyExcess(1e-5) / 1e-10).toBeCloseTo(5 / (7 * Math.PI ** 2), 9)
    expect(energyExcess(1e-20) / 1e-40).toBeCloseTo(5 / (7 * Math.PI ** 2), 15)
  })

  // The binomial series of √(x² + y²) with ∫ xⁿ/(eˣ + 1) dx = (1 − 2^(−n)) n! ζ(n + 1) (DLMF 25.5.3):
  // F ~ (3/2) ζ(3) y + (45/4) ζ(5)/y − (2835/32) ζ(7)/y³; values of ζ from OEIS A002117, A013663, A013665.
  it.each([1e4, 1e6, 1e100, 1e300])('ends as its asymptotic series at y = %d', (y) => {
    const massless = (7 * Math.PI ** 4) / 120
    const zeta = [1.2020569031595942, 1.03692775514337, 1.008349277381923]
    const inverse = 1 / y
    const perMass = 1.5 * zeta[0] + (11.25 * zeta[1] - 88.59375 * zeta[2] * inverse ** 2) * inverse ** 2
    expect(Math.abs((energyRatio(y) / y / perMass) * massless - 1)).toBeLessThanOrEqual(6 * EPS)
  })

  it('gives the limits at infinity and NaN below zero', () => {
    const functions = [energyRatio, logSlope, logSlopeDerivative]
    expect(functions.map((f) => f(Number.POSITIVE_INFINITY))).toEqual([Number.POSITIVE_INFINITY, 1, 0])
    for (const y of [-1, -1e-12, Number.NaN])
      expect(functions.map((f) => f(y))).toEqual([Number.NaN, Number.NaN, Number.NaN])
  })
})

describe('shape', () => {
  it('has a slope that rises strictly where doubles can tell, and never leaves 0 to 1', () => {
    // Steps of 1 %: at y = 1e6 the slope still rises by 2e-2 · 13e-12, a thousand eps.
    const slopes = geometric(1e-9, 1e6, 3500).map(logSlope)
    for (let i = 1; i < slopes.length; i++) expect(slopes[i]).toBeGreaterThan(slopes[i - 1])
    for (const y of geometric(1e-300, 1e300, 2000)) {
      expect(logSlope(y)).toBeGreaterThanOrEqual(0)
      expect(logSlope(y)).toBeLessThanOrEqual(1)
    }
  })

  it('keeps ds/d ln y between s(1 − s) and 2s(1 − s)', () => {
    // Both bounds follow from s² ≤ ⟨g²⟩ ≤ s, see energy.ts; 1 − s carries 3 eps of 1.
    for (const y of geometric(1e-9, 1e9, 3000)) {
      const [s, ds] = [logSlope(y), logSlopeDerivative(y)]
      expect(ds).toBeGreaterThanOrEqual(s * (1 - s) - 8 * EPS * s)
      expect(ds).toBeLessThanOrEqual(2 * s * (1 - s) + 8 * EPS * s)
    }
  })

  it.each(JOINS)('is continuous across the join at %d', (y) => {
    for (const [f, scale] of [
      [energyRatio, energyRatio(y)],
      [logSlope, 1],
      [logSlopeDerivative, 1],
    ] as const) {
      // The function itself moves by less than its scale times 1e-15 over the two steps; each side errs by up to 4 eps.
      expect(Math.abs(f(y * (1 + 2 * EPS)) - f(y * (1 - 2 * EPS)))).toBeLessThanOrEqual(10 * EPS * scale)
    }
  })
})

describe('agreement of the functions with each other', () => {
  it('writes the same numbers in one call', () => {
    const out = new Float64Array(3)
    for (const y of [0, 1e-12, 1e-3, 0.7, 0.75, 1, 20, 1e5]) {
      energyDerivatives(y, out)
      expect([...out]).toEqual([energyRatio(y), logSlope(y), logSlopeDerivative(y)])
    }
  })

  it('has a slope and a change that integrate to the ratio', () => {
    for (const y of geometric(1e-4, 1e4, 200)) {
      for (const d of [-2, -0.7, -0.03, 0.01, 0.3, 1, 3]) {
        // Each side rounds to 4 eps, y e^d to 1 + |d| eps, which the ratio passes on by at most that.
        const [there, here] = [energyRatio(y * Math.exp(d)), energyRatio(y)]
        expect(Math.abs(((1 + energyRatioChange(y, d)) * here) / there - 1)).toBeLessThanOrEqual(16 * EPS)
      }
    }
  })

  it('gives the change of a short step from the slope', () => {
    // R(y e^d)/R(y) − 1 = s d + (s² + ds/d ln y) d²/2 + …: at d = 1e-8 the third order is below 1e-16 of the first.
    for (const y of geometric(1e-6, 1e6, 100)) {
      const [d, s] = [1e-8, logSlope(y)]
      const series = s * d + ((s * s + logSlopeDerivative(y)) * d * d) / 2
      expect(Math.abs(energyRatioChange(y, d) / series - 1)).toBeLessThanOrEqual(1e-14)
    }
  })
})
