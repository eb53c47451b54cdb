/** The rows of a timetable. */
import type { Moment, Solution } from '../solve'
import { fixed, significant } from './number'
import { duration, fromNow, NEAR } from './time'

export interface MomentWords {
  readonly kind: Moment['kind']
  readonly label: string
  /** From now, in Gyr. */
  readonly when: string
  /** Redshift of what lies behind, scale factor of what lies ahead; empty where neither says anything. */
  readonly where: string
}

export function momentWords({ origin, end, moments }: Pick<Solution, 'origin' | 'end' | 'moments'>): MomentWords[] {
  return moments.map((moment) => ({
    kind: moment.kind,
    label: `${moment.kind === 'now' ? 'today' : moment.label}${apart(moment, origin.time, end.time)}`,
    when: whenOf(moment),
    where: whereOf(moment),
  }))
}

/** Close to the origin or the end, where the time from now says too little: by how much. */
function apart({ kind, time }: Moment, origin: number | null, end: number | null): string {
  if (time === null || kind === 'origin' || kind === 'now' || kind === 'end') return ''
  if (origin !== null && time > origin && time - origin < NEAR) return `, after ${duration(time - origin)}`
  if (end !== null && time < end && end - time < NEAR) return `, ${duration(end - time)} before`
  return ''
}

function whenOf({ kind, time }: Moment): string {
  if (kind === 'now') return 'now'
  if (time !== null) return fromNow(time)
  return kind === 'origin' ? '−∞' : '+∞'
}

function whereOf({ kind, time, scale, redshift }: Moment): string {
  if (kind === 'now' || scale === null || scale === 0) return ''
  const past = time === null ? kind === 'origin' : time < 0
  if (!past || redshift === null || redshift <= 0) return `a ${significant(scale, 3)}`
  return `z ${redshift < 20 ? fixed(redshift, 2) : significant(redshift, 4)}`
}
