/**
 * The scalar fields of the reference set (test/reference/set-a.json: Taylor series of order 44 in time, checked by Gragg's method in
 * other variables; their field is at rest until a = 1e-5, ours until 1e-6, which moves nothing by more than 1e-14).
 * Every value within 1e-10 of itself or of its conditioning: the integration takes some 50 steps of 1e-11 and better.
 */
import { describe, expect, it } from 'vitest'
import { familyOf } from '../../lib/dark-energy/index'
import { type Event, eventAtScale, eventAtTime, isEvent, sinceNow } from '../../lib/history/event'
import { lookAhead } from '../../lib/history/field/ahead'
import { backgroundOf } from '../../lib/history/field/background'
import { BUDGET, fieldToday } from '../../lib/history/field/height'
import { type Field, TIMED_PHI } from '../../lib/history/field/motion'
import { passage } from '../../lib/history/field/shot'
import { trailByScale } from '../../lib/history/field/trail'
import { travelOn } from '../../lib/history/field/voyage'
import { type History, historyOf } from '../../lib/history/history'
import { transverseDistance } from '../../lib/measures/distances'
import { deceleration, equationOfState, hubbleRate, jerk } from '../../lib/measures/rates'
import { comovingDistance, eventHorizon, particleHorizon } from '../../lib/measures/sight'
import { valueIn } from '../../lib/numerics/ode'
import { type Budget, budgetOf } from '../../lib/scenario/budget'
import type { Scenario } from '../../lib/scenario/scenario'
import { hubbleLengthMpc, hubbleTimeGyr } from '../../lib/units'
import { isField, REFERENCES, type Reference, scenarioOf } from '../reference/set-a'

const TOLERANCE = 1e-10

interface Case {
  readonly reference: Reference
  readonly scenario: Scenario
  readonly budget: Budget
  readonly history: History
  readonly field: Field
  /** φ and φ̇ today. */
  readonly today: Float64Array
}

function caseOf(reference: Reference): Case {
  const scenario = scenarioOf(reference)
  const budget = budgetOf(scenario)
  const potential = familyOf('field').potential?.(scenario.law)
  if (!potential) throw new Error('the family has no potential')
  const purse = { left: BUDGET }
  const field = fieldToday({ potential, background: backgroundOf(budget), target: budget.dark, purse })
  const today = passage(field, purse).state
  return { reference, scenario, budget, history: historyOf(scenario, budget), field, today }
}

const number = (value: number | { readonly because: string }): number =>
  typeof value === 'number' ? value : Number.NaN

function at({ history }: Case, scale: number): Event {
  const event = eventAtScale(history, Math.log(scale), 'expanding')
  if (!isEvent(event)) throw new Error(event.because)
  return event
}

/** Their linear potential counts φ down from φ_i, ours up from 0. */
const isLinear = ({ field }: Case): boolean => field.potential.kind === 'linear'
const rest = (one: Case): number => one.reference.params.de?.phi_i ?? 0
const theirPhi = (one: Case, phi: number): number => (isLinear(one) ? rest(one) - phi : phi)

function phiAhead(one: Case, scale: number): number {
  const ahead = lookAhead(one.field, one.today, { left: BUDGET }, false)
  if (ahead.kind === 'shallow' || ahead.kind === 'spent') return phiBeforeTurning(one, scale)
  const out = new Float64Array(2)
  trailByScale(one.field, ahead.steps, ahead.end).into(out, Math.log(scale))
  return out[0]
}

function phiBeforeTurning(one: Case, scale: number): number {
  const { steps } = travelOn(one.field, one.today, { left: BUDGET })
  const target = Math.log(scale)
  const step = steps.find((each) => valueIn(each, 0, each.to) >= target)
  if (!step) return Number.NaN
  let [low, high] = [step.from, step.to]
  for (let i = 0; i < 60; i++) {
    const middle = (low + high) / 2
    if (valueIn(step, 0, middle) < target) low = middle
    else high = middle
  }
  return valueIn(step, TIMED_PHI, low)
}

function phiAtTurn(one: Case): number {
  const { steps, turns } = travelOn(one.field, one.today, { left: BUDGET })
  return valueIn(steps[turns[0].step], TIMED_PHI, turns[0].tau)
}

const PLAIN: Readonly<Record<string, (one: Case) => number>> = {
  amplitude_A: (one) => one.field.height / (isLinear(one) ? rest(one) : 1),
  Omega_phi: ({ budget }) => budget.dark,
  Omega_k: ({ budget }) => budget.curvature,
  phi_0: (one) => theirPhi(one, one.today[0]),
  psi_0: (one) => (isLinear(one) ? -1 : 1) * one.today[1],
  w_phi_0: (one) => number(equationOfState(at(one, 1))),
  q0: (one) => number(deceleration(at(one, 1))),
  j0: (one) => number(jerk(at(one, 1))),
  age: ({ history }) => history.past.time.total,
  age_Gyr: ({ history, scenario }) => history.past.time.total * hubbleTimeGyr(scenario.h0),
  particle_horizon: (one) => number(particleHorizon(one.history, at(one, 1))),
  event_horizon: (one) => number(eventHorizon(one.history, at(one, 1))),
  chi_to_crunch: (one) => number(eventHorizon(one.history, at(one, 1))),
  chi_to_turn: ({ history }) => history.future.conformal.total,
  t_turn_from_now: ({ history }) => history.end.turnaround?.time ?? Number.NaN,
  t_crunch_from_now: ({ history }) => history.end.time ?? Number.NaN,
  lifetime: ({ history }) => history.past.time.total + (history.end.time ?? Number.NaN),
  a_turn: ({ history }) => history.end.turnaround?.scale ?? Number.NaN,
  a_max: ({ history }) => history.end.turnaround?.scale ?? Number.NaN,
  phi_turn: (one) => theirPhi(one, phiAtTurn(one)),
  n_extrema: (one) => travelOn(one.field, one.today, { left: BUDGET }).turns.length,
}

function atTime({ history }: Case, time: number): Event {
  const event = eventAtTime(history, time)
  if (!isEvent(event)) throw new Error(event.because)
  return event
}

const chi = (one: Case, z: number) => number(comovingDistance(one.history, at(one, 1 / (1 + z))))

const ARGUED: Readonly<Record<string, (one: Case, x: number) => number>> = {
  'E(z': (one, z) => hubbleRate(at(one, 1 / (1 + z))),
  'lookback(z': (one, z) => -sinceNow(one.history, at(one, 1 / (1 + z)), 'time'),
  'D_C(z': chi,
  'D_L_Mpc(z': (one, z) =>
    (1 + z) * transverseDistance(chi(one, z), one.budget.curvature) * hubbleLengthMpc(one.scenario.h0),
  'w_phi(z': (one, z) => number(equationOfState(at(one, 1 / (1 + z)))),
  'E(a': (one, a) => hubbleRate(at(one, a)),
  't_from_now(a': (one, a) => sinceNow(one.history, at(one, a), 'time'),
  'chi_from_now(a': (one, a) => sinceNow(one.history, at(one, a), 'conformal'),
  'phi(a': (one, a) => theirPhi(one, phiAhead(one, a)),
  'a(t': (one, time) => Math.exp(atTime(one, time).place.N),
  'H(t': (one, time) => hubbleRate(atTime(one, time)),
}

function ours(one: Case, name: string): number {
  if (name in PLAIN) return PLAIN[name](one)
  const argued = /^(.*\([zat])=(?:now\+)?([\d.e+-]+)\)$/.exec(name)
  if (argued && argued[1] in ARGUED) return ARGUED[argued[1]](one, Number(argued[2]))
  throw new Error(`nothing computes ${name}`)
}

const ENDS: Readonly<Record<string, string>> = {
  A55: 'accelerating',
  A56: 'accelerating',
  A57: 'decelerating',
  A58: 'crunch',
}

describe.each(REFERENCES.filter(isField).map((one) => [`${one.id}: ${one.note}`, one] as const))(
  '%s',
  (_, reference) => {
    const one = caseOf(reference)

    it('begins and ends as it should', () => {
      expect(one.history.origin.kind).toBe('big-bang')
      expect(one.history.end.kind).toBe(ENDS[reference.id])
    })

    it.each(Object.entries(reference.quantities))('%s', (name, { value, sens }) => {
      const expected = Number(value)
      expect(Math.abs(ours(one, name) - expected)).toBeLessThanOrEqual(
        TOLERANCE * Math.max(Math.abs(expected), sens ?? 0),
      )
    })
  },
)
