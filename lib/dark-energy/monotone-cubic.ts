/**
 * Monotone cubic Hermite interpolation: slopes by Fritsch & Butland 1984, SIAM J. Sci. Stat. Comput. 5, 300 (weighted harmonic
 * mean of neighbouring secants, zero where these change sign), end slopes zero, constant outside the nodes.
 */

/** y = c₀ + c₁ t + c₂ t² + c₃ t³ with t = x − origin, for from ≤ x ≤ to. The origin is the end nearer to x = 0. */
export interface Cubic {
  readonly from: number
  readonly to: number
  readonly origin: number
  readonly coefficients: readonly [number, number, number, number]
}

/** Pieces from −∞ to ∞, in order; a piece across zero is cut there. Nodes ascend; of equal ones the values jump. */
export function monotoneCubic(x: readonly number[], y: readonly number[]): readonly Cubic[] {
  const last = x.length - 1
  const secants = x.slice(1).map((right, k) => (y[k + 1] - y[k]) / (right - x[k]))
  const slopes = x.map((_, k) => (k === 0 || k === last ? 0 : slopeAt(x, secants, k)))
  const pieces: Cubic[] = [constant(Number.NEGATIVE_INFINITY, x[0], y[0])]
  for (let k = 0; k < last; k++) {
    if (x[k + 1] > x[k]) pieces.push(hermite(x[k], x[k + 1], y[k], secants[k], slopes[k], slopes[k + 1]))
  }
  pieces.push(constant(x[last], Number.POSITIVE_INFINITY, y[last]))
  return pieces.flatMap(fromZero)
}

function slopeAt(x: readonly number[], secants: readonly number[], k: number): number {
  const [before, after] = [secants[k - 1], secants[k]]
  if (!(Math.sign(before) * Math.sign(after) > 0)) return 0
  const [left, right] = [x[k] - x[k - 1], x[k + 1] - x[k]]
  const [w1, w2] = [2 * right + left, right + 2 * left]
  return (w1 + w2) / (w1 / before + w2 / after)
}

const constant = (from: number, to: number, y: number): Cubic => ({
  from,
  to,
  origin: Number.isFinite(from) ? from : to,
  coefficients: [y, 0, 0, 0],
})

function hermite(from: number, to: number, y: number, secant: number, left: number, right: number): Cubic {
  const h = to - from
  return {
    from,
    to,
    origin: from,
    coefficients: [y, left, (3 * secant - 2 * left - right) / h, (left + right - 2 * secant) / (h * h)],
  }
}

/** The piece with its origin at the end nearer to zero, in two where it holds zero. */
function fromZero(piece: Cubic): readonly Cubic[] {
  const { from, to } = piece
  if (from < 0 && to > 0) return [moved({ ...piece, to: 0 }, 0), moved({ ...piece, from: 0 }, 0)]
  return [moved(piece, from >= 0 ? from : to)]
}

function moved(piece: Cubic, origin: number): Cubic {
  const [c0, c1, c2, c3] = piece.coefficients
  const t = origin - piece.origin
  return {
    ...piece,
    origin,
    coefficients: [c0 + t * (c1 + t * (c2 + t * c3)), c1 + t * (2 * c2 + 3 * t * c3), c2 + 3 * t * c3, c3],
  }
}

export function cubicAt({ origin, coefficients: [c0, c1, c2, c3] }: Cubic, x: number): number {
  const t = x - origin
  return t === 0 || (c1 === 0 && c2 === 0 && c3 === 0) ? c0 : c0 + t * (c1 + t * (c2 + t * c3))
}

export function cubicSlopeAt({ origin, coefficients: [, c1, c2, c3] }: Cubic, x: number): number {
  const t = x - origin
  return c1 + t * (2 * c2 + 3 * t * c3)
}

/** Mean over [x, x + d] of the cubic, by Simpson's rule, which is exact for cubics. */
export function cubicMean(piece: Cubic, x: number, d: number): number {
  return (cubicAt(piece, x) + 4 * cubicAt(piece, x + d / 2) + cubicAt(piece, x + d)) / 6
}
