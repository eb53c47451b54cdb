/** Scenario codes at random for property tests: every key, limits and short decimals included. */
import fc from 'fast-check'
import { FAMILIES } from '../../lib/dark-energy'
import type { Family } from '../../lib/dark-energy/law'
import type { Limits, Parameter, ParameterValue } from '../../lib/parameter'
import * as own from '../../lib/scenario/parameters'
import { readScenario } from '../../lib/scenario/read'

type Pair = readonly [string, string]

/** Sizes that mean something to people, from a millionth of a millionth up: evenly, by order of magnitude, short, and the limits. */
function plainNumber({ min, max, above }: Limits): fc.Arbitrary<number> {
  const any = fc.integer({ min: 0, max: 1e9 }).map((part) => min + ((max - min) * part) / 1e9)
  const small = fc.integer({ min: -1200, max: 100 }).map((power) => 10 ** (power / 100))
  const sizes =
    min < 0
      ? fc.oneof(
          small,
          small.map((x) => -x),
        )
      : small
  const short = fc.oneof(any, sizes).map((x) => Number(x.toPrecision(2)))
  return fc
    .oneof(any, sizes, short, fc.constantFrom(min, max, 0, 1))
    .filter((x) => x <= max && (above ? x > min : x >= min))
}

/** Any double within the limits, most of which are far from what means something. */
function anyNumber({ min, max, above }: Limits): fc.Arbitrary<number> {
  return fc
    .oneof(fc.double({ min, max, noNaN: true }), fc.constantFrom(min, max))
    .filter((x) => x <= max && (above ? x > min : x >= min))
    .map((x) => x + 0)
}

const textOf = (value: ParameterValue): string => (Array.isArray(value) ? value.join('_') : String(value))
const none: fc.Arbitrary<readonly Pair[]> = fc.constant([])
const cold: fc.Arbitrary<readonly Pair[]> = fc.constant([['cmb', '0']])

/** Codes whose numbers are drawn by `number`; what the reader refuses (neutrinos that outweigh matter, say) is left out. */
function codesOf(number: (limits: Limits) => fc.Arbitrary<number>): fc.Arbitrary<string> {
  const valueFor = (parameter: Parameter): fc.Arbitrary<ParameterValue> => {
    if (parameter.kind === 'number') return number(parameter)
    if (parameter.kind === 'choice') return fc.constantFrom(...parameter.choices.map(({ value }) => value))
    const list = fc.array(number(parameter), { minLength: parameter.least, maxLength: parameter.most })
    return parameter.ascending ? list.map((all) => [...new Set(all)].sort((one, other) => one - other)) : list
  }
  const optional = (key: string, value: fc.Arbitrary<ParameterValue>): fc.Arbitrary<readonly Pair[]> =>
    fc.option(value).map((one) => (one === null ? [] : [[key, textOf(one)]]))
  const of = (parameter: Limits & { readonly key: string }) => optional(parameter.key, number(parameter))
  const law = ({ key, parameters }: Family): fc.Arbitrary<readonly Pair[]> =>
    fc.tuple(...parameters.map((one) => optional(one.key, valueFor(one)))).map((all) => [['eos', key], ...all.flat()])
  const thermal = fc
    .tuple(of({ ...own.CMB, above: true }), of(own.NU), optional(own.MASSES.key, valueFor(own.MASSES)))
    .map((all) => all.flat())
  return fc
    .tuple(
      of(own.H0),
      of(own.MATTER),
      fc.oneof(of(own.CURVATURE), of(own.DARK)),
      fc.oneof(none, thermal, of(own.RADIATION), cold),
      fc.oneof(none, ...FAMILIES.map(law)),
      fc.option(fc.constantFrom('follow', 'hold')).map((one): readonly Pair[] => (one ? [['beyond', one]] : [])),
    )
    .map((all) => all.flat().map((pair) => pair.join(':')))
    .map((pairs) => (pairs.length > 0 ? pairs.join(',') : 'h0:67.66'))
    .filter((code) => readScenario(code, null).ok)
}

export const plainCode = codesOf(plainNumber)
export const anyCode = codesOf(anyNumber)
