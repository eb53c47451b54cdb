/** Nothing hangs: the work of a whole history, counted and not timed, for the costliest scenarios that hunts have found and random ones. */
import { describe, expect, test, vi } from 'vitest'
import { familyOf } from '../../lib/dark-energy/index'
import type { Potential } from '../../lib/dark-energy/potential'
import { Balance } from '../../lib/history/balance'
import { fieldHistory } from '../../lib/history/field/history'
import { isUnsolvable } from '../../lib/history/field/unsolvable'
import { type History, historyOf } from '../../lib/history/history'
import { budgetOf } from '../../lib/scenario/budget'
import { readScenario } from '../../lib/scenario/read'
import type { Scenario } from '../../lib/scenario/scenario'
import { chanceOf } from '../hunt/chance'
import { anyScenario } from '../hunt/costs'
import { counted } from './counted'

function read(code: string): Scenario {
  const reading = readScenario(code, 0)
  if (!reading.ok) throw new Error(JSON.stringify(reading.problems))
  return reading.value
}

/** The most panels and the most steps of a search among some ten thousand scenarios at the limits. */
const LAWS = [
  'matter:0.375,radiation:0.0008645815230733104,eos:log,w0:-16.818691976368427,wa:-0.48',
  'matter:0,cmb:0,eos:log,w0:-17.34,wa:-0.59',
  'matter:0.1352,cmb:0,eos:nodes,at:7799_410700,w:-20_3.103',
  'matter:0.6463,dark:0.000006581,masses:0,eos:nodes,at:0.000002255_0.000003481_0.00003877_1.314_30.67,w:-20_-19.74_20_20_-20',
  'matter:6922.813561374111,curvature:-0.000004514920823882501,radiation:0.0187,eos:jbp,w0:0.21,wa:-0.96',
  'matter:0.4086,dark:-0.00001198,eos:nodes,at:0.0000107_0.00006344_0.0001527_0.05937_0.8202,w:-0.02322_-20_-10.74_0.3615_-20',
  'matter:1,masses:0,eos:jbp,w0:-2.6e-8,wa:-20,beyond:hold',
]
/** Panels take some 5 µs each: 10 ms. Steps of a search take 1 µs: its own limits are far above what any scenario was seen to need. */
const [MOST_PANELS, MOST_STEPS] = [2000, 800]

function panelsOf({ past, future, before, home, descent }: History): number {
  return [...new Set([past, future, before, home, descent])].reduce((sum, one) => sum + one.panels.length, 0)
}

function workOf(scenario: Scenario): { readonly panels: number; readonly steps: number } {
  const weigh = vi.spyOn(Balance.prototype, 'weigh')
  try {
    const panels = panelsOf(historyOf(scenario, budgetOf(scenario)))
    return { panels, steps: weigh.mock.calls.length }
  } finally {
    weigh.mockRestore()
  }
}

describe('laws', () => {
  test.each(LAWS)('%s', (code) => {
    const { panels, steps } = workOf(read(code))
    expect(panels).toBeLessThan(MOST_PANELS)
    expect(steps).toBeLessThan(MOST_STEPS)
  })
  test('at random, at their limits', () => {
    for (let seed = 1; seed <= 300; seed++) {
      const { code, scenario } = anyScenario(chanceOf(seed))
      if (scenario.eos === 'field') continue
      const { panels, steps } = workOf(scenario)
      expect(panels, code).toBeLessThan(MOST_PANELS)
      expect(steps, code).toBeLessThan(MOST_STEPS)
    }
  })
})

/** The costliest by time, followed or refused. */
const FIELDS = [
  'matter:0.8336,curvature:-0.000003282,masses:0.11,eos:field,v:cosine,width:0.2902,start:0.02284',
  'matter:0.805,dark:0.000003179,masses:0,eos:field,v:exponential,slope:-0.04926',
  'matter:0.03793,curvature:-0.000006335,radiation:0.000004882,eos:field,v:cosine,width:3.229,start:1.292',
  'matter:0.06816,dark:1.009,masses:0,eos:field,v:exponential,slope:2.792',
  'matter:0.0015,dark:26.07,eos:field,v:cosine,width:0.4181,start:3.606',
  'matter:1352,dark:0.0006284,cmb:0,eos:field,v:linear,slope:-9.954,beyond:hold',
  'matter:0.3,eos:field,v:cosine,width:0.01,start:0.001',
  'matter:0.9367,dark:0.001135,eos:field,v:cosine,width:0.6301,start:68.71',
]
/** What the purses of search and future add up to, and what panels ask of the law that the steps become. */
const [MOST_EVALUATIONS, MOST_LOOKS] = [190_000, 200_000]

describe('fields', () => {
  const check = (code: string, scenario: Scenario) => {
    const budget = budgetOf(scenario)
    const count = { both: 0, one: 0 }
    const potential = counted(familyOf('field').potential?.(scenario.law) as Potential, count)
    try {
      expect(panelsOf(fieldHistory(budget, potential, scenario.beyond === 'hold')), code).toBeLessThan(MOST_PANELS)
    } catch (error) {
      // Given up with a reason.
      if (!isUnsolvable(error)) throw error
    }
    expect(count.both, code).toBeLessThanOrEqual(MOST_EVALUATIONS)
    expect(count.one, code).toBeLessThan(2 * MOST_EVALUATIONS + MOST_LOOKS)
  }
  test.each(FIELDS)('%s', (code) => check(code, read(code)))
  test('at random, at their limits', { timeout: 60_000 }, () => {
    for (let seed = 1; seed <= 100; seed++) {
      const { code, scenario } = anyScenario(chanceOf(seed))
      if (scenario.eos === 'field') check(code, scenario)
    }
  })
})
