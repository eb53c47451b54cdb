/** Epochs of equality and of changing acceleration, against closed forms. */
import { describe, expect, test } from 'vitest'
import {
  accelerationChanges,
  type Crossing,
  darkOverMatter,
  matterOverRadiation,
  nearestToNow,
  overtakings,
} from '../../lib/measures/epochs'
import { expectNear, expectRelative } from '../world/published'
import { universe } from '../world/universe'

const dark = (code: string) => overtakings(universe(code).history, darkOverMatter)

describe('matter and dark energy', () => {
  test.each([
    ['matter:0.3,cmb:0', Math.cbrt(0.3 / 0.7), true],
    ['matter:0.7,cmb:0', Math.cbrt(0.7 / 0.3), true],
    // a^(3 − n) = Ω_m/Ω_DE, n = 3(1 + w)
    ['matter:0.3,cmb:0,eos:constant,w:-0.5', (0.3 / 0.7) ** (1 / 1.5), true],
    ['matter:0.3,cmb:0,eos:constant,w:0.5', (0.3 / 0.7) ** (1 / -1.5), false],
  ] as const)('%s', (code, scale, rising) => {
    const list = dark(code)
    expect(list).toHaveLength(1)
    expect(list[0].rising).toBe(rising)
    // ln a is a difference of logarithms of order one, over a slope of at least one.
    expectNear(list[0].N, Math.log(scale), 1e-15)
  })
  test.each([
    ['w:-0.5', true],
    ['w:0.5', false],
    ['w:-1', true],
  ])('equal exactly today, %s', (w, rising) => {
    expect(dark(`matter:0.5,cmb:0,eos:constant,${w}`)).toEqual([
      { N: expect.closeTo(0, 15), rising, blur: expect.closeTo(0, 13) },
    ])
  })
  test('the more alike they thin out, the wider the error that is stated', () => {
    // ln a = ln(Ω_DE/Ω_m)/(3w): eps in the logarithms is eps/(3w) there. The densities are doubles that add up to 1.
    for (const w of [0.5, 1e-2, 1e-4, 1e-6]) {
      const [one] = dark(`matter:0.50048828125,cmb:0,eos:constant,w:${w}`)
      const off = Math.abs(one.N - Math.log(0.49951171875 / 0.50048828125) / (3 * w))
      expect(off).toBeLessThanOrEqual(one.blur ?? 0)
      expect(one.blur).toBeLessThan((20 * Number.EPSILON * (1 + Math.abs(one.N) * 3)) / (3 * w))
    }
  })
  test('dust-like dark energy never overtakes, not even when it weighs the same', () => {
    expect(dark('matter:0.5,cmb:0,eos:constant,w:0')).toEqual([])
    expect(dark('matter:0.3,cmb:0,eos:constant,w:0')).toEqual([])
  })
  test('w0 and wa: a pair of crossings, each where the closed form says', () => {
    // ln(Ω_DE/Ω_m) − 3(w0 + wa) N + 3 wa (a − 1): wa = −1.5 makes it rise and fall again.
    const f = (N: number) => Math.log(0.7 / 0.3) - 3 * (-0.9 - 1.5) * N - 4.5 * Math.expm1(N)
    const list = dark('matter:0.3,cmb:0,eos:cpl,w0:-0.9,wa:-1.5')
    expect(list.map((one) => one.rising)).toEqual([true, false])
    for (const { N } of list) expectNear(f(N), 0, 1e-14)
  })
  test('a pair that is nearly one: both found, or none, on either side of touching', () => {
    // At its top, N = ln(w0 + wa over wa), the ratio touches one for this Ω_DE/Ω_m.
    const [w0, wa] = [-0.2, -2]
    const top = Math.log((w0 + wa) / wa)
    const touching = Math.exp(3 * (w0 + wa) * top - 3 * wa * Math.expm1(top))
    const code = (excess: number) => {
      const matter = 1 / (1 + touching * (1 + excess))
      return `matter:${matter},cmb:0,eos:cpl,w0:${w0},wa:${wa}`
    }
    expect(dark(code(1e-10))).toHaveLength(2)
    expect(dark(code(-1e-10))).toHaveLength(0)
  })
  test('with the law held from today on, each side follows its own', () => {
    const list = dark('matter:0.3,cmb:0,eos:cpl,w0:-0.9,wa:-1.5,beyond:hold')
    expect(list.map((one) => one.rising)).toEqual([true])
  })
})

describe('matter and radiation', () => {
  test('massless', () => {
    const { history } = universe('matter:0.3,radiation:1e-4')
    const [one] = overtakings(history, matterOverRadiation)
    expectRelative(Math.exp(one.N), 1e-4 / 0.3, 4e-15)
    expect(one.rising).toBe(true)
  })
  test('ahead, where radiation still rules', () => {
    const { history } = universe('matter:0.3,radiation:0.6')
    const list = overtakings(history, matterOverRadiation)
    expect(list).toHaveLength(1)
    expectNear(list[0].N, Math.log(2), 1e-15)
  })
  test('never, where a massive neutrino outweighs cold matter for ever', () => {
    // 4 eV: Ω_ν h² = 0.043 against 0.02 of cold matter at h = 1.
    const { history, budget } = universe('h0:100,matter:0.063,masses:4')
    expect(budget.coldMatter).toBeLessThan(budget.massiveNeutrinos)
    expect(overtakings(history, matterOverRadiation)).toEqual([])
  })
})

describe('acceleration', () => {
  test('matter and a cosmological constant: a³ = Ω_m/2Ω_Λ', () => {
    const list = accelerationChanges(universe('matter:0.3,cmb:0').history)
    expect(list).toHaveLength(1)
    // ä/a has slope 3 Ω_Λ there and rounding of a few eps.
    expectNear(list[0].N, Math.log(0.3 / 1.4) / 3, 2e-15)
  })
  test('exactly today: radiation and Λ with Ω_r = Ω_Λ', () => {
    expect(accelerationChanges(universe('matter:0,radiation:0.5,dark:0.5').history)).toMatchObject([
      { N: 0, rising: true },
    ])
  })
  test('none where everything decelerates, or accelerates', () => {
    expect(accelerationChanges(universe('matter:1,cmb:0').history)).toEqual([])
    expect(accelerationChanges(universe('matter:0,cmb:0').history)).toEqual([])
    expect(accelerationChanges(universe('matter:2,cmb:0,dark:0').history)).toEqual([])
  })
  test('an end of the acceleration, by the closed form of ä', () => {
    const [w0, wa] = [-0.838, -0.62]
    const list = accelerationChanges(universe(`matter:0.3114,cmb:0,eos:cpl,w0:${w0},wa:${wa}`).history)
    expect(list.map((one) => one.rising)).toEqual([true, false])
    for (const { N } of list) {
      const a = Math.exp(N)
      const f = a ** (-3 * (1 + w0 + wa)) * Math.exp(-3 * wa * (1 - a))
      const w = w0 + wa * (1 - a)
      expectNear(0.3114 * a ** -3 + (1 - 0.3114) * f * (1 + 3 * w), 0, 1e-14)
    }
  })
  test('the tail is looked at too: dark energy that rules only at a = e^60', () => {
    // Ω_DE = 1e-60 beside dust that leaves E² as a^−3: equality of ä at a³ = Ω_m/2Ω_Λ.
    const [one, ...more] = accelerationChanges(universe('matter:0.9999999999999999,cmb:0,dark:1e-60').history)
    expect(more).toEqual([])
    expect(one.rising).toBe(true)
    expectRelative(one.N, Math.log(0.5e60) / 3, 1e-14)
  })
})

test('of several, the last up to now, else the first ahead', () => {
  const at = (N: number): Crossing => ({ N, rising: true, blur: 0 })
  expect(nearestToNow([])).toBe(null)
  expect(nearestToNow([at(-3), at(-1), at(2)])?.N).toBe(-1)
  expect(nearestToNow([at(-3), at(0), at(2)])?.N).toBe(0)
  expect(nearestToNow([at(1), at(2)])?.N).toBe(1)
})
