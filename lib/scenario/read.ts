/** The strict reader of the scenario code: the text is the value of `s`, decoded once. */
import { FAMILIES } from '../dark-energy'
import type { Family } from '../dark-energy/law'
import type { ParameterValues } from '../parameter'
import { budgetOf } from './budget'
import { closureFaults, lawFaults, positiveFaults, radiationFaults, weightFaults } from './conflicts'
import { readLaw, unknownFaults } from './family-keys'
import { readPairs } from './given'
import { nameFault } from './name'
import * as own from './parameters'
import { type Fault, problemsOf } from './problems'
import type { Closure, Radiation, Reading, Scenario } from './scenario'
import { readChoice, readList, readNumber, type Value } from './values'

/** A reading under way: the typed texts, and the faults found so far. */
interface Desk {
  readonly texts: ReadonlyMap<string, string>
  readonly faults: Fault[]
}

/**
 * The scenario that a code means, or everything that is wrong with it. `index` is the place of its `s`.
 * Never throws. The families may be others than the built-in ones; a new one needs no change here.
 */
export function readScenario(
  text: string,
  index: number | null,
  families: readonly Family[] = FAMILIES,
): Reading<Scenario> {
  const given = readPairs(text)
  const desk: Desk = { texts: given.texts, faults: [...given.faults] }
  const scenario = assemble(desk, families)
  if (desk.faults.length === 0) {
    const budget = budgetOf(scenario)
    const family = families.find((one) => one.key === scenario.eos)
    desk.faults.push(...weightFaults(desk.texts, scenario, budget), ...positiveFaults(desk.texts, family, budget))
  }
  if (desk.faults.length > 0) return { ok: false, problems: problemsOf(desk.faults, index) }
  return { ok: true, value: scenario }
}

/** A value at fault is replaced by its default here; the faults then keep the scenario from getting out. */
function assemble(desk: Desk, families: readonly Family[]): Scenario {
  const h0 = number(desk, own.H0)
  const matter = number(desk, own.MATTER)
  const baryons = number(desk, own.BARYONS)
  const closed = closure(desk)
  const radiated = radiation(desk)
  const { eos, law } = darkEnergy(desk, families)
  return { h0, matter, baryons, closure: closed, radiation: radiated, eos, law, beyond: beyond(desk), name: name(desk) }
}

/** The value of a key, or the fallback where it is absent or at fault. */
function take<T>(desk: Desk, key: string, read: (text: string) => Value<T>, fallback: T): T {
  const text = desk.texts.get(key)
  if (text === undefined) return fallback
  const value = read(text)
  if ('value' in value) return value.value
  desk.faults.push(value.fault)
  return fallback
}

type OwnNumber = Parameters<typeof readNumber>[0] & { readonly fallback: number | null }

function number(desk: Desk, parameter: OwnNumber): number {
  return take(desk, parameter.key, (text) => readNumber(parameter, text), parameter.fallback ?? 0)
}

function closure(desk: Desk): Closure {
  desk.faults.push(...closureFaults(desk.texts))
  const curvature = number(desk, own.CURVATURE)
  const dark = number(desk, own.DARK)
  return desk.texts.has(own.DARK.key) ? { given: 'dark', value: dark } : { given: 'curvature', value: curvature }
}

function radiation(desk: Desk): Radiation {
  const cmb = number(desk, own.CMB)
  const nu = number(desk, own.NU)
  const masses = take(desk, own.MASSES.key, (text) => readList(own.MASSES, text), own.MASSES.fallback)
  const density = number(desk, own.RADIATION)
  desk.faults.push(...radiationFaults(desk.texts, cmb))
  if (desk.texts.has(own.RADIATION.key)) return { kind: 'given', density }
  if (cmb === 0) return { kind: 'none' }
  return { kind: 'thermal', cmb, nu, masses: masses.filter((mass) => mass > 0).toSorted((a, b) => a - b) }
}

function darkEnergy(desk: Desk, families: readonly Family[]): { eos: string; law: ParameterValues } {
  const parameter = own.eosParameter(families)
  const before = desk.faults.length
  const eos = take(desk, parameter.key, (text) => readChoice(parameter, text), parameter.fallback)
  const family = desk.faults.length > before ? null : families.find((one) => one.key === eos)
  const law = family ? familyLaw(desk, family) : {}
  desk.faults.push(...strangers(desk, family ?? null, families))
  return { eos, law }
}

function familyLaw(desk: Desk, family: Family): ParameterValues {
  const { values, faults } = readLaw(family, desk.texts)
  desk.faults.push(...faults)
  if (faults.length === 0) desk.faults.push(...lawFaults(desk.texts, family, values))
  return values
}

function strangers(desk: Desk, family: Family | null, families: readonly Family[]): Fault[] {
  const others = [...desk.texts].filter(([key]) => !own.OWN_KEYS.has(key))
  const known = [...own.OWN_KEYS, ...(family?.parameters ?? []).map((one) => one.key)]
  return unknownFaults(others, family, families, [...new Set(known)])
}

function beyond(desk: Desk): Scenario['beyond'] {
  const { key, fallback } = own.BEYOND
  return take<string>(desk, key, (text) => readChoice(own.BEYOND, text), fallback) === 'hold' ? 'hold' : 'follow'
}

function name(desk: Desk): string | null {
  const text = desk.texts.get(own.AS.key)
  if (text === undefined) return null
  const fault = nameFault(text)
  if (fault) desk.faults.push(fault)
  return text
}
