/** Many places along one arm at once: the integrals to and from them, and E² there, as in place.ts. */
import { evaluatePairs } from '../numerics/chebyshev'
import type { Arm } from './arm'
import type { Span } from './event'
import { LEAST_EXPANSION, NEAR_TODAY, nearToday } from './place'
import type { Clock } from './tail'
import { elapsedIn, remainingIn } from './tail-integral'

export interface Places {
  readonly arm: Arm
  readonly count: number
  readonly N: Float64Array
  readonly inverseScale: Float64Array
  /** Index of the panel; their number for what lies in the tail. */
  readonly panel: Float64Array
  readonly s: Float64Array
  /** Where a run of places in one panel begins; the last entry is the count. */
  readonly starts: readonly number[]
}

export function startsOf(panel: Float64Array, count: number): readonly number[] {
  const starts = [0]
  for (let i = 1; i < count; i++) if (panel[i] !== panel[i - 1]) starts.push(i)
  starts.push(count)
  return starts
}

/** Integrals from the inner edges of the panels, or from the beginning of the tail. */
export type Within = Readonly<Record<Clock, Float64Array>>

/** Calls back for every run of places in one panel. */
function forPanels({ starts, panel }: Places, use: (panel: number, from: number, to: number) => void): void {
  for (let run = 1; run < starts.length; run++) use(panel[starts[run - 1]], starts[run - 1], starts[run])
}

export function withinInto(out: Within, places: Places): void {
  const { arm, s } = places
  forPanels(places, (index, from, to) => {
    if (index < arm.panels.length) {
      const panel = arm.panels[index]
      const scale = 2 / (panel.to - panel.from)
      evaluatePairs(out.time, out.conformal, panel.time.series, panel.conformal.series, s, panel.from, scale, from, to)
    } else {
      for (const clock of ['time', 'conformal'] as const)
        for (let i = from; i < to; i++) out[clock][i] = arm.tail ? elapsedIn(arm.tail[clock], s[i]) : 0
    }
  })
}

/** offset ± the integral from today, or to the end. */
export function spanInto(out: Float64Array, span: Span, places: Places, within: Within, clock: Clock): void {
  if (span.of === 'fromToday') fromTodayInto(out, span, places, within[clock], clock)
  else toEndInto(out, span, places, within[clock], clock)
}

function fromTodayInto(
  out: Float64Array,
  { offset, sign }: Span,
  places: Places,
  within: Float64Array,
  clock: Clock,
): void {
  const { arm, N } = places
  const sums = arm[clock].fromToday
  const near = NEAR_TODAY * arm.edges[1]
  forPanels(places, (index, from, to) => {
    const inner = sums[index]
    for (let i = from; i < to; i++) out[i] = offset + sign * (inner + within[i])
    if (index > 0) return
    for (let i = from; i < to; i++) {
      const m = Math.abs(N[i])
      if (m < near) out[i] = offset + sign * nearToday(arm, m, clock)
    }
  })
}

function toEndInto(
  out: Float64Array,
  { offset, sign }: Span,
  places: Places,
  within: Float64Array,
  clock: Clock,
): void {
  const { arm, s } = places
  const { toEnd, total } = arm[clock]
  forPanels(places, (index, from, to) => {
    if (index < arm.panels.length) {
      const [left, whole] = [toEnd[index], arm.panels[index][clock].total]
      for (let i = from; i < to; i++) out[i] = offset + sign * (left + (whole - within[i]))
    } else {
      const none = total === Number.POSITIVE_INFINITY ? total : 0
      for (let i = from; i < to; i++) out[i] = offset + sign * (arm.tail ? remainingIn(arm.tail[clock], s[i]) : none)
    }
  })
}

/**
 * E² by the form that rounds least: as the model has it, and where a zone or a tail knows it better, by that. NaN where it leaves the
 * doubles.
 */
export function expansionsAt(out: Float64Array, places: Places): void {
  const { arm, count, N, inverseScale, s } = places
  arm.model.expansionsInto(out, N, inverseScale, 0, count)
  forPanels(places, (index, from, to) => {
    const zone = index < arm.panels.length ? arm.panels[index].zone : null
    const form = zone?.plain ? null : (zone ?? arm.tail)
    if (form !== null) for (let i = from; i < to; i++) out[i] = form.expansion(s[i])
  })
  // A store of its own, since a choice between a number and NaN makes an object for every row.
  if (arm.end.kind === 'none') for (let i = 0; i < count; i++) if (out[i] < LEAST_EXPANSION) out[i] = Number.NaN
}
