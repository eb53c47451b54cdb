/** The long view: scale factor against cosmic time, as plain data. Whoever draws it chooses sizes and colours. */
import type { Solution } from '../solve'
import { extrapolates } from '../words/beyond'
import { END_NAMES, endLabel, endsInTime } from '../words/ending'
import { longViewCaption, longViewText } from './caption'
import { type Eras, erasOf } from './eras'
import { type Readings, readingsOf } from './readings'
import { type Point, sampleCurve } from './sample'
import { type Entry, type Window, windowOf } from './window'

export type Drawn = Pick<Solution, 'scenario' | 'code' | 'label' | 'origin' | 'end' | 'measures' | 'moments'>

/** What is put where a curve stops. */
export type Mark =
  /** Where a history begins or turns: a ring. */
  | { readonly kind: 'ring'; readonly at: Point }
  /** Where a history ends: a cross. */
  | { readonly kind: 'cross'; readonly at: Point }
  /** Where it leaves the window: an arrow along the curve. */
  | { readonly kind: 'arrow'; readonly at: Point; readonly from: Point }

export interface Curve {
  /** Place in the list of scenarios: hue and dash follow from it. */
  readonly slot: number
  readonly code: string
  readonly name: string
  /** The visible parts in the order of time. */
  readonly segments: readonly (readonly Point[])[]
  readonly marks: readonly Mark[]
  /** Beside the name: what becomes of it. */
  readonly note: string
  /** Where the label belongs; null where nothing of the curve is in the window. */
  readonly finish: { readonly at: Point; readonly edge: 'top' | 'right' | 'inside' } | null
  /** The time of a rip within the window, which the curve approaches. */
  readonly asymptote: number | null
  /** The ending by name, and its time where it has one. */
  readonly ending: string
  /** Null where the contents are not known. */
  readonly eras: Eras | null
  /** True where the future is the extrapolation of a law fitted to the past. */
  readonly extrapolated: boolean
}

export interface LongView {
  readonly window: Window
  readonly curves: readonly Curve[]
  /** For a cursor: it reads all curves at once. */
  readonly readings: Readings
  /** True where a future is the extrapolation of a law fitted to the past. */
  readonly hatched: boolean
  readonly caption: string
  readonly alternative: string
}

export function longView(entries: readonly Entry<Drawn>[]): LongView {
  const window = windowOf(entries)
  const solutions = entries.map(({ solution }) => solution)
  const curves = entries.map((entry, slot) => curveOf(entry, slot, window))
  return {
    window,
    curves,
    readings: readingsOf(entries, window),
    hatched: curves.some(({ extrapolated }) => extrapolated),
    caption: longViewCaption(solutions, {
      marks: new Set(curves.flatMap(({ marks }) => marks.map(({ kind }) => kind))),
      ribbons: curves.some(({ eras }) => eras !== null),
    }),
    alternative: longViewText(solutions, window),
  }
}

function curveOf(entry: Entry<Drawn>, slot: number, window: Window): Curve {
  const { solution } = entry
  const segments = sampleCurve(entry, window)
  const finish = finishOf(segments, window)
  const asymptote = asymptoteOf(solution, window)
  return {
    slot,
    code: solution.code,
    name: solution.label,
    segments: segments.map((segment) => segment.map(rounded)),
    marks: [...startMarks(solution, segments, window), ...endMarks(solution, segments, window)],
    note: asymptote === null ? noteOf(solution, window) : '',
    finish,
    asymptote,
    ending: endLabel(solution),
    eras: entry.contents ? erasOf(entry.contents, window) : null,
    extrapolated: extrapolates(solution.scenario),
  }
}

/** Far finer than a screen, and half as long on its way there. */
function rounded([time, scale]: Point): Point {
  return [Number(time.toPrecision(6)), Number(scale.toPrecision(6))]
}

function noteOf({ end }: Drawn, { to }: Window): string {
  if (end.kind === 'oscillating' || !endsInTime(end.kind)) return END_NAMES[end.kind]
  return end.time !== null && end.time <= to ? endLabel({ end }) : `later: ${endLabel({ end })}`
}

function asymptoteOf({ end }: Pick<Drawn, 'end'>, { to }: Window): number | null {
  return end.kind === 'rip' && end.time !== null && end.time <= to ? end.time : null
}

function finishOf(segments: Curve['segments'], { to, top }: Window): Curve['finish'] {
  const at = segments.at(-1)?.at(-1)
  if (!at) return null
  if (at[1] >= top) return { at, edge: 'top' }
  return { at, edge: at[0] >= to ? 'right' : 'inside' }
}

function startMarks({ origin }: Drawn, segments: Curve['segments'], window: Window): Mark[] {
  const marks: Mark[] = []
  if (origin.time !== null && origin.time >= window.from && origin.scale <= window.top) {
    marks.push({ kind: 'ring', at: [origin.time, origin.scale] })
  }
  const [at, from] = segments[0] ?? []
  const begins = origin.kind === 'big-bang' || origin.kind === 'singular'
  if (at && from && !(begins && origin.time === at[0])) marks.push({ kind: 'arrow', at, from })
  return marks
}

function endMarks({ end }: Drawn, segments: Curve['segments'], window: Window): Mark[] {
  const [from, at] = segments.at(-1)?.slice(-2) ?? []
  if (!at || !from) return []
  const asymptote = asymptoteOf({ end }, window)
  if (asymptote !== null)
    return [
      { kind: 'arrow', at, from },
      { kind: 'cross', at: [asymptote, window.top] },
    ]
  const inside = endsInTime(end.kind) && end.time !== null && end.time <= window.to
  return [inside ? { kind: 'cross', at } : { kind: 'arrow', at, from }]
}
