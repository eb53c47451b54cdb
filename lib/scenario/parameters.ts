/** The scenario's own keys, in canonical order; a dark-energy family adds its keys between `eos` and `beyond`. */
import { FAMILIES } from '../dark-energy'
import type { Family } from '../dark-energy/law'
import type { OwnParameter } from './own-parameter'

export const H0 = {
  kind: 'number',
  group: 'expansion rate',
  key: 'h0',
  symbol: 'H_0',
  label: 'Hubble constant',
  unit: 'km s⁻¹ Mpc⁻¹',
  meaning: 'Rate of expansion today.',
  min: 1,
  max: 1000,
  fallback: 67.66,
  slider: { min: 50, max: 100, step: 0.01 },
} as const satisfies OwnParameter

export const MATTER = {
  kind: 'number',
  group: 'densities',
  key: 'matter',
  symbol: 'Ω_m',
  label: 'matter',
  unit: '',
  meaning: 'Density today of baryons, cold dark matter and massive neutrinos, over the critical density.',
  min: 0,
  max: 10000,
  fallback: 0.3111,
  slider: { min: 0, max: 1, step: 0.0001 },
} as const satisfies OwnParameter

export const BARYONS = {
  kind: 'number',
  group: 'densities',
  key: 'baryons',
  symbol: 'Ω_b h²',
  label: 'baryons',
  unit: '',
  meaning: 'Physical density of baryons today; it moves recombination, the drag epoch and the sound horizon only.',
  min: 0.001,
  max: 0.1,
  fallback: 0.02242,
  slider: { min: 0.015, max: 0.03, step: 0.00001 },
} as const satisfies OwnParameter

export const CURVATURE = {
  kind: 'number',
  group: 'densities',
  key: 'curvature',
  symbol: 'Ω_k',
  label: 'curvature',
  unit: '',
  meaning: 'Positive for an open universe, negative for a closed one; dark energy then closes the budget.',
  min: -100,
  max: 100,
  fallback: 0,
  slider: { min: -0.5, max: 0.5, step: 0.001 },
} as const satisfies OwnParameter

export const DARK = {
  kind: 'number',
  group: 'densities',
  key: 'dark',
  symbol: 'Ω_DE',
  label: 'dark energy',
  unit: '',
  meaning: 'Density of dark energy today over the critical density; curvature then closes the budget.',
  min: -100,
  max: 100,
  fallback: null,
  slider: { min: -1, max: 2, step: 0.001 },
} as const satisfies OwnParameter

export const CMB = {
  kind: 'number',
  group: 'radiation and neutrinos',
  key: 'cmb',
  symbol: 'T_CMB',
  label: 'photon temperature',
  unit: 'K',
  meaning: 'Temperature of the cosmic microwave background today; 0 leaves out photons and neutrinos.',
  min: 0,
  max: 100,
  fallback: 2.7255,
  slider: { min: 2, max: 4, step: 0.0001 },
} as const satisfies OwnParameter

export const NU = {
  kind: 'number',
  group: 'radiation and neutrinos',
  key: 'nu',
  symbol: 'N_eff',
  label: 'neutrino species',
  unit: '',
  meaning: 'Effective number of neutrino species, shared by three states.',
  min: 0,
  max: 20,
  fallback: 3.044,
  slider: { min: 0, max: 6, step: 0.001 },
} as const satisfies OwnParameter

export const MASSES = {
  kind: 'list',
  group: 'radiation and neutrinos',
  key: 'masses',
  symbol: 'm_ν',
  label: 'neutrino masses',
  unit: 'eV',
  meaning: 'One to three masses, the rest of the three states massless.',
  min: 0,
  max: 10,
  fallback: [0.06],
  least: 1,
  most: 3,
  ascending: false,
} as const satisfies OwnParameter

export const RADIATION = {
  kind: 'number',
  group: 'radiation and neutrinos',
  key: 'radiation',
  symbol: 'Ω_r',
  label: 'radiation',
  unit: '',
  meaning: 'Density of radiation today, all of it massless, in place of temperature, species and masses.',
  min: 0,
  max: 10000,
  fallback: null,
  slider: { min: 0, max: 0.01, step: 0.00001 },
} as const satisfies OwnParameter

/** The families are the choices. */
export function eosParameter(families: readonly Family[]) {
  return {
    kind: 'choice',
    group: 'dark energy',
    key: 'eos',
    symbol: 'w',
    label: 'law of dark energy',
    unit: '',
    meaning: 'How the density of dark energy follows the scale factor.',
    fallback: 'lambda',
    choices: families.map((family) => ({ value: family.key, label: family.label })),
  } as const satisfies OwnParameter
}

export const EOS = eosParameter(FAMILIES)

export const BEYOND = {
  kind: 'choice',
  group: 'dark energy',
  key: 'beyond',
  symbol: '',
  label: 'beyond today',
  unit: '',
  meaning: 'Whether the law goes on after today or w stays at its value today.',
  fallback: 'follow',
  choices: [
    { value: 'follow', label: 'follow the law' },
    { value: 'hold', label: 'hold w of today' },
  ],
} as const satisfies OwnParameter

export const AS = {
  kind: 'text',
  group: 'name',
  key: 'as',
  symbol: '',
  label: 'name',
  unit: '',
  meaning: 'What figures and tables call the scenario.',
  least: 1,
  most: 60,
} as const satisfies OwnParameter

/** Canonical order. */
export const OWN_PARAMETERS: readonly OwnParameter[] = [
  H0,
  MATTER,
  BARYONS,
  CURVATURE,
  DARK,
  CMB,
  NU,
  MASSES,
  RADIATION,
  EOS,
  BEYOND,
  AS,
]
export const OWN_KEYS: ReadonlySet<string> = new Set(OWN_PARAMETERS.map((one) => one.key))
