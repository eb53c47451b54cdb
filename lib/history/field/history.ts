/** The whole history of a scenario with a scalar field: the past as a law in N, the future as far as it is one, else by time. */
import type { Potential } from '../../dark-energy/potential'
import { modelOf } from '../../model'
import type { Purse } from '../../numerics/ode'
import type { Budget } from '../../scenario/budget'
import { type Arm, armOf } from '../arm'
import { endOf } from '../ending'
import { originOf } from '../origin'
import type { History } from '../whole'
import type { Ahead } from './ahead'
import { aheadOf, heldModel, modelAhead, type Now, nowOf, tooLong, voyageBeside, voyageError, wayAhead } from './course'
import { averagedCrunch, crunchAfter, endAhead, fieldOrigin } from './endings'
import { BUDGET } from './height'
import { restOf, timedArm } from './timed-arm'
import { unsolvable } from './unsolvable'
import { legsBetween, returnAfter, type Voyage } from './voyage'

type Future = Pick<History, 'future' | 'home' | 'descent' | 'unfollowed' | 'end'>

/** The field as it is today, with its arm into the past. */
interface Here extends Now {
  readonly past: Arm
}

export function fieldHistory(budget: Budget, potential: Potential, hold: boolean): History {
  refuseNothing(budget)
  const purse = { left: BUDGET }
  const now = nowOf(budget, potential, purse)
  const here = { ...now, past: armOf(modelOf(budget, now.law), -1) }
  const ahead = hold ? held(here) : followed(here, aheadOf(purse))
  // Before a bounce in the frozen era the same universe came in, mirrored.
  const origin = fieldOrigin(budget, originOf(here.past, ahead.future))
  return { past: here.past, before: ahead.future, origin, ...ahead }
}

function refuseNothing({ dark, closes }: Budget): void {
  if (dark > 0) return
  throw unsolvable(
    `A scalar field at rest needs a positive density, and Ω_DE is ${Number(dark.toPrecision(6))}.`,
    closes === 'dark' ? 'matter' : 'dark',
  )
}

/** w of today for ever. */
function held(here: Here): Future {
  const model = heldModel(here)
  const future = armOf(model, 1)
  const home = future.end.kind === 'none' ? here.past : armOf(model, -1)
  return { future, home, descent: future, end: endOf(future, home) }
}

function followed(here: Here, purse: Purse): Future {
  const way = wayAhead(here, purse)
  return way.kind === 'turning' ? turning(here, way.voyage) : expanding(here, way.outlook)
}

function expanding(here: Here, outlook: Ahead): Future {
  const future = armOf(modelAhead(here, outlook), 1)
  if (future.end.kind === 'root') return averaged(here, future, future.end.N)
  return { future, home: here.past, descent: future, end: endAhead(here.field, outlook) }
}

/** Swings too many to be followed bring a closed universe back as dust does: on the average in the time that it took to grow. */
function averaged(now: Here, future: Arm, turn: number): Future {
  const { time, conformal } = now.past
  /* v8 ignore if -- a closed universe began or bounced; only tuned numbers let it rest behind for ever */
  if (!Number.isFinite(time.total + conformal.total)) throw tooLong()
  const unfollowed = {
    time: future.time.total + time.total,
    conformal: future.conformal.total + conformal.total,
    // The last swings before the crunch may cut it short.
    error: future.conformal.error + future.conformal.total + conformal.total,
    because: 'the field swings too fast to be followed through the contraction',
  }
  return { future, home: now.past, descent: future, unfollowed, end: averagedCrunch(future, turn, unfollowed.time) }
}

function turning(now: Here, voyage: Voyage): Future {
  const { steps, turns, end } = voyage
  const turn = turns[0]
  const last = steps[steps.length - 1].to
  const root = { kind: 'root', N: turn.N, narrows: [], doubt: null } as const
  const looser = voyageBeside(now, voyage)
  const error = voyageError(voyage, looser, turn.tau)
  const future = timedArm(now, { legs: legsBetween(steps, 0, turn.tau), forward: true, direction: 1, error }, root)
  const back = turns.length === 1 && end === 'crunch' ? returnAfter(steps, turn.tau) : null
  const whole = voyageError(voyage, looser, last)
  if (back === null) return unfollowed(now, voyage, future, whole)
  const way = { legs: legsBetween(steps, turn.tau, back), forward: false, direction: 1, error: whole } as const
  const descent = timedArm(now, way, root)
  const inwards = { legs: legsBetween(steps, back, last), forward: true, direction: -1, error: whole } as const
  const home = timedArm(now, inwards, { kind: 'none', farRoot: null, narrows: [], doubt: null })
  return { future, descent, home, end: crunchAfter(future, turn.N, descent.time.total + home.time.total, 1) }
}

/** Where the contraction is no single way back to a = 0 in doubles, only its length is told. */
function unfollowed(now: Here, { steps, turns, state }: Voyage, future: Arm, stray: number): Future {
  const rest = restOf(legsBetween(steps, turns[0].tau, steps[steps.length - 1].to), state, stray)
  const because =
    turns.length > 1
      ? 'the contraction is interrupted by another turning point, and is not followed scale factor by scale factor'
      : 'the densities of the contraction leave the range of floating-point numbers'
  return {
    future,
    descent: future,
    home: now.past,
    unfollowed: { ...rest, because },
    end: crunchAfter(future, turns[0].N, rest.time, turns.length),
  }
}
