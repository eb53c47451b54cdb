/**
 * A linear potential V ∝ 1 + α φ that collapses: w today, turnaround and collapse in Gyr from now for Ω_DE = 0.7, H₀ = 70, flat, without
 * radiation, the field at rest until a = 1e-3 (not published: recomputed with another program to the digits given; the scenario is that of
 * Kallosh, Kratochvil, Linde, Linder & Shmakova 2003, JCAP 10, 015, arXiv:astro-ph/0307185). Ours starts at a = 1e-6: a field that starts
 * at rest deep in the age of matter has moved by less than a^3 of what it moves until today, 1e-9.
 */
import { describe, expect, it } from 'vitest'
import { eventAtScale, isEvent } from '../../lib/history/event'
import { equationOfState } from '../../lib/measures/rates'
import { readScenario } from '../../lib/scenario/read'
import { solve } from '../../lib/solve'

const ROWS = [
  { alpha: 0.5, w0: -0.9574, turnaround: 59.14, collapse: 70.76 },
  { alpha: 0.7, w0: -0.9053, turnaround: 32.41, collapse: 41.91 },
  { alpha: 1.0, w0: -0.7134, turnaround: 14.97, collapse: 22.14 },
]

describe.each(ROWS)('alpha = $alpha', ({ alpha, w0, turnaround, collapse }) => {
  const reading = readScenario(`h0:70,matter:0.3,cmb:0,eos:field,v:linear,slope:${-alpha}`, 0)
  if (!reading.ok) throw new Error(JSON.stringify(reading.problems))
  const solution = solve(reading.value)

  it('has the w of today', () => {
    const now = eventAtScale(solution.history, 0, 'expanding')
    expect(isEvent(now) && equationOfState(now)).toBeCloseTo(w0, 4)
  })

  it('turns round and collapses in time', () => {
    expect(solution.end.kind).toBe('crunch')
    expect(Math.abs((solution.end.turnaround?.time ?? 0) - turnaround)).toBeLessThanOrEqual(0.005)
    expect(Math.abs((solution.end.time ?? 0) - collapse)).toBeLessThanOrEqual(0.005)
  })
})
