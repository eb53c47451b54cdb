/** A field whose way costs more than it may is refused, wherever the budget of evaluations ends; with enough of it the way is found. */
import { expect, it } from 'vitest'
import { familyOf } from '../../lib/dark-energy/index'
import { nowOf, wayAhead } from '../../lib/history/field/course'
import { BUDGET, FUTURE_BUDGET } from '../../lib/history/field/height'
import { budgetOf } from '../../lib/scenario/budget'
import { readScenario } from '../../lib/scenario/read'

const PURSES = [10, 30, 100, 300, 1000, 2000, 3000, 5000, 8000, FUTURE_BUDGET]

function outcomes(code: string): readonly string[] {
  const reading = readScenario(code, 0)
  if (!reading.ok) throw new Error(code)
  const { eos, law } = reading.value
  const potential = familyOf(eos).potential?.(law)
  if (!potential) throw new Error(eos)
  const now = nowOf(budgetOf(reading.value), potential, { left: BUDGET })
  return PURSES.map((left) => {
    try {
      return wayAhead(now, { left }).kind
    } catch (error) {
      return String(error)
    }
  })
}

it.each([
  ['expanding', 'matter:0.3,cmb:0,eos:field,v:inverse,slope:1,start:1'],
  ['turning', 'matter:0.3,cmb:0,eos:field,v:linear,slope:-1'],
])('%s', (kind, code) => {
  const found = outcomes(code)
  expect(found[0]).toContain('takes too many steps. This scenario is over its budget')
  expect(found.at(-1)).toBe(kind)
  // First refusals, then answers: more budget never loses one.
  const first = found.indexOf(kind)
  expect(new Set(found.slice(0, first))).toEqual(new Set([found[0]]))
  expect(new Set(found.slice(first))).toEqual(new Set([kind]))
})
