/** What a person has at hand to change the scenarios: tabs, form and links. Nothing of it needs a solution. */
import { budgetOf } from '../scenario/budget'
import { MOST_SCENARIOS, readQuery } from '../scenario/query'
import { readScenario } from '../scenario/read'
import type { Scenario } from '../scenario/scenario'
import { linkQuery, writeScenario } from '../scenario/write'
import { type Form, formOf } from './fields'
import { pageLink } from './link'
import { type Place, placePairs, readPlace, THEMES, type Theme } from './place'

export interface Tab {
  readonly slot: number
  readonly name: string
  /** Canonical, but with its name as typed: ready for a form. */
  readonly plainCode: string
  readonly link: string
}

export interface Desk {
  readonly place: Place
  /** The same, for the unseen fields of a form. */
  readonly placeFields: readonly (readonly [key: string, value: string])[]
  readonly scenarios: readonly Tab[]
  /** Of the scenario in focus. */
  readonly form: Form
  readonly links: {
    /** Opens what is shown, in every detail. */
    readonly here: string
    /** Null where there are six already. */
    readonly add: string | null
    readonly copy: string | null
    /** Null for the last one. */
    readonly remove: string | null
    readonly themes: readonly { readonly theme: Theme | null; readonly link: string }[]
    readonly data: string
    readonly tables: readonly { readonly format: string; readonly link: string }[]
  }
}

export function deskOf(scenarios: readonly Scenario[], place: Place): Desk {
  const chosen = scenarios[place.focus] as Scenario
  return {
    place,
    placeFields: placePairs(place),
    scenarios: scenarios.map((scenario, slot) => ({
      slot,
      name: nameOf(scenario, slot),
      plainCode: decodeURIComponent(writeScenario(scenario)),
      link: pageLink(scenarios, { ...place, focus: slot }),
    })),
    form: formOf(chosen, budgetOf(chosen)),
    links: linksOf(scenarios, place),
  }
}

/** The desk that an address opens, from its query decoded once; null where it cannot be read as written. */
export function readDesk(query: URLSearchParams): Desk | null {
  const reading = readQuery(query.getAll('s'))
  if (!reading.ok) return null
  return deskOf(
    reading.value,
    readPlace((key) => query.get(key), reading.value.length),
  )
}

/** A scenario without a name is called by its place in the list. */
export function nameOf({ name }: Scenario, slot: number): string {
  return name ?? `Scenario ${slot + 1}`
}

/** What `Add` adds: every parameter at its default. */
const PLAIN_CODE = 'eos:lambda'
const TABLES = [
  { format: 'CSV', key: 'csv' },
  { format: 'JSON', key: 'json' },
]

function linksOf(scenarios: readonly Scenario[], place: Place): Desk['links'] {
  const { focus } = place
  const chosen = scenarios[focus] as Scenario
  const full = scenarios.length >= MOST_SCENARIOS
  const plain = readScenario(PLAIN_CODE, null)
  const without = scenarios.filter((_, slot) => slot !== focus)
  const copied = scenarios.toSpliced(focus + 1, 0, { ...chosen, name: copyName(chosen.name) })
  return {
    here: pageLink(scenarios, place),
    add: full || !plain.ok ? null : pageLink([...scenarios, plain.value], { ...place, focus: scenarios.length }),
    copy: full ? null : pageLink(copied, { ...place, focus: focus + 1 }),
    remove: without.length === 0 ? null : pageLink(without, { ...place, focus: Math.max(0, focus - 1) }),
    themes: [null, ...THEMES].map((one) => ({ theme: one, link: pageLink(scenarios, { ...place, theme: one }) })),
    data: `/api/history?${linkQuery(scenarios)}`,
    tables: TABLES.map(({ format, key }) => ({ format, link: `/api/table?${linkQuery(scenarios)}&format=${key}` })),
  }
}

/** A copy bears the name with a number behind, as far as it fits. */
function copyName(name: string | null): string | null {
  if (name === null) return null
  const [, stem = name, count] = /^(.*?)(?: (\d+))?$/u.exec(name) ?? []
  const copy = `${stem} ${Number(count ?? 1) + 1}`
  return [...copy].length <= 60 ? copy : name
}
