/** Changes of the scenario in focus that are more than one field: a published set, the defaults, a retuned Hubble constant. */
import { isMissing, type Missing, missing } from '../measures/outcome'
import { KEPT, type Kept, keptValue, retunedH0 } from '../retune'
import { PUBLISHED_SETS } from '../scenario/presets'
import { renamed } from '../scenario/published-names'
import { readQuery } from '../scenario/query'
import { readScenario } from '../scenario/read'
import type { Scenario } from '../scenario/scenario'
import { nameOf } from './desk'
import { pageLink } from './link'
import { type Place, readPlace } from './place'

interface Opened {
  readonly scenarios: readonly Scenario[]
  readonly place: Place
  readonly chosen: Scenario
}

/** Null for an address that cannot be read as written. */
function openedBy(query: URLSearchParams): Opened | null {
  const reading = readQuery(query.getAll('s'))
  if (!reading.ok) return null
  const place = readPlace((key) => query.get(key), reading.value.length)
  return { scenarios: reading.value, place, chosen: reading.value[place.focus] as Scenario }
}

const replaced = ({ scenarios, place, chosen }: Opened, scenario: Scenario): string =>
  pageLink(scenarios.with(place.focus, renamed(chosen, scenario)), place)

/** The word of `set` that means every parameter at its default. */
export const DEFAULTS = 'defaults'

/** The page with the scenario in focus set to a published set, or to the defaults; null where either cannot be read. */
export function presetLink(query: URLSearchParams): string | null {
  const opened = openedBy(query)
  const key = query.get('set')
  if (opened === null) return null
  if (key === DEFAULTS) {
    const plain = readScenario('eos:lambda', null)
    return plain.ok ? replaced(opened, { ...plain.value, name: opened.chosen.name }) : null
  }
  const set = PUBLISHED_SETS.find((one) => one.key === key)
  if (!set) return null
  if (set.change) return replaced(opened, { ...opened.chosen, [set.change.key]: set.change.value })
  const reading = readScenario(set.code ?? '', null)
  return reading.ok ? replaced(opened, reading.value) : null
}

export interface Retuned {
  /** The page with H₀ retuned, or as it was. */
  readonly link: string
  /** What was to be kept, in words. */
  readonly wish: string
  /** Null where it is kept. */
  readonly because: string | null
}

/** `keep` is what, `of` whose: the number of a scenario from 1, or the key of a published set. */
export function retuned(query: URLSearchParams): Retuned | null {
  const opened = openedBy(query)
  const kept = KEPT.find(({ key }) => key === query.get('keep'))
  if (opened === null || !kept) return null
  const model = modelOf(kept, opened, query.get('of') ?? '')
  if (model === null) return null
  const wish = `the ${kept.label} of ${model.name}`
  const h0 = isMissing(model.value) ? model.value : retunedH0(kept, opened.chosen, model.value)
  if (isMissing(h0)) return { link: replaced(opened, opened.chosen), wish, because: h0.because }
  return { link: replaced(opened, { ...opened.chosen, h0 }), wish, because: null }
}

interface Model {
  readonly name: string
  readonly value: number | Missing
}

function modelOf(kept: Kept, { scenarios }: Opened, of: string): Model | null {
  const slot = /^[1-6]$/.test(of) ? Number(of) - 1 : -1
  const scenario = scenarios[slot]
  if (scenario) return { name: nameOf(scenario, slot), value: keptValue(kept, scenario) }
  const set = PUBLISHED_SETS.find((one) => one.key === of)
  if (!set) return null
  const printed = set.kept?.[kept.key]
  return { name: set.title, value: printed === undefined ? missing('it is not published') : Number(printed) }
}
