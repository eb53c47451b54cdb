/** How much is asked of a potential: the work of a field's history, counted and not timed. */
import type { Potential } from '../../lib/dark-energy/potential'

export interface Count {
  both: number
  one: number
}

/** Counts how often it is asked for both its value and slope (by the equation of motion in N), and for one of them. */
export function counted(potential: Potential, count: Count): Potential {
  return {
    ...potential,
    bothInto: (out, phi) => {
      count.both++
      potential.bothInto(out, phi)
    },
    value: (phi) => {
      count.one++
      return potential.value(phi)
    },
    slope: (phi) => {
      count.one++
      return potential.slope(phi)
    },
  }
}
