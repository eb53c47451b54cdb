import fc from 'fast-check'
import { describe, expect, test, vi } from 'vitest'
import { FAMILIES } from '../../lib/dark-energy'
import type { Family } from '../../lib/dark-energy/law'
import type { Limits, Parameter, ParameterValue } from '../../lib/parameter'
import { isUsed } from '../../lib/scenario/family-keys'
import { mendScenario } from '../../lib/scenario/mend'
import * as own from '../../lib/scenario/parameters'
import { readScenario } from '../../lib/scenario/read'
import { writeScenario } from '../../lib/scenario/write'
import { decoded, opened } from './helpers'

/** Any double within limits, and often a short decimal, the limits themselves, or the default. */
function numberWithin({ min, max, above }: Limits): fc.Arbitrary<number> {
  const short = fc.double({ min, max, noNaN: true }).map((x) => Number(x.toPrecision(3)))
  const any = fc.oneof(fc.double({ min, max, noNaN: true }), short, fc.constantFrom(min, max))
  return any.filter((x) => x <= max && (above ? x > min : x >= min)).map((x) => x + 0)
}

function anyValue(parameter: Parameter): fc.Arbitrary<ParameterValue> {
  if (parameter.kind === 'number') return fc.oneof(numberWithin(parameter), fc.constant(parameter.fallback))
  if (parameter.kind === 'choice') return fc.constantFrom(...parameter.choices.map((one) => one.value))
  const list = fc.array(numberWithin(parameter), { minLength: parameter.least, maxLength: Math.min(3, parameter.most) })
  return parameter.ascending ? list.map((all) => [...new Set(all)].toSorted((a, b) => a - b)) : list
}

const textOf = (value: ParameterValue): string =>
  typeof value === 'string' ? value : typeof value === 'number' ? `${value}` : value.join('_')

type Pairs = readonly (readonly [string, string])[]

/** Keys that the choices of the family leave unused are absent, required ones present; the rest may be either. */
function lawPairs(family: Family): fc.Arbitrary<Pairs> {
  const each = family.parameters.map((one) => {
    const value = anyValue(one).map((typed) => [one, typed] as const)
    return one.kind === 'list' && one.fallback === null ? value : fc.oneof(value, fc.constant([one, null] as const))
  })
  return fc
    .tuple(...each)
    .map(usedBy)
    .filter(({ values }) => !family.conflict?.(values))
    .map(({ typed }) => [['eos', family.key] as const, ...typed])
}

function usedBy(all: readonly (readonly [Parameter, ParameterValue | null])[]) {
  const values: Record<string, ParameterValue> = {}
  const typed: [string, string][] = []
  for (const [parameter, value] of all) {
    if (isUsed(parameter, values) !== true) continue
    values[parameter.key] = value ?? parameter.fallback ?? []
    if (value !== null) typed.push([parameter.key, textOf(value)])
  }
  return { values, typed }
}

const optional = (parameter: Limits & { readonly key: string }): fc.Arbitrary<Pairs> =>
  fc.option(numberWithin(parameter)).map((x) => (x === null ? [] : [[parameter.key, `${x}`]]))

const thermal: fc.Arbitrary<Pairs> = fc
  .tuple(optional({ ...own.CMB, above: true }), optional(own.NU), fc.option(anyValue(own.MASSES)))
  .map(([cmb, nu, masses]) => [...cmb, ...nu, ...(masses === null ? [] : [['masses', textOf(masses)] as const])])
const radiation = fc.oneof(thermal, optional(own.RADIATION), fc.constant<Pairs>([['cmb', '0']]))
const closure = fc.oneof(optional(own.CURVATURE), optional(own.DARK))
const law = fc.oneof(fc.constant<Pairs>([]), ...FAMILIES.map(lawPairs))
const beyond: fc.Arbitrary<Pairs> = fc.option(fc.constantFrom('follow', 'hold')).map((x) => (x ? [['beyond', x]] : []))
const name = fc
  .string({ unit: 'grapheme', minLength: 1, maxLength: 20 })
  .map((text) => text.normalize('NFC'))
  .filter((text) => [...text].length <= 60 && !/[\p{Cc}\u202A-\u202E\u2066-\u2069]/u.test(text))

/** A good code, but for neutrinos that outweigh matter, in any order of its pairs. */
const code = fc
  .tuple(optional(own.H0), optional(own.MATTER), optional(own.BARYONS), closure, radiation, law, beyond)
  .chain((parts) => fc.shuffledSubarray(parts.flat(), { minLength: parts.flat().length }))
  .map((pairs) => pairs.map((pair) => pair.join(':')))
const named = fc
  .tuple(code, fc.option(name))
  .map(([pairs, as]) => [...pairs, ...(as === null ? [] : [`as:${as}`])].join(','))
  .filter((text) => text !== '')

// Generous for a busy machine: each property takes under a second on an idle one.
vi.setConfig({ testTimeout: 60_000 })

const throughUrl = (text: string): string => decoded(encodeURIComponent(text))

function opens(text: string): boolean {
  const reading = readScenario(text, 0)
  // Neutrinos that outweigh matter, and laws of a positive density beside Ω_DE ≤ 0: what the generator does not avoid.
  if (!reading.ok) expect(reading.problems.every((one) => /^(matter|masses|eos)$/.test(one.parameter))).toBe(true)
  return reading.ok
}

describe('reader and writer', () => {
  test('what is written reads back to the same scenario, through an address too', () => {
    fc.assert(
      fc.property(named, (text) => {
        fc.pre(opens(text))
        const scenario = opened(throughUrl(text))
        const canonical = writeScenario(scenario)
        expect(opened(decoded(canonical))).toEqual(scenario)
        expect(writeScenario(opened(decoded(canonical)))).toBe(canonical)
        expect(opened(new URL(`http://a/?s=${canonical}`).searchParams.get('s') ?? '')).toEqual(scenario)
      }),
      { numRuns: 400 },
    )
  })
  test('any order of the pairs means the same', () => {
    fc.assert(
      fc.property(
        code.filter((pairs) => pairs.length > 1),
        fc.infiniteStream(fc.nat()),
        (pairs, keys) => {
          fc.pre(opens(pairs.join(',')))
          const shuffled = pairs.map((pair) => [keys.next().value, pair] as const).toSorted(([a], [b]) => a - b)
          expect(opened(shuffled.map(([, pair]) => pair).join(','))).toEqual(opened(pairs.join(',')))
        },
      ),
    )
  })
  test('canonical text needs no escape but in the name', () => {
    fc.assert(
      fc.property(named, (text) => {
        fc.pre(opens(text))
        expect(writeScenario(opened(text))).toMatch(/^[a-z0-9:,_.e-]+(?:,as:[A-Za-z0-9\-_.!~*'()%]+)?$/)
      }),
    )
  })
})

const piece = fc.constantFrom(
  'h0',
  'matter',
  'masses',
  'eos',
  'cpl',
  'w0',
  'as',
  '__proto__',
  ':',
  ',',
  '_',
  '=',
  '-',
  '.',
  '1',
  '0',
  'e',
  ' ',
  '%',
  '%3A',
  '+',
  '\u0000',
  '\ud800',
)
const garbage = fc.oneof(
  fc.string({ unit: 'binary' }),
  fc.string({ maxLength: 200 }),
  fc.array(piece, { maxLength: 30 }).map((all) => all.join('')),
  named.chain((text) => fc.nat(text.length).map((at) => text.slice(0, at) + text.slice(at + 1))),
)

describe('garbage', () => {
  test('never throws; what opens has a canonical form that opens', () => {
    fc.assert(
      fc.property(garbage, (text) => {
        const reading = readScenario(text, 0)
        if (!reading.ok) expect(reading.problems.length).toBeGreaterThan(0)
        else expect(opened(decoded(writeScenario(reading.value)))).toEqual(reading.value)
      }),
      { numRuns: 1000 },
    )
  })
  test('mending never throws and gives codes that open', () => {
    fc.assert(
      fc.property(garbage, (text) => {
        const mended = mendScenario(text)
        if (mended) expect(opened(decoded(mended.code))).toEqual(mended.scenario)
        const reading = readScenario(text, 0)
        if (reading.ok) expect(mended).toMatchObject({ scenario: reading.value, changes: [] })
        else if (mended) expect(mended.changes.length).toBeGreaterThan(0)
      }),
      { numRuns: 1000 },
    )
  })
})
