/** Whether a solution holds nothing but finite numbers in the order that time demands: what does not is not given out. */
import type { Solution } from '../solve'

export function isSane({ origin, end, measures, moments }: Solution): boolean {
  const times = [
    origin.time ?? Number.NEGATIVE_INFINITY,
    0,
    end.turnaround?.time ?? 0,
    end.time ?? Number.POSITIVE_INFINITY,
  ]
  const inOrder = times.every((time, i) => i === 0 || times[i - 1] <= time)
  const numbers = [
    ...[origin.time, origin.scale, end.time, end.scale, end.turnaround?.scale],
    ...Object.values(measures).flatMap(({ value, error }) => [value, error]),
    ...moments.flatMap(({ time, scale, redshift }) => [time, scale, redshift]),
  ]
  return inOrder && numbers.every((one) => one === null || one === undefined || Number.isFinite(one))
}
