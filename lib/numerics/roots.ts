/** Roots of one equation in one unknown, bracketed, so that an answer always exists. */

/**
 * Root of f in [from, to], where f changes sign: Newton's step while it stays inside the shrinking bracket, bisection else
 * (Press et al., Numerical Recipes, §9.4). `evaluate` returns f; `slope` its derivative at the same point.
 * Ends when a step is below 2 eps |x| or the bracket is empty; the answer is good to the noise of f over its slope.
 */
export function bracketedNewton(
  f: (x: number) => number,
  slope: (x: number) => number,
  from: number,
  to: number,
): number {
  const rising = f(to) > 0
  let [low, high] = rising ? [from, to] : [to, from]
  let x = (from + to) / 2
  for (let step = 0; step < 200; step++) {
    const value = f(x)
    if (value === 0) return x
    if (value < 0) low = x
    else high = x
    const newton = x - value / slope(x)
    const inside = newton > Math.min(low, high) && newton < Math.max(low, high)
    const next = inside && step < 60 ? newton : (low + high) / 2
    if (Math.abs(next - x) <= 2 * Number.EPSILON * Math.abs(x) || next === low || next === high) return next
    x = next
  }
  return x
}

/** Root of f in [from, to], where f changes sign, by Brent's method (Brent 1973, ch. 4), to 2 eps |x| or the noise of f. */
export function brent(f: (x: number) => number, from: number, to: number): number {
  let [a, b] = [from, to]
  let [fa, fb] = [f(a), f(b)]
  let [c, fc] = [a, fa]
  let d = b - a
  let e = d
  for (let step = 0; step < 300; step++) {
    if (fb > 0 === fc > 0) {
      ;[c, fc] = [a, fa]
      d = e = b - a
    }
    if (Math.abs(fc) < Math.abs(fb)) {
      ;[a, b, c] = [b, c, b]
      ;[fa, fb, fc] = [fb, fc, fb]
    }
    const tolerance = 2 * Number.EPSILON * Math.abs(b) + Number.MIN_VALUE
    const middle = (c - b) / 2
    if (Math.abs(middle) <= tolerance || fb === 0) return b
    if (Math.abs(e) < tolerance || Math.abs(fa) <= Math.abs(fb)) {
      d = e = middle
    } else {
      const [p, q] = interpolation(a, b, c, fa, fb, fc, middle)
      if (2 * p < Math.min(3 * middle * q - Math.abs(tolerance * q), Math.abs(e * q))) {
        e = d
        d = p / q
      } else {
        d = e = middle
      }
    }
    ;[a, fa] = [b, fb]
    b += Math.abs(d) > tolerance ? d : Math.sign(middle) * tolerance
    fb = f(b)
  }
  return b
}

/** Brent's step p/q: the secant through two points, or inverse quadratic interpolation through three; p ≥ 0. */
function interpolation(
  a: number,
  b: number,
  c: number,
  fa: number,
  fb: number,
  fc: number,
  middle: number,
): [number, number] {
  const s = fb / fa
  let p: number
  let q: number
  if (a === c) {
    p = 2 * middle * s
    q = 1 - s
  } else {
    const [r, t] = [fb / fc, fa / fc]
    p = s * (2 * middle * t * (t - r) - (b - a) * (r - 1))
    q = (t - 1) * (r - 1) * (s - 1)
  }
  return p > 0 ? [p, -q] : [-p, q]
}
