/** JSON answers, remembered by what they answer until the memory for them is full; the least asked for make room. */
import { LRUCache } from 'lru-cache'
import type { Question } from '../../lib/answers/question'
import type { Reading } from '../../lib/scenario/scenario'
import type { Body } from './reply'

const BYTES = 32 * 2 ** 20

const answers = new LRUCache<string, Uint8Array<ArrayBuffer>>({
  maxSize: BYTES,
  sizeCalculation: (bytes, place) => bytes.length + 2 * place.length,
})
const encoder = new TextEncoder()
const headers = { 'Content-Type': 'application/json' }

export function remembered<T>(question: Question<T>, place: string): Reading<Body> {
  const known = answers.get(place)
  if (known) return { ok: true, value: { content: known, headers } }
  const answer = question.answer()
  if (!answer.ok) return answer
  const content = encoder.encode(JSON.stringify(answer.value))
  answers.set(place, content)
  return { ok: true, value: { content, headers } }
}
