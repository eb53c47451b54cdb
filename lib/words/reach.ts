/** How far light sent today gets. */
import type { EndKind } from '../history/outcome'
import { significant, withUnit } from './number'
import type { Told } from './told'

/** Where light gets everywhere: ∫ dt/a to the end diverges. */
const UNBOUNDED: ReadonlySet<EndKind> = new Set(['coasting', 'decelerating', 'static', 'oscillating'])

/** Whether light sent today comes to the antipode of a closed space, half a turn away, before the end. */
export function goesRound({ budget, measures }: Pick<Told, 'budget' | 'measures'>): boolean {
  const [reach, radius] = [measures.eventHorizon.value, measures.curvatureRadius.value]
  return budget.curvature < 0 && reach !== null && radius !== null && reach >= Math.PI * radius
}

/** The reach is a comoving distance, which is the proper distance today of what is reached at last. */
export function reachSentence(told: Pick<Told, 'budget' | 'end' | 'measures'>): string | null {
  const { end, measures } = told
  const reach = measures.eventHorizon.value
  if (goesRound(told)) return 'Light sent today reaches any place of the closed space before the end.'
  if (reach === null) return UNBOUNDED.has(end.kind) ? 'Light sent today reaches any place in the end.' : null
  const seen = measures.particleHorizon.value
  const beyond = seen !== null && reach >= seen ? ', beyond all that is seen today' : ' at most'
  return `Light sent today reaches ${withUnit(significant(reach, 3), 'Gly')}${beyond}.`
}
