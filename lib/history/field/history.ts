/** The whole history of a scenario with a scalar field: the past as a law in N, the future as far as it is one, else by time. */
import type { Potential } from '../../dark-energy/potential'
import { powerLaw } from '../../dark-energy/power-law'
import { type Model, modelOf } from '../../model'
import type { Purse } from '../../numerics/ode'
import type { Budget } from '../../scenario/budget'
import { type Arm, armOf } from '../arm'
import { endOf } from '../ending'
import { originOf } from '../origin'
import type { Origin } from '../outcome'
import type { History } from '../whole'
import { errorAhead, lookAhead, type Outlook } from './ahead'
import { backgroundOf } from './background'
import { averagedCrunch, crunchAfter, endAhead } from './endings'
import { BUDGET, FUTURE_BUDGET, fieldToday } from './height'
import { fieldLaw } from './law'
import { energyOf } from './motion'
import { FROZEN, PASSAGE_ERROR, passage } from './shot'
import { type Route, restOf, timedArm } from './timed-arm'
import { trailByScale } from './trail'
import { overBudget, unsolvable } from './unsolvable'
import { legsBetween, returnAfter, travelOn, type Voyage } from './voyage'

type Ahead = Pick<History, 'future' | 'home' | 'descent' | 'unfollowed' | 'end'>

/** Evaluations for a way on which the field swings; where they do not suffice, averages are told. */
const SWINGING_BUDGET = 40_000

/** The field as it is today. */
interface Now extends Route {
  readonly state: Float64Array
  readonly past: Arm
}

export function fieldHistory(budget: Budget, potential: Potential, hold: boolean): History {
  if (!(budget.dark > 0)) {
    const given = Number(budget.dark.toPrecision(6))
    throw unsolvable(
      `A scalar field at rest needs a positive density, and Ω_DE is ${given}.`,
      budget.closes === 'dark' ? 'matter' : 'dark',
    )
  }
  const purse = { left: BUDGET }
  const now = today(budget, potential, purse)
  const w = now.past.model.law.w(0)
  const ahead = hold ? held(now, modelOf(budget, powerLaw(w))) : followed(now, aheadOf(purse))
  // Before a bounce in the frozen era the same universe came in, mirrored.
  return { past: now.past, before: ahead.future, origin: fieldOrigin(now, originOf(now.past, ahead.future)), ...ahead }
}

/** The search for the height leaves at least so much for the future, and a whole history costs no more than both. */
const aheadOf = ({ left }: Purse): Purse => ({ left: Math.min(FUTURE_BUDGET, FUTURE_BUDGET / 2 + left) })

/** Only where every density is positive E² has no root on the way back whatever the digits. */
function fieldOrigin({ budget }: Now, origin: Origin): Origin {
  if (budget.curvature >= 0) return origin
  return { ...origin, proven: false, because: `${origin.because} This is seen by integration, not proven.` }
}

function today(budget: Budget, potential: Potential, purse: Purse): Now {
  const field = fieldToday({ potential, background: backgroundOf(budget), target: budget.dark, purse })
  const { steps, state } = passage(field, purse)
  const energy = energyOf(field, state[0], state[1])
  const law = fieldLaw(trailByScale(field, steps, 0), {
    today: energy,
    outside: { before: 0, after: 0 },
    breaks: [FROZEN],
    error: () => PASSAGE_ERROR,
  })
  return { field, budget, today: energy, state, past: armOf(modelOf(budget, law), -1) }
}

/** w of today for ever: an explicit law, whose contraction mirrors its expansion. */
function held(now: Now, model: Model): Ahead {
  const future = armOf(model, 1)
  const home = future.end.kind === 'none' ? now.past : armOf(model, -1)
  return { future, home, descent: future, end: endOf(future, home) }
}

function followed(now: Now, purse: Purse): Ahead {
  const { field, state } = now
  // With V ≥ 0 in flat or open space E² is a sum of positive terms.
  const mayTurn = !field.potential.positive || now.budget.curvature < 0
  const outlook = lookAhead(field, state, purse, mayTurn)
  // Swings thin out like dust, which a closed universe does not outlast.
  const swings = outlook.kind === 'swinging' && now.budget.curvature < 0
  if (outlook.kind !== 'shallow' && !swings) return expanding(now, outlook)
  if (swings) purse.left = Math.min(purse.left, SWINGING_BUDGET)
  const voyage = travelOn(field, state, purse)
  if (swings && voyage.end === 'spent') return expanding(now, outlook)
  if (voyage.end === 'expanding' && voyage.turns.length === 0)
    return expanding(now, lookAhead(field, state, purse, false))
  return turning(now, voyage)
}

function expanding(now: Now, outlook: Outlook): Ahead {
  if (outlook.kind === 'spent' || outlook.kind === 'shallow')
    throw overBudget('The future of this field takes too many steps.')
  const trail = trailByScale(now.field, outlook.steps, outlook.end)
  const law = fieldLaw(trail, {
    today: now.today,
    outside: { before: 0, after: outlook.exponent },
    breaks: [outlook.end],
    error: (N) => errorAhead(outlook, N),
  })
  const future = armOf(modelOf(now.budget, law), 1)
  if (future.end.kind === 'root') return averaged(now, future)
  return { future, home: now.past, descent: future, end: endAhead(now.field, outlook) }
}

/** Swings too many to be followed bring a closed universe back as dust does: on the average in the time that it took to grow. */
function averaged(now: Now, future: Arm): Ahead {
  const { time, conformal } = now.past
  if (!Number.isFinite(time.total + conformal.total)) throw overBudget('The future of this field takes too many steps.')
  const unfollowed = {
    time: future.time.total + time.total,
    conformal: future.conformal.total + conformal.total,
    error: future.conformal.error + conformal.total,
    because: 'the field swings too fast to be followed through the contraction',
  }
  return { future, home: now.past, descent: future, unfollowed, end: averagedCrunch(future, unfollowed.time) }
}

function turning(now: Now, voyage: Voyage): Ahead {
  const { steps, turns, end } = voyage
  if (end === 'spent' || turns.length === 0) throw overBudget('The future of this field takes too many steps.')
  if (end === 'expanding')
    throw overBudget('This universe turns round, bounces and expands again, which is not followed.')
  const turn = turns[0]
  const last = steps[steps.length - 1].to
  const root = { kind: 'root', N: turn.N, narrows: [], doubt: null } as const
  const future = timedArm(now, { legs: legsBetween(steps, 0, turn.tau), forward: true, direction: 1 }, root)
  const back = turns.length === 1 && end === 'crunch' ? returnAfter(steps, turn.tau) : null
  if (back === null) return unfollowed(now, voyage, future)
  const descent = timedArm(now, { legs: legsBetween(steps, turn.tau, back), forward: false, direction: 1 }, root)
  const inwards = { legs: legsBetween(steps, back, last), forward: true, direction: -1 } as const
  const home = timedArm(now, inwards, { kind: 'none', farRoot: null, narrows: [], doubt: null })
  return { future, descent, home, end: crunchAfter(future, descent.time.total + home.time.total, 1) }
}

/** Where the contraction is no single way back to a = 0 in doubles, only its length is told. */
function unfollowed(now: Now, { steps, turns, state, end }: Voyage, future: Arm): Ahead {
  const rest = restOf(legsBetween(steps, turns[0].tau, steps[steps.length - 1].to), state)
  const because =
    turns.length > 1
      ? 'the contraction is interrupted by another turning point, and is not followed scale factor by scale factor'
      : end === 'overflow'
        ? 'the densities of the contraction leave the range of floating-point numbers'
        : 'the contraction is not followed'
  return {
    future,
    descent: future,
    home: now.past,
    unfollowed: { ...rest, because },
    end: crunchAfter(future, rest.time, turns.length),
  }
}
