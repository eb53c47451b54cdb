import { askRulerTable } from '../../../../lib/answers/ask-ruler'
import { mapped } from '../../../../lib/answers/question'
import { streamed } from '../../download'
import { HOME } from '../../home'
import { pairsOf, reply } from '../../reply'

export const dynamic = 'force-dynamic'

/** The readings of the ruler in full, one row a scenario. */
export function GET(request: Request): Response {
  return reply(request, '/api/ruler/table', askRulerTable(pairsOf(request), HOME), (question) =>
    mapped(question.answer(), streamed),
  )
}
