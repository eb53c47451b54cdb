import { askDocument } from '../../../lib/interface/ask-document'
import { HOME } from '../home'
import { remembered } from '../remembered'
import { pairsOf, reply } from '../reply'

export const dynamic = 'force-dynamic'

/** The interface as an OpenAPI 3.1 document. */
export function GET(request: Request): Response {
  return reply(request, '/api/openapi.json', askDocument(pairsOf(request), HOME), remembered)
}
