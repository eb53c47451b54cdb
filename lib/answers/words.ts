/** `/api/words`: sentences, macros and references to paste, for scenarios and their figure. */

import type { Chart } from '../figures/chart'
import { entryOf } from '../figures/entry'
import { longView } from '../figures/long-view'
import type { Reading } from '../scenario/scenario'
import { linkQuery } from '../scenario/write'
import { ENGINE, type Solution } from '../solve'
import { macrosOf } from '../takeaway/macros'
import { methodsOf } from '../takeaway/methods'
import { type PressCard, pressOf } from '../takeaway/press'
import { bibtex, type Edition } from '../takeaway/sources'
import { summaryOf } from '../takeaway/summary'
import { type Known, knownOf } from '../takeaway/told'
import { nameOf } from '../words/desk'
import { readKeys } from './keys'
import { mapped, type Pairs, type Question, scenariosOf, solved } from './question'
import type { Home } from './table'

export interface Words {
  readonly engine: string
  readonly figure: { readonly caption: string; readonly alternative: string }
  readonly scenarios: readonly ScenarioWords[]
  readonly macros: string
  readonly bibtex: string
}

export interface ScenarioWords {
  readonly code: string
  readonly label: string
  readonly caption: string
  readonly alternative: string
  readonly summary: string
  readonly methods: string
  readonly press: PressCard
}

export function askWords(pairs: Pairs, home: Home): Reading<Question<Words>> {
  const keys = readKeys(pairs, [])
  return mapped(scenariosOf(keys.codes, keys.faults), (scenarios) => {
    const query = linkQuery(scenarios)
    const edition = { version: home.version, engine: ENGINE, link: `${home.base}/?${query}&engine=${ENGINE}` }
    return {
      canonical: query,
      answer: () =>
        mapped(
          solved(scenarios, (one) => one),
          (solutions) => wordsOf(solutions, edition),
        ),
    }
  })
}

export function wordsOf(solutions: readonly Solution[], edition: Edition): Words {
  const named = solutions.map((one, slot) => ({ ...one, label: nameOf(one.scenario, slot) }))
  const known = named.map(knownOf)
  const figure = figureOf(named)
  return {
    engine: ENGINE,
    figure: { caption: withOrigin(figure, named, edition), alternative: alternativeOf(figure, known) },
    scenarios: known.map((one) => {
      const alone = named.length === 1 ? figure : figureOf([one.solution])
      return {
        code: one.solution.code,
        label: one.solution.label,
        caption: withOrigin(alone, [one.solution], edition),
        alternative: alternativeOf(alone, [one]),
        summary: summaryOf(one),
        methods: methodsOf(one.solution, edition),
        press: pressOf(one),
      }
    }),
    macros: macrosOf(known, edition),
    bibtex: bibtex(named, edition),
  }
}

/** The long view of these scenarios. */
export const figureOf = (solutions: readonly Solution[]): Chart => longView(solutions.map(entryOf))

/** The frame of the figure in its own words, and each curve in numbers that are known. */
function alternativeOf({ alternative }: Chart, known: readonly Known[]): string {
  const [frame = ''] = alternative.split(/(?<=\.) /)
  return [frame, ...known.map((one) => `${one.solution.label}: ${summaryOf(one)}`)].join(' ')
}

/** A caption that stands on its own: which scenarios, and who computed them. */
function withOrigin({ caption }: Chart, solutions: readonly Solution[], { version, engine }: Edition): string {
  const names = solutions.map(({ label, code, scenario }) =>
    scenario.name === null ? code : `${label} (${code.replace(/,as:.*/, '')})`,
  )
  return `${caption} ${solutions.length > 1 ? 'Scenarios' : 'Scenario'}: ${names.join('; ')}. Longhence ${version}, engine ${engine}.`
}
