/** How far light sent today gets. */
import type { EndKind } from '../history/outcome'
import { significant, withUnit } from './number'
import type { Told } from './told'

/** Where light gets everywhere: ∫ dt/a to the end diverges. */
const UNBOUNDED: ReadonlySet<EndKind> = new Set(['coasting', 'decelerating', 'static', 'oscillating'])

/** The reach is a comoving distance, which is the proper distance today of what is reached at last. */
export function reachSentence({ end, measures }: Pick<Told, 'end' | 'measures'>): string | null {
  const reach = measures.eventHorizon.value
  if (reach === null) return UNBOUNDED.has(end.kind) ? 'Light sent today reaches any place in the end.' : null
  const seen = measures.particleHorizon.value
  const beyond = seen !== null && reach >= seen ? ', beyond all that is seen today' : ' at most'
  return `Light sent today reaches ${withUnit(significant(reach, 3), 'Gly')}${beyond}.`
}
