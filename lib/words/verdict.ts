/** What becomes of a universe, in one or two sentences with the numbers that matter. */
import type { Nearest } from '../neighbours/nearest'
import { accelerationClause } from './acceleration'
import { beyondSentence } from './beyond'
import { endClause, endTail } from './ending'
import { nearestEnding } from './neighbours'
import { originClause } from './origin'
import { reachSentence } from './reach'
import { capital, joined } from './sentence'
import type { Told } from './told'

export interface Verdict {
  /** Origin, acceleration and ending, then what they lead to. */
  readonly sentences: readonly string[]
  /** What the ending owes to the law beyond today; null where that choice changes nothing. */
  readonly aside: string | null
  /** What the nearest other ending would take, in the markup of labels; null where none is near. */
  readonly nearest: string | null
}

/** `other`: the same scenario with the other choice of `beyond`, null where the law knows no difference. */
export function verdictOf(told: Told, other: Told | null, nearest: Nearest | null = null): Verdict {
  const clauses = [originClause(told), accelerationClause(told), endClause(told)].filter((clause) => clause !== null)
  const sentences = [`${capital(joined(clauses))}.`, endTail(told), reachSentence(told)].filter((one) => one !== null)
  return {
    sentences,
    aside: other === null ? null : beyondSentence(told, other),
    nearest: nearest && nearestEnding(told.scenario, nearest),
  }
}
