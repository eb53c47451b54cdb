/**
 * The same code gives the same digits for ever: bit for bit where `Math.exp` and its kin are those that wrote the file, within
 * 2 eps and the stated bound on the error elsewhere. `WRITE_DIGITS=1` adds codes that are new, and writes all of them anew only
 * where `ENGINE` has another number (DEVELOPERS.md says when it gets one).
 */
import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import { expect, test } from 'vitest'
import { ENGINE } from '../../lib/solve'
import { CODES, type Digit, type Digits, digitsOf } from './digits'

const FILE = new URL('digits.json', import.meta.url)
const HERE = `${process.arch}, V8 ${process.versions.v8.split('.').slice(0, 2).join('.')}`
/** Of moments and ends no bound is stated: they are found from measures that have one, of about this relative size. */
const UNSTATED = 1e-12

type Values = Readonly<Record<string, Digit['value']>>

interface Kept {
  readonly engine: string
  readonly machine: string
  readonly digits: Readonly<Record<string, Values>>
}

if (process.env.WRITE_DIGITS) {
  const old = existsSync(FILE) ? kept() : null
  const digits = CODES.map((code) => [code, (old?.engine === ENGINE && old.digits[code]) || valuesOf(digitsOf(code))])
  const file: Kept = { engine: ENGINE, machine: HERE, digits: Object.fromEntries(digits) }
  writeFileSync(FILE, `${JSON.stringify(file, null, 2)}\n`)
}

const { engine, machine, digits } = kept()

test('the digits are those of this engine, for every code', () => {
  expect(engine).toBe(ENGINE)
  expect(Object.keys(digits)).toEqual(CODES)
})

test.each(CODES)('%s', (code) => {
  const [now, then] = [digitsOf(code), digits[code] ?? {}]
  expect(Object.keys(now)).toEqual(Object.keys(then))
  const changed = Object.keys(now).filter((name) => !same(now[name], then[name] ?? null))
  expect(changed.map((name) => `${name}: ${then[name]} was kept, now ${now[name].value}`)).toEqual([])
})

function same({ value, error }: Digit, then: Digit['value']): boolean {
  if (value === then || machine === HERE) return value === then
  if (typeof value !== 'number' || typeof then !== 'number') return false
  return Math.abs(value - then) <= 2 * Number.EPSILON * Math.abs(then) + (error || UNSTATED * Math.abs(then))
}

function kept(): Kept {
  return JSON.parse(readFileSync(FILE, 'utf8'))
}

function valuesOf(all: Digits): Values {
  return Object.fromEntries(Object.entries(all).map(([name, { value }]) => [name, value]))
}
