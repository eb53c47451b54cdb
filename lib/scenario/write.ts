/** The canonical writer: two scenarios are the same when this text is. It is ready to stand in the query of an address. */
import { FAMILIES } from '../dark-energy'
import type { Family } from '../dark-energy/law'
import type { ParameterValue } from '../parameter'
import { isUsed } from './family-keys'
import { QUERY } from './given'
import * as own from './parameters'
import type { Radiation, Scenario } from './scenario'

type Pair = readonly [key: string, text: string]

/** The scenario's code, its name percent-encoded. */
export function writeScenario(scenario: Scenario, families: readonly Family[] = FAMILIES): string {
  const { closure, name } = scenario
  const pairs: Pair[] = [
    [own.H0.key, writeNumber(scenario.h0)],
    [own.MATTER.key, writeNumber(scenario.matter)],
    ...unlessDefault(own.BARYONS.key, scenario.baryons, own.BARYONS.fallback),
    ...unlessDefault(closure.given, closure.value, closure.given === 'dark' ? null : own.CURVATURE.fallback),
    ...radiationPairs(scenario.radiation),
    ...lawPairs(scenario, families),
    ...unlessDefault(own.BEYOND.key, scenario.beyond, own.BEYOND.fallback),
    ...(name === null ? [] : [[own.AS.key, encodeURIComponent(name)] as const]),
  ]
  return pairs.map((pair) => pair.join(':')).join(',')
}

/** The query of an address that opens these scenarios, without the question mark. */
export function linkQuery(scenarios: readonly Scenario[], families: readonly Family[] = FAMILIES): string {
  return scenarios.map((one) => `${QUERY}=${writeScenario(one, families)}`).join('&')
}

/** String(x), with the plus sign of a large exponent encoded: in a query it would mean a blank. */
const writeNumber = (x: number): string => String(x).replace('+', '%2B')

function writeValue(value: ParameterValue): string {
  if (typeof value === 'string') return value
  return typeof value === 'number' ? writeNumber(value) : value.map(writeNumber).join('_')
}

function unlessDefault(key: string, value: ParameterValue, fallback: ParameterValue | null): Pair[] {
  const text = writeValue(value)
  return fallback !== null && text === writeValue(fallback) ? [] : [[key, text]]
}

function radiationPairs(radiation: Radiation): Pair[] {
  if (radiation.kind === 'none') return [[own.CMB.key, '0']]
  if (radiation.kind === 'given') return [[own.RADIATION.key, writeNumber(radiation.density)]]
  const masses = radiation.masses.length > 0 ? radiation.masses : [0]
  return [
    ...unlessDefault(own.CMB.key, radiation.cmb, own.CMB.fallback),
    ...unlessDefault(own.NU.key, radiation.nu, own.NU.fallback),
    ...unlessDefault(own.MASSES.key, masses, own.MASSES.fallback),
  ]
}

function lawPairs({ eos, law }: Scenario, families: readonly Family[]): Pair[] {
  const family = families.find((one) => one.key === eos)
  const used = (family?.parameters ?? []).filter((one) => isUsed(one, law) === true)
  return [
    ...unlessDefault(own.EOS.key, eos, own.EOS.fallback),
    ...used.flatMap((one) => unlessDefault(one.key, law[one.key], one.fallback)),
  ]
}
