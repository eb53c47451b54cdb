/** Ages next to a beginning keep their own relative accuracy, however little they are of the whole. */
import { describe, expect, it } from 'vitest'
import { eventAtScale, isEvent, sinceOrigin } from '../../lib/history/event'
import type { History } from '../../lib/history/history'
import { subjectOf } from '../../lib/quantities/quantity'
import { readScenario } from '../../lib/scenario/read'
import { erfc } from '../world/erfc'

function historyOf(code: string): History {
  const reading = readScenario(code, 0)
  if (!reading.ok) throw new Error(code)
  return subjectOf(reading.value).history
}

function age(history: History, N: number): number {
  const event = eventAtScale(history, N, 'expanding')
  if (!isEvent(event)) throw new Error(event.because)
  return sinceOrigin(history, event, 'time')
}

describe('log alone, w0 = −1: f = e^(3 wa N²/2), so that t = √(π/3wa) erfc(√(3wa)/2 |N|)', () => {
  it.each([
    [0.5, 4],
    [0.5, 9],
    [2, 3],
    [2, 7],
    [2, 15],
    [8, 7],
  ])('wa = %f at N = −%f', (wa, m) => {
    const history = historyOf(`matter:0,cmb:0,eos:log,w0:-1,wa:${wa}`)
    const x = (Math.sqrt(3 * wa) / 2) * m
    const expected = Math.sqrt(Math.PI / (3 * wa)) * erfc(x)
    // Rounding of the exponent, and the width of a panel over the length in which the integrand falls.
    expect(Math.abs(age(history, -m) / expected - 1)).toBeLessThan(1e-12 + 16 * Number.EPSILON * x * x)
  })
})

describe('barotropic alone, 3A(1 − α) = 1 and α > 1: f = u^p with u = 1 + N and p = 1/(1 − α), so that t = u^(1 − p/2)/(1 − p/2)', () => {
  it.each([1.5, 2, 3].flatMap((alpha) => [2, 10, 24, 40, 50].map((k) => [alpha, k] as const)))(
    'α = %f at u = 2^−%i',
    (alpha, k) => {
      const power = 1 - 1 / (1 - alpha) / 2
      const history = historyOf(`matter:0,cmb:0,eos:barotropic,excess:${1 / (3 * (1 - alpha))},alpha:${alpha}`)
      const u = 2 ** -k
      // The edge is the double next to −1: ln a tells u no better than to eps.
      const told = (2 * power * Number.EPSILON) / u
      expect(Math.abs(age(history, u - 1) / (u ** power / power) - 1)).toBeLessThan(1e-12 + told)
    },
  )
})
