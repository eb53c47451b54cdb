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

const CHANGES: readonly Moment['kind'][] = ['acceleration-start', 'acceleration-end']
/** Of the changes of the sign of ä ahead so many are told, and the last. */
const FEW = 4

export function momentWords({ moments }: Pick<Solution, 'moments'>): MomentWords[] {
  const swings = moments.filter(({ kind, time }) => CHANGES.includes(kind) && time !== null && time > 0)
  const skipped = new Set(swings.slice(FEW, -1))
  const more = (moment: Moment) =>
    skipped.size > 0 && moment === swings[FEW - 1] ? `, and ${skipped.size} changes more` : ''
  const shown = moments.filter((moment) => !skipped.has(moment))
  return shown.map((moment) => ({
    kind: moment.kind,
    label: `${moment.kind === 'now' ? 'today' : moment.label}${apart(moment)}${more(moment)}`,
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
