/** Who answers: the server, or where it cannot be reached or breaks down, this browser. */
import type { Routes } from '../../public/longhence'
import { answered } from './here'
import type { Question } from './worker'

type Route = '/api/ruler' | '/api/words'
type Answer<Asked extends Route> = Routes[Asked]['answers']['application/json']

export async function answerTo<Asked extends Route>(
  question: Question & { readonly route: Asked },
  signal: AbortSignal,
): Promise<Answer<Asked>> {
  const response = await fetch(`${question.route}?${question.asked}`, { signal }).catch(() => null)
  if (response?.ok) return response.json()
  signal.throwIfAborted()
  // What the server refuses is refused here too.
  const text = response && response.status < 500 ? null : await answered(question)
  if (text !== null) return JSON.parse(text)
  throw new Error(response ? `The server answered with ${response.status}.` : 'The server cannot be reached.')
}
