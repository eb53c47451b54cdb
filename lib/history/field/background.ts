/** Everything but the field in E²: radiation, neutrinos, cold matter and curvature, as functions of N = ln a. */
import { energyDerivatives } from '../../neutrinos/energy'
import type { Budget } from '../../scenario/budget'

export interface Background {
  readonly budget: Budget
  /** Writes the density, its slope by N, and the sum of the sizes of its parts. */
  into(out: Float64Array, N: number): void
}

export function backgroundOf(budget: Budget): Background {
  const { curvature, coldMatter, states } = budget
  const radiation = budget.photons + budget.masslessNeutrinos
  const energy = new Float64Array(3)
  return {
    budget,
    into(out, N) {
      const x = Math.exp(-N)
      const k = curvature * x * x
      const m = coldMatter * x * x * x
      const r = radiation * x * x * x * x
      let [value, slope] = [r + m, -4 * r - 3 * m]
      for (const state of states) {
        energyDerivatives(state.y / x, energy)
        const density = state.masslessDensity * energy[0] * x * x * x * x
        value += density
        slope -= (4 - energy[1]) * density
      }
      out[0] = value + k
      out[1] = slope - 2 * k
      out[2] = value + Math.abs(k)
    },
  }
}
