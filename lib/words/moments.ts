/** The rows of a timetable. */
import type { Moment } from '../solve'
import { fixed, significant } from './number'
import { fromNow } from './time'

export interface MomentWords {
  readonly kind: Moment['kind']
  readonly label: string
  /** From now, in Gyr. */
  readonly when: string
  /** Redshift of what lies behind, scale factor of what lies ahead; empty where neither says anything. */
  readonly where: string
}

export function momentWords(moment: Moment): MomentWords {
  return { kind: moment.kind, label: moment.label, when: whenOf(moment), where: whereOf(moment) }
}

function whenOf({ kind, time }: Moment): string {
  if (kind === 'now') return 'now'
  if (time !== null) return fromNow(time)
  return kind === 'origin' ? '−∞' : '+∞'
}

function whereOf({ kind, time, scale, redshift }: Moment): string {
  if (kind === 'now' || scale === null || scale === 0) return ''
  const past = time === null ? kind === 'origin' : time < 0
  if (past && redshift !== null && redshift > 0)
    return `z ${redshift < 20 ? fixed(redshift, 2) : significant(redshift, 4)}`
  return `a ${significant(scale, 3)}`
}
