/** The long view: scale factor against cosmic time, with the eras of each scenario. */
import type { Solution } from '../solve'
import { extrapolates } from '../words/beyond'
import { END_NAMES, endLabel, endsInTime } from '../words/ending'
import { longViewCaption, longViewText } from './caption'
import type { Chart, Curve, Mark, Ribbon } from './chart'
import { specialTimes } from './lines'
import { NO_READINGS, type Readings, readingsOf } from './readings'
import { type Ranges, steady } from './sample'
import { linearRange, type Range } from './scale'
import { type Entry, type Wanted, type Window, windowOf } from './window'

export type Drawn = Pick<Solution, 'scenario' | 'budget' | 'code' | 'label' | 'origin' | 'end' | 'measures' | 'moments'>

const TIME = { quantity: 'time', label: 'time from now', symbol: '', unit: 'Gyr' }
const SCALE = { quantity: 'scale', label: 'scale factor', symbol: 'a', unit: '' }

/** `focus` is the scenario that is drawn strong; a `read` figure has what a cursor reads. */
export function longView(entries: readonly Entry<Drawn>[], focus = 0, wanted?: Wanted, read = true): Chart {
  const window = windowOf(entries, wanted)
  const { top, ...range } = window
  const ranges = { x: range, y: linearRange(0, top) }
  const solutions = entries.map(({ solution }) => solution)
  const curves = entries.map((entry, slot) => curveOf(entry, slot, slot === focus, ranges))
  const ribbons = entries.flatMap((entry, slot) => ribbonOf(entry, slot, window))
  const hatched = solutions.some(({ scenario }) => extrapolates(scenario))
  return {
    title: 'The long view',
    x: { ...TIME, ...range },
    y: { ...SCALE, ...ranges.y },
    curves,
    references: [],
    spots: [],
    ribbons,
    now: 0,
    future: hatched ? 'hatched' : 'tint',
    readings: read ? longReadings(entries, range) : NO_READINGS,
    caption: longViewCaption(solutions, {
      marks: new Set(curves.flatMap(({ marks }) => marks.map(({ kind }) => kind))),
      ribbons: ribbons.length > 0,
      logarithmic: range.scaling !== 'linear',
      future: window.to > 0,
    }),
    alternative: longViewText(solutions, window, ribbons),
  }
}

function longReadings(entries: readonly Entry<Drawn>[], x: Range): Readings {
  const special = entries.flatMap(({ solution }) => specialTimes(solution))
  return readingsOf(
    entries.map(({ scales }) => scales),
    x,
    [0, ...special],
  )
}

function ribbonOf({ eras, solution }: Entry<Drawn>, slot: number, window: Window): Ribbon[] {
  if (!eras) return []
  const extrapolated = extrapolates(solution.scenario)
  return [{ tone: `slot-${slot}`, dash: slot, eras: eras(window), extrapolated }]
}

function curveOf(entry: Entry<Drawn>, slot: number, strong: boolean, ranges: Ranges): Curve {
  const { solution } = entry
  const segments = entry.lines(ranges)
  const asymptote = asymptoteOf(solution, ranges)
  return {
    tone: `slot-${slot}`,
    dash: slot,
    name: solution.label,
    strong,
    segments: steady(segments, ranges),
    marks: [...startMarks(solution, segments, ranges), ...endMarks(solution, segments, ranges)],
    note: asymptote === null ? noteOf(solution, ranges) : '',
    finish: finishOf(segments, ranges),
    asymptote,
  }
}

function noteOf({ end }: Drawn, { x }: Ranges): string {
  if (end.kind === 'oscillating' || !endsInTime(end.kind)) return END_NAMES[end.kind]
  return end.time !== null && end.time <= x.to ? endLabel({ end }) : `later: ${endLabel({ end })}`
}

function asymptoteOf({ end }: Pick<Drawn, 'end'>, { x }: Ranges): Curve['asymptote'] {
  const seen = end.kind === 'rip' && end.time !== null && end.time >= x.from && end.time <= x.to
  return seen ? { at: end.time, label: endLabel({ end }) } : null
}

export function finishOf(segments: Curve['segments'], { x, y }: Ranges): Curve['finish'] {
  const at = segments.at(-1)?.at(-1)
  if (!at) return null
  if (at[1] >= y.to) return { at, edge: 'top' }
  return { at, edge: at[0] >= x.to ? 'right' : 'inside' }
}

function startMarks({ origin }: Drawn, segments: Curve['segments'], { x, y }: Ranges): Mark[] {
  const marks: Mark[] = []
  if (origin.time !== null && origin.time >= x.from && origin.time <= x.to && origin.scale <= y.to) {
    marks.push({ kind: 'ring', at: [origin.time, origin.scale] })
  }
  const [at, from] = segments[0] ?? []
  const begins = origin.kind === 'big-bang' || origin.kind === 'singular'
  if (at && from && !(begins && origin.time === at[0])) marks.push({ kind: 'arrow', at, from })
  return marks
}

function endMarks({ end }: Drawn, segments: Curve['segments'], ranges: Ranges): Mark[] {
  const { x, y } = ranges
  const [from, at] = segments.at(-1)?.slice(-2) ?? []
  const asymptote = asymptoteOf({ end }, ranges)
  const cross: Mark[] = asymptote === null ? [] : [{ kind: 'cross', at: [asymptote.at, y.to] }]
  if (!at || !from) return cross
  const inside =
    endsInTime(end.kind) && end.time !== null && end.time <= x.to && (end.scale ?? Number.POSITIVE_INFINITY) <= y.to
  return [inside ? { kind: 'cross', at } : { kind: 'arrow', at, from }, ...cross]
}
