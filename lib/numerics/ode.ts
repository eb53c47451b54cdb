/**
 * Ordinary differential equations y′ = f(x, y), stepwise with error control, every step with its dense output.
 * Method and step control: Hairer, Nørsett & Wanner, Solving Ordinary Differential Equations I, 1993, sections II.4 to II.6.
 */
import { ALL_STAGES, DENSE, FIFTH, MOMENTS, RUNGS, STAGES, THIRD, type Weight } from './ode-tableau'

export interface Motion {
  /** Number of unknowns. */
  readonly size: number
  /** Writes f(x, y). */
  slopeInto(out: Float64Array, x: number, y: Float64Array): void
  /** Writes the size against which the error of each unknown is measured. */
  weightsInto(out: Float64Array, x: number, y: Float64Array): void
}

/** One step: each unknown as a polynomial of degree 7 over it. */
export interface Step {
  readonly from: number
  readonly to: number
  /** Eight numbers for each unknown, in the nested form that `valueIn` reads. */
  readonly dense: Float64Array
}

export interface Course {
  readonly from: number
  readonly to: number
  /** Unknowns at `from`; holds those at the last point reached afterwards. */
  readonly state: Float64Array
  /** Error allowed per step, relative to the weights. */
  readonly tolerance: number
  /** First step to try, in the size of x. */
  readonly first: number
  /** Widest step, for the sake of what lies between its stages. */
  readonly widest?: number
  /** Called after each step; may change the state (a projection), and stops the run by returning true. */
  readonly after?: (x: number, state: Float64Array, step: Step | null) => boolean
  /** Whether steps carry their dense output; without it `after` gets null. */
  readonly dense: boolean
  /** Evaluations of f left; the run stops where they are spent. */
  readonly purse: Purse
}

/** Evaluations that may still be spent, counted down; shared by the runs of one task. */
export interface Purse {
  left: number
}

/** How a run ended: at `to`, stopped by `after`, with an empty purse, or where no step was small enough. */
export type Arrival = 'there' | 'stopped' | 'spent' | 'stuck'

const LARGEST = 6
const SMALLEST = 1 / 3
const SAFETY = 0.9

/** Sparse rows as flat arrays, for speed. */
interface Row {
  readonly stages: Int32Array
  readonly weights: Float64Array
}

const rowOf = (weights: readonly Weight[]): Row => ({
  stages: Int32Array.from(weights, (one) => one.stage),
  weights: Float64Array.from(weights, (one) => one.weight),
})

const ROWS = RUNGS.map(rowOf)
const [FIFTH_ROW, THIRD_ROW] = [rowOf(FIFTH), rowOf(THIRD)]
const DENSE_ROWS = DENSE.map(rowOf)

/** Runs the course. */
export function travel(motion: Motion, course: Course): Arrival {
  const { size } = motion
  const { state, tolerance, purse, widest = Number.POSITIVE_INFINITY } = course
  const sign = course.to >= course.from ? 1 : -1
  const slopes = Array.from({ length: ALL_STAGES }, () => new Float64Array(size))
  const [trial, weights, next] = [new Float64Array(size), new Float64Array(size), new Float64Array(size)]
  let x = course.from
  let width = Math.min(Math.abs(course.first), Math.abs(course.to - x))
  let rejected = false
  motion.slopeInto(slopes[0], x, state)
  while (x !== course.to) {
    if (purse.left < ALL_STAGES) return 'spent'
    const left = Math.abs(course.to - x)
    const end = width >= left * (1 - 1e-12) ? course.to : x + sign * width
    const h = end - x
    if (Math.abs(h) <= 4 * Number.EPSILON * Math.abs(x) || !Number.isFinite(h)) return 'stuck'
    attempt(motion, x, h, state, slopes, trial, next)
    purse.left -= STAGES
    motion.weightsInto(weights, x, state)
    const error = errorOf(slopes, h, weights) / tolerance
    if (!(error <= 1)) {
      width = Math.abs(h) * (Number.isNaN(error) ? 0.1 : Math.max(SMALLEST, SAFETY * error ** (-1 / 8)))
      rejected = true
      continue
    }
    const step = course.dense ? denseStep(motion, x, end, state, next, slopes, trial) : null
    if (course.dense) purse.left -= ALL_STAGES - STAGES - 1
    state.set(next)
    x = end
    if (course.after?.(x, state, step)) return 'stopped'
    // A projection may have moved the state: its slope is taken anew where it did.
    if (changed(state, next)) motion.slopeInto(slopes[0], x, state)
    else slopes[0].set(slopes[STAGES])
    const growth = Math.min(LARGEST, Math.max(SMALLEST, SAFETY * Math.max(error, 1e-10) ** (-1 / 8)))
    width = Math.min(widest, Math.abs(h) * (rejected ? Math.min(1, growth) : growth))
    rejected = false
  }
  return 'there'
}

/** Slopes of all stages over [x, x + h], and the state at the end in `next`. */
function attempt(
  motion: Motion,
  x: number,
  h: number,
  state: Float64Array,
  slopes: readonly Float64Array[],
  trial: Float64Array,
  next: Float64Array,
): void {
  for (let s = 1; s < STAGES; s++) {
    combine(trial, state, h, ROWS[s], slopes)
    motion.slopeInto(slopes[s], x + MOMENTS[s] * h, trial)
  }
  combine(next, state, h, ROWS[STAGES], slopes)
  motion.slopeInto(slopes[STAGES], x + h, next)
}

/** out = state + h Σ weight · slope. */
function combine(
  out: Float64Array,
  state: Float64Array,
  h: number,
  { stages, weights }: Row,
  slopes: readonly Float64Array[],
): void {
  for (let i = 0; i < out.length; i++) {
    let sum = 0
    for (let k = 0; k < stages.length; k++) sum += weights[k] * slopes[stages[k]][i]
    out[i] = state[i] + h * sum
  }
}

/** The estimate of order 5, damped by that of order 3, over the weights. */
function errorOf(slopes: readonly Float64Array[], h: number, scale: Float64Array): number {
  let [fifth, third] = [0, 0]
  for (let i = 0; i < scale.length; i++) {
    fifth += (weighted(FIFTH_ROW, slopes, i) / scale[i]) ** 2
    third += (weighted(THIRD_ROW, slopes, i) / scale[i]) ** 2
  }
  const sum = fifth + 0.01 * third
  return sum === 0 ? 0 : (Math.abs(h) * fifth) / Math.sqrt(sum * scale.length)
}

function weighted({ stages, weights }: Row, slopes: readonly Float64Array[], i: number): number {
  let sum = 0
  for (let k = 0; k < stages.length; k++) sum += weights[k] * slopes[stages[k]][i]
  return sum
}

function denseStep(
  motion: Motion,
  x: number,
  to: number,
  state: Float64Array,
  next: Float64Array,
  slopes: readonly Float64Array[],
  trial: Float64Array,
): Step {
  const h = to - x
  for (let s = STAGES + 1; s < ALL_STAGES; s++) {
    combine(trial, state, h, ROWS[s], slopes)
    motion.slopeInto(slopes[s], x + MOMENTS[s] * h, trial)
  }
  const dense = new Float64Array(8 * state.length)
  for (let i = 0; i < state.length; i++) {
    const change = next[i] - state[i]
    dense[8 * i] = state[i]
    dense[8 * i + 1] = change
    dense[8 * i + 2] = h * slopes[0][i] - change
    dense[8 * i + 3] = 2 * change - h * (slopes[STAGES][i] + slopes[0][i])
    for (let k = 0; k < 4; k++) dense[8 * i + 4 + k] = h * weighted(DENSE_ROWS[k], slopes, i)
  }
  return { from: x, to, dense }
}

function changed(one: Float64Array, other: Float64Array): boolean {
  for (let i = 0; i < one.length; i++) if (one[i] !== other[i]) return true
  return false
}

/** An unknown at x inside the step. */
export function valueIn({ from, to, dense }: Step, unknown: number, x: number): number {
  const t = (x - from) / (to - from)
  const u = 1 - t
  const k = 8 * unknown
  return (
    dense[k] +
    t *
      (dense[k + 1] +
        u *
          (dense[k + 2] +
            t * (dense[k + 3] + u * (dense[k + 4] + t * (dense[k + 5] + u * (dense[k + 6] + t * dense[k + 7]))))))
  )
}
