/** Over all that a field's parameters allow: a history of numbers, or a reason; never a failure, and never without an end. */
import fc from 'fast-check'
import { expect, it } from 'vitest'
import { eventAtScale, eventAtTime, isEvent, sinceNow } from '../../lib/history/event'
import { isUnsolvable } from '../../lib/history/field/unsolvable'
import { readScenario } from '../../lib/scenario/read'
import { type Solution, solve } from '../../lib/solve'

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true }).map((x) => Number(x.toPrecision(4)))
const slope = fc.oneof(between(-3, 3), between(-20, 20))
const start = fc.oneof(between(0.01, 3), between(0.001, 100))
const potential = fc.oneof(
  fc.tuple(fc.constantFrom('exponential', 'linear'), slope).map(([v, s]) => `v:${v},slope:${s}`),
  fc.tuple(between(0.001, 20), start).map(([s, phi]) => `v:inverse,slope:${s},start:${phi}`),
  fc
    .tuple(fc.oneof(between(0.3, 3), between(0.01, 100)), start)
    .map(([width, phi]) => `v:cosine,width:${width},start:${phi}`),
)
const code = fc
  .tuple(
    fc.oneof(between(0, 1.5), between(0, 100)),
    fc.oneof(between(-1, 1), between(-10, 10)).map((k) => `curvature:${k}`),
    fc.constantFrom('masses:0', 'cmb:0', 'radiation:0.001', 'nu:3'),
    potential,
  )
  .filter(([matter, , light]) => light !== 'nu:3' || matter > 0.01)
  .map(([matter, curvature, light, v]) => `matter:${matter},${curvature},${light},eos:field,${v}`)

function solved(text: string): Solution | string {
  const reading = readScenario(text, 0)
  if (!reading.ok) throw new Error(JSON.stringify(reading.problems))
  try {
    return solve(reading.value)
  } catch (error) {
    if (isUnsolvable(error)) return error.message
    throw error
  }
}

it('is a history or a reason', { timeout: 120_000 }, () => {
  fc.assert(
    fc.property(code, (text) => {
      const solution = solved(text)
      if (typeof solution === 'string') {
        expect(solution).not.toMatch(/NaN|Infinity|undefined/)
        return
      }
      const { history, measures, moments, origin, end } = solution
      expect(JSON.stringify([measures, moments, origin, end], (_, x) => (Number.isNaN(x) ? 'NaN' : x))).not.toContain(
        'NaN',
      )
      for (const one of Object.values(measures)) expect(one.value === null || Number.isFinite(one.value)).toBe(true)
      for (const scale of [0.9, 0.5, 0.1, 1e-3]) {
        const event = eventAtScale(history, Math.log(scale), 'expanding')
        if (!isEvent(event)) continue
        const again = eventAtTime(history, sinceNow(history, event, 'time'))
        expect(isEvent(again) && Math.abs(again.place.N - event.place.N)).toBeLessThan(1e-7)
      }
    }),
    { numRuns: 60 },
  )
})
