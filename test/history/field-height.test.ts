/**
 * The field as it is followed has today's Ω_DE, or the scenario is refused: next to a height with which the universe turns round before
 * today it nearly rests, and Ω_DE goes like the logarithm of how near.
 */
import { expect, it } from 'vitest'
import { familyOf } from '../../lib/dark-energy/index'
import { nowOf } from '../../lib/history/field/course'
import { BUDGET } from '../../lib/history/field/height'
import { isUnsolvable } from '../../lib/history/field/unsolvable'
import { budgetOf } from '../../lib/scenario/budget'
import { readScenario } from '../../lib/scenario/read'

function excessOf(code: string): number | string {
  const reading = readScenario(code, 0)
  if (!reading.ok) throw new Error(code)
  const [budget, potential] = [budgetOf(reading.value), familyOf('field').potential?.(reading.value.law)]
  if (!potential) throw new Error(code)
  try {
    return Math.abs(nowOf(budget, potential, { left: BUDGET }).today / budget.dark - 1)
  } catch (error) {
    if (isUnsolvable(error)) return error.message
    throw error
  }
}

// A step of eps in the height moves Ω_DE by 10⁻⁴ to 0.3 of itself: no double is the height.
it.each([
  'h0:56.3519,matter:0.0501,curvature:-0.2995,eos:field,v:exponential,slope:0.0306',
  'h0:81.4,matter:0.02639,curvature:-0.5748,eos:field,v:exponential,slope:0.2237',
  'h0:64.67,matter:0.06913,curvature:-0.4479,eos:field,v:linear,slope:0.05936',
])('is refused: %s', (code) => expect(excessOf(code)).toContain('too near'))

// A step of eps moves it by up to 1e-11.
it.each([
  'h0:73.44,matter:0.08466,curvature:-0.9735,eos:field,v:exponential,slope:0.2911',
  'h0:85.34,matter:0.04663,curvature:-0.5495,eos:field,v:linear,slope:0.1547',
  'matter:0.3,eos:field,v:cosine',
])('is met: %s', (code) => expect(excessOf(code)).toBeLessThan(2e-11))

// The shots nearest to it stray by what the steps add up to.
it('is met nearly', () => {
  const code = 'h0:61.73,matter:0.2341,curvature:-0.9598,eos:field,v:cosine,width:8.646,start:4.178'
  expect(excessOf(code)).toBeLessThan(1e-8)
})
