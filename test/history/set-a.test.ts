/**
 * Every value of the reference set for the laws that exist, within 1e-12 of itself plus 16 × 2⁻⁵³ × sens: sens is its own
 * conditioning, by which an error of eps in every parameter moves it. Source: test/reference/set-a.json, made by the scripts beside it.
 */
import { describe, expect, it } from 'vitest'
import {
  type Branch,
  type Event,
  eventAtAge,
  eventAtScale,
  isEvent,
  sinceNow,
  sinceOrigin,
} from '../../lib/history/event'
import { type History, historyOf } from '../../lib/history/history'
import { antipode, comovingVolume, transverseDistance } from '../../lib/measures/distances'
import { accelerationChanges, darkOverMatter, matterOverRadiation, overtakings } from '../../lib/measures/epochs'
import { isMissing } from '../../lib/measures/outcome'
import { deceleration, hubbleRate, jerk } from '../../lib/measures/rates'
import { comovingDistance, eventHorizon, particleHorizon, redshiftAt } from '../../lib/measures/sight'
import { type Budget, budgetOf } from '../../lib/scenario/budget'
import { hubbleLengthMpc, hubbleTimeGyr } from '../../lib/units'
import { lawIsKnown, REFERENCES, type Reference, scenarioOf } from '../reference/set-a'

const EPS = 2 ** -53
const RELATIVE = 1e-12
const CONDITION = 16

interface Case {
  readonly reference: Reference
  readonly history: History
  readonly budget: Budget
  readonly h0: number
}

function caseOf(reference: Reference): Case {
  const scenario = scenarioOf(reference)
  const budget = budgetOf(scenario)
  return { reference, budget, history: historyOf(scenario, budget), h0: scenario.h0 }
}

const number = (value: number | { readonly because: string }): number =>
  typeof value === 'number' ? value : Number.POSITIVE_INFINITY

function at({ history }: Case, scale: number, branch: Branch = 'expanding'): Event {
  const event = eventAtScale(history, Math.log(scale), branch)
  if (!isEvent(event)) throw new Error(event.because)
  return event
}

/** The set looks for equal densities of matter and dark energy from ln a = −30 on (refcore.py, analyse). */
const darkEqualities = (history: History): number[] =>
  overtakings(history, darkOverMatter)
    .filter((one) => one.N > -30)
    .map((one) => Math.exp(one.N))

/** Values without an argument. */
const PLAIN: Readonly<Record<string, (one: Case) => number>> = {
  Omega_k: ({ budget }) => budget.curvature,
  Omega_de: ({ budget }) => budget.dark,
  Omega_gamma: ({ budget }) => budget.photons,
  Omega_nu: ({ budget }) => budget.masslessNeutrinos + budget.massiveNeutrinos,
  q0: (one) => number(deceleration(at(one, 1))),
  j0: (one) => number(jerk(at(one, 1))),
  age: ({ history }) => history.past.time.total,
  age_Gyr: ({ history, h0 }) => history.past.time.total * hubbleTimeGyr(h0),
  event_horizon: (one) => number(eventHorizon(one.history, at(one, 1))),
  particle_horizon: (one) => number(particleHorizon(one.history, at(one, 1))),
  chi_since_bounce: ({ history }) => history.past.conformal.total,
  chi_to_crunch: ({ history: { future, descent, home } }) =>
    future.conformal.total + descent.conformal.total + home.conformal.total,
  z_reach: (one) => {
    const reach = redshiftAt(one.history, number(eventHorizon(one.history, at(one, 1))), 0)
    return isMissing(reach) ? Number.POSITIVE_INFINITY : reach.value
  },
  a_min: ({ history }) => history.origin.scale,
  a_loiter: ({ history }) =>
    history.origin.kind === 'static' ? history.origin.scale : (history.end.scale ?? Number.NaN),
  a_max: ({ history }) => history.end.turnaround?.scale ?? Number.NaN,
  t_turn_from_now: ({ history }) => history.end.turnaround?.time ?? Number.NaN,
  t_crunch_from_now: ({ history }) => history.end.time ?? Number.NaN,
  t_rip_from_now: ({ history }) => history.end.time ?? Number.NaN,
  lifetime: ({ history }) => history.past.time.total + (history.end.time ?? Number.NaN),
  a_eq_mr: ({ history }) => Math.exp(overtakings(history, matterOverRadiation)[0].N),
  'a_eq_mde[0]': ({ history }) => darkEqualities(history)[0],
  'a_eq_mde[1]': ({ history }) => darkEqualities(history)[1],
  'a_acc[0]': ({ history }) => Math.exp(accelerationChanges(history)[0].N),
  'a_acc[1]': ({ history }) => Math.exp(accelerationChanges(history)[1].N),
}

const chi = (one: Case, scale: number) => number(comovingDistance(one.history, at(one, scale)))
const transverse = (one: Case, z: number) => transverseDistance(chi(one, 1 / (1 + z)), one.budget.curvature)
const luminosity = (one: Case, z: number) => (1 + z) * transverse(one, z) * hubbleLengthMpc(one.h0)

/** Values at a redshift or a scale factor. The set writes D_M, D_L with the sign of the bare formula past an antipode. */
const ARGUED: Readonly<Record<string, (one: Case, x: number) => number>> = {
  'lookback(z': (one, z) => -sinceNow(one.history, at(one, 1 / (1 + z)), 'time'),
  'D_C(z': (one, z) => chi(one, 1 / (1 + z)),
  'D_M(z': transverse,
  'D_L_Mpc(z': luminosity,
  'mu(z': (one, z) => 5 * Math.log10(luminosity(one, z)) + 25,
  'V_C(z': (one, z) => comovingVolume(chi(one, 1 / (1 + z)), one.budget.curvature),
  'E(z': (one, z) => hubbleRate(at(one, 1 / (1 + z))),
  'E(a': (one, a) => hubbleRate(at(one, a)),
  'q(a': (one, a) => number(deceleration(at(one, a))),
  'j(a': (one, a) => number(jerk(at(one, a))),
  't_from_now(a': (one, a) => sinceNow(one.history, at(one, a), 'time'),
  't(a': (one, a) => sinceOrigin(one.history, at(one, a), 'time'),
  'particle_horizon_proper(a': (one, a) => a * number(particleHorizon(one.history, at(one, a))),
  'event_horizon_proper(a': (one, a) => a * number(eventHorizon(one.history, at(one, a))),
}

function scaleAtFraction(one: Case, fraction: number): number {
  const event = eventAtAge(one.history, fraction * one.history.past.time.total)
  return isEvent(event) ? Math.exp(event.place.N) : Number.NaN
}

function ours(one: Case, name: string): number {
  if (name in PLAIN) return PLAIN[name](one)
  const fraction = /^a\(t=([\d.]+)\*age\)$/.exec(name)
  if (fraction) return scaleAtFraction(one, Number(fraction[1]))
  const argued = /^(.*\([za])=([\d.e+-]+)\)$/.exec(name)
  if (argued && argued[1] in ARGUED) return ARGUED[argued[1]](one, Number(argued[2]))
  throw new Error(`nothing computes ${name}`)
}

/** The set's own sign conventions past the antipode of a closed universe: negative sin, growing volume. */
function theirs(one: Case, name: string, value: number): number {
  const z = /^(?:D_M|D_L_Mpc|mu|V_C)\(z=([\d.e+-]+)\)$/.exec(name)
  if (!z) return value
  return name.startsWith('V_C') ? Math.min(value, wholeSphere(one)) : Math.abs(value)
}

const wholeSphere = ({ budget }: Case): number =>
  budget.curvature < 0 ? 2 * Math.PI ** 2 * (antipode(budget.curvature) / Math.PI) ** 3 : Number.POSITIVE_INFINITY

const ORIGINS: Readonly<Record<string, string>> = {
  'big-bang': 'big-bang',
  bounce: 'bounce',
  loiter: 'static',
  asymptotic: 'eternal',
}
const ENDS: Readonly<Record<string, string>> = {
  recollapse: 'crunch',
  loiter: 'static',
  'big-rip': 'rip',
  'de-sitter': 'exponential',
  'eternal-accelerating': 'accelerating',
  coasting: 'coasting',
  'eternal-decelerating': 'decelerating',
}

describe.each(REFERENCES.filter(lawIsKnown).map((one) => [`${one.id}: ${one.note}`, one] as const))(
  '%s',
  (_, reference) => {
    const one = caseOf(reference)

    it('begins and ends as it should', () => {
      expect(one.history.origin.kind).toBe(ORIGINS[reference.past])
      expect(one.history.end.kind).toBe(ENDS[reference.future])
    })

    it.each(Object.entries(reference.quantities))('%s', (name, { value, sens }) => {
      const expected = theirs(one, name, Number(value))
      const actual = ours(one, name)
      if (!Number.isFinite(expected)) return expect(actual).toBe(expected)
      const tolerance = RELATIVE * Math.abs(expected) + CONDITION * EPS * (sens ?? 4 * Math.max(1, Math.abs(expected)))
      expect(Math.abs(actual - expected)).toBeLessThanOrEqual(tolerance)
    })
  },
)
