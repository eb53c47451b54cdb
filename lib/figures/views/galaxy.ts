/** The galaxy that the view of horizons follows: where it is, and until when its light sets out to reach us. */
import { isEvent } from '../../history/event'
import { lastSight } from '../../measures/last-sight'
import { isMissing } from '../../measures/outcome'
import { comovingDistance } from '../../measures/sight'
import { type Instant, instantAt, instantOf, isInstant } from '../../quantities/instant'
import type { Solution } from '../../solve'
import type { Followed } from '../../words/galaxy'
import { unitOf } from './paths'

export interface Galaxy {
  readonly redshift: number
  /** Comoving, in Gly. */
  readonly distance: number
  /** When the light set out that arrives today. */
  readonly seen: Instant
  /** When the last light sets out that ever arrives; null where there is none. */
  readonly last: Instant | null
}

/** Null where nothing is seen at this redshift. */
export function galaxyAt(solution: Solution, redshift: number): Galaxy | null {
  const seen = instantAt(solution, 'z', redshift)
  if (!isInstant(seen)) return null
  const chi = comovingDistance(solution.history, seen)
  if (isMissing(chi)) return null
  const last = lastSight(solution.history, chi)
  return { redshift, distance: chi * unitOf(solution), seen, last: isEvent(last) ? instantOf(solution, last) : null }
}

export function followedOf(solution: Solution, redshift: number): Followed {
  const galaxy = galaxyAt(solution, redshift)
  return {
    redshift,
    distance: galaxy?.distance ?? null,
    seen: galaxy?.seen.time ?? null,
    last: galaxy?.last?.time ?? null,
    always: solution.measures.eventHorizon.value === null,
  }
}
