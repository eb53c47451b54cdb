/**
 * Turning points of a ↦ E²(a), found by steps that cannot pass over one.
 *
 * Split E² = P − M into its positive and its negative terms. Going outwards by s, with every exponent n held at its worst value on
 * the step, ln P falls by at most s · ⟨n⟩_P (Jensen: P is a sum of exponentials) and ln M rises by at most s times its largest growth.
 * So no root lies nearer than h/D, h = ln P − ln M, D the sum of the two: the step is its own certificate. For constant exponents
 * and one negative term this is Newton's step on a convex function. Where D ≤ 0 on all that is left, there is no root.
 */
import { type Component, expansionAt, type Model } from '../model'

export type Direction = 1 | -1

export type Search =
  | { readonly kind: 'none' }
  /** E² vanishes at N and is negative beyond. */
  | { readonly kind: 'root'; readonly N: number; readonly certain: boolean }
  /** E² and its slope vanish together within rounding: a static state, or a root so near to a double one that doubles cannot tell. */
  | { readonly kind: 'double'; readonly N: number }

/** h where rounding in the components alone could decide the sign of E². */
const NOISE = 32 * Number.EPSILON
const MOST_STEPS = 20000
/** Beyond e^±FARTHEST the scale factor is not a double; the search then leans on what is left of the certificate. */
const FARTHEST = 700

/** First turning point outwards from today in the given direction. */
export function searchTurning(model: Model, direction: Direction): Search {
  const plus = model.components.filter((one) => one.omega > 0)
  const minus = model.components.filter((one) => one.omega < 0)
  if (minus.length === 0) return { kind: 'none' }
  let [N, length] = [0, 1]
  for (let step = 0; step < MOST_STEPS; step++) {
    const h = logSum(plus, N) - logSum(minus, N)
    if (Number.isNaN(h) || Math.abs(N) > FARTHEST) return { kind: 'none' }
    if (h <= NOISE) return settle(model, N, direction)
    if (safeStep(plus, minus, N, direction, h, Number.POSITIVE_INFINITY) === Number.POSITIVE_INFINITY)
      return { kind: 'none' }
    const safe = safeStep(plus, minus, N, direction, h, length)
    const advance = Math.min(safe, length)
    if (advance <= Number.EPSILON * Math.abs(N)) return settle(model, N, direction)
    N += direction * advance
    length = 2 * advance
  }
  return settle(model, N, direction)
}

const logSum = (components: readonly Component[], N: number): number => {
  const logs = components.map((one) => one.logSize(N))
  const largest = Math.max(...logs)
  return largest + Math.log(logs.reduce((sum, one) => sum + Math.exp(one - largest), 0))
}

/** A distance within which h cannot reach zero, given that exponents are bounded on the next `length`. */
function safeStep(
  plus: readonly Component[],
  minus: readonly Component[],
  N: number,
  direction: Direction,
  h: number,
  length: number,
): number {
  const [from, to] = direction > 0 ? [N, N + length] : [N - length, N]
  // Rate at which a term shrinks outwards: n going up, −n going down.
  const shrink = (one: Component, worst: 'fastest' | 'slowest'): number => {
    const [low, high] = one.exponentRange(from, to)
    const [slow, fast] = direction > 0 ? [low, high] : [-high, -low]
    return worst === 'fastest' ? fast : slow
  }
  const total = logSum(plus, N)
  const fall = plus.reduce((sum, one) => sum + Math.exp(one.logSize(N) - total) * shrink(one, 'fastest'), 0)
  const rise = Math.max(...minus.map((one) => -shrink(one, 'slowest')))
  const closing = fall + rise
  return closing <= 0 ? Number.POSITIVE_INFINITY : Number.isNaN(closing) ? 0 : h / closing
}

/** The certified steps have come to rest at N: a simple root, or a double one, is here. */
function settle(model: Model, start: number, direction: Direction): Search {
  let N = start
  for (let step = 0; step < 8; step++) {
    const { first } = model.derivatives(N)
    const magnitude = model.magnitude(N)
    // A slope that rounding could have made: the root is double as far as doubles can tell.
    if (direction * first > -1e-7 * magnitude) return { kind: 'double', N: atRest(model, N) }
    const change = expansionAt(model, N, Math.exp(-N)) / first
    N -= change
    if (Math.abs(change) <= 2 * Number.EPSILON * Math.abs(N)) break
  }
  return { kind: 'root', N, certain: true }
}

/** The minimum of E² near N: where its slope vanishes. */
function atRest(model: Model, start: number): number {
  let N = start
  for (let step = 0; step < 8; step++) {
    const { first, second } = model.derivatives(N)
    N -= first / second
  }
  return N
}
