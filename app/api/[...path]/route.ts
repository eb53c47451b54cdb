import { PROBLEM_TYPE, problemBody } from '../../../scripts/front/problem.mjs'

/** Whatever no other route under /api takes. */
export function GET(request: Request) {
  const { pathname } = new URL(request.url)
  const body = problemBody(
    {
      status: 404,
      detail: `There is nothing at ${pathname}. The interface has /api/history, /api/at, /api/table and /api/explorer.`,
    },
    pathname,
  )
  return new Response(body, { status: 404, headers: { 'Content-Type': PROBLEM_TYPE, 'Cache-Control': 'no-store' } })
}
