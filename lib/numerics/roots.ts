/** The root of one equation in one unknown: bracketed, so that an answer always exists, or from nearby, which is sooner there. */

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

/** A step this small against its place is the last: the next would be its square. */
const LAST_STEP = 1e-9
const STEPS = 8

/**
 * Root of a smooth function from a start nearby, by Newton's method: `step` is f/f′. To the noise of that, or null where the steps do
 * not shrink at once.
 */
export function newton(step: (x: number) => number, start: number): number | null {
  let x = start
  for (let i = 0; i < STEPS; i++) {
    const change = step(x)
    x -= change
    if (Math.abs(change) <= LAST_STEP * Math.abs(x)) return x
  }
  return null
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
