/** What the view of horizons draws: light cones, horizons, and a galaxy that rests in the expansion. */
import { isMissing } from '../../measures/outcome'
import type { ColumnKey } from '../../quantities/column'
import { columnOf } from '../../quantities/columns'
import type { Instant } from '../../quantities/instant'
import type { Solution } from '../../solve'
import { hubbleLengthGly } from '../../units'

export interface Path {
  readonly tone: string
  readonly name: string
  /** Comoving distance in Gly; null where the path is not. `galaxy` is that of the galaxy. */
  readonly comoving: (solution: Solution, instant: Instant, galaxy: number | null) => number | null
}

/** Gly for one unit of comoving distance. */
export const unitOf = ({ scenario }: Solution): number => hubbleLengthGly(scenario.h0)

const column = (key: ColumnKey) => {
  const found = columnOf(key)
  return (solution: Solution, instant: Instant): number | null => {
    const value = found.value(solution, instant)
    return isMissing(value) ? null : value
  }
}

const hubbleRadius = column('hubbleRadius')

export const GALAXY_TONE = 'part-galaxy'
export const CONE_TONE = 'part-cone'

export const PATHS: readonly Path[] = [
  {
    tone: CONE_TONE,
    name: 'past light cone',
    comoving: (solution, { conformal, time }) => (time <= 0 ? -conformal * unitOf(solution) : null),
  },
  { tone: 'part-event', name: 'event horizon', comoving: column('eventHorizon') },
  { tone: 'part-particle', name: 'particle horizon', comoving: column('particleHorizon') },
  {
    tone: 'part-hubble',
    name: 'Hubble radius',
    comoving: (solution, instant) => {
      const radius = hubbleRadius(solution, instant)
      return radius === null ? null : radius / instant.scale
    },
  },
  {
    tone: 'part-sent',
    name: 'light sent today',
    comoving: (solution, { conformal, time }) => (time >= 0 ? conformal * unitOf(solution) : null),
  },
  { tone: GALAXY_TONE, name: 'galaxy', comoving: (_, __, galaxy) => galaxy },
]
