/** The visible lines of a history; where it begins and ends the scale factor is known without asking. */
import { type Lines, placesAlong, type Ranges, type Source, sampleCurve } from './sample'
import type { Range } from './scale'
import type { Scales, Seen } from './window'

type Limits = Pick<Seen, 'origin' | 'end'>

export const linesOf = (solution: Limits, scales: Scales, ranges: Ranges): Lines =>
  sampleCurve(sourceOf(solution, scales, ranges.x), ranges)

function sourceOf(solution: Limits, scales: Scales, x: Range): Source {
  const known = new Map(limitsOf(solution))
  return {
    places: placesAlong(x, [0, ...specialTimes(solution)]),
    values: (times) => {
      const found = scales(times)
      return times.map((time, i) => known.get(time) ?? found[i] ?? null)
    },
  }
}

export function specialTimes({ origin, end }: Limits): number[] {
  return [origin.time, end.time, end.turnaround?.time ?? null].filter((time) => time !== null)
}

/** Those that the history itself may not include. */
function limitsOf({ origin, end }: Limits): [number, number][] {
  const points: [number, number][] = []
  if (origin.time !== null) points.push([origin.time, origin.scale])
  if (end.time !== null && end.scale !== null) points.push([end.time, end.scale])
  return points
}
