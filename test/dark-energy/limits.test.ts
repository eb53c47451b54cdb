/** Each family at the values where it becomes a simpler law, known in closed form. */
import { describe, expect, test } from 'vitest'
import { familyOf } from '../../lib/dark-energy'
import type { Law } from '../../lib/dark-energy/law'
import type { ParameterValues } from '../../lib/parameter'

const law = (key: string, values: ParameterValues = {}): Law => familyOf(key).law(values)
const PLACES = [-30, -8, -2.5, -0.7, -1e-9, 0, 1e-9, 0.3, 1, 4, 25]

function expectSame(one: Law, other: Law, tolerance = 1e-14) {
  for (const N of PLACES) {
    const size = 1 + Math.abs(other.logDensity(N))
    expect(Math.abs(one.logDensity(N) - other.logDensity(N)), `ln f at ${N}`).toBeLessThanOrEqual(tolerance * size)
    expect(Math.abs(one.w(N) - other.w(N)), `w at ${N}`).toBeLessThanOrEqual(tolerance * (1 + Math.abs(other.w(N))))
  }
}

describe('exactly', () => {
  test.each<[string, ParameterValues, string, ParameterValues]>([
    ['cpl', { w0: -0.8, wa: 0 }, 'constant', { w: -0.8 }],
    ['jbp', { w0: -0.8, wa: 0 }, 'constant', { w: -0.8 }],
    ['ba', { w0: -0.8, wa: 0 }, 'constant', { w: -0.8 }],
    ['log', { w0: -0.8, wa: 0 }, 'constant', { w: -0.8 }],
    ['nodes', { at: [0.1, 0.5, 2], w: [-0.8, -0.8, -0.8] }, 'constant', { w: -0.8 }],
    ['barotropic', { excess: 0.25, alpha: 1 }, 'constant', { w: -1.25 }],
    ['barotropic', { excess: 0, alpha: 3 }, 'lambda', {}],
    ['chaplygin', { b: 1, alpha: 0.7 }, 'lambda', {}],
    ['chaplygin', { b: 0, alpha: 0.7 }, 'constant', { w: 0 }],
    ['constant', { w: -1 }, 'lambda', {}],
  ])('%s %o is %s %o', (key, values, simple, its) => expectSame(law(key, values), law(simple, its), 0))
})

describe('nearly', () => {
  // The laws depend on these values smoothly: a step of 1e-9 moves ln f by 1e-9 times its sensitivity, at most 3N²/2 and the like.
  test.each<[string, ParameterValues, string, ParameterValues]>([
    ['barotropic', { excess: 0.25, alpha: 1 - 1e-11 }, 'constant', { w: -1.25 }],
    ['barotropic', { excess: 0.25, alpha: 1 + 1e-11 }, 'constant', { w: -1.25 }],
    ['barotropic', { excess: 1e-14, alpha: 0.5 }, 'lambda', {}],
    ['chaplygin', { b: 1 - 1e-16, alpha: 0.2 }, 'lambda', {}],
    ['log', { w0: -0.8, wa: 1e-13 }, 'constant', { w: -0.8 }],
    ['ba', { w0: -0.8, wa: 1e-12 }, 'constant', { w: -0.8 }],
  ])('%s %o is %s %o', (key, values, simple, its) => {
    const [one, other] = [law(key, values), law(simple, its)]
    for (const N of PLACES.filter((x) => Math.abs(x) < 5)) {
      expect(Math.abs(one.logDensity(N) - other.logDensity(N))).toBeLessThan(1e-9)
      expect(Math.abs(one.w(N) - other.w(N))).toBeLessThan(1e-9)
    }
  })
})

describe('two laws in one', () => {
  test('a Chaplygin gas of α = 0 is a constant and dust', () => {
    const gas = law('chaplygin', { b: 0.6, alpha: 0 })
    for (const N of PLACES) {
      const sum = 0.6 + 0.4 * Math.exp(-3 * N)
      // eps times |3N|, by which rounding of N moves the dust.
      expect(Math.abs(gas.density(N) / sum - 1)).toBeLessThan(4 * Number.EPSILON * (1 + Math.abs(3 * N)))
      expect(Math.abs(gas.w(N) + 0.6 / sum)).toBeLessThan(1e-14)
    }
  })
  test('α = 1: ρ² = B + (1 − B) a⁻⁶ (Kamenshchik, Moschella & Pasquier 2001, eq. 4)', () => {
    const gas = law('chaplygin', { b: 0.6, alpha: 1 })
    for (const N of [-3, -1, 0, 1, 3]) expect(gas.density(N) ** 2 / (0.6 + 0.4 * Math.exp(-6 * N))).toBeCloseTo(1, 13)
  })
  test('the laws of two numbers agree on w and dw/da today', () => {
    // dw/da = −w_a at a = 1 for all four: they are made so.
    for (const key of ['cpl', 'jbp', 'ba', 'log']) {
      const one = law(key, { w0: -0.9, wa: 0.4 })
      expect(one.w(0)).toBe(-0.9)
      expect((one.w(1e-5) - one.w(-1e-5)) / 2e-5).toBeCloseTo(-0.4, 8)
    }
  })
  test.each<[string, number]>([
    ['cpl', -0.9 + 0.4],
    ['ba', -0.9 + 0.4],
    ['jbp', -0.9],
  ])('%s begins at w = %d', (key, w) => expect(law(key, { w0: -0.9, wa: 0.4 }).w(-60)).toBeCloseTo(w, 14))
  test('the Barboza–Alcaniz law returns to w0 and turns at a = 1 ± 1/√2', () => {
    const one = law('ba', { w0: -0.9, wa: 1 })
    expect(one.w(60)).toBeCloseTo(-0.9, 14)
    expect(one.w(Math.log(1 - Math.SQRT1_2))).toBeCloseTo(-0.9 + (1 + Math.SQRT2) / 2, 14)
    expect(one.w(Math.log(1 + Math.SQRT1_2))).toBeCloseTo(-0.9 + (1 - Math.SQRT2) / 2, 14)
  })
})

describe('nodes', () => {
  const at = [0.1, 0.3, 0.5, 1, 2]
  const w = [-1.2, -0.5, -0.6, -0.6, 0.2]
  const one = law('nodes', { at, w })
  test('w goes through the nodes and stays outside them', () => {
    at.forEach((a, k) => {
      expect(one.w(Math.log(a))).toBeCloseTo(w[k], 14)
    })
    expect(one.w(-9)).toBe(-1.2)
    expect(one.w(9)).toBe(0.2)
  })
  test('monotone between nodes, flat between equal ones', () => {
    for (let k = 0; k + 1 < at.length; k++) {
      const [from, to] = [Math.log(at[k]), Math.log(at[k + 1])]
      const values = Array.from({ length: 101 }, (_, i) => one.w(from + ((to - from) * i) / 100))
      const sign = Math.sign(w[k + 1] - w[k])
      values.forEach((value, i) => {
        if (i > 0) expect(sign * (value - values[i - 1])).toBeGreaterThanOrEqual(-1e-14)
      })
    }
    expect(one.w(Math.log(0.7))).toBeCloseTo(-0.6, 14)
  })
  test('nodes that are neighbours in the doubles make a jump', () => {
    const jump = law('nodes', { at: [1e5, 100000.00000000001, 2e5], w: [-1, -0.5, -0.5] })
    const N = Math.log(1e5)
    expect(jump.w(N - 0.01)).toBe(-1)
    expect(jump.w(N + 0.01)).toBe(-0.5)
    expect(jump.logDensity(N + 1)).toBeCloseTo(-1.5, 10)
  })
  test('as many values as scale factors', () => {
    expect(familyOf('nodes').conflict?.({ at: [0.5, 1], w: [-1, -1, -1] })).toEqual({
      key: 'w',
      allowed: '2 numbers, as many as in at',
    })
    expect(familyOf('nodes').conflict?.({ at: [0.5, 1], w: [-1, -1] })).toBe(null)
  })
})
