/**
 * Numbers of twice the digits of a double, as unevaluated sums of two doubles (Dekker 1971, Numer. Math. 18, 224;
 * Knuth, The Art of Computer Programming, vol. 2, section 4.2.2). For arguments well inside the range of doubles.
 */

/** high + low, with |low| at most half a unit in the last place of high. */
export type Twofold = readonly [high: number, low: number]

/** Bound of the relative rounding error of one operation here; `exponential` and `logarithm` say theirs. */
export const TWOFOLD_EPSILON = 2 ** -102

export const twofold = (x: number): Twofold => [x, 0]

/** Exact sum of two doubles. */
function sumOf(a: number, b: number): Twofold {
  const s = a + b
  const t = s - a
  return [s, a - (s - t) + (b - t)]
}

/** The same for |a| ≥ |b|. */
function quickSum(a: number, b: number): Twofold {
  const s = a + b
  return [s, b - (s - a)]
}

const SPLITTER = 2 ** 27 + 1

/** Exact product of two doubles. */
function productOf(a: number, b: number): Twofold {
  const p = a * b
  const ta = SPLITTER * a
  const ah = ta - (ta - a)
  const al = a - ah
  const tb = SPLITTER * b
  const bh = tb - (tb - b)
  const bl = b - bh
  return [p, ah * bh - p + ah * bl + al * bh + al * bl]
}

export function plus([a, aLow]: Twofold, [b, bLow]: Twofold): Twofold {
  const [s, e] = sumOf(a, b)
  const [t, f] = sumOf(aLow, bLow)
  const [u, g] = quickSum(s, e + t)
  return quickSum(u, g + f)
}

export const minus = (a: Twofold, [b, bLow]: Twofold): Twofold => plus(a, [-b, -bLow])

export function times([a, aLow]: Twofold, [b, bLow]: Twofold): Twofold {
  const [p, e] = productOf(a, b)
  return quickSum(p, e + (a * bLow + aLow * b))
}

export function over(a: Twofold, b: Twofold): Twofold {
  const q = a[0] / b[0]
  const rest = minus(a, times(b, [q, 0]))
  const r = rest[0] / b[0]
  const last = minus(rest, times(b, [r, 0]))
  return plus(quickSum(q, r), [last[0] / b[0], 0])
}

/** Times a power of two. */
const scaled = ([a, aLow]: Twofold, power: number): Twofold => [a * power, aLow * power]

const LN2: Twofold = [Math.LN2, 2.3190468138462996e-17]
const HALVINGS = 9
/** 1/k! for k = 2 … 9, each to twice the digits. */
const FACTORIALS: readonly Twofold[] = inverseFactorials(9)

function inverseFactorials(most: number): readonly Twofold[] {
  const list: Twofold[] = []
  let factorial = 1
  for (let k = 2; k <= most; k++) {
    factorial *= k
    list.push(over([1, 0], [factorial, 0]))
  }
  return list
}

/** eˣ for |x| < 700, with a relative error below TWOFOLD_EPSILON (64 + |x|). */
export function exponential(x: Twofold): Twofold {
  const k = Math.round(x[0] / LN2[0])
  const r = scaled(minus(x, times(LN2, [k, 0])), 2 ** -HALVINGS)
  // eʳ − 1 − r by its series, |r| < 7e-4.
  let series: Twofold = [0, 0]
  for (let i = FACTORIALS.length - 1; i >= 0; i--) series = times(plus(series, FACTORIALS[i]), r)
  let excess = plus(r, times(series, r))
  // (1 + s)² − 1 = 2s + s².
  for (let i = 0; i < HALVINGS; i++) excess = plus(scaled(excess, 2), times(excess, excess))
  const half = Math.trunc(k / 2)
  return scaled(scaled(plus([1, 0], excess), 2 ** half), 2 ** (k - half))
}

/** ln x for x > 0, with an absolute error below TWOFOLD_EPSILON (64 + |ln x|): one step of Newton's method from the double. */
export function logarithm(x: Twofold): Twofold {
  const first: Twofold = [Math.log(x[0]), 0]
  const ratio = times(x, exponential([-first[0], 0]))
  const d = minus(ratio, [1, 0])
  // ln(1 + d) = d − d²/2 + …, |d| of the order of eps.
  return plus(first, minus(d, scaled(times(d, d), 0.5)))
}
