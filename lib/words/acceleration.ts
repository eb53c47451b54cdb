/** Since when the expansion speeds up or slows down, as a clause without a subject; null where the ending says it all. */
import type { Moment } from '../solve'
import { duration } from './time'
import type { Told } from './told'

type Change = Moment & { readonly time: number }

export function accelerationClause(told: Pick<Told, 'measures' | 'moments'>): string | null {
  const q = told.measures.deceleration.value
  if (q === null || q === 0) return null
  const changes = told.moments.filter(isChange)
  const last = changes.filter((one) => one.time <= 0).at(-1)
  return q < 0 ? speedingUp(last) : slowingDown(last, changes)
}

function speedingUp(last: Change | undefined): string {
  return last === undefined ? 'has accelerated throughout' : `has accelerated for ${duration(-last.time)}`
}

function slowingDown(last: Change | undefined, changes: readonly Change[]): string | null {
  const next = changes.find((one) => one.kind === 'acceleration-start' && one.time > 0)
  if (next !== undefined) return `slows down today, begins to accelerate in ${duration(next.time)}`
  return last === undefined ? null : `stopped accelerating ${duration(-last.time)} ago`
}

function isChange(moment: Moment): moment is Change {
  return moment.time !== null && (moment.kind === 'acceleration-start' || moment.kind === 'acceleration-end')
}
