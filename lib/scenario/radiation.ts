/** Today's densities of photons and neutrinos over the critical density. */
import { BOLTZMANN, ELECTRONVOLT, GRAVITATION, REDUCED_PLANCK, SPEED_OF_LIGHT } from '../constants'
import { energyRatio } from '../neutrinos/energy'
import { listOf } from '../numerics/list'
import { perSecond } from '../units'
import type { Radiation } from './scenario'

const STATES = 3
/** T_ν/T_γ for N_eff = 3: photons keep the entropy of electrons and positrons. */
const TEMPERATURE_RATIO = Math.cbrt(4 / 11)
/** Density of one massless state with N_eff/3 = 1, over that of photons: (7/8) (4/11)^(4/3). */
export const STATE_RATIO = ((7 / 8) * 4 * TEMPERATURE_RATIO) / 11

/** One neutrino state with a mass. */
export interface MassiveState {
  /** eV */
  readonly mass: number
  /** y today = m c²/(k_B T_ν): the mass in units of the temperature. */
  readonly y: number
  /** Ω today, with the full energy. */
  readonly density: number
  /** Ω today that the state would have without its mass. */
  readonly masslessDensity: number
}

export interface RadiationBudget {
  /** With `radiation:` all of it stands here. */
  readonly photons: number
  readonly masslessNeutrinos: number
  readonly states: readonly MassiveState[]
}

/** One list for all, since an optimized loop goes by the kind of the list that it met. */
const NONE: readonly MassiveState[] = []

/**
 * Ω_γ = (8πG/3H₀²) (π²/15) (k_B T)⁴/(ħ³c⁵), T in K and H₀ in km s⁻¹ Mpc⁻¹.
 * Relative accuracy that of the constants, rounding below 1e-15.
 */
export function photonDensity(temperature: number, h0: number): number {
  const energy = BOLTZMANN * temperature
  const fourth = (energy / REDUCED_PLANCK) ** 3 * energy
  const massDensity = ((Math.PI ** 2 / 15) * fourth) / SPEED_OF_LIGHT ** 5
  return (((8 * Math.PI * GRAVITATION) / 3) * massDensity) / perSecond(h0) ** 2
}

/** T_ν = (4/11)^(1/3) (N_eff/3)^(1/4) T_CMB, in K. */
export function neutrinoTemperature(cmb: number, nu: number): number {
  return TEMPERATURE_RATIO * Math.sqrt(Math.sqrt(nu / STATES)) * cmb
}

export function radiationBudget(radiation: Radiation, h0: number): RadiationBudget {
  if (radiation.kind === 'none') return { photons: 0, masslessNeutrinos: 0, states: NONE }
  if (radiation.kind === 'given') return { photons: radiation.density, masslessNeutrinos: 0, states: NONE }
  const photons = photonDensity(radiation.cmb, h0)
  const each = photons * STATE_RATIO * (radiation.nu / STATES)
  // No neutrinos at all (N_eff = 0), or so cold that nothing is left in doubles: a mass then weighs nothing either.
  if (each === 0) return { photons, masslessNeutrinos: 0, states: NONE }
  const temperature = neutrinoTemperature(radiation.cmb, radiation.nu)
  const { masses } = radiation
  const states = masses.length === 0 ? NONE : listOf(masses, (mass) => massiveState(mass, temperature, each))
  return { photons, masslessNeutrinos: (STATES - states.length) * each, states }
}

function massiveState(mass: number, temperature: number, masslessDensity: number): MassiveState {
  const y = (mass * ELECTRONVOLT) / (BOLTZMANN * temperature)
  return { mass, y, density: masslessDensity * energyRatio(y), masslessDensity }
}
