import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { isUnsolvable } from '../../lib/history/field/unsolvable'
import { historyOf } from '../../lib/history/history'
import { isMissing } from '../../lib/measures/outcome'
import { COLUMN_KEYS, type ColumnKey } from '../../lib/quantities/column'
import { COLUMNS, columnNamed } from '../../lib/quantities/columns'
import { type Instant, instantAt, isInstant, VARIABLES, type Variable } from '../../lib/quantities/instant'
import { budgetOf } from '../../lib/scenario/budget'
import { readScenario } from '../../lib/scenario/read'
import { hubbleTimeGyr } from '../../lib/units'
import { plainCode } from './codes'

function subject(code: string) {
  const reading = readScenario(code, null)
  if (!reading.ok) throw new Error(JSON.stringify(reading.problems))
  const budget = budgetOf(reading.value)
  return { scenario: reading.value, budget, history: historyOf(reading.value, budget) }
}

type Branch = 'expanding' | 'contracting'

function instant(one: ReturnType<typeof subject>, variable: Variable, value: number, branch?: Branch) {
  const found = instantAt(one, variable, value, branch)
  if (!isInstant(found)) throw new Error(found.because)
  return found
}

function cell(code: string, key: ColumnKey, variable: Variable, value: number, branch?: Branch) {
  const one = subject(code)
  const found = columnNamed(key)?.value(one, instant(one, variable, value, branch))
  if (found === undefined) throw new Error(`no column ${key}`)
  return found
}

const EDS = 'h0:70,matter:1,cmb:0'
const CLOSED = 'h0:70,matter:2,dark:0,cmb:0'
const LOITERING_SPHERE = 'h0:70,matter:0.3,dark:1.7,cmb:0'
const BOUNCE = 'h0:70,matter:0.1,dark:2,cmb:0'

describe('the list', () => {
  test('has every column once, in the order of answers', () => {
    expect(COLUMNS.map(({ key }) => key)).toEqual(COLUMN_KEYS)
  })
  test.each(COLUMNS.map((one) => [one.key, one] as const))('%s says what it is', (key, one) => {
    for (const text of [one.symbol, one.label, one.meaning, one.formula, one.source]) expect(text).not.toBe('')
    expect(one.meaning).toMatch(/^[A-Z].*\.$/)
    expect(one.digits.count).toBeGreaterThan(0)
    expect(columnNamed(key)).toBe(one)
  })
  test('units stand where they belong', () => {
    const units = Object.fromEntries(COLUMNS.map(({ key, unit }) => [key, unit]))
    expect(units).toMatchObject({ time: 'Gyr', hubble: 'km/s/Mpc', comoving: 'Mpc', volume: 'Gpc³', temperature: 'K' })
    expect(units).toMatchObject({ arcsecond: 'kpc', modulus: 'mag', conformal: 'Gly', criticalDensity: 'kg/m³', w: '' })
  })
  test('no name is taken from the prototype', () => {
    for (const name of ['__proto__', 'constructor', 'toString']) expect(columnNamed(name)).toBeUndefined()
  })
})

describe('today', () => {
  const today = (key: ColumnKey) => cell('h0:70,matter:0.3', key, 'z', 0)
  test('distances, angles and the drift are 0', () => {
    for (const key of ['lookback', 'comoving', 'transverse', 'angular', 'luminosity', 'arcsecond', 'volume'] as const) {
      expect(today(key)).toBe(0)
    }
    expect(today('drift')).toBe(0)
    expect(Object.is(today('time'), 0)).toBe(true)
  })
  test('the modulus is a logarithm of 0 and has no value', () => {
    expect(today('modulus')).toEqual({ because: expect.stringContaining('logarithm') })
  })
  test('a = 1, z = 0, H = H_0, T = T_0', () => {
    expect(['scale', 'redshift', 'hubble', 'temperature'].map((key) => today(key as ColumnKey))).toEqual([
      1, 0, 70, 2.7255,
    ])
  })
})

describe('what was asked for comes back as it was', () => {
  const given: readonly (readonly [Variable, ColumnKey, number])[] = [
    ['z', 'redshift', 0.1],
    ['z', 'redshift', 1089.8],
    ['scale', 'scale', 0.7],
    ['scale', 'scale', 1e-9],
    ['time', 'time', -3.3],
    ['age', 'age', 0.00037],
  ]
  test.each(given)('%s as %s', (variable, key, value) =>
    expect(cell('h0:70,matter:0.3', key, variable, value)).toBe(value),
  )
})

/** Closed forms: Einstein–de Sitter a = (3t/2)^(2/3), D_C = 2(1 − √a), q = ½, j = 1 (Hogg 1999; Peebles 1993, chapter 5). */
describe('Einstein–de Sitter', () => {
  // A few roundings of sums and roots, doubled by the power of a: 64 eps.
  const close = (value: unknown, expected: number) =>
    expect(Math.abs((value as number) / expected - 1)).toBeLessThan(64 * Number.EPSILON)
  const gyr = hubbleTimeGyr(70)
  const mpc = 299792.458 / 70

  test.each([0.01, 0.5, 3, 1000])('z = %f', (z) => {
    const a = 1 / (1 + z)
    const at = (key: ColumnKey) => cell(EDS, key, 'z', z)
    close(at('age'), (2 / 3) * gyr * a ** 1.5)
    close(at('hubble'), 70 * a ** -1.5)
    close(at('deceleration'), 0.5)
    close(at('jerk'), 1)
    close(at('comoving'), -2 * mpc * Math.expm1(-0.5 * Math.log1p(z)))
    close(at('particleHorizon'), 2 * gyr * Math.sqrt(a))
    close(at('conformal'), 2 * gyr * Math.sqrt(a))
    close(at('hubbleRadius'), gyr * a ** 1.5)
    close(at('omegaMatter'), 1)
    // c H₀ (1 − √(1 + z)) in cm/s per year; H₀ = 70 km/s/Mpc is 7.1588e-11 per year.
    close(at('drift'), (-100 * 299792458 * Math.expm1(0.5 * Math.log1p(z))) / (gyr * 1e9))
  })
  test('H_0 = 70 gives a critical density of 9.204e-27 kg/m³', () => {
    // 1.878 34e-26 h² kg/m³, Review of Particle Physics, table of astrophysical constants; with G of CODATA 2018.
    expect(cell(EDS, 'criticalDensity', 'z', 0)).toBeCloseTo(1.87834e-26 * 0.49, 31)
  })
  test('light never stops arriving: no event horizon', () => {
    expect(cell(EDS, 'eventHorizon', 'z', 0)).toEqual({ because: expect.stringContaining('no event horizon') })
  })
})

describe('lines of sight lead to the past of the expansion only', () => {
  const sight = ['comoving', 'transverse', 'angular', 'luminosity', 'modulus', 'arcsecond', 'volume', 'drift'] as const
  const nowhere: readonly (readonly [string, string, Variable, number, Branch])[] = [
    ['in the future', EDS, 'z', -0.5, 'expanding'],
    ['in the future, by time', EDS, 'time', 5, 'expanding'],
    ['on the way back after a turnaround', CLOSED, 'scale', 0.5, 'contracting'],
    ['before a bounce', BOUNCE, 'scale', 0.9, 'contracting'],
  ]
  test.each(nowhere)('%s', (_, code, variable, value, branch) => {
    for (const key of sight) expect(cell(code, key, variable, value, branch), key).toHaveProperty('because')
    expect(cell(code, 'lookback', variable, value, branch)).toBeTypeOf('number')
  })
})

describe('contraction', () => {
  test('H is negative, the Hubble radius is not', () => {
    expect(cell(CLOSED, 'hubble', 'scale', 0.5, 'contracting')).toBeLessThan(0)
    expect(cell(CLOSED, 'hubbleRadius', 'scale', 0.5, 'contracting')).toBeGreaterThan(0)
  })
  test('the same size comes back, in time order about the turnaround', () => {
    const there = cell(CLOSED, 'time', 'scale', 0.5, 'expanding') as number
    const back = cell(CLOSED, 'time', 'scale', 0.5, 'contracting') as number
    const { turnaround } = subject(CLOSED).history.end
    const turn = (turnaround?.time ?? 0) * hubbleTimeGyr(70)
    expect(Math.abs(there + back - 2 * turn)).toBeLessThan(32 * Number.EPSILON * back)
  })
  test('ages before a bounce are negative', () => {
    expect(cell(BOUNCE, 'age', 'scale', 0.9, 'contracting')).toBeLessThan(0)
    expect(cell(BOUNCE, 'conformal', 'scale', 0.9, 'contracting')).toBeLessThan(0)
  })
  test('at a turnaround the expansion stands still', () => {
    const { turnaround } = subject(CLOSED).history.end
    const at = (key: ColumnKey) => cell(CLOSED, key, 'scale', turnaround?.scale ?? 0)
    expect(at('hubble')).toBe(0)
    expect(at('criticalDensity')).toBe(0)
    expect(at('hubbleRadius')).toHaveProperty('because')
    expect(at('deceleration')).toHaveProperty('because')
  })
})

describe('beyond the antipode of a closed space', () => {
  const note = (key: ColumnKey, z: number) => {
    const one = subject(LOITERING_SPHERE)
    return columnNamed(key)?.note?.(one, instant(one, 'z', z)) ?? null
  }
  test('a note says so, beside the value', () => {
    expect(note('transverse', 0.1)).toBe(null)
    expect(note('comoving', 1e6)).toBe(null)
    for (const key of ['transverse', 'angular', 'luminosity', 'modulus', 'arcsecond', 'volume'] as const) {
      expect(note(key, 1e6), key).toContain('antipode')
      expect(cell(LOITERING_SPHERE, key, 'z', 1e6)).toBeTypeOf('number')
    }
  })
  test('the volume stops at the whole sphere, 2π²R³', () => {
    const R = 299792.458 / 70 / 1e3 / Math.sqrt(1)
    const whole = 2 * Math.PI ** 2 * R ** 3
    expect(Math.abs((cell(LOITERING_SPHERE, 'volume', 'z', 1e6) as number) / whole - 1)).toBeLessThan(1e-14)
  })
})

describe('photons', () => {
  test('no temperature without photons of a known one', () => {
    for (const code of ['h0:70,cmb:0', 'h0:70,radiation:0.0001']) {
      expect(cell(code, 'temperature', 'z', 1)).toHaveProperty('because')
    }
  })
  test('it grows as 1 + z', () => expect(cell('h0:70,cmb:3', 'temperature', 'z', 999)).toBe(3000))
})

/** Sizes over all that doubles hold, and the edges of what can be asked. */
const value: Readonly<Record<Variable, fc.Arbitrary<number>>> = {
  z: fc.oneof(
    fc.double({ min: -1, minExcluded: true, max: 10, noNaN: true }),
    fc.double({ min: -300, max: 308, noNaN: true }).map((x) => 10 ** x),
    fc.constantFrom(0, -1 + Number.EPSILON, Number.MAX_VALUE, 1e-300),
  ),
  scale: fc.oneof(
    fc.double({ min: -323, max: 308, noNaN: true }).map((x) => 10 ** x),
    fc.double({ min: 0, minExcluded: true, max: 3, noNaN: true }),
    fc.constantFrom(1, Number.MIN_VALUE, Number.MAX_VALUE),
  ),
  time: fc.oneof(
    fc.double({ min: -100, max: 100 }),
    fc.double({ noNaN: true, noDefaultInfinity: true }),
    fc.constant(0),
  ),
  age: fc.oneof(
    fc.double({ min: -100, max: 100 }),
    fc.double({ noNaN: true, noDefaultInfinity: true }),
    fc.constant(0),
  ),
}
const asked = fc
  .constantFrom(...VARIABLES)
  .chain((variable) => fc.tuple(fc.constant(variable), value[variable].filter(Number.isFinite)))

/** Null where the engine declines, with a reason: that too is an answer. */
function solvable(code: string): ReturnType<typeof subject> | null {
  try {
    return subject(code)
  } catch (error) {
    if (isUnsolvable(error)) return null
    throw error
  }
}

test('every column of every legal scenario is a finite number or has a reason, at every epoch', () => {
  const epochs = fc.array(asked, { minLength: 4, maxLength: 12 })
  const property = fc.property(plainCode, epochs, fc.boolean(), (code, epochs, contracting) => {
    const one = solvable(code)
    if (one === null) return
    for (const [variable, at] of epochs) {
      const found = instantAt(one, variable, at, contracting ? 'contracting' : 'expanding')
      if (!isInstant(found)) expect(found.because).not.toBe('')
      else expectNumbersOrReasons(one, found, `${code} at ${variable}=${at}`)
    }
  })
  fc.assert(property, { numRuns: 300 })
}, 60_000)

function expectNumbersOrReasons(one: ReturnType<typeof subject>, found: Instant, where: string) {
  for (const column of COLUMNS) {
    const cell = column.value(one, found)
    const good = isMissing(cell) ? cell.because !== '' : Number.isFinite(cell) && !Object.is(cell, -0)
    expect(good, `${where}: ${column.key} is ${JSON.stringify(cell)}`).toBe(true)
    expect(column.note?.(one, found)).not.toBe('')
  }
}
