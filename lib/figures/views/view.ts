/** What a view is: quantities to choose from, axes to choose from, and the figure that comes of it. */
import type { Solution } from '../../solve'
import type { Place } from '../../words/place'
import type { Chart } from '../chart'
import { type Horizontal, horizontalNamed } from '../horizontal'
import { fractionOf, type Range } from '../scale'

export type Comparison = 'value' | 'ratio' | 'difference'

/** What a view can show. */
export interface Show {
  readonly key: string
  /** In the choice. */
  readonly word: string
  /** Keys of horizontal axes; the first is the default. */
  readonly by: readonly string[]
  /** Ways to compare scenarios, beside the values themselves. */
  readonly compare: readonly Comparison[]
  /** True where it is of the scenario in focus alone. */
  readonly alone?: true
}

export interface View {
  readonly key: string
  readonly title: string
  /** The word before the choice of what is shown. */
  readonly choice: string
  /** The first is the default. */
  readonly shows: readonly [Show, ...Show[]]
  readonly chart: (asked: Asked) => Chart
  /** What has to be said beside the figure. */
  readonly notes?: (asked: Asked) => readonly string[]
  /** True where a person names a galaxy to be followed. */
  readonly galaxy?: true
}

export interface Asked {
  readonly solutions: readonly Solution[]
  readonly focus: number
  readonly show: Show
  readonly by: Horizontal
  readonly compare: Comparison
  readonly left: number | null
  readonly right: number | null
  readonly galaxy: number
}

/** Unless someone names another. */
export const GALAXY = 1

export const focusOf = ({ solutions, focus }: Asked): Solution => solutions[focus] as Solution

/** A place read in the words of a view: whatever is not one of its choices is its default. */
export function askedOf(view: View, place: Place, solutions: readonly Solution[]): Asked {
  const show = view.shows.find(({ key }) => key === place.show) ?? view.shows[0]
  const by = show.by.find((key) => key === place.by) ?? show.by[0] ?? ''
  const compare = solutions.length > 1 ? show.compare.find((key) => key === place.compare) : undefined
  return {
    solutions,
    focus: place.focus,
    show,
    by: horizontalNamed(by) as Horizontal,
    compare: compare ?? 'value',
    left: place.left,
    right: place.right,
    galaxy: place.galaxy ?? GALAXY,
  }
}

/** The scenarios that are drawn. */
export const drawnOf = <S>({ alone }: Show, all: readonly S[], focus: number): readonly S[] =>
  alone ? all.slice(focus, focus + 1) : all

/** The range that is asked for, as far as it is one of the axis; else its own. */
export function rangeOf({ by, solutions, left, right }: Asked, whole: boolean): Range {
  const own = by.range(solutions, whole)
  // An axis that begins at 0 has nothing before it.
  const least = own.from >= 0 ? Math.max(0, left ?? own.from) : (left ?? own.from)
  const wanted = { ...own, from: least, to: right ?? own.to }
  const good = wanted.to > wanted.from && Number.isFinite(fractionOf(wanted, own.from)) && legal(wanted)
  return good ? wanted : own
}

function legal({ scaling, from }: Range): boolean {
  return scaling !== 'log' || from > 0
}
