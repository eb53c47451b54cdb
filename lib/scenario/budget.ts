/** What the universe holds today: every Ω over the critical density, with sum 1. */
import { decimalsCancel, exactSum } from './exact-sum'
import { type MassiveState, radiationBudget } from './radiation'
import type { Scenario } from './scenario'

export interface Budget {
  readonly photons: number
  readonly masslessNeutrinos: number
  /** All states with mass together. */
  readonly massiveNeutrinos: number
  /** Each state with mass. */
  readonly states: readonly MassiveState[]
  /** Baryons and cold dark matter: Ω_m less the massive neutrinos. Negative where they outweigh it: such a code is refused. */
  readonly coldMatter: number
  readonly curvature: number
  readonly dark: number
  /** Which of the two follows from the others. */
  readonly closes: 'curvature' | 'dark'
  /**
   * The closing density is the correctly rounded 1 − (photons + massless neutrinos + each massive state + cold matter +
   * the given one), and this is what the rounding took: density + remainder is right to twice the digits of a double.
   */
  readonly closingRemainder: number
}

export function budgetOf(scenario: Scenario): Budget {
  const { photons, masslessNeutrinos, states } = radiationBudget(scenario.radiation, scenario.h0)
  const massiveNeutrinos = exactSum(states.map((one) => one.density)).high
  const coldMatter = scenario.matter - massiveNeutrinos
  const { given, value } = scenario.closure
  const terms = [photons, masslessNeutrinos, ...states.map((one) => one.density), coldMatter, value]
  const closing = closingDensity(terms, scenario.radiation.kind !== 'thermal')
  const [curvature, dark] = given === 'curvature' ? [value, closing.high] : [closing.high, value]
  const closes = given === 'curvature' ? 'dark' : 'curvature'
  const closingRemainder = closing.low
  return { photons, masslessNeutrinos, massiveNeutrinos, states, coldMatter, curvature, dark, closes, closingRemainder }
}

/**
 * 1 − Σ terms. `typed`: every term is a number that somebody typed. Those which add up to 1 as decimals (0.1 and 0.9,
 * 0.3 and 0.7) leave exactly nothing, though their doubles leave 1e-17, which would decide the far future.
 */
function closingDensity(terms: readonly number[], typed: boolean): { readonly high: number; readonly low: number } {
  const all = [1, ...terms.map((one) => -one)]
  const sum = exactSum(all)
  const negligible = Math.abs(sum.high) <= all.length * Number.EPSILON * Math.max(...all.map(Math.abs))
  return typed && negligible && decimalsCancel(all) ? { high: 0, low: 0 } : sum
}
