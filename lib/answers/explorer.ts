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

/** What a hand that drags may leave out. */
export type Part = 'view' | 'words'

type Words = Pick<Explorer, 'scenarios' | 'moments' | 'measures'>
type Plain = Omit<Explorer, 'panel' | keyof Words>

/** While a hand drags: without what a cursor reads, and without what was not asked for. */
export interface Brief extends Plain {
  readonly scenarios: readonly (Tab & Partial<ScenarioView>)[]
  readonly moments: Explorer['moments'] | null
  readonly measures: Explorer['measures'] | null
  readonly panel: Panel | null
}

export function explorer(asked: Asked): Explorer {
  const sight = sightOf(asked)
  return { ...plain(sight, true), ...words(sight), panel: panelOf(sight.subject) }
}

export function brief(asked: Asked, parts: ReadonlySet<Part>): Brief {
  const sight = sightOf(asked)
  return {
    ...plain(sight, false),
    ...(parts.has('words') ? words(sight) : { scenarios: sight.desk.scenarios, moments: null, measures: null }),
    panel: parts.has('view') ? panelOf(sight.subject) : null,
  }
}

interface Sight {
  readonly address: Opened
  readonly subject: Subject
  readonly desk: Desk
  /** True where the address names no scenario. */
  readonly plain: boolean
}

function sightOf({ codes, keys, frame }: Asked): Sight {
  const address = opened(codes)
  const solutions = address.solutions.map(named)
  const scenarios = solutions.map(({ scenario }) => scenario)
  const place = settled(
    readPlace((key) => keys.get(key), scenarios.length),
    solutions,
  )
  const subject = { solutions, scenarios, place, frame: frame ?? null }
  return { address, subject, desk: deskOf(scenarios, place), plain: codes.length === 0 }
}

/** `read` is with what a cursor reads. */
function plain({ address, subject, desk, plain: titled }: Sight, read: boolean): Plain {
  return {
    ...desk,
    titled,
    title: titled ? DEMO.title : joined(subject.solutions.map(({ label }) => label)),
    long: longPanel(subject, read),
    refusal: address.problems.length === 0 ? null : refusalOf(address, desk.links.here),
  }
}

function words({ subject, desk }: Sight): Words {
  const { solutions, scenarios, place } = subject
  const focus = solutions[place.focus] as Solution
  return {
    scenarios: desk.scenarios.map((tab) => ({
      ...tab,
      ...told(solutions[tab.slot] as Solution, tab.slot, scenarios, place),
    })),
    moments: momentWords(focus),
    measures: measureWords(focus.measures),
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
