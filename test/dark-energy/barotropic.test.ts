/**
 * The barotropic law against closed forms (dark energy alone, flat: E² = u^(1/(1−α)), u = 1 + 3A(1 − α) ln a) and against
 * multiprecision values (test/reference/barotropic.json, made by barotropic.py beside it: mpmath, tanh-sinh, 40 digits).
 */

import { describe, expect, test } from 'vitest'
import { eventAtTime, expansionAtEvent } from '../../lib/history/event'
import { UNBOUND_SYSTEMS, unbinding } from '../../lib/measures/unbinding'
import { readScenario } from '../../lib/scenario/read'
import REFERENCE from '../reference/barotropic.json'
import { expectRelative } from '../world/published'
import { gyr, known, measure, scaleAtTime, universe } from '../world/universe'

const alone = (excess: number, alpha: number) =>
  universe(`h0:70,matter:0,cmb:0,eos:barotropic,excess:${excess},alpha:${alpha}`)
const withMatter = (excess: number, alpha: number) =>
  universe(`matter:0.3,cmb:0,eos:barotropic,excess:${excess},alpha:${alpha}`)

describe('dark energy alone', () => {
  test.each([
    [0.1, 0.75, 'rip'],
    [0.1, 1, 'rip'],
    [0.02, 0.51, 'rip'],
    [10, 0.9999, 'rip'],
    [1e-4, 0.999, 'rip'],
    [0.1, 2, 'singular'],
    [0.3, 1.1, 'singular'],
    [1e-5, 4, 'singular'],
    [10, 5, 'singular'],
  ] as const)('A = %d, α = %d ends after 2/(3A(2α − 1)) Hubble times', (excess, alpha, kind) => {
    const { end, scenario } = alone(excess, alpha)
    expect(end.kind).toBe(kind)
    // t = ∫ dN/E; 977.792 is the Hubble time of 1 km/s/Mpc in Gyr to six digits.
    expectRelative(end.time ?? Number.NaN, ((2 / (3 * excess * (2 * alpha - 1))) * 977.792) / scenario.h0, 1e-6)
    expectRelative((end.time ?? Number.NaN) / gyr(alone(excess, alpha)), 2 / (3 * excess * (2 * alpha - 1)), 1e-13)
  })
  test('the singular end lies at a = e^(1/(3A(α − 1)))', () => {
    expectRelative(alone(0.1, 2).end.scale ?? Number.NaN, Math.exp(1 / 0.3), 1e-14)
    // Too large for a double.
    expect(alone(1e-5, 4).end.scale).toBe(null)
  })
  test('A < 0 turns it round in time: it began with infinite density', () => {
    const { origin, end } = alone(-0.1, 2)
    expect(origin.kind).toBe('singular')
    expectRelative(origin.scale, Math.exp(-1 / 0.3), 1e-14)
    expectRelative((origin.time ?? Number.NaN) / gyr(alone(-0.1, 2)), -2 / 0.9, 1e-13)
    expect(end.kind).toBe('accelerating')
  })
  test('little rip of α = 1/2: ln a = (2/3A)(e^(3At/2) − 1) (Frampton, Ludwick & Scherrer 2011, Phys. Rev. D 84, 063003)', () => {
    const solution = alone(0.1, 0.5)
    expect(solution.end).toMatchObject({ kind: 'little-rip', time: null, scale: null })
    for (const t of [-6, -0.5, 0.01, 1, 5, 20, 30]) {
      const N = Math.expm1(0.15 * t) / 0.15
      // a itself carries eps |N|.
      expectRelative(scaleAtTime(solution, t), Math.exp(N), 1e-13 * (1 + Math.abs(N)))
    }
  })
  test('α below 1/2: E² = u^p, t = ((1 + sN)^(1 − p/2) − 1)/(s(1 − p/2)), out to the last double', () => {
    const solution = alone(0.2, 0.25)
    const [s, p] = [0.45, 4 / 3]
    expect(solution.end.kind).toBe('little-rip')
    for (const N of [0.1, 1, 20, 300]) {
      const t = ((1 + s * N) ** (1 - p / 2) - 1) / (s * (1 - p / 2))
      expectRelative(Math.log(scaleAtTime(solution, t)), N, 1e-13 / Math.min(1, N))
    }
  })
  test('used up with nothing else about, it leaves a universe at rest', () => {
    const { end } = alone(-0.1, 0.75)
    expect(end).toMatchObject({ kind: 'static', time: null, proven: true })
    expectRelative(end.scale ?? Number.NaN, Math.exp(1 / (0.3 * 0.25)), 1e-13)
    expect(alone(0.1, 0.75).origin.kind).toBe('static')
  })
  test('for α < 1/2 it comes to rest in finite time, and stays there', () => {
    const solution = alone(-0.1, 0.2)
    // ∫ u^(−p/2) dN from u = 1 to 0 with p = 5/4, s = −0.24.
    const rest = 1 / (0.24 * (1 - 5 / 8))
    const scale = solution.end.scale ?? Number.NaN
    expect(scaleAtTime(solution, 0.999 * rest)).toBeLessThan(scale)
    expectRelative(scaleAtTime(solution, rest + 1), scale, 1e-14)
    expect(expansionAtEvent(known(eventAtTime(solution.history, rest + 1)))).toBe(0)
  })
  test('α = 0: ρ = 1 − 3|A| ln a turns negative, and the universe round, after 2/(3|A|) Hubble times', () => {
    const solution = alone(-0.1, 0)
    expect(solution.origin.kind).toBe('eternal')
    expect(solution.end.kind).toBe('crunch')
    // Half of the way back is as far as today; a = 0 is never reached.
    expect(solution.end.time).toBe(null)
    expectRelative((solution.end.turnaround?.time ?? Number.NaN) / gyr(solution), 2 / 0.3, 1e-14)
    expectRelative(solution.end.turnaround?.scale ?? Number.NaN, Math.exp(1 / 0.3), 1e-14)
    expectRelative(scaleAtTime(solution, 4 / 0.3), 1, 1e-13)
  })
  test('its mirror image bounces', () => {
    const { origin, end } = alone(0.1, 0)
    expect(origin.kind).toBe('bounce')
    expectRelative((origin.time ?? Number.NaN) / gyr(alone(0.1, 0)), -2 / 0.3, 1e-14)
    expect(end.kind).toBe('little-rip')
    // Where rounding puts u at zero exactly.
    expect(alone(7.779153655283153, 0).origin.kind).toBe('bounce')
    expectRelative(alone(7.779153655283153, 0).history.past.time.total, 2 / (3 * 7.779153655283153), 1e-14)
  })
  test('α < 0: used up in finite time, with infinite pressure', () => {
    const { end } = alone(-0.1, -1)
    expect(end.kind).toBe('singular')
    // p = 1/2, s = −0.6: ∫ u^(−1/4) dN = 1/(0.6 · 3/4).
    expectRelative((end.time ?? Number.NaN) / gyr(alone(-0.1, -1)), 1 / 0.45, 1e-13)
  })
})

interface Reference {
  readonly matter: number
  readonly dark?: number
  readonly excess: number
  readonly alpha: number
  readonly values: object
}
const CASES: readonly Reference[] = REFERENCE

describe.each(CASES)(
  'matter $matter, dark $dark, A = $excess, α = $alpha',
  ({ matter, dark, excess, alpha, values }) => {
    const closing = dark === undefined ? '' : `,dark:${dark}`
    const solution = universe(`matter:${matter},cmb:0${closing},eos:barotropic,excess:${excess},alpha:${alpha}`)
    const { past, future } = solution.history
    const ours: Readonly<Record<string, number>> = {
      age: past.time.total,
      particleHorizon: past.conformal.total,
      timeToEnd: future.time.total,
      eventHorizon: future.conformal.total,
      timeToTurnaround: future.time.total,
      turnaroundScale: solution.end.turnaround?.scale ?? Number.NaN,
    }
    test.each(Object.entries(values))('%s', (key, value) => {
      // Sums of some forty panels, each good to 2e-14.
      expectRelative(ours[key], Number(value), 2e-13)
    })
  },
)

test.each(['dark:-0.1', 'dark:0', 'matter:1,cmb:0'])(
  '%s: the law has no meaning without a positive density',
  (rest) => {
    const reading = readScenario(`${rest},eos:barotropic,excess:0.1`, 0)
    expect(!reading.ok && reading.problems.map((one) => one.parameter)).toEqual(['eos'])
  },
)

describe('what it ends in beside matter', () => {
  test.each([
    [0.1, 0.5, 'big-bang', 'little-rip'],
    [0.1, 0.4, 'big-bang', 'little-rip'],
    [0.1, 0.6, 'big-bang', 'rip'],
    [0.1, 1, 'big-bang', 'rip'],
    [0.1, 1.5, 'big-bang', 'singular'],
    [0.1, 0, 'big-bang', 'little-rip'],
    [0.1, -2, 'singular', 'little-rip'],
    [-0.1, 0.5, 'big-bang', 'decelerating'],
    [-0.1, 1, 'big-bang', 'accelerating'],
    [-0.1, 1.5, 'singular', 'accelerating'],
    [-0.1, 0, 'big-bang', 'crunch'],
    [-0.1, -2, 'big-bang', 'singular'],
    [0, 3, 'big-bang', 'exponential'],
  ] as const)('A = %d, α = %d: %s, %s', (excess, alpha, origin, end) => {
    const solution = withMatter(excess, alpha)
    expect([solution.origin.kind, solution.end.kind]).toEqual([origin, end])
  })
  test('a closed universe that turns round before dark energy is used up goes home to a big crunch', () => {
    expect(universe('matter:0.3,cmb:0,dark:0.75,eos:barotropic,excess:-0.3,alpha:-1').end.kind).toBe('singular')
    expect(universe('matter:2,cmb:0,dark:0.75,eos:barotropic,excess:-0.3,alpha:-1').end.kind).toBe('crunch')
  })
  test('used up, the law has no w, and everything else goes on', () => {
    const solution = withMatter(-0.3, 0.5)
    // Beyond a = e^(1/0.45) matter is alone: E² = 0.3 a⁻³.
    const a = 20
    expectRelative(solution.history.future.model.expansion(Math.log(a), 1 / a), 0.3 / a ** 3, 1e-15)
    expect(solution.history.future.model.law.w(Math.log(a))).toBe(Number.NaN)
    expect(measure(solution, 'asymptoticHubble')).toBe(0)
  })
  test('a little rip unbinds galaxies in its time, a rip all', () => {
    const galaxy = UNBOUND_SYSTEMS[1]
    expect(unbinding(withMatter(0.1, 0.5).history, 70, galaxy)).not.toBe(null)
    const { history } = withMatter(0.1, 2)
    const times = UNBOUND_SYSTEMS.map((one) => unbinding(history, 70, one)?.time ?? Number.NaN)
    expect(times).toEqual(times.toSorted((one, other) => one - other))
    expect(times[0]).toBeGreaterThan(0)
    expect(times[4]).toBeLessThanOrEqual(history.future.time.total)
  })
})
