/** The keys of a dark-energy law as the form leaves them, also when it has just become another law. */
import { FAMILIES } from '../dark-energy'
import type { ListParameter, Parameter } from '../parameter'
import { EOS } from '../scenario/parameters'
import { WAS } from './fields'
import { listText, numberText } from './typed'

type Fields = ReadonlyMap<string, string>

/** Texts by key for the law that is chosen, those of its parameters that its other choices leave in force. */
export function familyTexts(fields: Fields): ReadonlyMap<string, string> {
  const used = parametersOf(fields.get(EOS.key)).filter((one) => inForce(one, fields))
  return new Map(used.map((one) => [one.key, textOf(one, fields)]))
}

function parametersOf(family: string | undefined): readonly Parameter[] {
  return FAMILIES.find(({ key }) => key === family)?.parameters ?? []
}

function inForce({ only }: Parameter, fields: Fields): boolean {
  if (!only) return true
  const ruling = parametersOf(fields.get(EOS.key)).find((one) => one.key === only.key)
  const value = fields.get(only.key) ?? (ruling?.kind === 'choice' ? ruling.fallback : '')
  return only.values.includes(value)
}

function textOf(parameter: Parameter, fields: Fields): string {
  const was = fields.get(WAS)
  const changed = was !== undefined && was !== fields.get(EOS.key)
  const kept =
    changed && !parametersOf(was).some((one) => same(one, parameter)) ? '' : (fields.get(parameter.key) ?? '')
  if (parameter.kind === 'choice') return kept
  if (parameter.kind === 'number') return numberText(kept)
  return changed && kept === '' && parameter.fallback === null ? start(parameter) : listText(kept)
}

/** Two laws share a parameter when it bears the same symbol and the same limits in both. */
function same(one: Parameter, other: Parameter): boolean {
  if (one.kind === 'choice' || other.kind === 'choice') return false
  const alike = one.key === other.key && one.kind === other.kind && one.symbol === other.symbol
  return alike && one.min === other.min && one.max === other.max
}

/** Where a list that a law requires begins: a w of −1 throughout, given at even steps up to today. */
function start({ least, ascending }: ListParameter): string {
  const places = Array.from({ length: least }, (_, i) => (i + 1) / least)
  return places.map((place) => (ascending ? String(place) : '-1')).join('_')
}
