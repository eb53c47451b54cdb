/** Published sets against the rows of their tables (test/reference/parameter-sets.csv, whose column `source` names the table). */
import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { PUBLISHED_SETS } from '../../lib/scenario/presets'
import { readScenario } from '../../lib/scenario/read'
import { writeScenario } from '../../lib/scenario/write'

const text = readFileSync(new URL('../reference/parameter-sets.csv', import.meta.url), 'utf8')
const rows = text
  .trim()
  .split('\n')
  .slice(1)
  .map((line) => {
    const [set, parameter, value, plus, minus, confidence, , ...source] = line.split(',')
    return { set, parameter, value, plus, minus, confidence, source: source.join(',').replaceAll('"', '') }
  })
const rowOf = (set: string, parameter: string) => rows.find((row) => row.set === set && row.parameter === parameter)

const COLUMNS: Readonly<Record<string, string>> = {
  H_0: 'H0',
  Ω_m: 'Omega_m',
  'Ω_b h²': 'omega_b',
  Ω_k: 'Omega_K',
  w_0: 'w0',
  w_a: 'wa',
}

describe.each(PUBLISHED_SETS.map((one) => [one.key, one] as const))('%s', (key, set) => {
  it('prints the values and errors of its rows', () => {
    for (const { symbol, value, error } of set.values) {
      const row = rowOf(key, COLUMNS[symbol] ?? '')
      expect(value.replace('−', '-')).toBe(row?.value)
      const errors = row?.plus === row?.minus ? (row?.plus ? `± ${row.plus}` : '') : `+${row?.plus} −${row?.minus}`
      expect(error).toBe(errors)
      expect(set.confidence).toBe(row?.confidence ? `${row.confidence}%` : 'best fit')
      const [identifier] = /arXiv:[\d.]+/.exec(row?.source ?? '') ?? []
      expect(set.citation).toContain(identifier)
    }
  })
  it('is a scenario with these numbers and its name, in canonical form', () => {
    if (set.code === null) {
      expect(set.values.map(({ value }) => Number(value))).toEqual([set.change?.value])
      return
    }
    const reading = readScenario(set.code, null)
    if (!reading.ok) throw new Error(JSON.stringify(reading.problems))
    expect(decodeURIComponent(writeScenario(reading.value))).toBe(set.code)
    const { h0, matter, baryons, closure, law, name } = reading.value
    const ours: Readonly<Record<string, unknown>> = {
      H_0: h0,
      Ω_m: matter,
      'Ω_b h²': baryons,
      Ω_k: closure.value,
      w_0: law.w0,
      w_a: law.wa,
    }
    for (const { symbol, value } of set.values) expect(ours[symbol]).toBe(Number(value.replace('−', '-')))
    expect(name).toMatch(/\S/)
  })
  it('retunes to the angle and the age of its own rows', () => {
    if (set.kept === null) return
    expect(Number(set.kept.acousticAngle) * 100).toBeCloseTo(Number(rowOf(key, '100theta_star')?.value), 9)
    expect(set.kept.age).toBe(rowOf(key, 'age')?.value)
  })
})
it('has every key once', () => {
  expect(new Set(PUBLISHED_SETS.map(({ key }) => key)).size).toBe(PUBLISHED_SETS.length)
  expect(rows.length).toBeGreaterThan(40)
})
