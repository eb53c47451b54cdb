/** Every figure there is, for scenarios that try them hard: to look at, and to be tested. */
import type { Chart } from '../figures/chart'
import { VIEWS } from '../figures/views'
import { DEMO } from '../scenario/demo'
import { nameOf } from '../words/desk'
import { PLAIN_PLACE, type Place } from '../words/place'
import { longChart } from './long-panel'
import { opened } from './opened'
import { viewChart } from './panel'

export interface Collection {
  readonly key: string
  readonly title: string
  readonly codes: readonly string[]
}

export const COLLECTIONS: readonly Collection[] = [
  { key: 'demo', ...DEMO },
  {
    key: 'six',
    title: 'Six at once',
    codes: [
      'h0:70,matter:0.3,as:Flat',
      'h0:70,matter:1.4,dark:0,as:Closed and heavy',
      'h0:70,matter:0.3,dark:0,as:Open',
      'h0:70,matter:1,cmb:0,as:Matter alone',
      'h0:70,matter:0.3,eos:constant,w:-1.5,as:Phantom',
      'h0:70,matter:0.3,eos:field,v:linear,slope:0.9,as:Rolling field',
    ],
  },
  {
    key: 'strange',
    title: 'No beginning, a bounce, nothing at all',
    codes: [
      'h0:70,matter:0,cmb:0,as:Only a constant',
      'h0:70,matter:0.1,dark:2,cmb:0,as:Bounce',
      'h0:70,matter:0,dark:0,cmb:0,as:Empty',
    ],
  },
  { key: 'one', title: 'One alone', codes: ['h0:70,matter:0.3,as:A scenario with a rather long name'] },
]

export interface Exhibit {
  readonly place: Place
  readonly chart: Chart
}

/** Every view with all that it shows, each against its first axis, the first one compared, and some of the others. */
export function exhibitsOf({ codes }: Collection, wanted: (index: number) => boolean = () => true): readonly Exhibit[] {
  const solutions = opened(codes).solutions.map((one, slot) => ({ ...one, label: nameOf(one.scenario, slot) }))
  const places = placesOf(solutions.length > 1).filter((_, index) => wanted(index))
  return places.map((place) => {
    const subject = { solutions, place }
    return { place, chart: place.view === null ? longChart(subject) : viewChart(subject) }
  })
}

/** The long view first. */
function placesOf(several: boolean): readonly Place[] {
  const views = VIEWS.flatMap(({ key: view, shows }) =>
    shows.flatMap(({ key: show, by, compare }) => [
      ...by.map((axis) => ({ ...PLAIN_PLACE, view, show, by: axis })),
      ...(several ? compare.map((how) => ({ ...PLAIN_PLACE, view, show, compare: how })) : []),
    ]),
  )
  return [PLAIN_PLACE, { ...PLAIN_PLACE, time: 'log' }, { ...PLAIN_PLACE, from: -14, to: 10 }, ...views]
}
