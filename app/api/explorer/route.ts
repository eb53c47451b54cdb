import { askExplorer } from '../../../lib/answers/ask-explorer'
import { remembered } from '../remembered'
import { pairsOf, reply } from '../reply'

export const dynamic = 'force-dynamic'

/** The explorer as data, for the live page. */
export function GET(request: Request): Response {
  return reply(request, '/api/explorer', askExplorer(pairsOf(request)), remembered)
}
