import { composedLink } from '../../lib/words/compose'

/** Where the form of the page goes: it answers with the address that the fields spell. */
export function GET(request: Request): Response {
  const query = new URL(request.url).searchParams
  const location = composedLink({
    codes: query.getAll('s'),
    focus: query.get('focus') ?? undefined,
    theme: query.get('theme') ?? undefined,
    fields: new Map([...query].reverse()),
  })
  return new Response(null, { status: 303, headers: { location, 'cache-control': 'no-store' } })
}
