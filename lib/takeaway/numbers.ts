/** Every number of a solution that sentences and macros may state, by key: the measures, and the times of what happens. */
import { MEASURES } from '../quantities/measures'
import type { Solution } from '../solve'

export type Numbers = ReadonlyMap<string, number>

export function numbersOf({ measures, origin, end, moments }: Solution): Numbers {
  const found: (readonly [string, number | null | undefined])[] = [
    ...MEASURES.map(({ key }) => [key, measures[key].value] as const),
    ['originTime', origin.time],
    ['originScale', origin.scale],
    ['endTime', end.time],
    ['endScale', end.scale],
    ['turnTime', end.turnaround?.time],
    ['turnScale', end.turnaround?.scale],
    ['speedingTime', moments.findLast(({ kind, time }) => kind === 'acceleration-start' && (time ?? 1) <= 0)?.time],
    ['slowingTime', moments.findLast(({ kind, time }) => kind === 'acceleration-end' && (time ?? 1) <= 0)?.time],
  ]
  return new Map(found.flatMap(([key, value]) => (typeof value === 'number' ? [[key, value] as const] : [])))
}
