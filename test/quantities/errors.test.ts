/**
 * Stated errors against true ones: those of columns at epochs, and of measures, by the reference set (test/reference/set-a.json).
 * Its parameters and ours are the same doubles, but what closes the budget is rounded on the way: an error of eps in every parameter
 * moves a value by eps × sens, and as much is allowed for beside the bound.
 */
import { expect, test } from 'vitest'
import { historyOf } from '../../lib/history/history'
import { antipode } from '../../lib/measures/distances'
import { isMissing, type Outcome } from '../../lib/measures/outcome'
import { boundOf } from '../../lib/quantities/bounds'
import type { ColumnKey } from '../../lib/quantities/column'
import { columnNamed } from '../../lib/quantities/columns'
import { type ColumnSubject, instantAt, isInstant } from '../../lib/quantities/instant'
import { MEASURES, type MeasureKey } from '../../lib/quantities/measures'
import { subjectOf } from '../../lib/quantities/quantity'
import { budgetOf } from '../../lib/scenario/budget'
import { hubbleLengthGly, hubbleLengthMpc, hubbleTimeGyr } from '../../lib/units'
import { lawIsKnown, REFERENCES, scenarioOf } from '../reference/set-a'

const EPS = 2 ** -53

/** Name in the set, column, and the unit of the set in that of the column; `proper` for what the set multiplies by a. */
const COLUMNS_OF: Readonly<Record<string, readonly [ColumnKey, (h0: number) => number, 'proper'?]>> = {
  'lookback(z': ['lookback', hubbleTimeGyr],
  'D_C(z': ['comoving', hubbleLengthMpc],
  'D_M(z': ['transverse', hubbleLengthMpc],
  'D_L_Mpc(z': ['luminosity', () => 1],
  'mu(z': ['modulus', () => 1],
  'V_C(z': ['volume', (h0) => (hubbleLengthMpc(h0) / 1e3) ** 3],
  'E(z': ['hubble', (h0) => h0],
  'E(a': ['hubble', (h0) => h0],
  'q(a': ['deceleration', () => 1],
  'j(a': ['jerk', () => 1],
  't_from_now(a': ['time', hubbleTimeGyr],
  't(a': ['age', hubbleTimeGyr],
  'particle_horizon_proper(a': ['particleHorizon', hubbleLengthGly, 'proper'],
  'event_horizon_proper(a': ['eventHorizon', hubbleLengthGly, 'proper'],
}

const MEASURES_OF: Readonly<Record<string, readonly [MeasureKey, (h0: number) => number]>> = {
  q0: ['deceleration', () => 1],
  j0: ['jerk', () => 1],
  age_Gyr: ['age', () => 1],
  event_horizon: ['eventHorizon', hubbleLengthGly],
  particle_horizon: ['particleHorizon', hubbleLengthGly],
  z_reach: ['reachRedshift', () => 1],
}

interface Comparison {
  readonly name: string
  readonly off: number
  readonly stated: number
  /** What no bound can be asked to stay below. */
  readonly least: number
}

function compare(name: string, outcome: Outcome, expected: number, sens: number | null): Comparison[] {
  if (isMissing(outcome) || !Number.isFinite(expected)) return []
  const moved = EPS * (sens ?? Math.abs(expected))
  const off = Math.max(0, Math.abs(outcome.value - expected) - moved)
  return [{ name, off, stated: outcome.error, least: Math.max(off, 4 * EPS * Math.abs(expected), moved) }]
}

function cell(subject: ColumnSubject, key: ColumnKey, variable: 'z' | 'scale', at: number): Outcome {
  const [column, instant] = [columnNamed(key), instantAt(subject, variable, at)]
  if (!column || !isInstant(instant)) return { because: 'there is none' }
  const [value, error] = [column.value(subject, instant), boundOf(column).value(subject, instant)]
  return typeof value === 'number' && typeof error === 'number' ? { value, error } : { because: 'there is none' }
}

const comparisons = REFERENCES.filter(lawIsKnown).flatMap((reference): Comparison[] => {
  const scenario = scenarioOf(reference)
  const budget = budgetOf(scenario)
  const subject = { scenario, budget, history: historyOf(scenario, budget) }
  const measured = subjectOf(scenario)
  return Object.entries(reference.quantities).flatMap(([name, { value, sens }]) => {
    const where = `${reference.id} ${name}`
    const measure = MEASURES_OF[name]
    if (measure) {
      const unit = measure[1](scenario.h0)
      const found = MEASURES.find(({ key }) => key === measure[0])?.value(measured)
      return found ? compare(where, found, Number(value) * unit, sens === null ? null : sens * unit) : []
    }
    const [, head = '', argument = ''] = /^(.*\([za])=([\d.e+-]+)\)$/.exec(name) ?? []
    const column = COLUMNS_OF[head]
    if (!column) return []
    const x = Number(argument)
    const unit = column[1](scenario.h0) / (column[2] ? x : 1)
    // The set writes distances past the antipode with their sign, and lets the volume grow.
    if (head === 'V_C(z' && Number(value) > wholeSphere(budget.curvature)) return []
    const expected = /^D_|^mu/.test(head) ? Math.abs(Number(value)) : Number(value)
    const found = cell(subject, column[0], head.endsWith('z') ? 'z' : 'scale', x)
    return compare(where, found, expected * unit, sens === null ? null : sens * unit)
  })
})

function wholeSphere(curvature: number): number {
  return 2 * Math.PI ** 2 * (antipode(curvature) / Math.PI) ** 3
}

test('the reference set has a thousand of them', () => expect(comparisons.length).toBeGreaterThan(1000))

test('no true error exceeds the stated one', () => {
  const worse = comparisons.filter(({ off, stated }) => off > stated)
  expect(worse.map(({ name, off, stated }) => `${name}: ${off} above ${stated}`)).toEqual([])
})

test('in the median the stated error is below a hundred times what cannot be helped', () => {
  const ratios = comparisons.map(({ stated, least }) => stated / least).sort((one, other) => one - other)
  expect(ratios[ratios.length >> 1]).toBeLessThan(100)
})
