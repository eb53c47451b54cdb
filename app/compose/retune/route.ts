import { retuned } from '../../../lib/words/compose-scenario'
import { sent } from '../sent'

/** The page with H₀ retuned; where that cannot be, the page that says why. */
export function GET(request: Request): Response {
  const { search, searchParams } = new URL(request.url)
  const result = retuned(searchParams)
  if (result === null) return sent(request, `/${search}`)
  return sent(request, result.because === null ? result.link : `/retune${search}`)
}
