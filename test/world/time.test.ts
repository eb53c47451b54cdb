/** Laws that every history obeys, whatever its parameters: no source needed but the definitions. */
import fc from 'fast-check'
import { describe, expect, test, vi } from 'vitest'
import {
  type Event,
  eventAtAge,
  eventAtScale,
  eventAtTime,
  isEvent,
  sinceNow,
  sinceOrigin,
  untilEnd,
} from '../../lib/history/event'
import { hubbleRate } from '../../lib/measures/rates'
import type { Solution } from '../../lib/solve'
import { anyCode, attempt, everywhere } from './any-universe'
import { expectNear } from './published'
import { known } from './universe'

// Hundreds of whole histories per test: seconds on a busy machine.
vi.setConfig({ testTimeout: 60_000 })

const EPS = Number.EPSILON
const RUNS = 200

/** ln a at a part of the way out along an arm. */
function along(solution: Solution, arm: 'past' | 'future', part: number, most = 30): number {
  const { end, direction } = solution.history[arm]
  return part * (end.kind === 'none' ? direction * most : 0.999 * end.N)
}
const at = (solution: Solution, N: number): Event => known(eventAtScale(solution.history, N, 'expanding'))

test('every legal code is solved or given up, and few are given up', () => {
  let given = 0
  fc.assert(
    fc.property(fc.boolean().chain(anyCode), (code) => {
      const solution = attempt(code)
      if (solution === null) given++
      else expect(Number.isFinite(solution.history.past.panels.length)).toBe(true)
    }),
    { numRuns: 600, seed: 3 },
  )
  expect(given).toBeLessThan(8)
})

describe('an event', () => {
  test('is found again by its time', () => {
    everywhere(true, RUNS, (solution, { part, arm }) => {
      const { history } = solution
      const N = along(solution, arm, part, 8)
      const event = at(solution, N)
      const t = sinceNow(history, event, 'time')
      fc.pre(Math.abs(t) < 1e300)
      const again = eventAtTime(history, t)
      // Nearer to the origin or to a rip than the digits of the time, it may fall beyond.
      if (!isEvent(again)) {
        const margin = Math.min(sinceOrigin(history, event, 'time'), untilEnd(history, event, 'time'))
        return expectNear(margin, 0, 64 * EPS * Math.abs(t))
      }
      // eps in t moves N by E eps t, and N of a panel is good to eps of its edges.
      expectNear(again.place.N, N, 64 * EPS * (1 + Math.abs(N) + Math.abs(hubbleRate(event) * t)))
    })
  })
  test('is found again by its age, close to the origin too', () => {
    everywhere(true, RUNS, (solution, { part }) => {
      const { history } = solution
      fc.pre(history.origin.time !== null)
      const N = along(solution, 'past', part)
      const event = at(solution, N)
      const age = sinceOrigin(history, event, 'time')
      // Below this, doubles lose digits.
      fc.pre(age > 1e-290)
      const again = eventAtAge(history, age)
      if (!isEvent(again)) throw new Error(again.because)
      // The age near the origin keeps its own digits; a panel inverts to eps of its width in ln a, some units at most.
      expectNear(again.place.N, N, 64 * EPS * (2 + Math.abs(N) + Math.abs(hubbleRate(event)) * age))
    })
  })
  test('has an age that exceeds its time by the age of today, in both clocks', () => {
    everywhere(true, RUNS, (solution, { part, arm }) => {
      const { history } = solution
      const event = at(solution, along(solution, arm, part))
      for (const clock of ['time', 'conformal'] as const) {
        const age = history.past[clock].total
        const [since, now] = [sinceOrigin(history, event, clock), sinceNow(history, event, clock)]
        fc.pre(Number.isFinite(age) && Number.isFinite(since))
        // Sums over some fifty panels from either side.
        expectNear(since - now, age, 64 * EPS * (age + Math.abs(now)))
      }
    })
  })
})

describe('along the expansion', () => {
  test('time and conformal time grow, the event horizon shrinks', () => {
    everywhere(true, RUNS, (solution) => {
      const { history } = solution
      const scales = [
        ...[0.9, 0.6, 0.3, 0.1, 0.01].map((part) => along(solution, 'past', part, 5)),
        0,
        ...[0.01, 0.1, 0.3, 0.6, 0.9].map((part) => along(solution, 'future', part, 5)),
      ]
      const events = scales.map((N) => at(solution, N))
      for (let k = 1; k < events.length; k++) {
        for (const clock of ['time', 'conformal'] as const) {
          const [before, after] = [events[k - 1], events[k]]
          const [one, two] = [sinceNow(history, before, clock), sinceNow(history, after, clock)]
          // Where dark energy gathers or thins like e^a, a step can be below the digits of what went before.
          const distinct = Math.abs(two - one) > 64 * EPS * Math.max(Math.abs(one), Math.abs(two))
          expect(two - one).toBeGreaterThanOrEqual(distinct ? 0 : -64 * EPS * Math.max(Math.abs(one), Math.abs(two)))
          const left = untilEnd(history, before, clock)
          if (Number.isFinite(left)) expect(untilEnd(history, after, clock)).toBeLessThanOrEqual(left)
        }
      }
    })
  })
  test('time to the end and time from now add up to the end', () => {
    everywhere(true, RUNS, (solution, { part, arm }) => {
      const { history } = solution
      fc.pre(history.end.time !== null)
      const end = history.end.time ?? Number.NaN
      const event = at(solution, along(solution, arm, part, 8))
      const now = sinceNow(history, event, 'time')
      expectNear(now + untilEnd(history, event, 'time'), end, 64 * EPS * (end + Math.abs(now)))
    })
  })
})

describe('about a turning point', () => {
  test.each(['future', 'past'] as const)('the %s one: equal scales at equal times on both sides', (arm) => {
    let seen = 0
    everywhere(true, RUNS, (solution, { part }) => {
      const { history } = solution
      fc.pre(history[arm].end.kind === 'root' && (arm === 'future' || history.future.end.kind !== 'root'))
      seen++
      const N = along(solution, arm, part)
      const out = at(solution, N)
      const mirror = known(eventAtScale(history, N, 'contracting'))
      const turning = sinceNow(history, at(solution, along(solution, arm, 1)), 'time')
      const total = history[arm].time.total * (arm === 'future' ? 1 : -1)
      const [one, two] = [sinceNow(history, out, 'time'), sinceNow(history, mirror, 'time')]
      expectNear(one + two, 2 * total, 64 * EPS * Math.abs(total))
      expect(Math.abs(two - total)).toBeGreaterThanOrEqual(0.99 * Math.abs(turning - total))
      expect(mirror.sign).toBe(-1)
      const again = known(eventAtTime(history, two))
      expectNear(again.place.N, N, 64 * EPS * (1 + Math.abs(N) + Math.abs(hubbleRate(out) * two)))
      expect(hubbleRate(mirror)).toBeCloseTo(-hubbleRate(out), 9)
    })
    expect(seen).toBeGreaterThan(20)
  })
})
