/** What a figure shows within its view: the keys of the page's address, read strictly. */
import type { z } from 'zod'
import { HORIZONTALS } from '../figures/horizontal'
import { VIEWS } from '../figures/views'
import { type Fault, fault } from '../scenario/problems'
import { MOST_SCENARIOS } from '../scenario/query'
import { FARTHEST_END, FARTHEST_GALAXY, PLAIN_PLACE, type Place } from '../words/place'
import { count, limited, oneOf, take } from './fields'

const SHOWS = [...new Set(VIEWS.flatMap(({ shows }) => shows.map(({ key }) => key)))].map((key) => ({ key }))
const COMPARISONS = [{ key: 'ratio' }, { key: 'difference' }] as const

const end = (key: string, meaning: string) => limited({ key, min: -FARTHEST_END, max: FARTHEST_END, unit: '' }, meaning)

export const PLACE_FIELDS = {
  focus: count('focus', 1, MOST_SCENARIOS, 'The scenario that comparisons refer to, counted from 1.'),
  time: oneOf('time', [{ key: 'log' }] as const, 'Of the long view: time in logarithmic steps away from now.'),
  from: end('from', 'Of the long view: where it begins, in Gyr from now.'),
  to: end('to', 'Of the long view: where it ends, in Gyr from now.'),
  show: oneOf('show', SHOWS, 'Of the other views: what they show.'),
  by: oneOf(
    'by',
    HORIZONTALS,
    `Of the other views: the horizontal axis, ${HORIZONTALS.map(({ key }) => key).join(', ')}.`,
  ),
  compare: oneOf('compare', COMPARISONS, 'Of the other views: over the scenario in focus, or less it.'),
  galaxy: limited(
    { key: 'galaxy', min: 0, above: true, max: FARTHEST_GALAXY, unit: '' },
    'Of the view reach: redshift of the galaxy that is followed.',
  ),
  left: end('left', 'Of the other views: where the axis begins, in its own unit.'),
  right: end('right', 'Of the other views: where the axis ends, in its own unit.'),
}

const LONG_KEYS = ['time', 'from', 'to']
const VIEW_KEYS = ['show', 'by', 'compare', 'galaxy', 'left', 'right']

/** Adds to `faults`; where it does, the place is not the one asked for. `view` is `long` or one of the others. */
export function readFigurePlace(
  view: string,
  values: ReadonlyMap<string, string>,
  scenarios: number,
  faults: Fault[],
): Place {
  const word = <T extends string>(key: string, field: z.ZodType<{ readonly key: T }, string>): T | null =>
    take(values, key, field, faults)?.key ?? null
  const figure = (key: string, field: z.ZodType<number, string>): number | null =>
    take(values, key, field, faults) ?? null
  const { focus, time, from, to, show, by, compare, galaxy, left, right } = PLACE_FIELDS
  const place: Place = {
    ...PLAIN_PLACE,
    view: view === 'long' ? null : view,
    focus: (figure('focus', focus) ?? 1) - 1,
    time: word('time', time),
    show: word('show', show),
    by: word('by', by),
    compare: word('compare', compare),
    from: figure('from', from),
    to: figure('to', to),
    left: figure('left', left),
    right: figure('right', right),
    galaxy: figure('galaxy', galaxy),
  }
  faults.push(...strangers(view, values), ...misfits(view, place), ...focusFaults(values, place.focus, scenarios))
  return place
}

/** Keys of another view. */
function strangers(view: string, values: ReadonlyMap<string, string>): Fault[] {
  return (view === 'long' ? VIEW_KEYS : LONG_KEYS)
    .filter((key) => values.has(key))
    .map((key) => fault(key, values.get(key) ?? '', 'nothing with this view', `view=${view} does not read ${key}.`))
}

/** Words that another view or another choice knows. */
function misfits(key: string, { show: shown, by, compare }: Place): Fault[] {
  const view = VIEWS.find((one) => one.key === key)
  if (!view) return []
  const show = shown === null ? view.shows[0] : view.shows.find((one) => one.key === shown)
  if (!show)
    return [
      oneFault(
        'show',
        shown,
        view.shows.map((one) => one.key),
        `view=${key}`,
      ),
    ]
  const axis = by === null || show.by.includes(by) ? [] : [oneFault('by', by, show.by, `show=${show.key}`)]
  const known = compare === null || show.compare.some((one) => one === compare)
  return known ? axis : [...axis, oneFault('compare', compare, show.compare, `show=${show.key}`)]
}

function oneFault(key: string, value: string | null, allowed: readonly string[], where: string): Fault {
  return fault(key, value ?? '', `one of ${allowed.join(', ')}`, `${where} does not know this word.`)
}

function focusFaults(values: ReadonlyMap<string, string>, focus: number, scenarios: number): Fault[] {
  if (focus < scenarios) return []
  return [
    fault('focus', values.get('focus') ?? '', `a whole number from 1 to ${scenarios}`, 'There is no such scenario.'),
  ]
}
