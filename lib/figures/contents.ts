/** What a universe is made of at a time, and whether its expansion speeds up then. */

import type { Component } from '../components'
import { type Event, type Found, isEvent } from '../history/event'

const ERAS = ['radiation', 'matter', 'curvature', 'dark energy'] as const

export type Era = (typeof ERAS)[number]

export interface Contents {
  /** The component of the largest density, whatever its sign. */
  readonly dominant: Era
  readonly accelerating: boolean
}

/** Neutrinos count as radiation, as they do in the equality of matter and radiation. */
const ERA_OF: Readonly<Record<Component['key'], Era>> = {
  radiation: 'radiation',
  neutrino: 'radiation',
  matter: 'matter',
  curvature: 'curvature',
  dark: 'dark energy',
}

/** Null where the history does not reach. */
export const contentsOf = (event: Found): Contents | null =>
  isEvent(event) ? { dominant: dominantAt(event), accelerating: accelerates(event) } : null

function dominantAt({ place: { arm, N } }: Event): Era {
  const { components } = arm.model
  const logs = components.map((one) => one.logSize(N))
  const largest = Math.max(...logs)
  const sizes: Record<Era, number> = { radiation: 0, matter: 0, curvature: 0, 'dark energy': 0 }
  components.forEach(({ key }, i) => {
    sizes[ERA_OF[key]] += Math.exp((logs[i] ?? largest) - largest)
  })
  return ERAS.reduce((best, one) => (sizes[one] > sizes[best] ? one : best))
}

/** ä/a = E² + ½ dE²/dN in units of H₀². */
function accelerates({ place: { arm, N } }: Event): boolean {
  const { value, first } = arm.model.derivatives(N)
  return value + first / 2 > 0
}
