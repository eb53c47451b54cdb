/** Closed forms of the last light, where a = e^(H₀ t): χ_eh = e^(−H₀ t) and χ(z) = z, in c/H₀ (Rindler 1956, MNRAS 116, 662). */
import { expect, it } from 'vitest'
import { isEvent, sinceNow } from '../../lib/history/event'
import { historyOf } from '../../lib/history/history'
import { lastSight } from '../../lib/measures/last-sight'
import { budgetOf } from '../../lib/scenario/budget'
import { readScenario } from '../../lib/scenario/read'

function history(code: string) {
  const reading = readScenario(code, null)
  if (!reading.ok) throw new Error(code)
  return historyOf(reading.value, budgetOf(reading.value))
}

it.each([0.01, 0.5, 1, 2, 1000])('a constant alone: from z = %s until −ln z', (z) => {
  const alone = history('matter:0,cmb:0')
  const found = lastSight(alone, z)
  if (!isEvent(found)) throw new Error(found.because)
  // 1 − z loses a few eps of max(1, z) before it is searched for; dt = e^(t) dη scales that by 1/z.
  const tolerance = 32 * Number.EPSILON * Math.max(1, 1 / z, Math.log(z))
  expect(Math.abs(sinceNow(alone, found, 'time') + Math.log(z))).toBeLessThan(tolerance)
})

it('there is no last light where light gets everywhere, nor from beyond all that is ever seen', () => {
  expect(lastSight(history('matter:1,cmb:0'), 1)).toHaveProperty('because')
  // Flat, with matter: everything ever visible lies within past + future conformal time, below 5 c/H₀ here.
  expect(lastSight(history('matter:0.3,cmb:0'), 5)).toMatchObject({
    because: expect.stringContaining('none of its light'),
  })
})
