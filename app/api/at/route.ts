import { askAt } from '../../../lib/answers/at'
import { remembered } from '../remembered'
import { pairsOf, reply } from '../reply'

export const dynamic = 'force-dynamic'

/** All columns at given redshifts, scale factors, times or ages. */
export function GET(request: Request): Response {
  return reply(request, '/api/at', askAt(pairsOf(request)), remembered)
}
