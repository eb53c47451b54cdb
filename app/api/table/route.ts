import { mapped } from '../../../lib/answers/question'
import { askTable } from '../../../lib/answers/table'
import { streamed } from '../download'
import { HOME } from '../home'
import { pairsOf, reply } from '../reply'

export const dynamic = 'force-dynamic'

/** Evenly spaced rows as a download, streamed. */
export function GET(request: Request): Response {
  return reply(request, '/api/table', askTable(pairsOf(request), HOME), (question) =>
    mapped(question.answer(), streamed),
  )
}
