/**
 * Recombination and the sound horizon, by fits for the standard early universe. Each is missing outside the range of its fit.
 */
import { eventAtScale, isEvent } from '../history/event'
import type { History } from '../history/history'
import { integrate } from '../numerics/integrate'
import type { Budget } from '../scenario/budget'
import type { Scenario } from '../scenario/scenario'
import { transverseDistance } from './distances'
import { type Bounded, bounded, isMissing, type Missing, missing, type Outcome } from './outcome'
import { comovingDistance } from './sight'

/** z* of Hu & Sugiyama 1996 is 0.18% high of the values of Planck 2018 (arXiv:1807.06209, Table 2, five columns). */
const CALIBRATION = 0.99818

/** How far off a fit may be: at the parameters of those columns, for each unit of N_eff away from them, and for each e-fold. */
interface Straying {
  readonly there: number
  readonly nu: number
  readonly baryons: number
  readonly matter: number
  readonly cmb: number
}

/** N_eff, Ω_b h², Ω_m h² and T_CMB of those columns. */
const THERE = { nu: 3.046, baryons: 0.0224, matter: 0.143, cmb: 2.7255 }
/**
 * The columns are met within 0.03 and 0.05. Elsewhere the fits, which know neither N_eff nor T_CMB, depart so far from an integration of
 * recombination with helium (Peebles 1968, ApJ 153, 1; test/reference/recombination.py), with some room.
 */
const RECOMBINATION_FIT: Straying = { there: 0.1, nu: 0.5, baryons: 2.3, matter: 0.4, cmb: 1150 }
const DRAG_FIT: Straying = { there: 0.05, nu: 0.4, baryons: 1.4, matter: 0.8, cmb: 1350 }

/** Why the fits do not hold, or null where they do: the ranges within which they were made or checked. */
function outside({ radiation, baryons, h0, matter }: Scenario): Missing | null {
  if (radiation.kind !== 'thermal') return missing('without a photon temperature there is no recombination to compute')
  const density = matter * (h0 / 100) ** 2
  const ranges: readonly (readonly [string, number, number, number])[] = [
    ['the photon temperature', radiation.cmb, 2.7, 2.75],
    ['the effective number of neutrinos', radiation.nu, 2, 4.5],
    ['Ω_b h²', baryons, 0.015, 0.03],
    ['Ω_m h²', density, 0.08, 0.25],
  ]
  const broken = ranges.find(([, value, low, high]) => !(value >= low && value <= high))
  if (!broken) return null
  const [name, value, low, high] = broken
  return missing(`the fit holds for ${name} from ${low} to ${high}, not for ${Number(value.toPrecision(4))}`)
}

function fitError({ there, nu, baryons, matter, cmb }: Straying, { h0, radiation, ...scenario }: Scenario): number {
  /* v8 ignore if -- without a temperature there is no fit */
  if (radiation.kind !== 'thermal') return Number.NaN
  const folds = (value: number, known: number) => Math.abs(Math.log(value / known))
  return (
    there +
    nu * Math.abs(radiation.nu - THERE.nu) +
    baryons * folds(scenario.baryons, THERE.baryons) +
    matter * folds(scenario.matter * (h0 / 100) ** 2, THERE.matter) +
    cmb * folds(radiation.cmb, THERE.cmb)
  )
}

/** z of last scattering: Hu & Sugiyama 1996, ApJ 471, 542, eq. E-1, times 0.99818. */
export function recombinationRedshift(scenario: Scenario): Outcome {
  const refusal = outside(scenario)
  if (refusal) return refusal
  const [b, m] = [scenario.baryons, scenario.matter * (scenario.h0 / 100) ** 2]
  const g1 = (0.0783 * b ** -0.238) / (1 + 39.5 * b ** 0.763)
  const g2 = 0.56 / (1 + 21.1 * b ** 1.81)
  return {
    value: CALIBRATION * 1048 * (1 + 0.00124 * b ** -0.738) * (1 + g1 * m ** g2),
    error: fitError(RECOMBINATION_FIT, scenario),
  }
}

/** z at which baryons leave the photons' drag: Aizpuru, Arjona & Nesseris 2021, Phys. Rev. D 104, 043521, eq. A2. */
export function dragRedshift(scenario: Scenario): Outcome {
  const refusal = outside(scenario)
  if (refusal) return refusal
  const [b, m] = [scenario.baryons, scenario.matter * (scenario.h0 / 100) ** 2]
  const value = (1 + 428.169 * b ** 0.256459 * m ** 0.616388 + 925.56 * m ** 0.751615) * m ** -0.714129
  return { value, error: fitError(DRAG_FIT, scenario) }
}

/** Of cold matter: with less the variable is as good. */
const LEAST = 1e-6
/** a at which all radiation, early, equals cold matter: with v = √(1 + a/a_eq) − 1, a²H of both is linear in v. */
const equality = ({ photons, masslessNeutrinos, coldMatter, states }: Budget): number =>
  states.reduce((sum, one) => sum + one.masslessDensity, photons + masslessNeutrinos) / Math.max(coldMatter, LEAST)

/** Comoving sound horizon at z in c/H₀: ∫ c_s da/(a² H) with c_s = c/√(3(1 + R)), R = 3ρ_b/4ρ_γ. */
export function soundHorizon(history: History, scenario: Scenario, z: Bounded): Outcome {
  const { model, end } = history.past
  if (end.kind !== 'none') return missing('the expansion did not begin at a = 0')
  const load = (0.75 * scenario.baryons) / ((scenario.h0 / 100) ** 2 * model.budget.photons)
  const integrand = (a: number) => 1 / (a * a * Math.sqrt(3 * (1 + load * a) * model.expansion(Math.log(a), 1 / a)))
  const scale = 1 / (1 + z.value)
  const equal = equality(model.budget)
  const last = scale / equal / (1 + Math.sqrt(1 + scale / equal))
  const { value, error } = integrate((v) => 2 * equal * (1 + v) * integrand(equal * v * (2 + v)), 0, last)
  return bounded(value, error + (integrand(scale) * z.error) / (1 + z.value) ** 2)
}

/** θ* = r_s(z*)/D_M(z*), radian. */
export function acousticAngle(history: History, scenario: Scenario): Outcome {
  const z = recombinationRedshift(scenario)
  if (isMissing(z)) return z
  const sound = soundHorizon(history, scenario, z)
  if (isMissing(sound)) return sound
  const event = eventAtScale(history, -Math.log1p(z.value), 'expanding')
  /* v8 ignore if -- with a sound horizon the expansion began at a = 0 and passed z* */
  if (!isEvent(event)) return missing(event.because)
  const chi = comovingDistance(history, event)
  /* v8 ignore if -- z* is above 0, so it lies in the past */
  if (typeof chi !== 'number') return chi
  const { model, conformal } = history.past
  const { curvature } = model.budget
  const distance = transverseDistance(chi, curvature)
  const angle = sound.value / distance
  // dχ = dz/E, and D_M moves by √(1 + Ω_k D_M²) times that: cos or cosh of χ/R.
  const chiError = conformal.error + z.error / Math.sqrt(model.expansion(-Math.log1p(z.value), 1 + z.value))
  const distanceError = chiError * Math.sqrt(Math.max(0, 1 + curvature * distance ** 2))
  return bounded(angle, (sound.error + angle * distanceError) / distance)
}
