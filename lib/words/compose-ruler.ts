/** From the form of the ruler back to an address of the page. */
import { addressed } from './compose'
import { type Place, placeKeys, RULER_KEYS, readPlace } from './place'
import { type RulerAsk, rulerAskOf, rulerPlaceOf } from './ruler-ask'

/** `query` is that of the form: every scenario, the rest of the place, and each reading in a key of its own. */
export function rulerFormLink(query: URLSearchParams): string {
  const codes = query.getAll('s')
  const place = readPlace((key) => (key === 'read' ? chosen(query) : query.get(key)), Math.max(1, codes.length))
  const queries = codes.map((code) => `s=${addressed(code)}`)
  return `/?${[...queries, ...placeKeys(settled(place))].join('&')}`
}

const chosen = (query: URLSearchParams): string => query.getAll('read').join(',') || 'none'

/** Without what would hold anyway. */
const settled = (place: Place): Place => ({ ...place, ...rulerPlaceOf(rulerAskOf(place)) })

/** The same address with the ruler asked otherwise. */
export function rulerLink(here: string, place: Place, ask: RulerAsk): string {
  const [path = '/', query = ''] = here.split('?')
  const own: readonly string[] = RULER_KEYS
  const others = query.split('&').filter((pair) => pair !== '' && !own.includes(pair.replace(/=.*$/s, '')))
  const asked = placeKeys({ ...place, ...rulerPlaceOf(ask) }).filter((pair) => own.includes(pair.replace(/=.*$/s, '')))
  return `${path}?${[...others, ...asked].join('&')}`
}
