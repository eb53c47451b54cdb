/** Boundaries between endings, against published formulas and closed forms. */
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { askNeighbours } from '../../lib/answers/neighbours'
import { freeParameters } from '../../lib/neighbours/free'
import { kindsOf } from '../../lib/neighbours/kinds'
import { nearestOf } from '../../lib/neighbours/nearest'
import { neighboursOf } from '../../lib/neighbours/neighbours'
import type { Neighbour } from '../../lib/neighbours/shape'
import { readScenario } from '../../lib/scenario/read'
import type { Scenario } from '../../lib/scenario/scenario'
import { nearestEnding } from '../../lib/words/neighbours'
import { answerOf, problemsOf } from '../answers/ask'
import { anyCode, attempt } from '../world/any-universe'
import { noBigBang, recollapse } from '../world/dust-boundaries'
import { universe } from '../world/universe'

function read(code: string): Scenario {
  const reading = readScenario(code, 0)
  if (!reading.ok) throw new Error(JSON.stringify(reading.problems))
  return reading.value
}

type Pick = readonly [parameter: string, direction: Neighbour['direction'], aspect: 'end' | 'origin']

function neighbour(code: string, [parameter, direction, aspect]: Pick): Neighbour {
  const { neighbours } = neighboursOf(read(code))
  const found = neighbours.find(
    (one) => one.parameter === parameter && one.direction === direction && one[aspect] !== null,
  )
  if (!found) throw new Error(`${code} has no such neighbour among ${JSON.stringify(neighbours)}`)
  return found
}

/** What the interface promises. */
const PROMISED = 2e-10
const near = (actual: number, expected: number) =>
  expect(Math.abs(actual - expected)).toBeLessThanOrEqual(2 * PROMISED * Math.max(0.001, Math.abs(expected)))

describe.each([0.1, 0.3, 0.5, 0.7, 1.5, 2, 5])('matter %s and Λ (Carroll, Press & Turner 1992)', (matter) => {
  const code = `matter:${matter},cmb:0,dark:${0.5 * (noBigBang(matter) + recollapse(matter))}`
  test('no big bang', () => {
    const { value, origin } = neighbour(code, ['dark', 'up', 'origin'])
    near(value, noBigBang(matter))
    expect(origin).toEqual({ from: 'big-bang', to: 'bounce' })
  })
  test('collapse', () => {
    const { value, end } = neighbour(code, ['dark', 'down', 'end'])
    near(value, recollapse(matter))
    expect(end).toEqual({ from: 'exponential', to: 'crunch' })
  })
})

/** E² = Ω_r a⁻⁴ + (1 − Ω_r − Ω_Λ) a⁻² + Ω_Λ has a double root where (1 − Ω_r − Ω_Λ)² = 4 Ω_r Ω_Λ: √Ω_Λ = √Ω_r ± 1. */
describe.each([0.25, 0.5, 1.5, 3])('radiation %s and Λ', (radiation) => {
  const least = radiation > 1 ? (Math.sqrt(radiation) - 1) ** 2 : 0
  const most = (Math.sqrt(radiation) + 1) ** 2
  const code = `matter:0,radiation:${radiation},dark:${(least + most) / 2}`
  test('no big bang', () => near(neighbour(code, ['dark', 'up', 'origin']).value, most))
  test('collapse', () => near(neighbour(code, ['dark', 'down', 'end']).value, least))
})

/** Where a law's exponent passes that of what rules beside it: closed forms of w and of the index. */
test.each([
  ['matter:0.3,eos:constant,w:-0.8', ['w', 'down', 'end'], -1, 'rip'],
  ['matter:0.3,eos:constant,w:-0.8', ['w', 'up', 'end'], -1 / 3, 'decelerating'],
  ['matter:0.3,eos:constant,w:-1.2', ['w', 'up', 'end'], -1, 'accelerating'],
  ['matter:0.3,curvature:0.1,eos:constant,w:-0.5', ['w', 'up', 'end'], -1 / 3, 'coasting'],
  ['matter:0.3,eos:cpl,w0:-0.9,wa:0.1', ['wa', 'down', 'end'], 0, 'decelerating'],
  ['matter:0.3,eos:cpl,w0:-0.9,wa:-0.1', ['wa', 'up', 'end'], 0, 'rip'],
  ['matter:0.3,eos:ba,w0:-0.9,wa:0.1', ['w0', 'down', 'end'], -1, 'rip'],
  ['matter:0.3,eos:barotropic,excess:0.1,alpha:0.4', ['alpha', 'up', 'end'], 0.5, 'rip'],
  ['matter:0.3,eos:barotropic,excess:0.1,alpha:0.8', ['alpha', 'up', 'end'], 1, 'singular'],
  ['matter:0.3,eos:field,slope:1', ['slope', 'up', 'end'], Math.SQRT2, 'decelerating'],
  ['matter:0.3,curvature:0.1,eos:field,slope:1', ['slope', 'up', 'end'], Math.SQRT2, 'coasting'],
  ['matter:0.3,dark:0.7,cmb:0', ['dark', 'down', 'end'], 0, 'crunch'],
] as const)('%s: %s', (code, which, value, kind) => {
  const found = neighbour(code, which)
  near(found.value, value)
  expect(found.end?.to).toBe(kind)
})

test('where any change will do, the change is 0', () => {
  const { neighbours } = neighboursOf(read('matter:1,cmb:0'))
  const ofCurvature = neighbours.filter((one) => one.parameter === 'curvature' && one.end)
  expect(ofCurvature.map(({ change, end }) => [change, end?.to])).toEqual([
    [0, 'exponential'],
    [0, 'crunch'],
  ])
})

test('in random universes the kinds on both sides of a boundary are as told', { timeout: 60_000 }, () => {
  fc.assert(
    fc.property(anyCode(true), (code) => {
      const scenario = read(code)
      for (const { parameter, index, value, direction, end, origin } of neighboursOf(scenario).neighbours) {
        const one = freeParameters(scenario).find((other) => other.key === parameter && other.index === index)
        if (!one) throw new Error(parameter)
        const margin = 1e-7 * Math.max(Math.abs(value), one.slider.step) * (direction === 'up' ? 1 : -1)
        const beyond = value + margin
        if (beyond < one.min || beyond > one.max) continue
        const kinds = kindsOf(one.with(beyond))
        // Next to another boundary the far side may be narrower than this.
        if (kinds && end) expect(kinds.end.kind, `${code} ${parameter} ${value}`).not.toBe(end.from)
        if (kinds && origin) expect(kinds.origin.kind, `${code} ${parameter} ${value}`).not.toBe(origin.from)
      }
    }),
    { numRuns: 25, seed: 5 },
  )
})

test('classification alone says what a whole solution says', { timeout: 60_000 }, () => {
  fc.assert(
    fc.property(anyCode(true), (code) => {
      const solution = attempt(code)
      fc.pre(solution !== null)
      const kinds = kindsOf(read(code))
      expect([kinds?.origin.kind, kinds?.end.kind]).toEqual([solution?.origin.kind, solution?.end.kind])
    }),
    { numRuns: 100, seed: 6 },
  )
})

describe('the sentence', () => {
  const said = (code: string) => {
    const scenario = read(code)
    const nearest = nearestOf(scenario)
    return nearest && nearestEnding(scenario, nearest)
  }
  test.each([
    ['matter:0.3,cmb:0,dark:0.7', 'With Ω_DE below 0 it would end in a Big Crunch, Ω_k closing the budget.'],
    ['matter:0.3,eos:constant,w:-0.98', 'With w below −1.00 it would end in a Big Rip, Ω_DE closing the budget.'],
    // B is 0 to 1, and a gas with B = 0 is dust.
    ['matter:0.05,eos:chaplygin', /^With B at 0 it would expand for ever at a falling pace/],
    ['matter:1,cmb:0', /^With any Ω_(m|k) (above|below) (0|1\.00) it would /],
  ])('%s', (code, sentence) => expect(said(code)).toMatch(sentence))
  test('is about the scenario itself', () => {
    for (const code of ['matter:0.3', 'matter:0.4,dark:0.85,eos:cpl,w0:-0.6,wa:-1.6']) {
      const nearest = nearestOf(read(code))
      expect(nearest?.to).not.toBe(universe(code).end.kind)
    }
  })
})

describe('the question', () => {
  test('one answer for each scenario, with the rule of closing', () => {
    const { scenarios } = answerOf(askNeighbours, 's=matter:0.3,cmb:0,dark:0.7&s=h0:60')
    expect(scenarios).toMatchObject([
      { code: 'h0:67.66,matter:0.3,dark:0.7,cmb:0', closes: 'curvature', end: 'exponential', origin: 'big-bang' },
      { closes: 'dark' },
    ])
    expect(scenarios[0].leftOut.map(({ parameter }) => parameter)).toEqual(['baryons'])
  })
  test('unknown keys are refused', () => {
    expect(problemsOf(askNeighbours, 's=h0:70&z=1')).toMatchObject([{ parameter: 'z', scenario: null }])
  })
})
