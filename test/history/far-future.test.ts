import { expect, test } from 'vitest'
import { eventAtScale, eventAtTime, isEvent } from '../../lib/history/event'
import { historyOf } from '../../lib/history/history'
import { budgetOf } from '../../lib/scenario/budget'
import { readScenario } from '../../lib/scenario/read'
import { erfc } from '../world/erfc'
import { known, universe } from '../world/universe'

/**
 * Half dust and half dark energy with w = −1/15 in flat space: E² = (a⁻³ + a^(−2.8))/2. With x = a^(1/10),
 * H₀t = 10√2 ∫ x¹⁴ dx/√(1 + x²), and I_n = ∫ xⁿ dx/√(1 + x²) = [xⁿ⁻¹ √(1 + x²) − (n − 1) I_(n−2)]/n, I_0 = asinh x.
 */
function ageAt(a: number): number {
  const x = a ** 0.1
  const root = Math.sqrt(1 + x * x)
  let integral = Math.asinh(x)
  for (let n = 2; n <= 14; n += 2) integral = (x ** (n - 1) * root - (n - 1) * integral) / n
  return 10 * Math.SQRT2 * integral
}

// The densities part so slowly that both terms of the tail are infinite at the end of the doubles.
test.each([10, 1e4, 1e9, 1e30, 1e100])('the scale factor is found at the time of a = %f', (a) => {
  const reading = readScenario(`matter:0.5,cmb:0,eos:constant,w:${-1 / 15}`, null)
  if (!reading.ok) throw new Error('not read')
  const event = eventAtTime(historyOf(reading.value, budgetOf(reading.value)), ageAt(a) - ageAt(1))
  if (!isEvent(event)) throw new Error(event.because)
  // a goes like t^(2/3) and w is rounded, each of which ln a multiplies: 64 eps of 1 + ln a. The recurrence loses a digit or two.
  const tolerance = 64 * Number.EPSILON * (1 + Math.log(a))
  expect(Math.abs(Math.exp(event.place.N) / a - 1)).toBeLessThan(tolerance)
})

/**
 * Dark energy alone with ln E = bN² − cN: H₀t = √(π/b) e^(μ²b) [erfc √b(μ − N) − erfc √bμ]/2 with μ = c/2b = 660, and a rip after
 * 5e143/H₀. Times are followed to a hundred powers of ten.
 */
const [B, MU] = [0.75 * 0.001, 660]
const LATE_RIP = 'matter:0,cmb:0,eos:log,w0:-0.34,wa:0.001'
const whole = Math.sqrt(Math.PI / B) * Math.exp(MU * MU * B)
const elapsed = (N: number) => (whole / 2) * (erfc(Math.sqrt(B) * (MU - N)) - erfc(Math.sqrt(B) * MU))

test.each([50, 150, 250, 300])('long before a rip that is farther than times are followed, at a = e^%d', (N) => {
  const { history } = universe(LATE_RIP)
  const place = known(eventAtTime(history, elapsed(N))).place
  // The two exponents are up to 330.
  expect(Math.abs(place.N - N)).toBeLessThan(1e-12 * N)
  expect(place.N).toBe(known(eventAtScale(history, place.N, 'expanding')).place.N)
})

test('farther than that, neither a time nor a scale factor has a place; after the rip, none either', () => {
  const { history } = universe(LATE_RIP)
  const because = expect.stringContaining('farther than the history is followed')
  expect(eventAtScale(history, 400, 'expanding')).toEqual({ because })
  expect(eventAtTime(history, elapsed(400))).toEqual({ because })
  expect(eventAtTime(history, 1.01 * whole)).toEqual({ because: 'this is after the end' })
})
