/**
 * E²(a) = H²/H₀² as a sum of densities, a function of N = ln a alone:
 * Ω_r a⁻⁴ + Σ Ω_ν(a) + Ω_c a⁻³ + Ω_k a⁻² + Ω_DE f(a), with E(1) = 1.
 * Every component is Ω e^(−∫n dN); its derivatives follow from n and n′ (Friedmann's equation and the conservation of energy).
 */
import { amountsOf, type Component, componentsOf, merged } from './components'
import type { Law, Logarithmic } from './dark-energy/law'
import { energyDerivatives, energyRatio, energyRatioChange } from './neutrinos/energy'
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
  /** The same at many places, by the form that rounds least. */
  expansionsInto(out: Float64Array, places: Float64Array, inverseScales: Float64Array, from: number, to: number): void
  /** Ω f of one component, as the budget names it, at many places. */
  densitiesInto(
    out: Float64Array,
    key: Component['key'],
    places: Float64Array,
    inverseScales: Float64Array,
    count: number,
  ): void
  /** dE²/dN and d²E²/dN² at many places. */
  slopesInto(
    first: Float64Array,
    second: Float64Array,
    places: Float64Array,
    inverseScales: Float64Array,
    count: number,
  ): void
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

  const energy = new Float64Array(3)
  const expansionsInto: Model['expansionsInto'] = (out, places, inverseScales, from, to) => {
    for (let i = from; i < to; i++) {
      const x = inverseScales[i]
      out[i] = ((radiation * x + coldMatter) * x + curvature) * x * x
    }
    for (const state of states) for (let i = from; i < to; i++) out[i] += densityOf(state, inverseScales[i])
    if (dark !== 0) addDark(out, places, inverseScales, from, to)
    if (!cancels) return
    for (let i = from; i < to; i++) if (Math.abs(places[i]) < NEAR_TODAY) out[i] = 1 + changeFrom(TODAY, places[i])
  }

  let laws = new Float64Array(0)
  const addDark: Model['expansionsInto'] = (out, places, inverseScales, from, to) => {
    if (law.exponent === 0) for (let i = from; i < to; i++) out[i] += dark
    else if (law.densitiesInto) {
      if (laws.length < out.length) laws = new Float64Array(out.length)
      law.densitiesInto(laws, places, inverseScales, from, to)
      for (let i = from; i < to; i++) out[i] += dark * laws[i]
    } else for (let i = from; i < to; i++) out[i] += dark * law.density(places[i])
  }

  const densitiesInto: Model['densitiesInto'] = (out, key, places, inverseScales, count) => {
    out.fill(0, 0, count)
    if (key === 'neutrino') {
      for (const state of states) for (let i = 0; i < count; i++) out[i] += densityOf(state, inverseScales[i])
    } else if (key === 'dark') {
      const steady = law.exponent === 0
      if (amounts.dark !== 0)
        for (let i = 0; i < count; i++) out[i] = amounts.dark * (steady ? 1 : law.density(places[i]))
    } else {
      const [amount, cubed, fourth] = [amounts[key], key !== 'curvature', key === 'radiation']
      if (amount === 0) return
      for (let i = 0; i < count; i++) {
        const x = inverseScales[i]
        out[i] = amount * x * x * (cubed ? x : 1) * (fourth ? x : 1)
      }
    }
  }

  const slopesInto: Model['slopesInto'] = (first, second, places, inverseScales, count) => {
    for (let i = 0; i < count; i++) {
      const x = inverseScales[i]
      const square = x * x
      const k = sized(curvature, square)
      const m = sized(coldMatter, square * x)
      const r = sized(radiation, square * square)
      first[i] = -2 * k - 3 * m - 4 * r
      second[i] = 4 * k + 9 * m + 16 * r
    }
    for (const state of states) {
      for (let i = 0; i < count; i++) {
        if (!(inverseScales[i] > NO_SCALE)) continue
        energyDerivatives(state.y / inverseScales[i], energy)
        const square = inverseScales[i] * inverseScales[i]
        const density = state.masslessDensity * energy[0] * square * square
        const n = 4 - energy[1]
        first[i] -= n * density
        second[i] += (n * n + energy[2]) * density
      }
    }
    if (dark === 0 || law.exponent === 0) return
    for (let i = 0; i < count; i++) {
      law.derivativesInto(energy, places[i])
      first[i] += dark * energy[1]
      second[i] += dark * energy[2]
    }
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
    expansionsInto,
    densitiesInto,
    slopesInto,
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

/** Density of a state of massive neutrinos at 1/a. */
function densityOf({ masslessDensity, y }: MassiveState, x: number): number {
  if (!(x > NO_SCALE)) return 0
  const square = x * x
  return masslessDensity * energyRatio(y / x) * square * square
}

/** Nothing stays nothing where the power leaves the doubles. */
const sized = (omega: number, power: number): number => (omega === 0 ? 0 : omega * power)

/** E² at N by the form that rounds least: from today's E² = 1 nearby where large densities cancel, as the plain sum elsewhere. */
export function expansionAt(model: Model, N: number, inverseScale: number): number {
  return model.cancels && Math.abs(N) < NEAR_TODAY ? model.expansionFrom(TODAY, N) : model.expansion(N, inverseScale)
}

const [place, inverseScale, first, second] = Array.from({ length: 4 }, () => new Float64Array(1))

/** dE²/dN at N. */
export function slopeAt(model: Model, N: number): number {
  place[0] = N
  inverseScale[0] = Math.exp(-N)
  model.slopesInto(first, second, place, inverseScale, 1)
  return first[0]
}

/** How dark energy varies in this direction where it goes like a power of ln a, else null. */
export function logarithmicIn(model: Model, direction: 1 | -1): Logarithmic | null {
  if (model.budget.dark === 0) return null
  const asymptote = direction > 0 ? model.law.future : model.law.past
  return asymptote.kind === 'logarithmic' ? asymptote : null
}

const logs: number[] = []

/** ln E² at N, also where E² itself leaves the doubles; for components that keep their signs. */
export function logExpansion({ acting }: Model, N: number): number {
  let largest = Number.NEGATIVE_INFINITY
  for (let i = 0; i < acting.length; i++) {
    logs[i] = acting[i].logSize(N)
    largest = Math.max(largest, logs[i])
  }
  let sum = 0
  for (let i = 0; i < acting.length; i++) sum += Math.sign(acting[i].omega) * Math.exp(logs[i] - largest)
  return largest + Math.log(sum)
}
