import { composedLink } from '../../lib/words/compose'
import { readPlace } from '../../lib/words/place'
import { sent } from './sent'

/** Where the form of the page goes: it answers with the address that the fields spell. */
export function GET(request: Request): Response {
  const query = new URL(request.url).searchParams
  const codes = query.getAll('s')
  const location = composedLink({
    codes,
    place: readPlace((key) => query.get(key), Math.max(1, codes.length)),
    fields: new Map([...query].reverse()),
  })
  return sent(request, location)
}
