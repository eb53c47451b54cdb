/** What the neighbourhood of a scalar field costs: counted, not timed. */
import { afterEach, describe, expect, test, vi } from 'vitest'
import { field } from '../../lib/dark-energy/field'
import type { Potential } from '../../lib/dark-energy/potential'
import { fieldNeighboursOf, MOST_EVALUATIONS } from '../../lib/neighbours/field'
import { freeParameters } from '../../lib/neighbours/free'
import { isUnsolved, kindsFollowed } from '../../lib/neighbours/kinds'
import { MOST_LOOKS, MOST_STEPS, narrowBracket, narrowWall, walkFrom, walkOn } from '../../lib/neighbours/walk'
import type { ParameterValues } from '../../lib/parameter'
import { readScenario } from '../../lib/scenario/read'
import type { Scenario } from '../../lib/scenario/scenario'
import { counted } from '../history/counted'
import { chanceOf } from '../hunt/chance'
import { anyScenario } from '../hunt/costs'

function read(code: string): Scenario {
  const reading = readScenario(code, 0)
  if (!reading.ok) throw new Error(JSON.stringify(reading.problems))
  return reading.value
}

/** What a whole history may cost, as the purses of search and future add up. */
const ONE_HISTORY = 190_000
/** Single looks at the potential come with error weights and with the panels of laws. */
const LOOKS_PER_EVALUATION = 2

afterEach(() => {
  vi.restoreAllMocks()
})

function workOf(scenario: Scenario): { both: number; one: number; spent: number } {
  const count = { both: 0, one: 0 }
  const plain = field.potential as (values: ParameterValues) => Potential
  vi.spyOn(field as { potential: typeof plain }, 'potential').mockImplementation((values) =>
    counted(plain(values), count),
  )
  const tally = { left: MOST_EVALUATIONS }
  fieldNeighboursOf(scenario, tally)
  return { ...count, spent: MOST_EVALUATIONS - tally.left }
}

function check(code: string, scenario: Scenario): void {
  const { both, one, spent } = workOf(scenario)
  expect(spent, code).toBeLessThanOrEqual(MOST_EVALUATIONS + ONE_HISTORY)
  expect(both, code).toBeGreaterThan(0)
  expect(both, code).toBeLessThanOrEqual(MOST_EVALUATIONS + ONE_HISTORY)
  expect(one, code).toBeLessThanOrEqual(LOOKS_PER_EVALUATION * (MOST_EVALUATIONS + ONE_HISTORY))
}

describe('the whole neighbourhood', () => {
  test.each([
    'matter:0.3,eos:field',
    'matter:0.3,curvature:-0.05,eos:field,v:cosine',
    'matter:0.8336,curvature:-0.000003282,masses:0.11,eos:field,v:cosine,width:0.2902,start:0.02284',
    'matter:0.805,dark:0.000003179,masses:0,eos:field,v:exponential,slope:-0.04926',
    'matter:1352,dark:0.0006284,cmb:0,eos:field,v:linear,slope:-9.954,beyond:hold',
    'matter:0.9367,dark:0.001135,eos:field,v:cosine,width:0.6301,start:68.71',
  ])('%s', (code) => check(code, read(code)))
  test('at random, at their limits', { timeout: 60_000 }, () => {
    for (let seed = 1; seed <= 40; seed++) {
      const { code, scenario } = anyScenario(chanceOf(seed))
      if (scenario.eos === 'field') check(code, scenario)
      vi.restoreAllMocks()
    }
  })
})

test.each(['matter:0.3,eos:field', 'matter:0.3,eos:field,slope:1,beyond:hold', 'matter:0.3,curvature:-0.05,eos:field'])(
  'one number one way, whatever the purse: %s',
  { timeout: 60_000 },
  (code) => {
    const scenario = read(code)
    const tally = { left: Number.POSITIVE_INFINITY }
    const today = kindsFollowed(scenario, tally)
    if (isUnsolved(today)) throw new Error(today.because)
    for (const one of freeParameters(scenario).filter(({ key }) => key === 'slope' || key === 'curvature')) {
      const walk = walkFrom(one, 1, today, MOST_STEPS)
      walkOn(walk, tally, 0)
      narrowWall(walk, tally, 0)
      for (const bracket of walk.brackets) narrowBracket(walk, bracket, tally, 0)
      expect(walk.looks).toBeLessThanOrEqual(MOST_LOOKS)
    }
  },
)
