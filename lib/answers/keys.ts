/** The keys of a query, strictly: each known and at most once, but for the scenarios. */

import { type Fault, fault } from '../scenario/problems'
import { MOST_SCENARIOS } from '../scenario/query'

export const SCENARIO = 's'

export interface Keys {
  /** Every `s`, in order. */
  readonly codes: readonly string[]
  /** The others. A map, since `__proto__` is as good a key as any. */
  readonly values: ReadonlyMap<string, string>
  readonly faults: readonly Fault[]
}

/** `pairs` are those of the query, decoded once. */
export function readKeys(pairs: Iterable<readonly [string, string]>, known: readonly string[]): Keys {
  const codes: string[] = []
  const values = new Map<string, string>()
  const faults: Fault[] = []
  for (const [key, value] of pairs) {
    if (key === SCENARIO) codes.push(value)
    else if (!known.includes(key)) faults.push(unknown(key, value, known))
    else if (values.has(key)) faults.push(fault(key, value, 'once', `${key} stands more than once.`))
    else values.set(key, value)
  }
  return { codes, values, faults }
}

function unknown(key: string, value: string, known: readonly string[]): Fault {
  const allowed = `one of ${[`${SCENARIO} (up to ${MOST_SCENARIOS} times)`, ...known].join(', ')}`
  return fault(key, value, allowed, 'There is no such parameter.')
}
