import { rulerFormLink } from '../../../lib/words/compose-ruler'
import { sent } from '../sent'

/** Where the form of the ruler goes: it answers with the address that its fields spell. */
export function GET(request: Request): Response {
  return sent(request, rulerFormLink(new URL(request.url).searchParams))
}
