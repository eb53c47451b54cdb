/** Splits a scenario code into its pairs; `as` takes the whole rest, commas and colons included. */

export interface Pair {
  readonly key: string
  /** Null where the pair has no colon. */
  readonly value: string | null
}

const NAME = 'as:'

export function splitPairs(text: string): Pair[] {
  const pairs: Pair[] = []
  for (let from = 0; from <= text.length; ) {
    if (text.startsWith(NAME, from)) return [...pairs, { key: 'as', value: text.slice(from + NAME.length) }]
    const comma = text.indexOf(',', from)
    const to = comma < 0 ? text.length : comma
    pairs.push(pairOf(text.slice(from, to)))
    from = to + 1
  }
  return pairs
}

function pairOf(text: string): Pair {
  const colon = text.indexOf(':')
  return colon < 0 ? { key: text, value: null } : { key: text.slice(0, colon), value: text.slice(colon + 1) }
}
