/** A galaxy that is followed: where it is, and until when its light sets out to reach us. */
import { significant, withUnit } from './number'
import { duration, isNow } from './time'

export interface Followed {
  readonly redshift: number
  /** Gly today; null where no line of sight leads there. */
  readonly distance: number | null
  /** Gyr from now, of the light that arrives today. */
  readonly seen: number | null
  /** Gyr from now, of the last light that ever arrives; null where there is no last. */
  readonly last: number | null
  /** True where there is no last light because light has no limit. */
  readonly always: boolean
}

export function galaxySentences({ redshift, distance, seen, last, always }: Followed): readonly string[] {
  const z = `z = ${redshift}`
  if (distance === null || seen === null) return [`Nothing is seen at ${z} in this universe.`]
  const today = `A galaxy seen at ${z} is ${withUnit(significant(distance, 3), 'Gly')} away today; its light took ${duration(-seen)}.`
  if (always) return [today, 'There is no last moment from which it can be seen.']
  if (last === null) return [today]
  return [today, `Light that it sends until ${when(last)} reaches us at some time, later light never.`]
}

function when(time: number): string {
  if (isNow(time)) return 'now'
  return time < 0 ? `${duration(-time)} ago` : `${duration(time)} from now`
}
