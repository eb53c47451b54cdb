import { presetLink } from '../../../lib/words/compose-scenario'
import { sent } from '../sent'

/** The page with the scenario in focus as published, or at its defaults. */
export function GET(request: Request): Response {
  const { search, searchParams } = new URL(request.url)
  return sent(request, presetLink(searchParams) ?? `/${search}`)
}
