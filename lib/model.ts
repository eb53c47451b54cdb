/**
 * E²(a) = H²/H₀² as a sum of densities, a function of N = ln a alone:
 * Ω_r a⁻⁴ + Σ Ω_ν(a) + Ω_c a⁻³ + Ω_k a⁻² + Ω_DE f(a), with E(1) = 1.
 * Every component is Ω e^(−∫n dN); its derivatives follow from n and n′ (Friedmann's equation and the conservation of energy).
 */
import type { Asymptote, Law, Logarithmic, Part } from './dark-energy/law'
import { energyDerivatives, energyRatio, energyRatioChange, logSlope, logSlopeDerivative } from './neutrinos/energy'
import { relativeBend } from './numerics/bend'
import { expm2 } from './numerics/exponential'
import type { Budget } from './scenario/budget'
import type { MassiveState } from './scenario/radiation'

/** E² at an anchor N, where it is known without rounding: 1 today, 0 at a turning point. */
export interface Anchor {
  readonly N: number
  readonly value: number
}

export interface Derivatives {
  /** E². */
  value: number
  /** dE²/dN. */
  first: number
  /** d²E²/dN². */
  second: number
  /** ä/a in H₀²: E² + ½ dE²/dN, to which curvature adds exactly nothing. */
  acceleration: number
}

/** A term of E² that keeps its sign. */
export interface Term {
  /** Carries the sign. */
  readonly omega: number
  /** ln |Ω f| at N. */
  logSize(N: number): number
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

/** Today: E² = 1 exactly. */
export const TODAY: Anchor = { N: 0, value: 1 }
const NEAR_TODAY = 0.7
/** Below this a⁻¹ all that thins out like matter is nothing, and m c² a/k T is no double. */
const NO_SCALE = 1e-290

export interface Model {
  readonly budget: Budget
  readonly law: Law
  /** The components that are not zero, as the budget names them. */
  readonly components: readonly Component[]
  /** What acts on the expansion: the same, with those that thin out alike added up first, so that they can cancel exactly. */
  readonly acting: readonly Component[]
  /** E² at N, with a⁻¹ = e^(−N) passed in by callers who know it more exactly. */
  expansion(N: number, inverseScale: number): number
  /** E² at N where dark energy over its density today is known better than from N. */
  expansionWith(N: number, density: number): number
  /** Do today's densities cancel to 1 from a sum of sizes above 4? */
  readonly cancels: boolean
  /** Is any component negative, now or ever? */
  readonly signed: boolean
  /** E²(anchor.N + d), without cancellation for small d. */
  expansionFrom(anchor: Anchor, d: number): number
  /** E²(N + d) − E²(N) − d dE²/dN, without cancellation for small d: all of E² near a double root at N. */
  bendFrom(N: number, d: number): number
  /** The same with the change of dark energy over its density today given. */
  expansionFromWith(anchor: Anchor, d: number, inDark: number): number
  /** Sum of the sizes of the terms that expansionFrom adds: its rounding error is a few eps times this. */
  magnitudeFrom(anchor: Anchor, d: number): number
  /** Sum of the sizes of the components at N: the rounding error of expansion is a few eps times this. */
  magnitude(N: number): number
  /** E² and its first two derivatives by N. */
  derivatives(N: number): Derivatives
}

export function modelOf(budget: Budget, law: Law): Model {
  const amounts = amountsOf(budget)
  const acted = merged(amounts, law)
  const { curvature, dark, matter: coldMatter, radiation } = acted
  const states = budget.states

  const expansion = (N: number, inverseScale: number): number => {
    const known = withoutDark(inverseScale)
    return dark === 0 ? known : known + dark * law.density(N)
  }
  const withoutDark = (x: number): number => {
    let relativistic = radiation
    if (x > NO_SCALE) for (const state of states) relativistic += state.masslessDensity * energyRatio(state.y / x)
    return ((relativistic * x + coldMatter) * x + curvature) * x * x
  }

  /** E²(anchor.N + d) − E²(anchor.N), and the sum of the sizes of its terms in `size`. */
  let size = 0
  const changeFrom = (anchor: Anchor, d: number, inDark = dark === 0 ? 0 : law.change(anchor.N, d)): number => {
    const x = Math.exp(-anchor.N)
    const e = Math.expm1(-d)
    const squared = e * (e + 2)
    const fourth = squared * (squared + 2)
    const k = curvature * x * x * squared
    const m = coldMatter * x * x * x * e * (e * (e + 3) + 3)
    let relativistic = radiation * fourth
    for (const state of states) {
      const y = state.y / x
      relativistic += state.masslessDensity * energyRatio(y) * (fourth + energyRatioChange(y, d) * (1 + fourth))
    }
    const r = relativistic * x * x * x * x
    const de = dark * inDark
    size = Math.abs(k) + Math.abs(m) + Math.abs(r) + Math.abs(de)
    return k + m + r + de
  }

  const energy = new Float64Array(3)
  const derivatives = (N: number): Derivatives => {
    const x = Math.exp(-N)
    const square = x * x
    const k = sized(curvature, square)
    const m = sized(coldMatter, square * x)
    const r = sized(radiation, square * square)
    let value = k + m + r
    let first = -2 * k - 3 * m - 4 * r
    let second = 4 * k + 9 * m + 16 * r
    let acceleration = -0.5 * m - r
    if (x > NO_SCALE) {
      for (const state of states) {
        energyDerivatives(state.y / x, energy)
        const density = state.masslessDensity * energy[0] * square * square
        const n = 4 - energy[1]
        value += density
        first -= n * density
        second += (n * n + energy[2]) * density
        acceleration += (1 - 0.5 * n) * density
      }
    }
    if (dark !== 0) {
      law.derivativesInto(energy, N)
      value += dark * energy[0]
      first += dark * energy[1]
      second += dark * energy[2]
      acceleration += dark * (energy[0] + 0.5 * energy[1])
    }
    return { value, first, second, acceleration }
  }

  const acting = componentsOf(acted, budget, law)
  const cancels = acting.reduce((sum, one) => sum + Math.abs(one.omega), 0) > 4
  return {
    budget,
    law,
    components: acted === amounts ? acting : componentsOf(amounts, budget, law),
    acting,
    cancels,
    signed: acting.some((one) => one.omega < 0 || one.terms !== undefined),
    expansion,
    expansionWith: (N, density) =>
      cancels && Math.abs(N) < NEAR_TODAY
        ? 1 + changeFrom(TODAY, N, density - 1)
        : withoutDark(Math.exp(-N)) + dark * density,
    bendFrom: (N, d) => acting.reduce((sum, one) => sum + one.bend(N, d), 0),
    expansionFrom: (anchor, d) => anchor.value + changeFrom(anchor, d),
    expansionFromWith: (anchor, d, inDark) => anchor.value + changeFrom(anchor, d, inDark),
    magnitudeFrom(anchor, d) {
      changeFrom(anchor, d)
      return Math.abs(anchor.value) + size
    },
    magnitude: (N) => acting.reduce((sum, one) => sum + Math.exp(one.logSize(N)), 0),
    derivatives,
  }
}

/** Nothing stays nothing where the power leaves the doubles. */
const sized = (omega: number, power: number): number => (omega === 0 ? 0 : omega * power)

/** E² at N by the form that rounds least: from today's E² = 1 nearby where large densities cancel, as the plain sum elsewhere. */
export function expansionAt(model: Model, N: number, inverseScale: number): number {
  return model.cancels && Math.abs(N) < NEAR_TODAY ? model.expansionFrom(TODAY, N) : model.expansion(N, inverseScale)
}

export const asymptoteOf = (one: Component, direction: 1 | -1): Asymptote => (direction > 0 ? one.future : one.past)

/** How dark energy varies in this direction where it goes like a power of ln a, else null. */
export function logarithmicIn(model: Model, direction: 1 | -1): Logarithmic | null {
  if (model.budget.dark === 0) return null
  const asymptote = direction > 0 ? model.law.future : model.law.past
  return asymptote.kind === 'logarithmic' ? asymptote : null
}

/** ln E² at N, also where E² itself leaves the doubles; for components that keep their signs. */
export function logExpansion(model: Model, N: number): number {
  const logs = model.acting.map((one) => one.logSize(N))
  const largest = Math.max(...logs)
  const sum = model.acting.reduce(
    (total, one, i) => total + Math.sign(one.omega) * Math.exp((logs[i] ?? largest) - largest),
    0,
  )
  return largest + Math.log(sum)
}

/** Ω today of what thins out by one law each. */
interface Amounts {
  readonly radiation: number
  readonly matter: number
  readonly curvature: number
  readonly dark: number
}

const amountsOf = (budget: Budget): Amounts => ({
  radiation: budget.photons + budget.masslessNeutrinos,
  matter: budget.coldMatter,
  curvature: budget.curvature,
  dark: budget.dark,
})

/** Dark energy that thins out exactly like radiation, matter or curvature counts as that. */
function merged(amounts: Amounts, { exponent }: Law): Amounts {
  const { radiation, matter, curvature, dark } = amounts
  if (exponent === 4) return { radiation: radiation + dark, matter, curvature, dark: 0 }
  if (exponent === 3) return { radiation, matter: matter + dark, curvature, dark: 0 }
  if (exponent === 2) return { radiation, matter, curvature: curvature + dark, dark: 0 }
  return amounts
}

function componentsOf(amounts: Amounts, budget: Budget, law: Law): readonly Component[] {
  const all: Component[] = [
    powerComponent('radiation', amounts.radiation, 4),
    powerComponent('matter', amounts.matter, 3),
    powerComponent('curvature', amounts.curvature, 2),
    darkComponent(amounts.dark, law),
    ...budget.states.map(neutrinoComponent),
  ]
  return all.filter((one) => one.omega !== 0)
}

function powerComponent(key: Component['key'], omega: number, exponent: number): Component {
  const logCoefficient = Math.log(Math.abs(omega))
  const range = [exponent, exponent] as const
  const asymptote = { kind: 'power', exponent, logCoefficient, settled: 0 } as const
  return {
    key,
    omega,
    logSize: (N) => logCoefficient - exponent * N,
    exponentRange: () => range,
    density: (N) => omega * Math.exp(-exponent * N),
    bend: (N, d) => omega * Math.exp(-exponent * N) * expm2(-exponent * d),
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
    logSize: (N) => log + law.logDensity(N),
    exponentRange: law.exponentRange,
    density: (N) => omega * law.density(N),
    bend: (N, d) => omega * law.bend(N, d),
    terms: law.parts && ((direction) => law.parts?.(direction)?.map((part) => termOf(omega, part)) ?? null),
    past: scaled(law.past),
    future: scaled(law.future),
  }
}

function termOf(darkEnergy: number, { factor, logDensity, exponentRange }: Part): Term {
  const omega = darkEnergy * factor
  const log = Math.log(Math.abs(omega))
  return { omega, logSize: (N) => log + logDensity(N), exponentRange }
}

/** The exponent of a massive state falls from 4 to 3, since the logarithmic slope of its energy ratio rises from 0 to 1. */
function neutrinoComponent(state: MassiveState): Component {
  const y = (N: number) => state.y * Math.exp(N)
  const logMassless = Math.log(state.masslessDensity)
  const cold = Math.log(1e9 / state.y)
  const logCold = logMassless + Math.log(energyRatio(1e20) * 1e-20 * state.y)
  const density = (N: number): number =>
    N > cold ? Math.exp(logCold - 3 * N) : state.masslessDensity * energyRatio(y(N)) * Math.exp(-4 * N)
  // The energy ratio is 1 + 0.07 y² at small y and (y/3.15)(1 + 6.5/y²) at large y: settled where the corrections are below 1e-17.
  return {
    key: 'neutrino',
    omega: state.density,
    // Also where y itself is no double any more.
    logSize: (N) => (N > cold ? logCold - 3 * N : logMassless + Math.log(energyRatio(y(N))) - 4 * N),
    density,
    bend: (N, d) =>
      density(N) *
      relativeBend(Math.log1p(energyRatioChange(y(N), d)) - 4 * d, d, (t) => -logSlopeDerivative(y(N + t))),
    exponentRange: (from, to) => [4 - logSlope(y(to)), 4 - logSlope(y(from))],
    past: { kind: 'power', exponent: 4, logCoefficient: logMassless, settled: Math.log(1e-8 / state.y) },
    future: { kind: 'power', exponent: 3, logCoefficient: logCold, settled: cold },
  }
}
