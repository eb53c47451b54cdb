/**
 * The rip of Caldwell, Kamionkowski & Weinberg 2003, PRL 91, 071301, arXiv:astro-ph/0302506 (CKW1 to CKW6 of published.json):
 * flat, Ω_m = 0.3, H₀ = 70, no radiation, w constant.
 */
import { describe, expect, test } from 'vitest'
import { JULIAN_YEAR } from '../../lib/constants'
import { eventAtScale, untilEnd } from '../../lib/history/event'
import { UNBOUND_SYSTEMS, unbinding } from '../../lib/measures/unbinding'
import { expectNear, expectPrinted, expectRelative, PUBLISHED } from './published'
import { gyr, known, measure, universe } from './universe'

const { CKW1, CKW2, CKW3, CKW4, CKW5, CKW6 } = PUBLISHED
const phantom = (w: number) => universe(`matter:0.3,h0:70,cmb:0,eos:constant,w:${w}`)
const rip = phantom(-1.5)

function timeLeft(solution = rip): number {
  expect(solution.end.kind).toBe('rip')
  return solution.end.time ?? Number.NaN
}

describe('time of the rip', () => {
  test('w = −1.5', () => {
    expectPrinted(timeLeft(), CKW1.value)
    expectPrinted(timeLeft(), CKW1.recomputed)
  })
  test.each(Object.entries(CKW6.recomputed))('w = %s, recomputed only', (w, expected) => {
    expectPrinted(timeLeft(phantom(Number(w))), expected)
  })
  test('total age', () => {
    const total = measure(rip, 'age') + timeLeft()
    expectPrinted(total, CKW5.recomputed)
    // The table adds two numbers that are each rounded to a Gyr.
    expectPrinted(total, CKW5.value, 0.5)
  })
  test('the formula (2/3)/(|1+w| H₀ √(1−Ω_m)), to what it neglects', () => {
    const formula = ((2 / 3 / 0.5) * gyr(rip)) / Math.sqrt(0.7)
    expectPrinted(formula, CKW2.recomputed)
    // It drops matter: 1/√(x + y) lies between 1/√x and (1 − y/2x)/√x, and ∫ of the bound is 1 − (3/14)(0.75/5.25).
    expect(timeLeft()).toBeLessThan(formula)
    expect(timeLeft()).toBeGreaterThan(formula * (1 - (3 / 14) * (0.75 / 5.25)))
  })
  test('dark energy alone keeps to the formula, whatever w', () => {
    for (const w of [-1.001, -1.1, -1.5, -2, -5, -20]) {
      const { end, history } = universe(`matter:0,cmb:0,eos:constant,w:${w}`)
      // 1 + w loses the digits that w shares with −1.
      const tolerance = 1e-14 + (4 * Number.EPSILON * Math.abs(w)) / Math.abs(1 + w)
      expectRelative(history.future.time.total, 2 / (3 * Math.abs(1 + w)), tolerance)
      expect(end.kind).toBe('rip')
    }
  })
})

/** P √(2|1+3w|)/(6π|1+w|): the time that is left when ä/a = (2π/P)², exact where matter is gone. */
const formula = (period: number, w: number) =>
  (period * Math.sqrt(2 * Math.abs(1 + 3 * w))) / (6 * Math.PI * Math.abs(1 + w))

describe('unbinding', () => {
  const { history, scenario } = rip
  /** Seconds between the unbinding of a system and the rip, counted from the rip so that no digits cancel. */
  function secondsLeft(system: (typeof UNBOUND_SYSTEMS)[number]): number {
    const found = unbinding(history, scenario.h0, system)
    const left = untilEnd(history, known(eventAtScale(history, found?.N ?? Number.NaN, 'expanding')), 'time')
    return left * gyr(rip) * 1e9 * JULIAN_YEAR
  }

  test('factor of the formula', () => expectPrinted(formula(1, -1.5), CKW3.recomputed))

  test.each(UNBOUND_SYSTEMS.map((one) => [one.kind, one] as const))('%s by the formula', (_, system) => {
    // Matter over dark energy is 0.43 a^−4.5: 1e-6 at a = 17, when clusters go, and below 1e-14 for all others. E² there differs from
    // dark energy alone by that, and the integral by a tenth of it. N near 100 (atoms) costs |1+w| N eps in E.
    expectRelative(
      secondsLeft(system),
      formula(system.period, -1.5),
      system.kind === 'unbinding-cluster' ? 2e-6 : 1e-13,
    )
  })

  const YEAR = JULIAN_YEAR
  test.each([
    ['unbinding-cluster', 'Gyr', 1e9 * YEAR, 1, 0.5],
    ['unbinding-galaxy', 'Myr', 1e6 * YEAR, 60, 5],
    ['unbinding-planet', 'months', YEAR / 12, 3, 0.5],
    ['unbinding-earth', 'minutes', 60, 30, 5],
  ] as const)('%s as in the timetable', (kind, unit, seconds, count, half) => {
    const system = UNBOUND_SYSTEMS.find((one) => one.kind === kind)
    if (!system) throw new Error(kind)
    expect(CKW4.value[kind]).toBe(`${count} ${unit}`)
    // One significant digit, of an estimate: half a unit of that digit. The atom's 1e-19 s follows from no period (a classical
    // electron gives 4e-17 s) and is left out.
    expectNear(secondsLeft(system) / seconds, count, half)
  })

  test('moments carry the same times, and come in the order of the table', () => {
    const moments = rip.moments.filter((one) => one.kind.startsWith('unbinding'))
    expect(moments.map((one) => one.kind)).toEqual(Object.keys(CKW4.value))
    for (const moment of moments.slice(0, 2)) {
      const system = UNBOUND_SYSTEMS.find((one) => one.kind === moment.kind)
      if (!system) throw new Error(moment.kind)
      const left = (timeLeft() - (moment.time ?? Number.NaN)) * 1e9 * YEAR
      // Differences of 21.7 Gyr: eps of that over 63 Myr is 8e-14 and over 1 Gyr less.
      expectRelative(left, secondsLeft(system), 1e-12)
    }
  })

  test('nothing is torn apart without a rip', () => {
    for (const code of ['matter:0.3', 'matter:2,cmb:0,dark:0', 'matter:0.3,eos:constant,w:-0.9']) {
      const { history, scenario, moments } = universe(code)
      for (const system of UNBOUND_SYSTEMS) expect(unbinding(history, scenario.h0, system)).toBe(null)
      expect(moments.some((one) => one.kind.startsWith('unbinding'))).toBe(false)
    }
  })
})
