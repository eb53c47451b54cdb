/** A scenario: everything that a person chooses, checked and complete, in the units of the scenario code. */
import type { ParameterValues } from '../parameter'

/** Either `curvature` is given and dark energy closes the budget, or the other way round. */
export interface Closure {
  readonly given: 'curvature' | 'dark'
  /** Ω_k or Ω_DE today. */
  readonly value: number
}

export type Radiation =
  /** Photons of temperature `cmb` (K) and three neutrino states that share `nu`; `masses` in eV, ascending, none zero. */
  | { readonly kind: 'thermal'; readonly cmb: number; readonly nu: number; readonly masses: readonly number[] }
  /** `cmb:0`: neither photons nor neutrinos. */
  | { readonly kind: 'none' }
  /** Ω_r today, all of it massless. */
  | { readonly kind: 'given'; readonly density: number }

export interface Scenario {
  /** km s⁻¹ Mpc⁻¹ */
  readonly h0: number
  /** Ω_m today, massive neutrinos included. */
  readonly matter: number
  /** Ω_b h². */
  readonly baryons: number
  readonly closure: Closure
  readonly radiation: Radiation
  /** Key of the dark-energy family. */
  readonly eos: string
  /** All parameters that this family reads, defaults filled in. */
  readonly law: ParameterValues
  readonly beyond: 'follow' | 'hold'
  readonly name: string | null
}

/** What was wrong with one parameter; `scenario` is the index of the `s` it stood in, null outside a scenario. */
export interface Problem {
  readonly parameter: string
  readonly scenario: number | null
  readonly value: string
  readonly allowed: string
  readonly message: string
}

export type Reading<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly problems: readonly Problem[] }
