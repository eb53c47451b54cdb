/** What a cursor over the long view reads: every scale factor at the same times across the window. */
import type { Entry, Window } from './window'

export interface Readings {
  /** Gyr from now, ascending. */
  readonly times: readonly number[]
  /** For each curve its scale factors at these times, null where it is not there; they may lie above the window. */
  readonly scales: readonly (readonly (number | null)[])[]
}

/** Together with now, three special times of each of six scenarios, and both edges: 300 at most. */
const STEPS = 279

export function readingsOf(entries: readonly Entry[], window: Window): Readings {
  const times = timesOf(entries, window)
  return {
    times,
    scales: entries.map(({ scales }) => scales(times).map((scale) => (known(scale) ? digits(scale) : null))),
  }
}

function timesOf(entries: readonly Entry[], { from, to }: Window): number[] {
  const even = Array.from({ length: STEPS + 1 }, (_, i) => from + ((to - from) * i) / STEPS)
  const special = entries.flatMap(({ solution: { origin, end } }) => [
    origin.time,
    end.time,
    end.turnaround?.time ?? null,
  ])
  const inside = [...even, 0, ...special].filter((time) => time !== null && time >= from && time <= to) as number[]
  return [...new Set(inside.map(digits))].sort((one, other) => one - other)
}

const known = (scale: number | null): scale is number => scale !== null && Number.isFinite(scale)

/** As many as a screen can show and a read-out can use. */
function digits(value: number): number {
  return Number(value.toPrecision(7))
}
