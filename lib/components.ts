/**
 * The components of E²: what each is today, how it varies, and what it tends to. Every one is Ω e^(−∫n dN).
 */
import type { Asymptote, Law, Part } from './dark-energy/law'
import { energyRatio, energyRatioChange, logSlope, logSlopeDerivative } from './neutrinos/energy'
import { relativeBend } from './numerics/bend'
import { expm2 } from './numerics/exponential'
import { listOf } from './numerics/list'
import type { Budget } from './scenario/budget'
import type { MassiveState } from './scenario/radiation'

/** |Ω f| = e^(logCoefficient − exponent N). */
export interface Power {
  readonly exponent: number
  readonly logCoefficient: number
}

/** As `logSize` of a term. */
export const logOfPower = ({ logCoefficient, exponent }: Power, N: number): number => logCoefficient - exponent * N

/** As `rounding` of a term. */
export const roundingOfPower = ({ logCoefficient }: Power, log: number): number => roundingOf(logCoefficient, log, 0)

/** A term of E² that keeps its sign. */
export interface Term {
  /** Carries the sign. */
  readonly omega: number
  /** ln |Ω f| at N. */
  logSize(N: number): number
  /** Bound of the rounding error of logSize at N, where it is `log`, in units of eps. */
  rounding(N: number, log: number): number
  /** Present where n is the same at all times, as for most: then nobody need be called. */
  readonly power?: Power | undefined
  /** Bounds of the exponent n on [from, to]. */
  exponentRange(from: number, to: number): readonly [number, number]
}

/** One component of E², for arguments about signs and growth. Its Ω today carries the sign unless it has terms of both. */
export interface Component extends Term {
  readonly key: 'radiation' | 'matter' | 'neutrino' | 'curvature' | 'dark'
  /** Ω f at N. */
  density(N: number): number
  /** Ω f(N + d) − Ω f(N) − d Ω f′(N), without cancellation for small d. */
  bend(N: number, d: number): number
  /** What it is the sum of where it changes sign outwards; null in a direction where it does not, absent where it never does. */
  readonly terms?: (direction: 1 | -1) => readonly Term[] | null
  readonly past: Asymptote
  readonly future: Asymptote
}

export const asymptoteOf = (one: Component, direction: 1 | -1): Asymptote => (direction > 0 ? one.future : one.past)

/** Ω today of what thins out by one law each. */
export interface Amounts {
  readonly radiation: number
  readonly matter: number
  readonly curvature: number
  readonly dark: number
}

export const amountsOf = (budget: Budget): Amounts => ({
  radiation: budget.photons + budget.masslessNeutrinos,
  matter: budget.coldMatter,
  curvature: budget.curvature,
  dark: budget.dark,
})

/** Dark energy that thins out exactly like radiation, matter or curvature counts as that. */
export function merged(amounts: Amounts, { exponent }: Law): Amounts {
  const { radiation, matter, curvature, dark } = amounts
  if (exponent === 4) return { radiation: radiation + dark, matter, curvature, dark: 0 }
  if (exponent === 3) return { radiation, matter: matter + dark, curvature, dark: 0 }
  if (exponent === 2) return { radiation, matter, curvature: curvature + dark, dark: 0 }
  return amounts
}

export function componentsOf(amounts: Amounts, budget: Budget, law: Law): readonly Component[] {
  const all: Component[] = [
    powerComponent('radiation', amounts.radiation, 4),
    powerComponent('matter', amounts.matter, 3),
    powerComponent('curvature', amounts.curvature, 2),
    darkComponent(amounts.dark, law),
    ...listOf(budget.states, neutrinoComponent),
  ]
  return all.filter((one) => one.omega !== 0)
}

function powerComponent(key: Component['key'], omega: number, exponent: number): Component {
  const logCoefficient = Math.log(Math.abs(omega))
  const range = [exponent, exponent] as const
  const power = { exponent, logCoefficient }
  const asymptote = { kind: 'power', exponent, logCoefficient, settled: 0 } as const
  return {
    key,
    omega,
    power,
    logSize: (N) => logOfPower(power, N),
    rounding: (_, log) => roundingOfPower(power, log),
    exponentRange: () => range,
    density: (N) => omega * Math.exp(-exponent * N),
    bend: (N, d) => omega * Math.exp(-exponent * N) * expm2(-exponent * d),
    terms: undefined,
    past: asymptote,
    future: asymptote,
  }
}

function darkComponent(omega: number, law: Law): Component {
  const log = Math.log(Math.abs(omega))
  const scaled = (one: Asymptote): Asymptote =>
    one.kind === 'power' ? { ...one, logCoefficient: one.logCoefficient + log } : one
  return {
    key: 'dark',
    omega,
    power: law.exponent === undefined ? undefined : { exponent: law.exponent, logCoefficient: log },
    logSize: (N) => log + law.logDensity(N),
    rounding: (N, size) => roundingOf(log, size, law.roughness?.(N) ?? 0),
    exponentRange: law.exponentRange,
    density: (N) => omega * law.density(N),
    bend: (N, d) => omega * law.bend(N, d),
    terms: law.parts && ((direction) => law.parts?.(direction)?.map((part) => termOf(omega, part)) ?? null),
    past: scaled(law.past),
    future: scaled(law.future),
  }
}

/** Of ln |Ω| + ln f: both are rounded, and ln f is four times its size or what its law says. */
const roundingOf = (logCoefficient: number, log: number, roughness: number): number =>
  2 + 2 * Math.abs(logCoefficient) + 4 * Math.abs(log - logCoefficient) + roughness

function termOf(darkEnergy: number, { factor, logDensity, roughness, exponentRange }: Part): Term {
  const omega = darkEnergy * factor
  const log = Math.log(Math.abs(omega))
  return {
    omega,
    logSize: (N) => log + logDensity(N),
    rounding: (N, size) => roundingOf(log, size, roughness?.(N) ?? 0),
    exponentRange,
  }
}

/** R(y) = 1 + 5y²/(7π²) to 1e-17 below this. */
const HOT = 1e-4
const HOT_SQUARE = 5 / (7 * Math.PI ** 2)
/**
 * R(y) ∝ y (1 + Σ c_k y^(−2k)) to 1e-17 above this: the root in the energy integral expanded in x/y, with the moments
 * I_n = ∫ x^n/(eˣ + 1) dx = n! (1 − 2^(−n)) ζ(n + 1): c_k = binomial(½, k) I_(2k+2)/I_2.
 */
const COLD = 600
const COLD_SERIES = [
  { size: 6.46970883252999, rate: 2 },
  { size: -49.54476700631098, rate: 4 },
  { size: 1394.940967821448, rate: 6 },
]

/** The exponent of a massive state falls from 4 to 3, since the logarithmic slope of its energy ratio rises from 0 to 1. */
function neutrinoComponent(state: MassiveState): Component {
  const y = (N: number) => state.y * Math.exp(N)
  const logMassless = Math.log(state.masslessDensity)
  const cold = Math.log(1e9 / state.y)
  const logCold = logMassless + Math.log(energyRatio(1e20) * 1e-20 * state.y)
  const density = (N: number): number =>
    N > cold ? Math.exp(logCold - 3 * N) : state.masslessDensity * energyRatio(y(N)) * Math.exp(-4 * N)
  return {
    key: 'neutrino',
    omega: state.density,
    power: undefined,
    // Also where y itself is no double any more.
    logSize: (N) => (N > cold ? logCold - 3 * N : logMassless + Math.log(energyRatio(y(N))) - 4 * N),
    // The energy ratio is right to 4 eps, its argument to 4 more.
    rounding: (N, log) => 10 + 2 * Math.abs(logMassless) + 4 * Math.abs(log) + 16 * Math.abs(N),
    exponentRange: (from, to) => [4 - logSlope(y(to)), 4 - logSlope(y(from))],
    density,
    bend: (N, d) =>
      density(N) *
      relativeBend(Math.log1p(energyRatioChange(y(N), d)) - 4 * d, d, (t) => -logSlopeDerivative(y(N + t))),
    terms: undefined,
    past: {
      kind: 'power',
      exponent: 4,
      logCoefficient: logMassless,
      settled: Math.log(HOT / state.y),
      corrections: [{ size: HOT_SQUARE * state.y ** 2, rate: 2 }],
    },
    future: {
      kind: 'power',
      exponent: 3,
      logCoefficient: logCold,
      settled: Math.log(COLD / state.y),
      corrections: listOf(COLD_SERIES, ({ size, rate }) => ({ size: size * state.y ** -rate, rate })),
    },
  }
}
