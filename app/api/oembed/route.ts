import { askOEmbed } from '../../../lib/answers/oembed'
import { HOME } from '../home'
import { remembered } from '../remembered'
import { pairsOf, reply } from '../reply'

export const dynamic = 'force-dynamic'

/** How a site that is given a link of ours shows it. */
export function GET(request: Request): Response {
  return reply(request, '/api/oembed', askOEmbed(pairsOf(request), HOME), remembered)
}
