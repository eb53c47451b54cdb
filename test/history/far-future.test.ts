import { expect, test } from 'vitest'
import { eventAtTime, isEvent } from '../../lib/history/event'
import { historyOf } from '../../lib/history/history'
import { budgetOf } from '../../lib/scenario/budget'
import { readScenario } from '../../lib/scenario/read'

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
