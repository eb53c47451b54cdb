import { askRuler } from '../../../lib/answers/ask-ruler'
import { remembered } from '../remembered'
import { pairsOf, reply } from '../reply'

export const dynamic = 'force-dynamic'

/** The ruler of the page as data, for the live page. */
export function GET(request: Request): Response {
  return reply(request, '/api/ruler', askRuler(pairsOf(request)), remembered)
}
