/** Boundaries between endings of scalar fields, against published results and whole solutions. */
import { describe, expect, test } from 'vitest'
import { eventAtScale, isEvent } from '../../lib/history/event'
import { isOverBudget, isUnsolvable } from '../../lib/history/field/unsolvable'
import { historyOf } from '../../lib/history/history'
import { equationOfState } from '../../lib/measures/rates'
import { freeParameters } from '../../lib/neighbours/free'
import { isUnsolved, kindsFollowed } from '../../lib/neighbours/kinds'
import { neighboursOf } from '../../lib/neighbours/neighbours'
import type { Edge, Neighbour } from '../../lib/neighbours/shape'
import { budgetOf } from '../../lib/scenario/budget'
import { readScenario } from '../../lib/scenario/read'
import type { Scenario } from '../../lib/scenario/scenario'
import { chanceOf } from '../hunt/chance'
import { anyScenario } from '../hunt/costs'

function read(code: string): Scenario {
  const reading = readScenario(code, 0)
  if (!reading.ok) throw new Error(JSON.stringify(reading.problems))
  return reading.value
}

/** Kinds of a whole history; null where there is none, undefined where it costs too much. */
function whole(scenario: Scenario): { readonly end: string; readonly origin: string } | null | undefined {
  try {
    const { end, origin } = historyOf(scenario, budgetOf(scenario))
    return { end: end.kind, origin: origin.kind }
  } catch (error) {
    if (!isUnsolvable(error)) throw error
    return isOverBudget(error) ? undefined : null
  }
}

const endsIn = (list: readonly Neighbour[], parameter: string) =>
  list.filter((one) => one.parameter === parameter && one.end).map(({ value, end }) => [value, end?.to])

describe('exponential potential (Copeland, Liddle & Wands 1998, Phys. Rev. D 57, 4686)', () => {
  const { neighbours, edges } = neighboursOf(read('matter:0.3,eos:field,slope:1'))
  const slopes = neighbours.filter((one) => one.parameter === 'slope')
  test('w = −1 + slope²/3 is −1/3 at slope² = 2', () => {
    expect(slopes.map(({ direction, end }) => [direction, end?.to])).toEqual([
      ['down', 'decelerating'],
      ['up', 'decelerating'],
    ])
    for (const { value, accuracy, certain } of slopes) {
      expect(Math.abs(Math.abs(value) - Math.SQRT2)).toBeLessThanOrEqual(accuracy)
      // What the interface promises where no integration is needed.
      expect(accuracy).toBeLessThanOrEqual(2e-10 * 2)
      expect(certain).toBe(true)
    }
  })
  test('up to slope² = 3/Ω_DE, where it scales with matter at Ω_DE = 3/slope², there is a solution', () => {
    const limits = edges.filter((one) => one.parameter === 'slope')
    expect(limits.map((one) => one.direction)).toEqual(['down', 'up'])
    for (const { value, because } of limits) {
      expect(Math.abs(value)).toBeGreaterThan(Math.sqrt(3 / 0.7))
      expect(because).toMatch(/^This field reaches Ω_DE = 0\.\d+ today at most/)
    }
  })
})

describe('linear potential: it becomes negative and collapses, however small its slope (Kallosh & Linde 2003, JCAP 02, 002)', () => {
  test('no slope but 0 ends in another way', () => {
    const { neighbours, edges } = neighboursOf(read('matter:0.3,eos:field,v:linear,slope:0.7'))
    expect(endsIn(neighbours, 'slope')).toEqual([])
    expect(edges.filter((one) => one.parameter === 'slope').length).toBe(2)
  })
  test('any slope will do to leave a constant density', () => {
    const { neighbours } = neighboursOf(read('matter:0.3,eos:field,v:linear,slope:0'))
    expect(endsIn(neighbours, 'slope')).toEqual([
      [0, 'crunch'],
      [0, 'crunch'],
    ])
  })
})

/** Swings about a quadratic minimum thin out like dust: Turner 1983, Phys. Rev. D 28, 1243. */
test('curvature alone decides of a cosine, as of dust', () => {
  const { neighbours } = neighboursOf(read('matter:0.3,eos:field,v:cosine'))
  expect(endsIn(neighbours, 'curvature')).toEqual([
    [0, 'crunch'],
    [0, 'coasting'],
  ])
})

/** ä > 0 needs w < −1/3 of what rules: Friedmann's equations. */
test('held, a field accelerates where its w of today is below −1/3', () => {
  const scenario = read('matter:0.3,cmb:0,eos:field,v:linear,slope:0.7,beyond:hold')
  const up = neighboursOf(scenario).neighbours.find((one) => one.parameter === 'slope' && one.direction === 'up')
  if (!up) throw new Error('no neighbour')
  const wAt = (slope: number) => {
    const other = { ...scenario, law: { ...scenario.law, slope } }
    const now = eventAtScale(historyOf(other, budgetOf(other)), 0, 'expanding')
    return isEvent(now) ? equationOfState(now) : Number.NaN
  }
  expect(wAt(up.value - up.accuracy)).toBeLessThan(-1 / 3)
  expect(wAt(up.value + up.accuracy)).toBeGreaterThan(-1 / 3)
  expect(up.end).toEqual({ from: 'accelerating', to: 'decelerating' })
})

describe.each([
  'matter:0.3,eos:field',
  'matter:0.3,curvature:-0.05,eos:field,slope:1.5',
  'matter:0.3,curvature:-0.05,eos:field,v:linear,slope:0.7',
  'matter:0.3,eos:field,v:inverse',
  'matter:0.3,curvature:0.05,cmb:0,eos:field,v:linear,slope:0.7,beyond:hold',
])('%s: whole histories on both sides are as told', (code) => {
  const scenario = read(code)
  const { neighbours, edges, leftOut } = neighboursOf(scenario)
  const sides = (one: Neighbour | Edge) => {
    const free = freeParameters(scenario).find((other) => other.key === one.parameter && other.index === one.index)
    if (!free) throw new Error(one.parameter)
    // Beyond the bracket by its own rounding.
    const away = (one.direction === 'up' ? 1 : -1) * (one.accuracy * (1 + 1e-6) + 1e-12 * Math.abs(one.value))
    return [whole(free.with(one.value - away)), whole(free.with(one.value + away))]
  }
  test('neighbours', () => {
    expect(neighbours.length + edges.length).toBeGreaterThan(0)
    for (const one of neighbours) {
      const [near, far] = sides(one)
      const what = `${one.parameter} ${one.value}`
      if (one.end) expect([near?.end, far?.end], what).toEqual([one.end.from, one.end.to])
      if (one.origin) expect([near?.origin, far?.origin], what).toEqual([one.origin.from, one.origin.to])
    }
  })
  test('edges', () => {
    for (const one of edges) {
      const [near, far] = sides(one)
      expect(near, `${one.parameter} ${one.value}`).toBeTruthy()
      expect(far, `${one.parameter} ${one.value}`).toBeNull()
    }
  })
  test('each parameter is followed, or named with a reason', () => {
    for (const { because } of leftOut) expect(because).toMatch(/\.$/)
  })
})

test('classification says what a whole history says', { timeout: 60_000 }, () => {
  let compared = 0
  for (let seed = 1; seed <= 150; seed++) {
    const { code, scenario } = anyScenario(chanceOf(seed))
    if (scenario.eos !== 'field') continue
    const told = kindsFollowed(scenario, { left: 0 })
    const seen = whole(scenario)
    if (seen === undefined || (isUnsolved(told) && told.dear)) continue
    compared++
    const kinds = isUnsolved(told) ? null : { end: told.end.kind, origin: told.origin.kind }
    expect(kinds, code).toEqual(seen)
  }
  expect(compared).toBeGreaterThan(30)
})
