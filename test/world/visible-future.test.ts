/** What can be seen and reached in the future (FU1 to FU5 of published.json). */
import { describe, expect, test } from 'vitest'
import { type Event, eventAtAge, eventAtScale, sinceOrigin } from '../../lib/history/event'
import { accelerationChanges } from '../../lib/measures/epochs'
import { eventHorizon, redshiftAt } from '../../lib/measures/sight'
import { brent } from '../../lib/numerics/roots'
import { expectPrinted, expectRelative, PUBLISHED, printed } from './published'
import { comoving, gyr, known, measure, mpc, sure, timeAtScale, universe } from './universe'

const { FU1, FU2, FU3, FU4, FU5 } = PUBLISHED
const simple = universe('matter:0.3,h0:70,cmb:0')

describe('a source can be seen only up to some age of its own (Loeb 2002)', () => {
  /** Its last light that ever arrives left when its distance was the event horizon. */
  function lastAge(z: number): number {
    const chi = comoving(simple, z)
    const event = (N: number): Event => known(eventAtScale(simple.history, N, 'expanding'))
    const N = brent((x) => sure(eventHorizon(simple.history, event(x))) - chi, -5, 0)
    return sinceOrigin(simple.history, event(N), 'time') * gyr(simple)
  }
  test.each([
    ['5', FU1.value.to],
    ['10', FU1.value.from],
  ] as const)('present redshift %s', (z, published) => {
    expectPrinted(lastAge(Number(z)), FU1.recomputed[z])
    expectPrinted(lastAge(Number(z)), published)
  })
})

test('how far a signal reaches, and a signal that is answered (Heyl 2005)', () => {
  const reach = (fraction: number): number => {
    const horizon = measure(simple, 'eventHorizon') / gyr(simple)
    const found = redshiftAt(simple.history, fraction * horizon, 0)
    return 'value' in found ? found.value : Number.NaN
  }
  expectPrinted(reach(1), FU3.recomputed['one way'])
  expectPrinted(reach(0.5), FU3.recomputed.return)
  // A rocket stays behind light, and 0.15 behind it at most (read: 1.7 and 0.65).
  for (const [light, rocket] of [
    [reach(1), FU3.value['one way']],
    [reach(0.5), FU3.value.return],
  ] as const) {
    expect(light).toBeGreaterThan(printed(rocket).value)
    expect(light - printed(rocket).value).toBeLessThan(0.15)
  }
})

test('the largest distance that can be reached (Kwan, Lewis & James 2010)', () => {
  const solution = universe('matter:0.27,h0:72,cmb:0')
  const horizon = (measure(solution, 'eventHorizon') * mpc(solution)) / gyr(solution) / 1000
  expectPrinted(horizon, FU4.recomputed)
  // They do not print H₀ with more than two digits: about 72, so 1% of the length.
  expectRelative(horizon, printed(FU4.value).value, 0.011)
})

describe('the far future of a Planck 2018 universe (Krauss & Scherrer 2007)', () => {
  // Parameters of PL2 (arXiv:1807.06209, with BAO): Ω_m = 0.3111, h = 0.6766, one neutrino of 0.06 eV.
  const solution = universe('h0:67.66,matter:0.3111,nu:3.046')
  const age = measure(solution, 'age')
  const late = Math.exp(known(eventAtAge(solution.history, 100 / gyr(solution))).place.N)
  test('a hundred Gyr after the origin', () => {
    // The parameters are rounded to four digits, which exp(H t) with H t = 5.8 turns into 1e-3 of a.
    expectRelative(late, printed(FU2.recomputed['a(100 Gyr)']).value, 2e-3)
    expectPrinted(2.7255 / late, FU2.recomputed.temperature)
  })
  test('when the background falls below the plasma frequency, at a = 1e8', () => {
    const then = (age + timeAtScale(solution, 1e8) * gyr(solution)) / age
    expectPrinted(then, FU2.recomputed['a = 1e8 in present ages'])
    // The abstract: in less than 50 present ages.
    expect(then).toBeLessThan(50)
  })
})

describe('w0 and wa of DESI DR2 run forward', () => {
  const SETS = ['DESI+CMB+DESY5', 'DESI+CMB+Union3', 'DESI+CMB+Pantheon+'] as const
  const solve = (name: keyof typeof FU5.value) => {
    const { Omega_m, H0, w0, wa } = FU5.value[name]
    return universe(`h0:${H0},matter:${Omega_m},cmb:0,eos:cpl,w0:${w0},wa:${wa}`)
  }
  test.each(SETS)('%s: the acceleration ends', (name) => {
    const solution = solve(name)
    const end = accelerationChanges(solution.history).find((one) => !one.rising)
    expectPrinted(Math.exp(end?.N ?? Number.NaN), FU5.recomputed[name].scale)
    const moment = solution.moments.find((one) => one.kind === 'acceleration-end')
    expectPrinted(moment?.time ?? Number.NaN, FU5.recomputed[name].time)
    expect(solution.end.kind).toBe('decelerating')
  })
  test.each(SETS)('%s: w crosses −1', (name) => {
    const { law } = solve(name).history.past.model
    const N = brent((x) => law.w(x) + 1, -1, 0)
    expectPrinted(Math.expm1(-N), FU5.recomputed[name]['z of w = -1'])
  })
  test('DESI+CMB: decelerating already', () => {
    expectPrinted(measure(solve('DESI+CMB'), 'deceleration'), FU5.recomputed['DESI+CMB'].q0)
  })
})
