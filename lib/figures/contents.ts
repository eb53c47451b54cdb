/** What a universe is made of at a time, and whether its expansion speeds up then. */

import type { Component } from '../components'
import { type Event, eventAtTime, isEvent } from '../history/event'
import type { Solution } from '../solve'
import { hubbleTimeGyr } from '../units'

export type Era = 'radiation' | 'matter' | 'curvature' | 'dark energy'

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

/** At a time in Gyr from now; null where the history does not reach. */
export function contentsAt(
  { scenario, history }: Pick<Solution, 'scenario' | 'history'>,
  time: number,
): Contents | null {
  const event = eventAtTime(history, time / hubbleTimeGyr(scenario.h0))
  if (!isEvent(event)) return null
  return { dominant: dominantAt(event), accelerating: accelerates(event) }
}

function dominantAt({ place: { arm, N } }: Event): Era {
  const sizes = new Map<Era, number>()
  const logs = arm.model.components.map((one) => one.logSize(N))
  const largest = Math.max(...logs)
  arm.model.components.forEach(({ key }, i) => {
    const era = ERA_OF[key]
    sizes.set(era, (sizes.get(era) ?? 0) + Math.exp((logs[i] ?? largest) - largest))
  })
  return [...sizes].reduce((best, one) => (one[1] > best[1] ? one : best))[0]
}

/** ä/a = E² + ½ dE²/dN in units of H₀². */
function accelerates({ place: { arm, N } }: Event): boolean {
  const { value, first } = arm.model.derivatives(N)
  return value + first / 2 > 0
}
