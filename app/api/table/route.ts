import { mapped } from '../../../lib/answers/question'
import { askTable, type Download } from '../../../lib/answers/table'
import { HOME } from '../home'
import { pairsOf, reply } from '../reply'
import { streamOf } from '../stream'

export const dynamic = 'force-dynamic'

/** Evenly spaced rows as a download, streamed. */
export function GET(request: Request): Response {
  return reply(request, '/api/table', askTable(pairsOf(request), HOME), (question) =>
    mapped(question.answer(), streamed),
  )
}

const streamed = ({ mediaType, fileName, pieces }: Download) => ({
  content: streamOf(pieces()),
  headers: { 'Content-Type': mediaType, 'Content-Disposition': `attachment; filename="${fileName}"` },
})
