/**
 * A universe that swings for ever: with matter m, a negative density −r that thins out like radiation, and curvature −k, Friedmann's
 * equation in conformal time is (da/dη)² = m a − r − k a², so that a = m/2k − A cos √k(η − η₀): harmonic (closed form, derived here).
 */
import { expect, it } from 'vitest'
import { eventAtAge, eventAtConformal, eventAtTime, isEvent, sinceNow, untilEnd } from '../../lib/history/event'
import { known, universe } from '../world/universe'

const [m, r, k] = [3, 0.5, 1.5]
const swinging = universe(`matter:${m},cmb:0,curvature:${-k},eos:constant,w:0.3333333333333333`)
const middle = m / (2 * k)
const amplitude = Math.sqrt(middle ** 2 - r / k)
// Today a = 1 is the middle: a quarter of a swing after the smallest a.
const scaleAt = (eta: number) => middle + amplitude * Math.sin(Math.sqrt(k) * eta)

it.each([-20, -9.5, -6, -3.1, -1, 0.4, 2, 3.3, 5, 7.7, 12, 31])('η = %f', (eta) => {
  const event = known(eventAtConformal(swinging.history, eta))
  const expected = Math.log(scaleAt(eta))
  // η is the difference of whole swings, each good to some eps; near a turning point a follows its square.
  const tolerance = 256 * Number.EPSILON * (1 + Math.abs(eta))
  expect(Math.abs(event.place.N - expected)).toBeLessThan(tolerance)
  expect(event.sign).toBe(Math.cos(Math.sqrt(k) * eta) > 0 ? 1 : -1)
  // The turning points are nearest in time where a tells it least: there the square root of eps is left.
  expect(Math.abs(sinceNow(swinging.history, event, 'conformal') - eta)).toBeLessThan(tolerance)
})

it('times of swings add up', () => {
  // Kepler's equation: t = ∫ a dη = middle η + A(1 − cos √k η)/√k.
  for (const eta of [-6, -3.1, 2, 3.3, 5, 7.7]) {
    const t = middle * eta + (amplitude * (1 - Math.cos(Math.sqrt(k) * eta))) / Math.sqrt(k)
    const event = known(eventAtTime(swinging.history, t))
    expect(Math.abs(event.place.N - Math.log(scaleAt(eta)))).toBeLessThan(1024 * Number.EPSILON * (1 + Math.abs(eta)))
    expect(Math.abs(sinceNow(swinging.history, event, 'time') - t)).toBeLessThan(
      512 * Number.EPSILON * (1 + Math.abs(t)),
    )
  }
})

it('without a beginning there is no age', () => {
  // Dark energy alone: a = e^(H₀t), from all time.
  expect(eventAtAge(universe('matter:0,cmb:0').history, 1)).toMatchObject({
    because: expect.stringContaining('infinite'),
  })
})

it('what thins out faster than any power of a leaves time without end', () => {
  // f = a³ e^(−3(a − 1)): dt = dN/E grows without bound (Chevallier & Polarski 2001 with w0 = −1, wa = −1).
  const { history } = universe('matter:0,cmb:0,eos:cpl,w0:-1,wa:-1')
  const late = eventAtConformal(history, 1)
  expect(isEvent(late) && untilEnd(history, late, 'time')).toBe(Number.POSITIVE_INFINITY)
  const beyond = eventAtTime(history, 1e200)
  expect(isEvent(beyond)).toBe(false)
})
