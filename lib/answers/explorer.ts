/** Everything the explorer shows, from the texts of an address: what a page needs and nothing to compute. */
import { nearestOf } from '../neighbours/nearest'
import { DEMO } from '../scenario/demo'
import { readScenario } from '../scenario/read'
import type { Problem, Scenario } from '../scenario/scenario'
import type { Solution } from '../solve'
import { otherBeyond } from '../words/beyond'
import { type Desk, deskOf, nameOf, type Tab } from '../words/desk'
import { pageLink } from '../words/link'
import { type MeasureWords, measureWords } from '../words/measures'
import { type MomentWords, momentWords } from '../words/moments'
import { type Place, readPlace } from '../words/place'
import { joined } from '../words/sentence'
import { type Verdict, verdictOf } from '../words/verdict'
import { lately } from './lately'
import { type LongPanel, longPanel } from './long-panel'
import { type Opened, opened, solutionOf } from './opened'
import { type Panel, panelOf, type Subject, settled } from './panel'

export interface Asked {
  /** Every `s`, decoded once. */
  readonly codes: readonly string[]
  /** The other keys of the address, which are read leniently. */
  readonly keys: ReadonlyMap<string, string>
  /** Id of the one frame that figures are drawn for; for all where absent. */
  readonly frame?: string | undefined
}

export interface ScenarioView extends Tab {
  readonly verdict: Verdict
  readonly because: string
  readonly proven: boolean
  readonly notices: readonly { readonly message: string; readonly link: string | null }[]
}

/** What was wrong with an address, and what is shown in its place. */
export interface Refusal {
  readonly problems: readonly Problem[]
  readonly changes: readonly string[]
  /** Opens what is shown; null where nothing could be saved and the demo stands in. */
  readonly link: string | null
}

export interface Explorer extends Desk {
  readonly title: string
  /** True where the title says more than the names of the scenarios. */
  readonly titled: boolean
  readonly scenarios: readonly ScenarioView[]
  readonly long: LongPanel
  readonly panel: Panel
  readonly moments: readonly MomentWords[]
  readonly measures: readonly MeasureWords[]
  readonly refusal: Refusal | null
}

/** While a hand drags, where the view below the long one is out of sight: without it and without what a cursor reads. */
export type Brief = Omit<Explorer, 'panel'> & { readonly panel: Panel | null }

export const explorer = (asked: Asked): Explorer => shown(asked, longPanel, panelOf)

export const brief = (asked: Asked): Brief =>
  shown(
    asked,
    (subject) => longPanel(subject, false),
    () => null,
  )

function shown<P>(
  asked: Asked,
  long: (subject: Subject) => LongPanel,
  below: (subject: Subject) => P,
): Omit<Explorer, 'panel'> & { readonly panel: P } {
  const address = opened(asked.codes)
  const solutions = address.solutions.map(named)
  const scenarios = solutions.map(({ scenario }) => scenario)
  const place = settled(
    readPlace((key) => asked.keys.get(key), scenarios.length),
    solutions,
  )
  const subject = { solutions, scenarios, place, frame: asked.frame ?? null }
  const desk = deskOf(scenarios, place)
  const focus = solutions[place.focus] as Solution
  const titled = asked.codes.length === 0
  return {
    ...desk,
    titled,
    title: titled ? DEMO.title : joined(solutions.map(({ label }) => label)),
    scenarios: desk.scenarios.map((tab) => ({
      ...tab,
      ...told(solutions[tab.slot] as Solution, tab.slot, scenarios, place),
    })),
    long: long(subject),
    panel: below(subject),
    moments: momentWords(focus),
    measures: measureWords(focus.measures),
    refusal: address.problems.length === 0 ? null : refusalOf(address, desk.links.here),
  }
}

function refusalOf({ problems, changes, kept }: Opened, link: string): Refusal {
  return { problems, changes, link: kept ? link : null }
}

function named(solution: Solution, slot: number): Solution {
  return { ...solution, label: nameOf(solution.scenario, slot) }
}

const nearestTo = lately(
  ({ code }: Solution) => code,
  ({ scenario }) => nearestOf(scenario),
)

function told(
  solution: Solution,
  slot: number,
  scenarios: readonly Scenario[],
  place: Place,
): Omit<ScenarioView, keyof Tab> {
  const other = otherBeyond(solution.scenario)
  return {
    verdict: verdictOf(solution, other && solutionOf(other), nearestTo(solution)),
    because: solution.end.because,
    proven: solution.end.proven,
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
