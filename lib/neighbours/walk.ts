/** One number of a scalar field's scenario moved one way from its value today, each step followed by integration. */
import { type Aspect, type Boundary, type Bracket, placeIn, type Way } from './boundary'
import type { Free } from './free'
import { isUnsolved, type Kinds, kindsFollowed, kindsOf, refuses, type Tally } from './kinds'
import { PRECISION } from './shape'

/** Between the two the solutions end. */
export interface Wall {
  readonly near: number
  readonly far: number
  readonly because: string
}

/** A bracket with the kinds at its far side. */
interface Met extends Bracket {
  readonly there: Kinds
}

/** As far as it has come. */
export interface Walk {
  readonly one: Free
  readonly way: Way
  readonly today: Kinds
  readonly distances: readonly number[]
  brackets: readonly Met[]
  wall: Wall | null
  /** Classifications by integration. */
  looks: number
  /** Steps outwards. */
  steps: number
  /** The last value at which there is a solution. */
  reached: number
}

/** Classifications by integration along one way, those that narrow its boundaries included. */
export const MOST_LOOKS = 24
/** Of these, the steps outwards. */
export const MOST_STEPS = 12
const SLOWEST = 1.7
const HALVINGS = 60

export function walkFrom(one: Free, way: Way, today: Kinds, steps: number): Walk {
  const distances = distancesOf(one, way, steps)
  return { one, way, today, distances, brackets: [], wall: null, looks: 0, steps: 0, reached: one.value }
}

const ASPECTS: readonly Aspect[] = ['end', 'origin']

/** Whether there is more to be seen farther out. */
export const goesOn = ({ distances, steps, wall, brackets }: Walk): boolean =>
  steps < distances.length && !wall && brackets.length < ASPECTS.length

/** Whether it ended before the limits of the code without a reason of its own. */
export const fallsShort = ({ one, way, distances, wall, brackets, reached }: Walk): boolean =>
  !wall && brackets.length < ASPECTS.length && reached !== one.value + way * (distances.at(-1) ?? 0)

/** Outwards to the limits of the code, until the tally is down to `floor`. */
export function walkOn(walk: Walk, tally: Tally, floor: number): void {
  const { one, way, distances } = walk
  while (goesOn(walk) && tally.left > floor) look(walk, walk.reached, one.value + way * distances[walk.steps++], tally)
}

/** From `near`, whose kinds are those of today but for the boundaries found already. What is too dear to follow is stepped over. */
function look(walk: Walk, near: number, far: number, tally: Tally): void {
  const { one, way, today } = walk
  const there = kindsFollowed(one.with(far), tally)
  walk.looks++
  if (isUnsolved(there)) {
    if (!there.dear) walk.wall = { near, far, because: there.because }
    return
  }
  const met = ASPECTS.filter(
    (aspect) => there[aspect].kind !== today[aspect].kind && !walk.brackets.some((other) => other.aspect === aspect),
  )
  walk.brackets = [...walk.brackets, ...met.map((aspect) => ({ aspect, way, near, far, there }))]
  walk.reached = far
}

/** By equal factors to where the code ends, from a slider's step, or from a larger share of the slider where steps are few. */
function distancesOf(one: Free, way: Way, steps: number): readonly number[] {
  const whole = Math.abs(limitOf(one, way) - one.value)
  const { min, max, step } = one.slider
  const first = Math.max(step, (max - min) / 2 ** steps)
  const growth = Math.max(SLOWEST, (whole / first) ** (1 / (steps - 1)))
  const list: number[] = []
  for (let distance = first; distance < whole * (1 - 1e-9); distance *= growth) list.push(distance)
  return whole > 0 ? [...list, whole] : []
}

/** The last value that the scenario code allows, such as that with which nothing is left to dark energy. */
function limitOf(one: Free, way: Way): number {
  const limit = way > 0 ? one.max : one.min
  if (!refuses(one.with(limit))) return limit
  let [near, far] = [one.value, limit]
  for (let i = 0; i < HALVINGS && Math.abs(far - near) > 0.01 * one.slider.step; i++) {
    const middle = near + (far - near) / 2
    if (refuses(one.with(middle))) far = middle
    else near = middle
  }
  return near
}

const sizeOf = ({ slider }: Free, near: number, far: number): number =>
  PRECISION * Math.max(Math.abs(near), Math.abs(far), slider.step)

/** Halves the way to where the solutions end. A kind that changes on it is a boundary before it. */
export function narrowWall(walk: Walk, tally: Tally, floor: number): void {
  const most = (walk.looks + MOST_LOOKS) / 2
  while (walk.wall && walk.looks < most && tally.left > floor) {
    const { wall } = walk
    const { near, far } = wall
    if (Math.abs(far - near) <= sizeOf(walk.one, near, far)) return
    const middle = near + (far - near) / 2
    walk.wall = null
    look(walk, near, middle, tally)
    if (walk.wall) continue
    walk.wall = walk.reached === middle ? { ...wall, near: middle } : wall
    if (walk.wall === wall) return
  }
}

/** Halves a bracket, by theorems where they decide; null where there is no solution beyond. */
export function narrowBracket(walk: Walk, bracket: Met, tally: Tally, floor: number): Boundary | null {
  const { one } = walk
  const { aspect } = bracket
  let { near, far, there: beyond } = bracket
  let assumed = false
  for (let i = 0; i < HALVINGS && Math.abs(far - near) > sizeOf(one, near, far); i++) {
    const middle = near + (far - near) / 2
    const known = kindsOf(one.with(middle))
    const there = known ?? followedAt(walk, middle, tally, floor)
    if (!there) break
    if (there[aspect].kind === walk.today[aspect].kind) near = middle
    else [far, beyond, assumed] = [middle, there, known !== null]
  }
  if (assumed && !hasSolution(walk, far, tally)) return null
  return { ...placeIn(near, far), beyond }
}

function followedAt(walk: Walk, value: number, tally: Tally, floor: number): Kinds | null {
  // One is kept for the far side.
  if (walk.looks >= MOST_LOOKS - 1 || tally.left <= floor) return null
  walk.looks++
  const there = kindsFollowed(walk.one.with(value), tally)
  return isUnsolved(there) ? null : there
}

/** Theorems say how a universe ends, and not that there is one. */
function hasSolution(walk: Walk, value: number, tally: Tally): boolean {
  if (tally.left <= 0) return false
  walk.looks++
  return !isUnsolved(kindsFollowed(walk.one.with(value), tally))
}
