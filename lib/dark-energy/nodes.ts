import { type Family, type Law, listOf } from './law'
import { type Cubic, cubicAt, cubicMean, cubicSlopeAt, monotoneCubic } from './monotone-cubic'
import { powerLaw } from './power-law'
import { smoothLaw } from './smooth-law'

/** A piece of w with ln f at its origin. */
interface Piece {
  readonly w: Cubic
  readonly logDensity: number
}

/** −3 ∫ (1 + w) dN from x to x + d within one piece. */
const logChangeWithin = (w: Cubic, x: number, d: number): number => (d === 0 ? 0 : -3 * d * (1 + cubicMean(w, x, d)))

/** ln f accumulated outwards from today. */
function piecesOf(cubics: readonly Cubic[]): readonly Piece[] {
  const ahead: Piece[] = []
  const behind: Piece[] = []
  for (const w of cubics.filter((one) => one.from >= 0)) ahead.push({ w, logDensity: outerEnd(ahead.at(-1)) })
  for (const w of cubics.filter((one) => one.from < 0).reverse())
    behind.push({ w, logDensity: outerEnd(behind.at(-1)) })
  return [...behind.reverse(), ...ahead]
}

function outerEnd(piece: Piece | undefined): number {
  if (piece === undefined) return 0
  const { origin, from, to } = piece.w
  const outer = origin === from ? to : from
  return piece.logDensity + logChangeWithin(piece.w, origin, outer - origin)
}

function interpolated(at: readonly number[], w: readonly number[]): Law {
  if (w.every((one) => one === w[0])) return powerLaw(w[0])
  const x = at.map(Math.log)
  const pieces = piecesOf(monotoneCubic(x, w))
  const pieceAt = (N: number): Piece => {
    let k = 0
    while (k + 1 < pieces.length && N >= pieces[k].w.to) k++
    return pieces[k]
  }
  const wAt = (N: number) => cubicAt(pieceAt(N).w, N)
  const logDensity = (N: number): number => {
    const piece = pieceAt(N)
    return piece.logDensity + logChangeWithin(piece.w, piece.w.origin, N - piece.w.origin)
  }
  const last = x.length - 1
  // Every piece rounds its cubic and its place, and up to fourteen are added up.
  const [steepest, farthest] = [Math.max(...w.map(Math.abs)), Math.max(...x.map(Math.abs))]
  return smoothLaw({
    logDensity,
    roughness: (N) => 192 * (1 + steepest) * (Math.abs(N) + farthest),
    logChange: (N, d) => logChangeAcross(pieces, N, d),
    w: wAt,
    wSlope: (N) => cubicSlopeAt(pieceAt(N).w, N),
    exponentRange: (from, to) => {
      if (to <= x[0] || from >= x[last]) return [3 * (1 + wAt(from)), 3 * (1 + wAt(to))]
      const values = [wAt(from), wAt(to), ...w.filter((_, k) => x[k] >= from && x[k] <= to)]
      // Between nodes w is monotone but for its rounding.
      const rounding = 1e-14 * Math.max(1, ...values.map(Math.abs))
      return [3 * (1 + Math.min(...values) - rounding), 3 * (1 + Math.max(...values) + rounding)]
    },
    past: {
      kind: 'power',
      exponent: 3 * (1 + w[0]),
      logCoefficient: logDensity(x[0]) + 3 * (1 + w[0]) * x[0],
      settled: x[0],
    },
    future: {
      kind: 'power',
      exponent: 3 * (1 + w[last]),
      logCoefficient: logDensity(x[last]) + 3 * (1 + w[last]) * x[last],
      settled: x[last],
    },
    breaks: [...new Set(x)],
  })
}

function logChangeAcross(pieces: readonly Piece[], N: number, d: number): number {
  const [low, high] = d < 0 ? [N + d, N] : [N, N + d]
  const inside = pieces.filter(({ w }) => w.from < high && w.to > low)
  if (inside.length <= 1) return logChangeWithin((inside[0] ?? pieces[0]).w, N, d)
  const sum = inside.reduce((total, { w }) => {
    const [from, to] = [Math.max(low, w.from), Math.min(high, w.to)]
    return total + logChangeWithin(w, from, to - from)
  }, 0)
  return d < 0 ? -sum : sum
}

export const nodes: Family = {
  key: 'nodes',
  label: 'w given at scale factors',
  formula: 'w(a) through nodes, monotone between them',
  clause: 'has a w(a) through nodes, monotone between them,',
  meaning: 'w runs smoothly through the given values, without overshooting, and stays constant before and after them.',
  source: 'Fritsch & Butland 1984, SIAM J. Sci. Stat. Comput. 5, 300',
  caution: 'Between the nodes the curve is a choice, and outside them w stays as it was at the first and the last.',
  parameters: [
    {
      kind: 'list',
      key: 'at',
      symbol: 'a_i',
      label: 'scale factors',
      unit: '',
      meaning: 'Scale factors at which w is given, 1 today.',
      min: 1e-6,
      max: 1e6,
      fallback: null,
      least: 2,
      most: 12,
      ascending: true,
    },
    {
      kind: 'list',
      key: 'w',
      symbol: 'w_i',
      label: 'values of w',
      unit: '',
      meaning: 'Pressure over energy density of dark energy at these scale factors.',
      min: -20,
      max: 20,
      fallback: null,
      least: 2,
      most: 12,
      ascending: false,
    },
  ],
  conflict: (values) => {
    const count = listOf(values, 'at').length
    return listOf(values, 'w').length === count ? null : { key: 'w', allowed: `${count} numbers, as many as in at` }
  },
  law: (values) => interpolated(listOf(values, 'at'), listOf(values, 'w')),
}
