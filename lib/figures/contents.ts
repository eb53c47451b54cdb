/** What a universe is made of at a size, and whether its expansion speeds up then. */

import type { Component } from '../components'
import type { Arm } from '../history/arm'

const ERAS = ['radiation', 'matter', 'curvature', 'dark energy'] as const

export type Era = (typeof ERAS)[number]

/** A size of a universe, on the run of its history where it has it. */
export interface Size {
  readonly arm: Arm
  readonly N: number
}

/** Neutrinos count as radiation, as they do in the equality of matter and radiation. */
const ERA_OF: Readonly<Record<Component['key'], Era>> = {
  radiation: 'radiation',
  neutrino: 'radiation',
  matter: 'matter',
  curvature: 'curvature',
  dark: 'dark energy',
}

/** The component of the largest density, whatever its sign. */
export function dominantAt({ arm, N }: Size): Era {
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
export function accelerates({ arm, N }: Size): boolean {
  const { value, first } = arm.model.derivatives(N)
  return value + first / 2 > 0
}
