/** The view below the long one: its figure, its choices as links, and what has to be said beside it. */
import type { Axis, Chart } from '../figures/chart'
import { horizontalNamed } from '../figures/horizontal'
import { type Shown, shownOf } from '../figures/picture'
import { type Frame, VIEW_FRAMES } from '../figures/plot'
import { VIEWS } from '../figures/views'
import { type Asked, askedOf, GALAXY, type View } from '../figures/views/view'
import { aside, closer, ranged, TEMPLATE, wider } from '../figures/zoom'
import type { Scenario } from '../scenario/scenario'
import type { Solution } from '../solve'
import { pageLink } from '../words/link'
import type { Place } from '../words/place'

export interface Option {
  readonly word: string
  readonly link: string
  readonly chosen: boolean
}

export interface Choice {
  readonly label: string
  readonly options: readonly Option[]
}

/** Links that change the range of a horizontal axis. */
export interface Zoom {
  /** A link in which the ends of the range are still missing. */
  readonly template: string
  readonly closer: string
  readonly wider: string
  readonly earlier: string
  readonly later: string
  /** Null where the range is its own. */
  readonly reset: string | null
}

export interface Panel {
  readonly key: string
  readonly tabs: readonly Option[]
  readonly choices: readonly Choice[]
  readonly notes: readonly string[]
  /** Null where none is followed; `template` is a link in which its redshift is still missing. */
  readonly galaxy: { readonly redshift: number; readonly template: string } | null
  readonly zoom: Zoom
  readonly figure: Shown
}

export interface Subject {
  readonly solutions: readonly Solution[]
  readonly scenarios: readonly Scenario[]
  readonly place: Place
  /** Only for this frame; for all where null. */
  readonly frame: string | null
}

export const viewOf = ({ view }: Place): View => VIEWS.find(({ key }) => key === view) ?? VIEWS[0]

/** A place whose words for the view are all understood, and none of them a default. */
export function settled(place: Place, solutions: readonly Solution[]): Place {
  const view = viewOf(place)
  const { show, by, compare, galaxy } = askedOf(view, place, solutions)
  return {
    ...place,
    view: view === VIEWS[0] ? null : view.key,
    show: show === view.shows[0] ? null : show.key,
    by: by.key === show.by[0] ? null : by.key,
    compare: compare === 'value' ? null : compare,
    galaxy: galaxy === GALAXY ? null : galaxy,
  }
}

export function viewChart({ solutions, place }: Pick<Subject, 'solutions' | 'place'>): Chart {
  const view = viewOf(place)
  return view.chart(askedOf(view, place, solutions))
}

export function panelOf(subject: Subject): Panel {
  const { solutions, place, frame } = subject
  const view = viewOf(place)
  const asked = askedOf(view, place, solutions)
  const chart = view.chart(asked)
  const link = linker(subject)
  return {
    key: view.key,
    tabs: VIEWS.map(({ key, title }) => ({
      word: title,
      link: link({ ...FRESH, view: key }),
      chosen: key === view.key,
    })),
    choices: [...shows(view, asked, link), ...axes(asked, link), ...comparisons(asked, link)],
    notes: view.notes?.(asked) ?? [],
    galaxy: view.galaxy
      ? { redshift: asked.galaxy, template: link({ galaxy: SAMPLE }).replace(String(SAMPLE), 'GALAXY') }
      : null,
    zoom: zoomOf(chart.x, place, link, 'left', 'right'),
    figure: shownOf(chart, framesOf(VIEW_FRAMES, frame), `view-${view.key}`),
  }
}

/** What one view says means nothing in another. */
const FRESH = { view: null, show: null, by: null, compare: null, left: null, right: null }
const PLAIN_RANGE = { left: null, right: null }
/** A redshift that nobody asks for, to be replaced. */
const SAMPLE = 1234.5678
/** Ends of a range that nobody asks for. */
const SAMPLES = [-1234.5678, 8765.4321] as const

export const framesOf = (frames: readonly Frame[], id: string | null): readonly Frame[] => {
  const chosen = frames.filter((one) => one.id === id)
  return chosen.length > 0 ? chosen : frames
}

type Link = (change: Partial<Place>) => string

export function linker({ solutions, scenarios, place }: Subject): Link {
  return (change) => pageLink(scenarios, settled({ ...place, ...change }, solutions))
}

function shows({ shows: all, choice }: View, { show }: Asked, link: Link): Choice[] {
  const options = all.map(({ key, word }) => ({
    word,
    link: link({ show: key, by: null, compare: null, ...PLAIN_RANGE }),
    chosen: key === show.key,
  }))
  return options.length > 1 ? [{ label: choice, options }] : []
}

function axes({ show, by }: Asked, link: Link): Choice[] {
  const options = show.by.map((key) => ({
    word: horizontalNamed(key)?.word ?? key,
    link: link({ by: key, ...PLAIN_RANGE }),
    chosen: key === by.key,
  }))
  return options.length > 1 ? [{ label: 'Against', options }] : []
}

const COMPARED = { value: 'values', ratio: 'ratio to', difference: 'difference from' } as const

function comparisons({ show, compare, solutions, focus }: Asked, link: Link): Choice[] {
  if (solutions.length < 2 || show.compare.length === 0) return []
  const name = solutions[focus]?.label ?? ''
  const options = (['value', ...show.compare] as const).map((key) => ({
    word: key === 'value' ? COMPARED.value : `${COMPARED[key]} ${name}`,
    link: link({ compare: key }),
    chosen: key === compare,
  }))
  return [{ label: 'As', options }]
}

/** `first` and `last` are the keys of the place that hold the range. */
export function zoomOf<K extends 'from' | 'to' | 'left' | 'right'>(
  x: Axis,
  place: Place,
  link: Link,
  first: K,
  last: K,
): Zoom {
  const sample = link({ [first]: SAMPLES[0], [last]: SAMPLES[1] })
  const template = sample
    .replace(`${first}=${SAMPLES[0]}`, `${first}=${TEMPLATE.from}`)
    .replace(`${last}=${SAMPLES[1]}`, `${last}=${TEMPLATE.to}`)
  const own = place[first] === null && place[last] === null
  return {
    template,
    closer: ranged(template, closer(x, 0.5)),
    wider: ranged(template, wider(x, 0.5)),
    earlier: ranged(template, aside(x, -1)),
    later: ranged(template, aside(x, 1)),
    reset: own ? null : link({ [first]: null, [last]: null }),
  }
}
