/** The pairs of a code as a map, each key once. */
import { type Pair, splitPairs } from './pairs'
import { OWN_KEYS } from './parameters'
import { type Fault, fault } from './problems'

/** Name of the query parameter: where a fault stands that belongs to no key. */
export const QUERY = 's'

const EXAMPLE = 'pairs such as matter:0.3,h0:70'

export interface Given {
  readonly texts: ReadonlyMap<string, string>
  readonly faults: readonly Fault[]
}

export function readPairs(text: string): Given {
  const texts = new Map<string, string>()
  if (text === '') return { texts, faults: [fault(QUERY, text, EXAMPLE, 'The scenario code is empty.')] }
  const faults: Fault[] = []
  for (const pair of splitPairs(text)) {
    const found = pairFault(pair, texts)
    if (found) faults.push(found)
    else texts.set(pair.key, pair.value ?? '')
  }
  return { texts, faults }
}

function pairFault({ key, value }: Pair, earlier: ReadonlyMap<string, string>): Fault | null {
  if (key === '') return fault(QUERY, value === null ? '' : `:${value}`, EXAMPLE, 'A pair has no key.')
  if (value === null) return bareFault(key)
  if (earlier.has(key)) return fault(key, value, 'once', `${key} stands more than once.`)
  return null
}

/** A piece without a colon: a key that lost its value, or the rest of a number with a decimal comma. */
function bareFault(piece: string): Fault {
  if (OWN_KEYS.has(piece)) return fault(piece, '', 'key:value', `${piece} has no value.`)
  const hint = /^\d+$/.test(piece) ? ' Decimals take a point, since a comma ends the pair.' : ''
  return fault(QUERY, piece, EXAMPLE, `A pair has no colon.${hint}`)
}
