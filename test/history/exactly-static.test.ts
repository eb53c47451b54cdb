/**
 * Double roots that decimals have exactly. With a double root at s and the other two those of a² + 2sa + q,
 * a⁴ E² = Λ (a − s)² (a² + 2sa + q): Ω_k = Λ (q − 3s²), Ω_m = 2sΛ (s² − q), Ω_r = Λ s² q, and E(1) = 1 fixes Λ.
 */
import { describe, expect, test } from 'vitest'
import { powerLaw } from '../../lib/dark-energy/power-law'
import { exactlyStatic } from '../../lib/history/exactly-static'
import { budgetOf } from '../../lib/scenario/budget'
import { readScenario } from '../../lib/scenario/read'
import { solve } from '../../lib/solve'

function read(code: string) {
  const reading = readScenario(code, 0)
  if (!reading.ok) throw new Error(JSON.stringify(reading.problems))
  return reading.value
}
const isStatic = (code: string): boolean => exactlyStatic(budgetOf(read(code)), powerLaw(-1))

describe('exact decimals', () => {
  test.each([
    // q = 0: dust.
    ['matter:0.5,cmb:0,dark:2', 0.5],
    ['matter:5.4,cmb:0,dark:6.4', 0.75],
    ['matter:6.75,cmb:0,dark:1', 1.5],
    ['matter:3.2,cmb:0,dark:0.2', 2],
    ['matter:3.2,cmb:0,curvature:-2.4', 2],
    // q = s²: radiation.
    ['matter:0,radiation:4,dark:1', Math.SQRT2],
    ['matter:0,radiation:2.25,dark:0.25', Math.sqrt(3)],
    // s = 2, q = 3: all four.
    ['matter:0.5,radiation:1.5,dark:0.125', 2],
  ])('%s', (code, scale) => {
    expect(isStatic(code)).toBe(true)
    const { origin, end } = solve(read(code))
    const [kind, found] = scale > 1 ? [end.kind, end.scale] : [origin.kind, origin.scale]
    expect([kind, end.proven]).toEqual(['static', true])
    // The slope fixes a: a few eps times a condition number of order one.
    expect(Math.abs((found ?? 0) / scale - 1)).toBeLessThan(1e-14)
  })
})

test.each([
  'matter:0.5,cmb:0,dark:2.0000000000000004',
  'matter:3.2,cmb:0,dark:0.20000000000000004',
  'matter:0.5,radiation:1.5,dark:0.12500000000000003',
  'matter:0.5,radiation:1.5000000000000002,dark:0.125',
  'matter:0.3,cmb:0,dark:0.7',
  // The light is computed, not typed.
  'matter:0.5,dark:2',
  // A double root at a = −1 is no matter: a⁴ E² = Λ (a + 1)² (a² − 2a + q) with q = 3/2, Λ = 1/2.
  'matter:0.5,radiation:0.75,dark:0.5',
])('%s is none', (code) => expect(isStatic(code)).toBe(false))

test('next to one of them the double that is nearest decides', () => {
  const above = solve(read('matter:3.2,cmb:0,dark:0.20000000000000004')).end
  const below = solve(read('matter:3.2,cmb:0,dark:0.19999999999999998')).end
  expect([above.kind, below.kind]).toEqual(['exponential', 'crunch'])
  expect([above.proven, below.proven]).toEqual([true, true])
})
