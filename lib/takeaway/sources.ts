/** Which publications stand behind the numbers of scenarios. */
import { familyOf } from '../dark-energy'
import { MEASURES } from '../quantities/measures'
import { HOGG } from '../quantities/quantity'
import type { Solution } from '../solve'
import { bibtexOf, type Publication, publicationsIn, software } from './bibliography'

type Answered = Pick<Solution, 'scenario' | 'measures'>

/** Of the law, of the measures that have a value, and of distances. */
export function publicationsOf(solutions: readonly Answered[]): readonly Publication[] {
  const sources = solutions.flatMap(({ scenario, measures }) => [
    familyOf(scenario.eos).source,
    ...MEASURES.filter(({ key }) => measures[key].value !== null).map(({ source }) => source),
  ])
  return [...new Set([...sources, HOGG].flatMap(publicationsIn))]
}

/** The year of the version, as CITATION.cff has it. */
const YEAR = '2026'

export interface Edition {
  readonly version: string
  readonly engine: string
  /** Opens the scenarios; empty where no address is known. */
  readonly link: string
}

export const bibtex = (solutions: readonly Answered[], { version, engine, link }: Edition): string =>
  `${[software(version, engine, link, YEAR), ...publicationsOf(solutions).map(bibtexOf)].join('\n\n')}\n`
