/** The ruler as the page shows it: rounded numbers, reasons once each, complaints beside the fields, and the downloads. */
import { linkQuery } from '../scenario/write'
import type { Solution } from '../solve'
import { nameOf } from '../words/desk'
import { rounded } from '../words/number'
import { PLAIN_PLACE, type Place, placeKeys, readPlace } from '../words/place'
import { rulerAskOf, rulerPlaceOf } from '../words/ruler-ask'
import { type RulerTyped, rulerTyped } from '../words/ruler-typed'
import { opened } from './opened'
import { type RulerLine, rulerLines } from './ruler'

export interface RulerRow {
  readonly key: string
  readonly symbol: string
  readonly label: string
  readonly unit: string
  /** One for each scenario; null where there is none. */
  readonly cells: readonly (string | null)[]
}

export interface RulerView {
  readonly scenarios: readonly { readonly slot: number; readonly name: string }[]
  readonly at: readonly RulerRow[]
  readonly between: readonly RulerRow[]
  /** Why cells are empty, or what has to be said beside them, each once. */
  readonly notes: readonly string[]
  readonly complaints: RulerTyped['complaints']
  readonly downloads: readonly { readonly format: string; readonly link: string }[]
}

const DOWNLOADS = [
  { format: 'CSV', key: 'csv' },
  { format: 'JSON', key: 'json' },
]

/** Of an address, which is read leniently. */
export function rulerOf(codes: readonly string[], textOf: (key: string) => string | undefined): RulerView {
  const { solutions } = opened(codes)
  return rulerView(solutions, readPlace(textOf, solutions.length))
}

export function rulerView(solutions: readonly Solution[], place: Place): RulerView {
  const ask = rulerAskOf(place)
  const lines = rulerLines(solutions, ask)
  const scenarios = solutions.map(({ scenario }, slot) => ({ slot, name: nameOf(scenario, slot) }))
  const names = scenarios.map(({ name }) => name)
  const query = [
    linkQuery(solutions.map(({ scenario }) => scenario)),
    ...placeKeys({ ...PLAIN_PLACE, ...rulerPlaceOf(ask) }),
  ].join('&')
  return {
    scenarios,
    at: lines.at.map(rowOf),
    between: lines.between.map(rowOf),
    notes: notesOf([...lines.at, ...lines.between], names),
    complaints: rulerTyped(ask).complaints,
    downloads: DOWNLOADS.map(({ format, key }) => ({ format, link: `/api/ruler/table?${query}&format=${key}` })),
  }
}

function rowOf({ quantity, unit, cells }: RulerLine): RulerRow {
  const { key, symbol, label, digits } = quantity
  const texts = cells.map(({ value }) => (value === null ? null : rounded(value, digits)))
  return { key, symbol, label, unit, cells: texts }
}

/** `Steady light, comoving distance: …`, each reason once; what holds of all scenarios or of all rows does not name them. */
function notesOf(lines: readonly RulerLine[], names: readonly string[]): string[] {
  const told = new Map<string, string[]>()
  names.forEach((name, slot) => {
    for (const [because, labels] of reasonsOf(lines, slot)) {
      const text = `${labels.length === lines.length ? '' : labels.join(', ')}: ${because}.`
      told.set(text, [...(told.get(text) ?? []), name])
    }
  })
  return [...told].map(([text, some]) => {
    const whose = some.length === names.length && names.length > 1 ? '' : some.join(', ')
    const note = `${whose}${whose && !text.startsWith(':') ? ', ' : ''}${text}`.replace(/^: /, '')
    return `${note.charAt(0).toUpperCase()}${note.slice(1)}`
  })
}

/** Labels of the rows by the reason that their cells give. */
function reasonsOf(lines: readonly RulerLine[], slot: number): ReadonlyMap<string, readonly string[]> {
  const labels = new Map<string, string[]>()
  for (const { quantity, cells } of lines) {
    const because = cells[slot]?.because
    if (because) labels.set(because, [...(labels.get(because) ?? []), quantity.label])
  }
  return labels
}
