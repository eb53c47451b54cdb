import { describe, expect, test } from 'vitest'
import { eventAtScale, isEvent } from '../../lib/history/event'
import { historyOf } from '../../lib/history/history'
import { particleHorizon } from '../../lib/measures/sight'
import { budgetOf } from '../../lib/scenario/budget'
import { readScenario } from '../../lib/scenario/read'

/**
 * Closed de Sitter space: a = a_min cosh x with x = √Ω H₀t since the bounce, so that c η = R gd(x), and from the infinite past
 * c η = R (π/2 + gd(x)) = 2R atan(eˣ), R = (c/H₀)/√(Ω − 1) (closed form of de Sitter 1917; gd is Gudermann's function).
 */
describe('particle horizon in closed de Sitter space', () => {
  const omega = 1.8
  const reading = readScenario(`matter:0,cmb:0,dark:${omega}`, null)
  if (!reading.ok) throw new Error('not read')
  const history = historyOf(reading.value, budgetOf(reading.value))
  const radius = 1 / Math.sqrt(omega - 1)
  const smallest = Math.sqrt((omega - 1) / omega)

  test.each([-40, -20, -5, -2, -0.5, 0.5, 2, 5])('x = %f', (x) => {
    const branch = x < 0 ? 'contracting' : 'expanding'
    const event = eventAtScale(history, Math.log(smallest * Math.cosh(x)), branch)
    if (!isEvent(event)) throw new Error(event.because)
    const expected = 2 * radius * Math.atan(Math.exp(x))
    // ln a is good to eps of itself, and η follows a: |x| eps; near the bounce x follows a by 1/tanh x.
    const tolerance = 32 * Number.EPSILON * (1 + Math.abs(x) + 1 / Math.abs(Math.tanh(x)))
    expect(Math.abs((particleHorizon(history, event) as number) / expected - 1)).toBeLessThan(tolerance)
  })
})
