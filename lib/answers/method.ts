/** What every number, law and parameter of the pages means: made from the lists, so that nothing of them is left out. */
import { FAMILIES } from '../dark-energy'
import type { Family } from '../dark-energy/law'
import type { Parameter } from '../parameter'
import { MEASURES } from '../quantities/measures'
import { MOMENT_KINDS } from '../quantities/moment-kinds'
import type { Quantity } from '../quantities/quantity'
import { BETWEEN } from '../ruler/between'
import { READINGS } from '../ruler/readings'
import { allowedBy } from '../scenario/family-keys'
import type { OwnParameter } from '../scenario/own-parameter'
import { OWN_PARAMETERS } from '../scenario/parameters'
import { CAUTIONS } from '../words/cautions'
import { unitText } from '../words/fields'

export interface MethodEntry {
  /** Of the page, after `#`. */
  readonly anchor: string
  readonly symbol: string
  readonly title: string
  readonly unit: string
  readonly formula: string | null
  readonly meaning: string
  readonly facts: readonly Fact[]
  /** Deeper by one step: the parameters of a law. */
  readonly parts: readonly MethodEntry[]
}

interface Fact {
  readonly term: 'Accuracy' | 'Source' | 'Key' | 'Allowed' | 'Default' | 'Caution'
  readonly text: string
}

export interface MethodSection {
  readonly anchor: string
  readonly title: string
  readonly entries: readonly MethodEntry[]
}

export function method(): readonly MethodSection[] {
  return [
    section(
      'measures',
      'Measures today',
      MEASURES.map((one) => quantityEntry('measure', one.key, one)),
    ),
    section(
      'moments',
      'Moments',
      Object.entries(MOMENT_KINDS).map(([kind, one]) => quantityEntry('moment', kind, one)),
    ),
    section(
      'readings',
      'Readings along a history',
      READINGS.map((one) => quantityEntry('reading', one.key, one)),
    ),
    section(
      'between',
      'Readings between two epochs',
      BETWEEN.map((one) => quantityEntry('between', one.key, one)),
    ),
    section('laws', 'Laws of dark energy', FAMILIES.map(lawEntry)),
    section(
      'parameters',
      'Parameters',
      OWN_PARAMETERS.map((one) => parameterEntry('parameter', one)),
    ),
    section(
      'cautions',
      'Cautions',
      CAUTIONS.map(({ key, title, text }) => entry(`caution-${key}`, '', title, text)),
    ),
  ]
}

const section = (anchor: string, title: string, entries: readonly MethodEntry[]): MethodSection => ({
  anchor,
  title,
  entries,
})

function entry(anchor: string, symbol: string, title: string, meaning: string): MethodEntry {
  return { anchor, symbol, title, meaning, unit: '', formula: null, facts: [], parts: [] }
}

type Explained = Pick<Quantity, 'symbol' | 'label' | 'formula' | 'meaning' | 'accuracy' | 'source'> &
  Partial<Pick<Quantity, 'unit'>>

function quantityEntry(kind: string, key: string, one: Explained): MethodEntry {
  return {
    ...entry(`${kind}-${key}`, one.symbol, one.label, one.meaning),
    unit: one.unit ?? '',
    formula: one.formula,
    facts: [
      { term: 'Accuracy', text: one.accuracy },
      { term: 'Source', text: one.source },
    ],
  }
}

function lawEntry(family: Family): MethodEntry {
  const { key, label, formula, meaning, caution, source, parameters } = family
  const once = parameters.filter((one, i) => parameters.findIndex((other) => other.key === one.key) === i)
  return {
    ...entry(`law-${key}`, '', label, meaning),
    formula,
    facts: [
      { term: 'Caution', text: caution },
      { term: 'Key', text: `eos:${key}` },
      { term: 'Source', text: source },
    ],
    parts: once.map((one) => parameterEntry(`law-${key}`, one)),
  }
}

function parameterEntry(kind: string, parameter: Parameter | OwnParameter): MethodEntry {
  const { key, symbol, label, meaning, unit } = parameter
  return {
    ...entry(`${kind}-${key}`, symbol, label, meaning),
    unit: unitText(unit),
    facts: [
      { term: 'Key', text: key },
      { term: 'Allowed', text: allowedText(parameter) },
      { term: 'Default', text: defaultText(parameter) },
    ],
  }
}

function allowedText(parameter: Parameter | OwnParameter): string {
  if (parameter.kind === 'text') return `${parameter.least} to ${parameter.most} characters`
  const own = parameter as Parameter
  if (own.kind !== 'choice') return unitText(allowedBy(own)).replaceAll('-', '−')
  const told = own.choices.map(({ value, label }) => (value === label ? value : `${value} (${label})`))
  // Exponents in brackets, in the markup of labels.
  return told.join(', ').replaceAll(/\^\(([^()]*)\)/g, '^{$1}')
}

function defaultText(parameter: Parameter | OwnParameter): string {
  if (parameter.kind === 'text') return 'none'
  const { fallback } = parameter
  if (fallback === null) return parameter.kind === 'list' ? 'none: the key is required' : 'follows from the others'
  return String(fallback).replaceAll(',', ', ').replaceAll('-', '−')
}
