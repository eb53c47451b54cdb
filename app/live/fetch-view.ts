/** Asks the server for what an address shows. */
import type { Brief, Part } from '../../lib/answers/explorer'
import { PLACE_KEYS, RULER_KEYS } from '../../lib/words/place'

/** What of an address the answer depends on; figures are drawn for one frame, and beside the long one maybe only these parts. */
export function askedOf(search: string, frame: string | null, parts: readonly Part[] | null = null): string {
  const query = new URLSearchParams(search)
  const asked = new URLSearchParams(query.getAll('s').map((code) => ['s', code]))
  const apart: readonly string[] = RULER_KEYS
  for (const key of PLACE_KEYS.filter((one) => !apart.includes(one))) {
    const value = query.get(key)
    if (value !== null) asked.set(key, value)
  }
  if (frame !== null) asked.set('frame', frame)
  if (parts !== null) asked.set('parts', ['long', ...parts].join(' '))
  return asked.toString()
}

export async function fetchView(asked: string, signal: AbortSignal): Promise<Brief> {
  const response = await fetch(`/api/explorer?${asked}`, { signal }).catch((error: unknown) => {
    throw signal.aborted ? error : new Error('The server cannot be reached.')
  })
  if (!response.ok) throw new Error(`The server answered with ${response.status}.`)
  return response.json()
}
