/** What the universe holds today: every Ω over the critical density, with sum 1. */
import { listOf } from '../numerics/list'
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
  /** What rounding took from `coldMatter`: density + remainder is right to twice the digits of a double. */
  readonly coldRemainder: number
  readonly curvature: number
  readonly dark: number
  /** Which of the two follows from the others: it is the correctly rounded 1 − (radiation + Ω_m + the given one). */
  readonly closes: 'curvature' | 'dark'
  /** What rounding took from the closing density, as for cold matter. */
  readonly closingRemainder: number
  /** Is every given density a number that somebody typed, none computed from a temperature? */
  readonly typed: boolean
}

export function budgetOf(scenario: Scenario): Budget {
  const { photons, masslessNeutrinos, states } = radiationBudget(scenario.radiation, scenario.h0)
  const { given, value } = scenario.closure
  const weights = listOf(states, (one) => one.density)
  const cold = exactSum([scenario.matter, ...listOf(weights, (one) => -one)])
  const terms = [photons, masslessNeutrinos, scenario.matter, value]
  const typed = scenario.radiation.kind !== 'thermal'
  const closing = closingDensity(terms, typed)
  return {
    photons,
    masslessNeutrinos,
    massiveNeutrinos: exactSum(weights).high,
    states,
    coldMatter: cold.high,
    coldRemainder: cold.low,
    curvature: given === 'curvature' ? value : closing.high,
    dark: given === 'curvature' ? closing.high : value,
    closes: given === 'curvature' ? 'dark' : 'curvature',
    closingRemainder: closing.low,
    typed,
  }
}

/**
 * 1 − Σ terms. `typed`: every term is a number that somebody typed. Those which add up to 1 as decimals (0.1 and 0.9,
 * 0.3 and 0.7) leave exactly nothing, though their doubles leave 1e-17, which would decide the far future.
 */
function closingDensity(terms: readonly number[], typed: boolean): { readonly high: number; readonly low: number } {
  const all = [1, ...listOf(terms, (one) => -one)]
  const sum = exactSum(all)
  const negligible = Math.abs(sum.high) <= all.length * Number.EPSILON * Math.max(...all.map(Math.abs))
  return typed && negligible && decimalsCancel(all) ? { high: 0, low: 0 } : sum
}
