/** The field after today through turning points, step by step in time, down to a crunch. */
import { type Purse, type Step, travel, valueIn } from '../../numerics/ode'
import { brent } from '../../numerics/roots'
import { byTime, type Field, project, RATE, SCALE, TIMED_PHI, TIMED_SPEED } from './motion'
import type { Leg } from './trail'

const TOLERANCE = 1e-11
/** Relative error of E² that the steps may add up to; ten times what the reference set shows. */
export const VOYAGE_ERROR = 1e-10
/** Relative size of everything but φ̇²/6 in E² from which the way to the crunch is one power of a, good to 1e-17 with its corrections. */
const SMALL = 2e-9
/** E² beyond which the contraction is left to its power: squares are still doubles. */
const LARGEST = 1e140
/** Times that H changes its sign before the scenario is given up. */
const MOST_TURNS = 20
/** Looks for H = 0 within a step. */
const LOOKS = 4

/** A moment at which H = 0. */
export interface Turn {
  readonly tau: number
  readonly N: number
  /** Index of its step. */
  readonly step: number
}

export interface Voyage {
  readonly steps: readonly Step[]
  readonly turns: readonly Turn[]
  /** In the power law of a crunch; above today's size with densities near the end of the doubles; or without an end. */
  readonly end: 'crunch' | 'overflow' | 'spent' | 'expanding'
  /** N, H, φ and φ̇ where it ended. */
  readonly state: Float64Array
}

const scratch = new Float64Array(3)

/** From today, with φ and φ̇ in `today`, by steps that many times `looser`. */
export function travelOn(field: Field, today: Float64Array, purse: Purse, looser = 1): Voyage {
  const steps: Step[] = []
  const turns: Turn[] = []
  let end: Voyage['end'] = 'spent'
  const after = (_: number, state: Float64Array, step: Step | null) => {
    project(field, state)
    /* v8 ignore if -- a dense course has every step */
    if (!step) return false
    steps.push(step)
    turns.push(...turnsIn(step, steps.length - 1))
    const outcome = outcomeAt(field, state, turns.length)
    if (outcome !== null) end = outcome
    return outcome !== null
  }
  const state = Float64Array.of(0, 1, today[0], today[1])
  const tolerance = looser * TOLERANCE
  travel(byTime(field), { from: 0, to: 1e9, state, tolerance, first: 0.05, after, dense: true, purse })
  return { steps, turns, end, state }
}

/** Sign changes of H within a step. */
function turnsIn(step: Step, index: number): Turn[] {
  const rate = (tau: number) => valueIn(step, RATE, tau)
  const found: Turn[] = []
  let [from, was] = [step.from, rate(step.from)]
  for (let k = 1; k <= LOOKS; k++) {
    const to = step.from + ((step.to - step.from) * k) / LOOKS
    const is = rate(to)
    if (was !== 0 && was > 0 !== is > 0) {
      const tau = brent(rate, from, to)
      found.push({ tau, N: valueIn(step, SCALE, tau), step: index })
    }
    ;[from, was] = [to, is]
  }
  return found
}

function outcomeAt(field: Field, state: Float64Array, turns: number): Voyage['end'] | null {
  const [N, H] = [state[SCALE], state[RATE]]
  /* v8 ignore if -- guards, which no scenario has been seen to need */
  if (!Number.isFinite(N + H) || turns > MOST_TURNS) return 'spent'
  if (H > 0) return N > 690 || (turns === 0 && N > 5 && accelerates(field, state)) ? 'expanding' : null
  field.background.into(scratch, N)
  const kinetic = state[TIMED_SPEED] ** 2 / 6
  const rest = scratch[2] + Math.abs(field.height * field.potential.value(state[TIMED_PHI]))
  if (rest < SMALL * kinetic && N < -1) return 'crunch'
  return H * H > LARGEST && kinetic > 0.99 * H * H
    ? N < -1
      ? /* v8 ignore next -- there the power law has set in long before */ 'crunch'
      : 'overflow'
    : null
}

/** Nothing but a potential is left that goes on for ever and falls no faster than it does here: no turning point is in sight. */
function accelerates(field: Field, state: Float64Array): boolean {
  if (field.potential.kind !== 'exponential' && field.potential.kind !== 'inverse') return false
  field.background.into(scratch, state[SCALE])
  const potential = field.height * field.potential.value(state[TIMED_PHI])
  return scratch[2] + state[TIMED_SPEED] ** 2 / 6 < 1e-3 * potential
}

/** The parts of the steps between two moments, in order of time. */
export function legsBetween(steps: readonly Step[], from: number, to: number): Leg[] {
  return steps
    .filter((one) => one.to > from && one.from < to)
    .map((step) => ({ step, from: Math.max(from, step.from), to: Math.min(to, step.to) }))
}

/** The moment after `tau` at which N = 0; null where it never is. */
export function returnAfter(steps: readonly Step[], tau: number): number | null {
  for (const leg of legsBetween(steps, tau, Number.POSITIVE_INFINITY)) {
    const scale = (x: number) => valueIn(leg.step, SCALE, x)
    if (scale(leg.to) <= 0 && scale(leg.from) > 0) return brent(scale, leg.from, leg.to)
  }
  return null
}
