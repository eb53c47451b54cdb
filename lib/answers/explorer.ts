/** Everything the explorer shows, from the texts of an address: what a page needs and nothing to compute. */
import { contentsAt } from '../figures/contents'
import { type LongView, longView } from '../figures/long-view'
import type { Entry } from '../figures/window'
import { DEMO } from '../scenario/demo'
import { MOST_SCENARIOS } from '../scenario/query'
import { readScenario } from '../scenario/read'
import type { Problem, Scenario } from '../scenario/scenario'
import { linkQuery } from '../scenario/write'
import { type Solution, scalesAt } from '../solve'
import { otherBeyond } from '../words/beyond'
import { type Form, formOf } from '../words/fields'
import { type Place, pageLink, readPlace, THEMES, type Theme } from '../words/link'
import { type MeasureWords, measureWords } from '../words/measures'
import { type MomentWords, momentWords } from '../words/moments'
import { joined } from '../words/sentence'
import { type Verdict, verdictOf } from '../words/verdict'
import { type Opened, opened, solutionOf } from './opened'

export interface Asked {
  /** Every `s`, decoded once. */
  readonly codes: readonly string[]
  readonly focus: string | undefined
  readonly theme: string | undefined
}

export interface ScenarioView {
  readonly slot: number
  readonly name: string
  /** Canonical, but with its name as typed: ready for a form. */
  readonly plainCode: string
  readonly verdict: Verdict
  readonly because: string
  readonly proven: boolean
  readonly link: string
  readonly notices: readonly { readonly message: string; readonly link: string | null }[]
}

/** What was wrong with an address, and what is shown in its place. */
export interface Refusal {
  readonly problems: readonly Problem[]
  readonly changes: readonly string[]
  /** Opens what is shown; null where nothing could be saved and the demo stands in. */
  readonly link: string | null
}

export interface Explorer {
  readonly title: string
  /** True where the title says more than the names of the scenarios. */
  readonly titled: boolean
  readonly place: Place
  readonly scenarios: readonly ScenarioView[]
  readonly figure: LongView
  readonly form: Form
  readonly moments: readonly MomentWords[]
  readonly measures: readonly MeasureWords[]
  readonly refusal: Refusal | null
  readonly links: {
    /** Null where there are six already. */
    readonly add: string | null
    readonly copy: string | null
    /** Null for the last one. */
    readonly remove: string | null
    readonly themes: readonly { readonly theme: Theme | null; readonly link: string }[]
    readonly data: string
  }
}

export function explorer(asked: Asked): Explorer {
  const address = opened(asked.codes)
  const solutions = address.solutions.map(named)
  const scenarios = solutions.map(({ scenario }) => scenario)
  const place = readPlace(asked.focus, asked.theme, scenarios.length)
  const focus = solutions[place.focus] as Solution
  const titled = asked.codes.length === 0
  return {
    titled,
    title: titled ? DEMO.title : joined(solutions.map(({ label }) => label)),
    place,
    scenarios: solutions.map((solution, slot) => scenarioView(solution, slot, scenarios, place)),
    figure: longView(solutions.map(drawable)),
    form: formOf(focus.scenario, focus.budget),
    moments: momentWords(focus),
    measures: measureWords(focus.measures),
    refusal: address.problems.length === 0 ? null : refusalOf(address, pageLink(scenarios, place)),
    links: linksOf(scenarios, place),
  }
}

function refusalOf({ problems, changes, kept }: Opened, link: string): Refusal {
  return { problems, changes, link: kept ? link : null }
}

function drawable(solution: Solution): Entry<Solution> {
  return {
    solution,
    scales: (times) => scalesAt(solution, times),
    contents: (time) => contentsAt(solution, time),
  }
}

/** A scenario without a name is called by its place in the list. */
function named(solution: Solution, slot: number): Solution {
  return { ...solution, label: solution.scenario.name ?? `Scenario ${slot + 1}` }
}

function scenarioView(solution: Solution, slot: number, scenarios: readonly Scenario[], place: Place): ScenarioView {
  const other = otherBeyond(solution.scenario)
  return {
    slot,
    name: solution.label,
    plainCode: decodeURIComponent(solution.code),
    verdict: verdictOf(solution, other && solutionOf(other)),
    because: solution.end.because,
    proven: solution.end.proven,
    link: pageLink(scenarios, { ...place, focus: slot }),
    notices: solution.notices.map(({ message, code }) => ({
      message,
      link: code && replaced(code, slot, scenarios, place),
    })),
  }
}

/** The page with one scenario read from another code. */
function replaced(code: string, slot: number, scenarios: readonly Scenario[], place: Place): string | null {
  const reading = readScenario(decodeURIComponent(code), slot)
  return reading.ok ? pageLink(scenarios.with(slot, reading.value), place) : null
}

/** What `Add` adds: every parameter at its default. */
const PLAIN_CODE = 'eos:lambda'

function linksOf(scenarios: readonly Scenario[], place: Place): Explorer['links'] {
  const { focus, theme } = place
  const chosen = scenarios[focus] as Scenario
  const full = scenarios.length >= MOST_SCENARIOS
  const plain = readScenario(PLAIN_CODE, null)
  const without = scenarios.filter((_, slot) => slot !== focus)
  const copied = scenarios.toSpliced(focus + 1, 0, { ...chosen, name: copyName(chosen.name) })
  return {
    add: full || !plain.ok ? null : pageLink([...scenarios, plain.value], { theme, focus: scenarios.length }),
    copy: full ? null : pageLink(copied, { theme, focus: focus + 1 }),
    remove: without.length === 0 ? null : pageLink(without, { theme, focus: Math.max(0, focus - 1) }),
    themes: [null, ...THEMES].map((one) => ({ theme: one, link: pageLink(scenarios, { focus, theme: one }) })),
    data: `/api/history?${linkQuery(scenarios)}`,
  }
}

/** A copy bears the name with a number behind, as far as it fits. */
function copyName(name: string | null): string | null {
  if (name === null) return null
  const [, stem = name, count] = /^(.*?)(?: (\d+))?$/u.exec(name) ?? []
  const copy = `${stem} ${Number(count ?? 1) + 1}`
  return [...copy].length <= 60 ? copy : name
}
