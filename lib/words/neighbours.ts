/** What the next ending hangs on, in a sentence. */
import type { EndKind } from '../history/outcome'
import type { Nearest } from '../neighbours/nearest'
import type { Scenario } from '../scenario/scenario'
import { significant } from './number'

const WOULD: Readonly<Record<EndKind, string>> = {
  crunch: 'end in a Big Crunch',
  rip: 'end in a Big Rip',
  'little-rip': 'expand without bound, in a little rip',
  exponential: 'expand for ever, exponentially',
  accelerating: 'expand for ever at a rising pace',
  coasting: 'expand for ever at a pace that becomes steady',
  decelerating: 'expand for ever at a falling pace',
  static: 'come to rest',
  singular: 'end in a singularity',
  oscillating: 'oscillate for ever',
}

/** `With Ω_m above 1.70 it would end in a Big Crunch, Ω_k closing the budget.` Symbols are in the markup of labels. */
export function nearestEnding({ closure }: Scenario, { symbol, value, where, apart, to }: Nearest): string {
  const closing = closure.given === 'dark' ? 'Ω_k' : 'Ω_DE'
  return `With ${apart ? '' : 'any '}${symbol} ${where} ${significant(value, 3)} it would ${WOULD[to]}, ${closing} closing the budget.`
}
