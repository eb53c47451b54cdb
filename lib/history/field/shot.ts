/** One try: the field from rest at a = 10⁻⁶ to today, for a height of its potential. */
import type { Potential } from '../../dark-energy/potential'
import { type Arrival, type Purse, type Step, travel } from '../../numerics/ode'
import type { Background } from './background'
import { byScale, energyOf, type Field } from './motion'
import { overBudget } from './unsolvable'

/** ln a until which the field is at rest. */
export const FROZEN = Math.log(1e-6)
/** Accuracy per step of the field's way as it is kept. */
export const FINAL = 3e-12
/** Relative error of ρ that the steps of a passage may add up to; ten times what the reference set shows. */
export const PASSAGE_ERROR = 3e-11
const scratch = new Float64Array(3)

/** A field on its way to today. */
export interface Shot {
  /** ln of the height over the smallest conceivable one. */
  readonly y: number
  /** Ω_DE reached less the one wanted, over the one wanted; null where the universe does not come to a = 1. */
  readonly excess: number | null
  /** How often φ̇ changed its sign. */
  readonly swings: number
}

export interface Search {
  readonly potential: Potential
  readonly background: Background
  /** Ω_DE today. */
  readonly target: number
  readonly purse: Purse
}

/** The widest steps in N where E² might pass zero between them. */
const WIDEST_STEP = 0.5

const mayTurn = ({ potential, background }: Field): boolean => !potential.positive || background.budget.curvature < 0

const lowestOf = ({ potential, target }: Search): number => target / potential.value(potential.start)

export const fieldOf = (search: Search, y: number): Field => ({
  potential: search.potential,
  background: search.background,
  height: lowestOf(search) * Math.exp(y),
})

/** Follows the field from rest to today; no farther than to where it is clear that it does not arrive with a positive energy. */
export function shoot(search: Search, y: number, tolerance: number): Shot {
  const field = fieldOf(search, y)
  const state = Float64Array.of(search.potential.start, 0)
  let [swings, sign, turns] = [0, 0, false]
  const after = (N: number, { 0: phi, 1: speed }: Float64Array) => {
    if (sign * speed < 0) swings++
    sign = Math.sign(speed)
    turns = nearlyTurned(field, N, phi, speed)
    return turns || energyOf(field, phi, speed) <= 0
  }
  const arrival = run(field, state, tolerance, search.purse, after, false)
  if (arrival === 'spent') throw overBudget('The height of the potential is not found.')
  if (arrival === 'stuck' || turns) return { y, excess: null, swings }
  // The energy only falls: where it is used up before today, nothing is left today.
  const excess = arrival === 'there' ? energyOf(field, state[0], state[1]) / search.target - 1 : -1
  return { y, excess, swings }
}

/** E² in its last digits beside its parts. */
function nearlyTurned(field: Field, N: number, phi: number, speed: number): boolean {
  const { background, potential, height } = field
  if (!mayTurn(field)) return false
  background.into(scratch, N)
  const sizes = scratch[2] + (speed * speed) / 6 + Math.abs(height * potential.value(phi))
  return !(scratch[0] + energyOf(field, phi, speed) > 1e-6 * sizes)
}

function run(
  field: Field,
  state: Float64Array,
  tolerance: number,
  purse: Purse,
  after: (x: number, state: Float64Array, step: Step | null) => boolean,
  dense: boolean,
): Arrival {
  const widest = mayTurn(field) ? WIDEST_STEP : Number.POSITIVE_INFINITY
  return travel(byScale(field), { from: FROZEN, to: 0, state, tolerance, first: 0.2, widest, after, dense, purse })
}

/** The field's way from rest to today, step by step. */
export function passage(
  field: Field,
  purse: Purse,
  tolerance = FINAL,
): { readonly steps: readonly Step[]; readonly state: Float64Array } {
  const steps: Step[] = []
  const state = Float64Array.of(field.potential.start, 0)
  const after = (_x: number, _state: Float64Array, step: Step | null) => {
    /* v8 ignore else -- a dense course has every step */
    if (step) steps.push(step)
    return false
  }
  const arrival = run(field, state, tolerance, purse, after, true)
  /* v8 ignore if -- the search for the height, which goes first, is the dearer one */
  if (arrival === 'spent') throw overBudget('The field swings too often before today to be followed.')
  /* v8 ignore if -- the last shots of the search came through with the same accuracy */
  if (arrival !== 'there') throw tooNear()
  return { steps, state }
}

export const tooNear = (): Error =>
  overBudget('The height sought lies too near to one with which the universe turns round before today.')
