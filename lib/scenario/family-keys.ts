/** Which of a family's parameters a scenario reads, and what a family key that it does not read belongs to. */
import type { Family } from '../dark-energy/law'
import type { Parameter, ParameterValue, ParameterValues } from '../parameter'
import { type Fault, fault } from './problems'
import { allowedChoice, allowedList, allowedNumber, readChoice, readList, readNumber, type Value } from './values'

export interface LawReading {
  readonly values: ParameterValues
  readonly faults: readonly Fault[]
}

/** Whether the parameter is read beside these values of its family; null where that hangs on a value at fault. */
export function isUsed(parameter: Parameter, values: ParameterValues): boolean | null {
  if (!parameter.only) return true
  const value = values[parameter.only.key]
  return value === undefined ? null : parameter.only.values.includes(String(value))
}

/** Reads the family's own keys among those given, in the family's order (a choice stands before those it rules). */
export function readLaw(family: Family, given: ReadonlyMap<string, string>): LawReading {
  const values: Record<string, ParameterValue> = {}
  const faults: Fault[] = []
  for (const parameter of family.parameters) {
    if (isUsed(parameter, values) !== true) continue
    const read = readParameter(parameter, given.get(parameter.key))
    if ('fault' in read) faults.push(read.fault)
    else values[parameter.key] = read.value
  }
  return { values, faults: [...faults, ...strayFaults(family, given, values, faults)] }
}

function readParameter(parameter: Parameter, text: string | undefined): Value<ParameterValue> {
  const { key } = parameter
  if (text === undefined) {
    if (parameter.fallback !== null) return { value: parameter.fallback }
    return { fault: fault(key, '', allowedBy(parameter), `${key} is required.`) }
  }
  if (parameter.kind === 'number') return readNumber(parameter, text)
  return parameter.kind === 'list' ? readList(parameter, text) : readChoice(parameter, text)
}

export function allowedBy(parameter: Parameter): string {
  if (parameter.kind === 'number') return allowedNumber(parameter)
  return parameter.kind === 'list' ? allowedList(parameter) : allowedChoice(parameter)
}

/** Keys of this family that the chosen words leave unused, as `width` without `v:cosine`. */
function strayFaults(
  family: Family,
  given: ReadonlyMap<string, string>,
  values: ParameterValues,
  known: readonly Fault[],
): Fault[] {
  const own = family.parameters.filter((one) => given.has(one.key))
  const keys = [...new Set(own.map((one) => one.key))]
  return keys.flatMap((key) => {
    const records = own.filter((one) => one.key === key)
    if (key in values || known.some((one) => one.parameter === key)) return []
    if (records.some((one) => isUsed(one, values) === null)) return []
    const conditions = records.map((one) => `${one.only?.key}:${one.only?.values.join(', ')}`)
    const message = `${key} is not used here.`
    return [fault(key, given.get(key) ?? '', `only with ${conditions.join(' or ')}`, message)]
  })
}

/** Keys that no part of the scenario reads. `family` null: the word after `eos` was wrong, so any family's key passes. */
export function unknownFaults(
  strangers: readonly (readonly [string, string])[],
  family: Family | null,
  families: readonly Family[],
  known: readonly string[],
): Fault[] {
  return strangers.flatMap(([key, value]) => {
    const owners = families.filter((one) => one.parameters.some((parameter) => parameter.key === key))
    if (owners.length === 0) return [fault(key, value, `one of ${known.join(', ')}`, 'There is no such parameter.')]
    if (family === null || owners.includes(family)) return []
    const message = `${key} is not used with eos:${family.key}.`
    return [fault(key, value, `only with eos:${owners.map((one) => one.key).join(' or eos:')}`, message)]
  })
}
