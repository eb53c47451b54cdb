/** Events by conformal time: it leads back to the time that led there, on every branch. */
import { expect, it } from 'vitest'
import { eventAtConformal, eventAtTime, isEvent, sinceNow } from '../../lib/history/event'
import { readScenario } from '../../lib/scenario/read'
import { solve } from '../../lib/solve'

const historyOf = (code: string) => {
  const reading = readScenario(code, null)
  if (!reading.ok) throw new Error(code)
  return solve(reading.value).history
}

it.each([
  ['h0:70,matter:0.3', [-0.9, -0.5, -1e-6, 1e-6, 0.7, 3]],
  // Turns round: the way back too.
  ['matter:0.4,dark:0.85,eos:cpl,w0:-0.6,wa:-1.6', [-0.5, 1, 3.6, 5, 7]],
  // Comes from a bounce: the contraction too.
  ['matter:0.1,dark:2,cmb:0', [-2.5, -1, -0.3, 1]],
] as const)('%s', (code, times) => {
  const history = historyOf(code)
  for (const time of times) {
    const event = eventAtTime(history, time)
    if (!isEvent(event)) throw new Error(`${time}: ${event.because}`)
    const again = eventAtConformal(history, sinceNow(history, event, 'conformal'))
    if (!isEvent(again)) throw new Error(`${time}: ${again.because}`)
    expect(again.phase).toBe(event.phase)
    // Both searches end within a few eps of their sums, which near a turning point are about four times the time from now.
    expect(Math.abs(sinceNow(history, again, 'time') - time)).toBeLessThan(
      64 * Number.EPSILON * Math.max(4, Math.abs(time)),
    )
  }
})

it('knows an event horizon when it sees one: matter alone has covered 2 c/H₀, and a cosmological constant alone leaves c/H₀', () => {
  // χ_ph = 2 c/H₀ for a = t^(2/3); χ_eh = c/H₀ for a = e^(H₀ t).
  expect(isEvent(eventAtConformal(historyOf('matter:1,cmb:0'), -1.999))).toBe(true)
  expect(isEvent(eventAtConformal(historyOf('matter:1,cmb:0'), -2.001))).toBe(false)
  expect(isEvent(eventAtConformal(historyOf('matter:0,cmb:0'), 0.999))).toBe(true)
  expect(isEvent(eventAtConformal(historyOf('matter:0,cmb:0'), 1.001))).toBe(false)
})
