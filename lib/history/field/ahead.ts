/** The field after today while the universe only expands: step by step in N until its law is a power of a. */
import { type Purse, type Step, travel, valueIn } from '../../numerics/ode'
import { brent } from '../../numerics/roots'
import type { Budget } from '../../scenario/budget'
import { byScale, energyOf, expansionOf, type Field, SPEED } from './motion'

/** Farthest ln a for which a and 1/a are doubles. */
const FARTHEST = 700
const TOLERANCE = 1e-11
/** From this N on a field that still rolls slowly is followed at a looser tolerance: slow roll damps errors. */
const LATE = 40
const LATE_TOLERANCE = 1e-8
/** Relative error of ρ that the steps may add up to; ten times what the reference set shows. */
const [ERROR, LATE_ERROR] = [1e-10, 1e-7]
/** The same for integrals over the average of swings that are not followed, of the order of (H/m)². */
const AVERAGED = 3e-5

/** Swings of the field that are followed; from then on it is dust on the average. */
const MOST_SWINGS = 60
/** n of a field that swings about a minimum of V = 0, on the average: that of dust. */
const SWINGING = 3
/** n has come to rest at its last value, as well as it is followed. */
const [SETTLED, LATE_SETTLED] = [1e-11, 1e-8]
/** Share of E² in the sizes of its parts below which the way through a turning point is followed by time. */
const SHALLOW = 0.05

/** Relative error of ρ at N. */
export function errorAhead(outlook: Ahead, N: number): number {
  if (outlook.kind === 'swinging' && N > outlook.end) return AVERAGED
  return N < LATE ? ERROR : LATE_ERROR
}

/** How the way ahead in N ended. */
export type Outlook =
  /** At a turning point, or too near to one. */
  { readonly kind: 'shallow' } | Ahead | { readonly kind: 'spent' }

/** In a power of a: `exponent` from the last step on. */
export interface Ahead {
  readonly kind: 'settled' | 'swinging' | 'far'
  readonly exponent: number
  readonly steps: readonly Step[]
  /** N where the steps are left. */
  readonly end: number
}

export const isAhead = (outlook: Outlook): outlook is Ahead => outlook.kind !== 'shallow' && outlook.kind !== 'spent'

const scratch = new Float64Array(3)

/** From today, with φ and φ̇ in `today`, by steps that many times `looser`. */
export function lookAhead(field: Field, today: Float64Array, purse: Purse, deep: boolean, looser = 1): Outlook {
  const steps: Step[] = []
  const last = finalExponent(field)
  let [swings, stop] = [0, null as Outlook['kind'] | null]
  let before = today[1]
  const after = (N: number, state: Float64Array, step: Step | null) => {
    /* v8 ignore else -- a dense course has every step */
    if (step) steps.push(step)
    if (deep && isShallow(field, N, state)) stop = 'shallow'
    else if (last !== null && settledAt(field, N, state, last)) stop = 'settled'
    else if (before * state[1] < 0 && ++swings >= MOST_SWINGS) stop = 'swinging'
    before = state[1]
    return stop !== null
  }
  const state = today.slice()
  const course = { from: 0, to: LATE, state, tolerance: looser * TOLERANCE, first: 0.1, after, dense: true, purse }
  const early = travel(byScale(field), course)
  const late = { ...course, from: LATE, to: FARTHEST, tolerance: looser * LATE_TOLERANCE }
  const arrival = early === 'there' ? travel(byScale(field), late) : early
  if (arrival === 'stuck' || stop === 'shallow') return { kind: 'shallow' }
  if (arrival === 'spent') return { kind: 'spent' }
  const end = steps[steps.length - 1].to
  if (stop === 'settled' && last !== null) return { kind: 'settled', exponent: last, steps, end }
  if (stop === 'swinging') return { kind: 'swinging', exponent: SWINGING, steps, end: lastRest(steps) }
  return { kind: 'far', exponent: beyond(field, state), steps, end }
}

/** n from the farthest ln a on: where a minimum of V = 0 is still ahead it is reached in the end, and no horizon may miss that. */
const beyond = (field: Field, state: Float64Array): number =>
  field.potential.kind === 'cosine' && field.potential.slope(field.potential.start) !== 0
    ? SWINGING
    : exponentAt(field, state)

const exponentAt = (field: Field, state: Float64Array): number => state[1] ** 2 / energyOf(field, state[0], state[1])

function isShallow(field: Field, N: number, state: Float64Array): boolean {
  field.background.into(scratch, N)
  const sizes = scratch[2] + state[1] ** 2 / 6 + Math.abs(field.height * field.potential.value(state[0]))
  return expansionOf(field, N, state[0], state[1]) < SHALLOW * sizes
}

/**
 * n at late times on an exponential potential: slope² where the field rules or the background thins out faster, else the
 * background's own (Copeland, Liddle & Wands 1998, Phys. Rev. D 57, 4686). Null for other potentials.
 */
export function finalExponent({ potential, background }: Field): number | null {
  if (potential.slope(potential.start) === 0) return 0
  if (potential.kind !== 'exponential') return null
  return Math.min(potential.parameter ** 2, slowestOf(background.budget))
}

/** Exponent of what thins out slowest beside the field; 6 where nothing is there, which no field exceeds. */
function slowestOf(budget: Budget): number {
  if (budget.curvature > 0) return 2
  if (budget.coldMatter + budget.massiveNeutrinos > 0) return 3
  return budget.photons + budget.masslessNeutrinos > 0 ? 4 : 6
}

/** n and its slope are those of the last power. */
function settledAt(field: Field, N: number, state: Float64Array, last: number): boolean {
  const n = exponentAt(field, state)
  const settled = N < LATE ? SETTLED : LATE_SETTLED
  if (Math.abs(n - last) > settled) return false
  const energy = energyOf(field, state[0], state[1])
  const H = Math.sqrt(expansionOf(field, N, state[0], state[1]))
  const push = (state[1] * field.height * field.potential.slope(state[0])) / (H * energy)
  return Math.abs(n * n - 6 * n - 6 * push) <= settled
}

/** The last moment at which φ̇ = 0: ρ is there what it is on the average. */
function lastRest(steps: readonly Step[]): number {
  const step = steps[steps.length - 1]
  return brent((N) => valueIn(step, SPEED, N), step.from, step.to)
}
