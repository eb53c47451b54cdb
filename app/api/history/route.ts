import { askHistory } from '../../../lib/answers/history'
import { remembered } from '../remembered'
import { pairsOf, reply } from '../reply'

export const dynamic = 'force-dynamic'

/** Whole histories: origin, end, measures, moments and a series to draw. */
export function GET(request: Request): Response {
  return reply(request, '/api/history', askHistory(pairsOf(request)), remembered)
}
