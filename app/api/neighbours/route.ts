import { askNeighbours } from '../../../lib/answers/neighbours'
import { remembered } from '../remembered'
import { pairsOf, reply } from '../reply'

export const dynamic = 'force-dynamic'

/** By how much each number may change before the universe begins or ends otherwise. */
export function GET(request: Request): Response {
  return reply(request, '/api/neighbours', askNeighbours(pairsOf(request)), remembered)
}
