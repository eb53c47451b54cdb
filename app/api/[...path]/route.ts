import { ROUTES } from '../../../lib/interface/routes'
import { problem } from '../reply'

/** Whatever no other route under /api takes. */
export function GET(request: Request) {
  const { pathname } = new URL(request.url)
  const paths = ROUTES.map(({ path }) => path).join(', ')
  return problem(
    { status: 404, detail: `There is nothing at ${pathname}. The interface has ${paths}; /api tells of them.` },
    pathname,
  )
}
