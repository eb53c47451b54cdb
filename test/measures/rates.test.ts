/** Rates and fractions at an event, against closed forms and in the places where they are not defined. */
import { describe, expect, test } from 'vitest'
import { eventAtScale } from '../../lib/history/event'
import {
  accelerationAt,
  deceleration,
  densityFraction,
  equationOfState,
  hubbleRate,
  jerk,
  type Share,
} from '../../lib/measures/rates'
import { expectNear, expectRelative } from '../world/published'
import { atScale, known, sure, universe } from '../world/universe'

const SHARES: readonly Share[] = ['matter', 'radiation', 'neutrino', 'curvature', 'dark']

describe('one component alone: q and j of a power law', () => {
  // E² ∝ a^−n: q = n/2 − 1, j = (n − 1)(n − 2)/2.
  test.each([
    ['matter:1,cmb:0', 3],
    ['matter:0,radiation:1', 4],
    ['matter:0,cmb:0', 0],
    ['matter:0,cmb:0,dark:0', 2],
    ['matter:0,cmb:0,eos:constant,w:-0.7', 0.9],
    ['matter:0,cmb:0,eos:constant,w:-1.4', -1.2],
  ])('%s', (code, n) => {
    const solution = universe(code)
    for (const a of [1e-4, 0.3, 1, 7]) {
      const event = atScale(solution, a)
      // n, n² and the powers of a: some roundings of terms up to n².
      expectNear(sure(deceleration(event)), n / 2 - 1, 1e-14)
      expectNear(sure(jerk(event)), ((n - 1) * (n - 2)) / 2, 1e-13)
      expectRelative(hubbleRate(event), a ** (-n / 2), 1e-14)
      expectNear(accelerationAt(event) * a ** n, 1 - n / 2, 1e-13)
    }
  })
})

describe.each([
  'matter:0.3,curvature:0.1',
  'matter:0.3,dark:1,masses:0.05_0.1',
  'matter:0.4,dark:-0.3,eos:cpl,w0:-0.8,wa:-0.5',
])('%s', (code) => {
  const solution = universe(code)
  test('fractions add up to one', () => {
    for (const a of [1e-6, 0.01, 0.5, 1, 1.1]) {
      const event = atScale(solution, a)
      const shares = SHARES.map((share) => sure(densityFraction(event, share)))
      const size = shares.reduce((sum, one) => sum + Math.abs(one), 0)
      expectNear(
        shares.reduce((sum, one) => sum + one),
        1,
        16 * Number.EPSILON * size,
      )
    }
  })
  test('q and j are the derivatives of H', () => {
    // d ln H/dN = −(1 + q) and dq/dN = q(1 + 2q) − j, by Richardson's combination of central differences: h⁴ and eps/h.
    const h = 1e-3
    const slope = (f: (N: number) => number, N: number) =>
      (8 * (f(N + h / 2) - f(N - h / 2)) - (f(N + h) - f(N - h))) / (6 * h)
    const at = (N: number) => known(eventAtScale(solution.history, N, 'expanding'))
    for (const N of [-6, -1, -0.3]) {
      const [q, j] = [sure(deceleration(at(N))), sure(jerk(at(N)))]
      expectNear(
        slope((x) => Math.log(hubbleRate(at(x))), N),
        -(1 + q),
        1e-9,
      )
      expectNear(
        slope((x) => sure(deceleration(at(x))), N),
        q * (1 + 2 * q) - j,
        1e-9,
      )
    }
  })
})

describe('where there is no answer', () => {
  test('at rest: q, j and fractions at a turning point', () => {
    const solution = universe('matter:2,cmb:0,dark:0')
    const event = known(
      eventAtScale(
        solution.history,
        solution.history.future.end.kind === 'root' ? solution.history.future.end.N : 0,
        'expanding',
      ),
    )
    expect(hubbleRate(event)).toBe(0)
    for (const value of [deceleration(event), jerk(event), densityFraction(event, 'matter')]) {
      expect(value).toMatchObject({ because: expect.stringContaining('stands still') })
    }
    // ä/a = −Ω_m/2a³ needs no H.
    expectRelative(accelerationAt(event), -1 / 8, 1e-13)
  })
  test('out of range: densities beyond the doubles', () => {
    const event = atScale(universe('matter:0.3'), 1e-100)
    for (const value of [deceleration(event), jerk(event), densityFraction(event, 'radiation')]) {
      expect(value).toMatchObject({ because: expect.stringContaining('outside the range') })
    }
  })
  test('w without dark energy', () => {
    expect(equationOfState(atScale(universe('matter:1,cmb:0'), 1))).toMatchObject({
      because: expect.stringContaining('no dark energy'),
    })
  })
  test('w beyond the doubles', () => {
    const { history } = universe('matter:0.3,cmb:0,eos:cpl,w0:-1,wa:20')
    expect(equationOfState(known(eventAtScale(history, 709, 'expanding')))).toMatchObject({
      because: expect.stringContaining('outside the range'),
    })
  })
})

test('w follows the law of its side, and H is negative on the way back', () => {
  const held = universe('matter:0.3,cmb:0,eos:cpl,w0:-0.9,wa:-0.5,beyond:hold')
  expect(equationOfState(atScale(held, 3))).toBe(-0.9)
  expectNear(sure(equationOfState(atScale(held, 0.5))), -0.9 - 0.25, 1e-15)
  const crunch = universe('matter:2,cmb:0,dark:0')
  expect(hubbleRate(atScale(crunch, 1, 'contracting'))).toBe(-1)
})
