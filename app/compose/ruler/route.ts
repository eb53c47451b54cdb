import { rulerFormLink } from '../../../lib/words/compose-ruler'

/** Where the form of the ruler goes: it answers with the address that its fields spell. */
export function GET(request: Request): Response {
  const location = rulerFormLink(new URL(request.url).searchParams)
  return new Response(null, { status: 303, headers: { location, 'cache-control': 'no-store' } })
}
