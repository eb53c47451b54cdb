/** The nearest good reading of a code that the strict reader refuses, and what was changed to get there. */
import { FAMILIES } from '../dark-energy'
import type { Family } from '../dark-energy/law'
import type { Parameter } from '../parameter'
import { loosePairs } from './mend-text'
import { nearestText } from './mend-value'
import type { OwnParameter } from './own-parameter'
import { CMB, CURVATURE, DARK, EOS, MASSES, MATTER, NU, OWN_PARAMETERS, RADIATION } from './parameters'
import { clip } from './problems'
import { MOST_SCENARIOS } from './query'
import { readScenario } from './read'
import type { Scenario } from './scenario'
import { writeScenario } from './write'

export interface Mended {
  readonly scenario: Scenario
  /** Canonical. */
  readonly code: string
  /** Plain sentences; empty where the code was good. */
  readonly changes: readonly string[]
}

/** A mending under way: keys with their texts in the order typed. */
interface Bench {
  readonly texts: Map<string, string>
  readonly changes: string[]
}

/** Never throws; null where nothing can be saved. */
export function mendScenario(text: string, families: readonly Family[] = FAMILIES): Mended | null {
  const good = readScenario(text, null, families)
  if (good.ok) return { scenario: good.value, code: writeScenario(good.value, families), changes: [] }
  const bench: Bench = { texts: new Map(), changes: [] }
  for (const { key, value } of loosePairs(text, bench.changes)) layOut(bench, key, value)
  settleFamily(bench, families)
  for (const [key, typed] of [...bench.texts]) mendValue(bench, key, typed, families)
  settleConflicts(bench)
  return finish(bench, families)
}

/** All codes of an address: those that can be saved, at most six; null where none can. */
export function mendQuery(values: readonly string[], families: readonly Family[] = FAMILIES): Mended[] | null {
  const mended = values.slice(0, MOST_SCENARIOS).map((text) => mendScenario(text, families))
  const saved = mended.filter((one) => one !== null)
  return saved.length > 0 ? saved : null
}

function layOut({ texts, changes }: Bench, key: string, value: string | null): void {
  if (key === '' && !value) return
  if (value === null || value === '') changes.push(`“${clip(key)}” has no value and is left out.`)
  else if (texts.has(key)) changes.push(`${clip(key)} stands more than once; the first is kept.`)
  else texts.set(key, value)
}

/** A missing or unknown law is that of the family's keys, as cpl for w0 and wa. */
function settleFamily(bench: Bench, families: readonly Family[]): void {
  const { texts, changes } = bench
  const word = texts.get(EOS.key)?.toLowerCase()
  if (families.some((one) => one.key === word)) return
  if (word !== undefined) changes.push(`There is no law eos:${clip(word)}; it is left out.`)
  texts.delete(EOS.key)
  const owns = (family: Family, key: string) => family.parameters.some((one) => one.key === key)
  const keys = [...texts.keys()].filter((key) => families.some((family) => owns(family, key)))
  const family = families.find((one) => keys.every((key) => owns(one, key)))
  if (keys.length === 0 || !family) return
  changes.push(`eos:${family.key} is added, which ${keys.join(' and ')} belong${keys.length === 1 ? 's' : ''} to.`)
  texts.set(EOS.key, family.key)
}

function mendValue(bench: Bench, key: string, typed: string, families: readonly Family[]): void {
  const parameters = parametersOf(key, bench.texts.get(EOS.key), families)
  // A key may have several records, each for other words beside it: the strict reader then decides.
  const nearest = parameters.map((one) => nearestText(one, typed)).find((one) => one !== null)
  if (nearest === undefined) drop(bench, key, reasonToDrop(key, typed, parameters.length > 0))
  else bench.texts.set(key, nearest)
  if (nearest !== undefined && nearest !== typed) bench.changes.push(`${key}:${clip(typed)} is read as ${nearest}.`)
}

const reasonToDrop = (key: string, typed: string, known: boolean): string =>
  known
    ? `${key}:${clip(typed)} cannot be read and counts as not given.`
    : `“${clip(key)}” is not used here and is left out.`

function parametersOf(
  key: string,
  eos: string | undefined,
  families: readonly Family[],
): readonly (Parameter | OwnParameter)[] {
  if (key === EOS.key) return [{ ...EOS, choices: families.map((one) => ({ value: one.key, label: one.label })) }]
  const family = families.find((one) => one.key === (eos ?? EOS.fallback).toLowerCase())
  return [...OWN_PARAMETERS, ...(family?.parameters ?? [])].filter((one) => one.key === key)
}

function drop({ texts, changes }: Bench, key: string, change: string): void {
  if (texts.delete(key)) changes.push(change)
}

/** Of two that exclude each other the first typed stays. */
function settleConflicts(bench: Bench): void {
  exclude(bench, [CURVATURE.key], [DARK.key])
  exclude(bench, [RADIATION.key], [CMB.key, NU.key, MASSES.key])
  if (Number(bench.texts.get(CMB.key) ?? 1) === 0) exclude(bench, [CMB.key], [NU.key, MASSES.key])
}

function exclude(bench: Bench, one: readonly string[], other: readonly string[]): void {
  const order = [...bench.texts.keys()]
  const present = order.filter((key) => one.includes(key) || other.includes(key))
  const first = present[0]
  if (first === undefined) return
  for (const key of present.filter((key) => one.includes(first) !== one.includes(key))) {
    drop(bench, key, `${key} cannot stand beside ${first} and is left out.`)
  }
}

/** Whatever the strict reader still refuses goes, one key at a time. */
function finish(bench: Bench, families: readonly Family[]): Mended | null {
  while (bench.texts.size > 0) {
    const reading = readScenario(codeOf(bench.texts), null, families)
    if (reading.ok) {
      const changes = bench.changes.length > 0 ? bench.changes : ['Blanks, capitals and separators are put right.']
      return { scenario: reading.value, code: writeScenario(reading.value, families), changes }
    }
    repair(bench, reading.problems[0].parameter)
  }
  return null
}

/** Values are within limits by now and conflicts settled: what is wrong with matter or masses is their weight. */
function repair(bench: Bench, parameter: string): void {
  const { texts, changes } = bench
  const heavy = parameter === MATTER.key || parameter === MASSES.key
  if (heavy && texts.get(MASSES.key) !== '0') {
    texts.set(MASSES.key, '0')
    changes.push('masses:0 is set, since massive neutrinos would outweigh matter.')
  } else if (texts.has(parameter)) drop(bench, parameter, `${parameter} does not fit and is left out.`)
  else drop(bench, lastFamilyKey(texts), 'The law lacks what it needs and is left out.')
}

/** A required key is missing: the law itself cannot stay, nor what belongs to it alone. */
function lastFamilyKey(texts: ReadonlyMap<string, string>): string {
  return texts.has(EOS.key) ? EOS.key : ([...texts.keys()].at(-1) ?? '')
}

/** The name last, as the reader wants it. */
function codeOf(texts: ReadonlyMap<string, string>): string {
  const pairs = [...texts].toSorted(([one], [other]) => Number(one === 'as') - Number(other === 'as'))
  return pairs.map((pair) => pair.join(':')).join(',')
}
