import { askWords } from '../../../lib/answers/words'
import { HOME } from '../home'
import { remembered } from '../remembered'
import { pairsOf, reply } from '../reply'

export const dynamic = 'force-dynamic'

/** Caption, methods, summary, macros and references to paste. */
export function GET(request: Request): Response {
  return reply(request, '/api/words', askWords(pairsOf(request), HOME), remembered)
}
