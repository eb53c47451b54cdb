/** Rates and fractions at an event. q = −1 − ½ (E²)′/E², j = 1 + (3/2)(E²)′/E² + ½ (E²)″/E², primes by ln a. */
import { type Event, expansionAtEvent } from '../history/event'
import { type Missing, missing } from './outcome'

export const AT_REST = missing('the expansion stands still here, so a ratio to H² is not defined')
const OUT_OF_RANGE = missing('the densities here are outside the range of floating-point numbers')

/** H/H₀, with its sign. Here and below `e2` is E² at the event, for callers who know it already. */
export const hubbleRate = (event: Event, e2 = expansionAtEvent(event)): number =>
  event.sign * Math.sqrt(Math.max(0, e2))

/** q = −ä a/ȧ². */
export function deceleration(event: Event, e2 = expansionAtEvent(event)): number | Missing {
  return ratio(-0.5 * derivatives(event).first - e2, e2)
}

/** j = a² (d³a/dt³)/ȧ³. */
export function jerk(event: Event, e2 = expansionAtEvent(event)): number | Missing {
  const { first, second } = derivatives(event)
  return ratio(e2 + 1.5 * first + 0.5 * second, e2)
}

const derivatives = ({ place }: Event) => place.arm.model.derivatives(place.N)

/** ä/a in H₀². */
export const accelerationAt = (event: Event): number => derivatives(event).acceleration

function ratio(value: number, e2: number): number | Missing {
  if (!(e2 > 0)) return AT_REST
  const out = value / e2
  return Number.isFinite(out) ? out : OUT_OF_RANGE
}

export type Share = 'matter' | 'radiation' | 'neutrino' | 'curvature' | 'dark'

/** Density of one component over the critical density at the event. */
export function densityFraction(event: Event, share: Share, e2 = expansionAtEvent(event)): number | Missing {
  const { N, arm } = event.place
  let density = 0
  for (const one of arm.model.components) if (one.key === share) density += one.density(N)
  return ratio(density, e2)
}

/** w of dark energy at the event, by the law that rules there. */
export function equationOfState({ place }: Event): number | Missing {
  if (place.arm.model.budget.dark === 0) return missing('there is no dark energy in this scenario')
  const w = place.arm.model.law.w(place.N)
  if (Number.isNaN(w)) return missing('dark energy is used up here')
  return Number.isFinite(w) ? w : OUT_OF_RANGE
}
