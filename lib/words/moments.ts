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

export function momentWords({ moments }: Pick<Solution, 'moments'>): MomentWords[] {
  return moments.map((moment) => ({
    kind: moment.kind,
    label: `${moment.kind === 'now' ? 'today' : moment.label}${apart(moment)}`,
    when: whenOf(moment),
    where: whereOf(moment),
  }))
}

/** Close to the origin or the end, where the time from now says too little: by how much. */
function apart({ kind, age, remaining }: Moment): string {
  if (kind === 'origin' || kind === 'now' || kind === 'end') return ''
  if (age !== null && age > 0 && age < NEAR) return `, after ${duration(age)}`
  if (remaining !== null && remaining > 0 && remaining < NEAR) return `, ${duration(remaining)} before`
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
  return `z ${redshift < 20 ? fixed(redshift, 2) : redshift < 1000 ? significant(redshift, 4) : fixed(redshift, 0)}`
}
