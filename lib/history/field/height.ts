/**
 * The height of the potential: the smallest positive one for which the field, at rest until a = 10⁻⁶, has today's Ω_DE at a = 1.
 *
 * The field's energy only falls while the universe expands (dρ/dN = −φ̇²), so heights below Ω_DE/v(start) cannot do: the search goes
 * up from there in ln(height), looking several times per swing of the field, and follows every peak in between to its top.
 */
import type { Potential } from '../../dark-energy/potential'
import { type Arrival, type Purse, type Step, travel } from '../../numerics/ode'
import type { Background } from './background'
import { byScale, energyOf, type Field } from './motion'
import { overBudget, unsolvable } from './unsolvable'

/** ln a until which the field is at rest. */
export const FROZEN = Math.log(1e-6)
const FINAL = 3e-12
/** Relative error of ρ that the steps of a passage may add up to; ten times what the reference set shows. */
export const PASSAGE_ERROR = 3e-11
const COARSE = 1e-5
const MIDDLE = 1e-7
/** Farthest apart looks lie in ln(height), and how many fall to half a swing of the field. */
const WIDEST = 0.35
const PER_SWING = 5
/** How far below the smallest conceivable height, in its logarithm, the largest Ω_DE is looked for. */
const LOWEST = 15
/** Heights at which the field swings more often before today are not tried. */
const MOST_SWINGS = 12
/** Evaluations of the equation of motion for the search, and for the future. */
export const BUDGET = 120_000
/** Of these, what is kept for the largest Ω_DE, where the one wanted is not found. */
const RESERVE = 30_000

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
function shoot(search: Search, y: number, tolerance: number): Shot {
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
export function passage(field: Field, purse: Purse): { readonly steps: readonly Step[]; readonly state: Float64Array } {
  const steps: Step[] = []
  const state = Float64Array.of(field.potential.start, 0)
  const after = (_x: number, _state: Float64Array, step: Step | null) => {
    if (step) steps.push(step)
    return false
  }
  const arrival = run(field, state, FINAL, purse, after, true)
  if (arrival === 'spent') throw overBudget('The field swings too often before today to be followed.')
  if (arrival !== 'there') throw tooNear()
  return { steps, state }
}

/** The field of the smallest height, or a problem that says how much Ω_DE can be reached. */
export function fieldToday(search: Search): Field {
  if (search.potential.slope(search.potential.start) === 0) return fieldOf(search, 0)
  return fieldOf(search, polished(search, bracketOf(search)))
}

/** Two heights between which Ω_DE passes its value, at coarse accuracy. */
function bracketOf(search: Search): readonly [Shot, Shot] {
  const top = highest(search)
  let before: Shot | null = null
  let last: Shot = shoot(search, 0, COARSE)
  let best = last
  while (last.y < top && last.swings < MOST_SWINGS && search.purse.left > RESERVE) {
    const next = shoot(search, Math.min(top, last.y + strideAfter(last)), COARSE)
    if (excessOf(next) > excessOf(best)) best = next
    const pair = signChange(search, last, next)
    if (pair) return pair
    if (before && mayRise(before, last, next, best)) {
      best = peakOf(search, before.y, last, next.y)
      if (excessOf(best) >= 0) return [before, best]
    }
    ;[before, last] = [last, next]
  }
  throw unreachable(search, best, last)
}

/** A universe that does not arrive has less than any Ω_DE. */
const excessOf = (shot: Shot): number => shot.excess ?? Number.NEGATIVE_INFINITY

function signChange(search: Search, last: Shot, next: Shot): readonly [Shot, Shot] | null {
  if (next.excess === null) return null
  if (last.excess === null) return next.excess > 0 ? pastTurning(search, last, next) : null
  return last.excess < 0 === next.excess < 0 ? null : [last, next]
}

/** Whether the peak between three looks can be the highest so far: by the parabola through them, with as much again for its error. */
function mayRise(before: Shot, last: Shot, next: Shot, best: Shot): boolean {
  const [a, b, c] = [excessOf(before), excessOf(last), excessOf(next)]
  if (!(a < b && c < b) || b >= 0) return false
  if (!Number.isFinite(a + c)) return true
  const [p, q] = [(b - a) / (last.y - before.y), (c - b) / (next.y - last.y)]
  const bend = (p - q) / (next.y - before.y)
  const slope = p - bend * (last.y - before.y)
  return b + (slope * slope) / (2 * bend) >= Math.min(0, excessOf(best))
}

/** Between a height with which the universe turns round too early and one with too much Ω_DE: a lower one that arrives. */
function pastTurning(search: Search, turned: Shot, arrived: Shot): readonly [Shot, Shot] | null {
  let [low, high] = [turned.y, arrived]
  for (let i = 0; i < 40; i++) {
    const middle = shoot(search, (low + high.y) / 2, COARSE)
    if (middle.excess === null) low = middle.y
    else if (middle.excess < 0) return [middle, high]
    else high = middle
  }
  return null
}

/** First on the straight line to the target, then by steps that resolve the swings. */
function strideAfter({ excess, swings, y }: Shot): number {
  const widest = Math.min(WIDEST, 2 / PER_SWING / Math.max(1, swings))
  if (y > 0 || excess === null || excess <= -1) return widest
  return Math.min(widest, Math.max(1e-9, -1.5 * Math.log1p(excess)))
}

/** Top of a peak inside (from, to), by golden sections (Kiefer 1953) from three looks. */
function peakOf(search: Search, from: number, inner: Shot, to: number): Shot {
  let [low, high, best] = [from, to, inner]
  for (let i = 0; i < 16 && high - low > 1e-5; i++) {
    const right = high - best.y > best.y - low
    const y = best.y + 0.381966 * (right ? high - best.y : low - best.y)
    const shot = shoot(search, y, MIDDLE)
    if (excessOf(shot) > excessOf(best)) {
      ;[low, high] = right ? [best.y, high] : [low, best.y]
      best = shot
    } else if (right) high = y
    else low = y
    if (best.excess !== null && best.excess >= 0) break
  }
  return best
}

/** The root in a bracket: false position at coarse accuracy (Dowell & Jarratt 1971), secants at full accuracy. */
function polished(search: Search, [one, other]: readonly [Shot, Shot]): number {
  const [a, b] = narrowed(search, one, other)
  let [y0, f0] = [a.y, shoot(search, a.y, FINAL).excess]
  let [y1, f1] = [b.y, shoot(search, b.y, FINAL).excess]
  if (f0 === null || f1 === null) throw tooNear()
  if (Math.abs(f0) < Math.abs(f1)) [y0, f0, y1, f1] = [y1, f1, y0, f0]
  for (let i = 0; i < 12 && f1 !== 0 && f1 !== f0; i++) {
    const step: number = (f1 * (y1 - y0)) / (f1 - f0)
    if (Math.abs(step) <= 1e-16 * Math.max(1, y1)) break
    const y: number = y1 - step
    const f: number | null = shoot(search, y, FINAL).excess
    if (f === null || Math.abs(f) >= Math.abs(f1)) break
    ;[y0, f0, y1, f1] = [y1, f1, y, f]
  }
  return y1
}

const tooNear = (): Error =>
  overBudget('The height sought lies too near to one with which the universe turns round before today.')

function narrowed(search: Search, one: Shot, other: Shot): readonly [Shot, Shot] {
  let [a, b] = [one, other]
  let [fa, fb] = [a.excess ?? 0, b.excess ?? 0]
  for (let i = 0; i < 60 && Math.abs(a.y - b.y) > 1e-4 && fa !== fb; i++) {
    const y = b.y - (fb * (b.y - a.y)) / (fb - fa)
    const c = shoot(search, y, COARSE)
    if (c.excess === null) throw tooNear()
    const fc = c.excess
    if (fc < 0 !== fb < 0) [a, fa] = [b, fb]
    else fa *= fb / (fb + fc)
    ;[b, fb] = [c, fc]
    if (Math.abs(fc) < 1e-5) break
  }
  return [a, b]
}

/** ln of the greatest height that is tried: the field at rest then weighs as much as all the rest at a = 10⁻⁶. */
function highest({ background, target }: Search): number {
  background.into(scratch, FROZEN)
  // Alone it loses at most a factor a⁻⁶ = 10³⁶ until today.
  return scratch[0] > 0 ? Math.log(Math.max(scratch[0] / target, 1e12)) : Math.log(1e37 * Math.max(1, 1 / target))
}

/** Heights below the smallest that could do are looked at only to say how much Ω_DE can be reached. */
function largest(search: Search, best: Shot): Shot {
  if (best.y > 0) return best
  let [above, top] = [best, best]
  for (let y = -WIDEST; y > -LOWEST; y -= WIDEST) {
    const next = shoot(search, y, COARSE)
    if (excessOf(next) < excessOf(top)) return peakOf(search, y, top, Math.max(above.y, top.y + 1e-4))
    ;[above, top] = [top, next]
  }
  return top
}

function unreachable(search: Search, best: Shot, last: Shot): Error {
  const { excess } = largest(search, best)
  const wanted = Number(search.target.toPrecision(6))
  if (excess !== null && excess > 0)
    return unsolvable(
      `With Ω_DE = ${wanted} the universe would turn round before today; this field needs more than that.`,
    )
  if (excess === null)
    return unsolvable('With this field the universe does not grow to its present size, whatever the height of V.')
  const most = Number((search.target * (1 + excess)).toPrecision(3))
  const swings = ` Heights at which it swings more than ${MOST_SWINGS} times before today are not tried.`
  const costs = search.purse.left > RESERVE ? '' : ' Greater heights are over the budget of computation.'
  const far = last.swings < MOST_SWINGS ? costs : swings
  return unsolvable(`This field reaches Ω_DE = ${most} today at most, and ${wanted} is wanted.${far}`)
}
