/**
 * Where the certified steps have come near to a zero of E²: is it passed, is it a turning point, or do E² and its slope vanish
 * together? A turning point is proven by a place beyond it with E² < 0, a passage by steps on E² with twice the digits.
 */
import { expansionAt, type Model, slopeAt } from '../model'
import type { Balance, Direction } from './balance'
import { exactlyStatic } from './exactly-static'
import { preciseExpansion, preciseSlope } from './precise'
import { FARTHEST, type Narrow } from './search'

export type Encounter =
  /** `slope` where it takes twice the digits. */
  | { readonly kind: 'root'; readonly N: number; readonly slope: number | null; readonly doubt: string | null }
  | { readonly kind: 'double'; readonly N: number; readonly exact: boolean; readonly doubt: string | null }
  /** E² stays positive up to N, where doubles are enough again. */
  | { readonly kind: 'passed'; readonly N: number; readonly narrow: Narrow | null }

/** h from which on doubles are enough again, well above where they are left. */
const CLEAR = 1e-9
/** Share of E² in its terms from which on doubles have digits enough for integrals. */
const NARROW = 1e-8
/** Rate of fall of h that is no matter of rounding. */
const STEEP = 1e-4
/** Newton's steps from where the search came to rest are far shorter than this in ln a. */
const STRAY = 0.1
const MOST_STEPS = 400
const MOST_NEWTON = 64

/** Slope of E² over the sizes of its terms that tells a simple root. */
const SLOPE = 1e-7
const UNRESOLVED = 'Whether E² vanishes there is beyond the digits of a scale factor.'
const ROUNDED = 'Rounding could change whether E² becomes negative there.'
const UNDECIDED = 'That holds to all digits that are computed, and one more could change it.'

/** What becomes of h, which the balance has just weighed at N; `fast`: it is not small, but falls within a digit of N. */
export function meet(
  model: Model,
  balance: Balance,
  N: number,
  direction: Direction,
  left: number,
  fast: boolean,
): Encounter {
  const simple = steepRoot(model, balance, N, direction, left)
  if (simple) return simple
  if (fast || Math.abs(N) > FARTHEST) return { kind: 'root', N, slope: null, doubt: UNRESOLVED }
  // Decimals that touch exactly do so, though the doubles that they are read as may not.
  if (exactlyStatic(model.budget, model.law)) return { kind: 'double', N: atRest(model, N), exact: true, doubt: null }
  return stepsWithAllDigits(model, balance, N, direction, left)
}

/** A simple root that doubles can tell: h falls steeply here, and is negative a little farther on. */
function steepRoot(
  model: Model,
  balance: Balance,
  start: number,
  direction: Direction,
  left: number,
): Encounter | null {
  const far = Math.abs(start) > FARTHEST
  const span = Math.min((STEEP / 16) * Math.max(1, Math.abs(start)), left / 2)
  const least = balance.falling(span)
  // Beyond the doubles there is no closer look, but a slow fall is as good as a steep one.
  if (!(least > (far ? 0 : STEEP))) return null
  const distance = (Math.max(0, balance.h) + 4 * balance.error) / least
  balance.weigh(start + direction * distance)
  const passed = balance.h < -balance.error && distance < span
  balance.weigh(start)
  return passed ? { kind: 'root', N: far ? start : polished(model, start), slope: null, doubt: null } : null
}

/**
 * Newton's method on E². Next to the edge of a law it wins no more than a part in each step. Where rounding tosses it about among
 * neighbours it goes round, of which whole rounds are left out (R. P. Brent 1980, BIT 20, 176, finds them).
 */
function polished(model: Model, start: number): number {
  let [N, mark] = [start, start]
  let [since, lap] = [0, 1]
  let last = MOST_NEWTON
  for (let step = 1; step <= last; step++) {
    const change = expansionAt(model, N, Math.exp(-N)) / slopeAt(model, N)
    if (!(Math.abs(change) < STRAY)) break
    N -= change
    if (Math.abs(change) <= 0.5 * Number.EPSILON * Math.abs(N)) break
    since += 1
    if (N === mark) last = step + ((last - step) % since)
    if (since === lap) [mark, since, lap] = [N, 0, 2 * lap]
  }
  return N
}

function stepsWithAllDigits(
  model: Model,
  balance: Balance,
  start: number,
  direction: Direction,
  left: number,
): Encounter {
  let [N, length] = [start, STEEP]
  for (let step = 0; step < MOST_STEPS; step++) {
    const { value, error } = preciseExpansion(model, N)
    const h = (value[0] - error) / model.magnitude(N)
    if (!(h > 0)) break
    if (h > CLEAR && h > 8 * balance.error) return { kind: 'passed', N, narrow: narrowAt(model, N) }
    // 2 E²/(P + M) ≤ ln P − ln M, of which a little is given up for rounding.
    const sure = 1.99 * h
    length = Math.min(length, (left - Math.abs(N - start)) / 2)
    const advance = Math.min(length, balance.reach(sure, length))
    if (!(advance > 2 * Number.EPSILON * Math.abs(N))) break
    N += direction * advance
    length = 2 * advance
    balance.weigh(N)
  }
  return rootBeyond(model, N, direction) ?? touching(model, N, direction)
}

/** A turning point at N, where E² is nothing, if E² is certainly negative a little farther on. */
function rootBeyond(model: Model, N: number, direction: Direction): Encounter | null {
  const least = Number.EPSILON * Math.max(Math.abs(N), 2 ** -20)
  for (let d = 2 * least; d < STEEP; d *= 2) {
    const { value, error } = preciseExpansion(model, N + direction * d)
    if (value[0] + error < 0) return simpleRoot(model, N)
    if (value[0] - error > 0 && d > 64 * least) break
  }
  return null
}

/** The root, to the digits that its slope allows. */
function simpleRoot(model: Model, N: number): Encounter {
  const slope = preciseSlope(model, N)
  const flat = Math.abs(slope) < STEEP * model.magnitude(N)
  return { kind: 'root', N: flat ? N : polished(model, N), slope: flat ? slope : null, doubt: null }
}

function touching(model: Model, N: number, direction: Direction): Encounter {
  // A slope that rounding could not have made, where E² itself is lost in it.
  if (direction * slopeAt(model, N) < -SLOPE * model.magnitude(N)) {
    return { kind: 'root', N: polished(model, N), slope: null, doubt: ROUNDED }
  }
  return { kind: 'double', N: atRest(model, N), exact: false, doubt: UNDECIDED }
}

/** The minimum that was passed, where it is one that doubles would lose. */
function narrowAt(model: Model, start: number): Narrow | null {
  const N = atRest(model, start)
  const value = preciseExpansion(model, N).value[0]
  const narrow = value > 0 && value < NARROW * model.magnitude(N) && model.derivatives(N).second > 0
  return narrow && Math.abs(N - start) < STRAY
    ? { N, value, slope: preciseSlope(model, N) }
    : /* v8 ignore next -- an approach that is not so narrow is seldom met here, and leaves nothing to remember */ null
}

/** The minimum of E² near N: where its slope vanishes. */
function atRest(model: Model, start: number): number {
  let N = start
  for (let step = 0; step < 8; step++) {
    const { first, second } = model.derivatives(N)
    if (!(Math.abs(first / second) < STRAY)) break
    N -= first / second
  }
  return N
}
