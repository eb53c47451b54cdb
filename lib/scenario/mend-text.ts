/** Splits a code that the strict reader refused: other separators, decimal commas, a second layer of encoding. */
import { type Pair, splitPairs } from './pairs'
import { clip } from './problems'

const MOST_CHARACTERS = 4000

/** Pairs with trimmed, lower-case keys; a name keeps its case. Adds to `changes` what it took for what. Never throws. */
export function loosePairs(text: string, changes: string[]): Pair[] {
  const plain = decodedAgain(text.slice(0, MOST_CHARACTERS)).replace(/^\?/, '').replace(/^s=/, '')
  const start = plain.search(/(?:^|[,;&])\s*as\s*[:=]/i)
  const head = start < 0 ? plain : plain.slice(0, start)
  const tail = start < 0 ? [] : [{ key: 'as', value: plain.slice(start).replace(/^.*?[:=]/s, '') }]
  const pieces = withDecimalPoints(head.replace(/[;&]/g, ',').split(','), changes)
  return [...pieces.flatMap((piece) => splitPairs(piece.replace('=', ':'))).map(trimmed), ...tail]
}

/** A link that was encoded twice has no colon left. */
function decodedAgain(text: string): string {
  if (!/%3A/i.test(text) || text.includes(':')) return text
  try {
    return decodeURIComponent(text)
  } catch {
    return text
  }
}

/** `matter:0,3` falls apart into `matter:0` and `3`; a piece of digits alone can be nothing but the decimals. */
function withDecimalPoints(pieces: readonly string[], changes: string[]): string[] {
  const whole: string[] = []
  for (const piece of pieces) {
    const before = whole.at(-1) ?? ''
    const decimals = /^\s*\d+(?:e[+-]?\d+)?(?:_[+-]?\d+)*\s*$/i.test(piece) && /[:=_]\s*[+−-]?\d+$/.test(before)
    if (decimals) {
      whole[whole.length - 1] = `${before}.${piece.trim()}`
      changes.push(`The decimal comma is read as a point: ${clip(`${before}.${piece}`.trim())}.`)
    } else whole.push(piece)
  }
  return whole
}

function trimmed({ key, value }: Pair): Pair {
  return { key: key.trim().toLowerCase(), value: value === null ? null : value.trim() }
}
