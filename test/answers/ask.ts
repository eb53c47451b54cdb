/** Questions as a route asks them. */
import type { Question } from '../../lib/answers/question'
import type { Problem, Reading } from '../../lib/scenario/scenario'

type Ask<T> = (pairs: URLSearchParams) => Reading<Question<T>>

export function answerOf<T>(ask: Ask<T>, query: string): T {
  const answer = questionOf(ask, query).answer()
  if (!answer.ok) throw new Error(JSON.stringify(answer.problems))
  return answer.value
}

export function questionOf<T>(ask: Ask<T>, query: string): Question<T> {
  const reading = ask(new URLSearchParams(query))
  if (!reading.ok) throw new Error(`${query}: ${JSON.stringify(reading.problems)}`)
  return reading.value
}

export function problemsOf(ask: Ask<unknown>, query: string): readonly Problem[] {
  const reading = ask(new URLSearchParams(query))
  if (reading.ok) throw new Error(`${query} is taken`)
  return reading.problems
}
