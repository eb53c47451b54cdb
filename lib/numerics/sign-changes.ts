/** Where a Chebyshev series changes its sign, so that no pair of changes is passed over that its coefficients can tell. */
import { evaluate, type Series } from './chebyshev'

export interface Bracket {
  readonly from: number
  readonly to: number
}

const NONE: readonly Bracket[] = []

/**
 * Intervals in [−1, 1] that hold one sign change each. On an interval of width w the series lies within w²/8 of its chord, and its
 * slope within w/2 of that of the chord, times the largest second derivative, Σ |c_j| j² (j² − 1)/3 (Trefethen, Approximation Theory
 * and Approximation Practice, 2013, ch. 3: T_j″(1) is the largest). Halved until that decides, or the series leaves its chord by less
 * than the `noise` of its values. A series that is not finite decides nothing: the whole interval stands for it.
 */
export function signChanges(series: Series, noise: number): readonly Bracket[] {
  let [bend, swing] = [0, 0]
  for (let j = 1; j < series.length; j++) {
    const size = Math.abs(series[j])
    swing += size
    bend += (size * j * j * (j * j - 1)) / 3
  }
  if (!Number.isFinite(bend)) return [{ from: -1, to: 1 }]
  // Then it keeps the sign of its mean.
  if (Math.abs(series[0]) > swing) return NONE
  const found: Bracket[] = []
  search(found, { series, bend, noise }, -1, 1, evaluate(series, -1), evaluate(series, 1))
  return found
}

interface Curve {
  readonly series: Series
  readonly bend: number
  readonly noise: number
}

function search(found: Bracket[], curve: Curve, from: number, to: number, left: number, right: number): void {
  const deviation = curve.bend * (to - from) ** 2
  const unlike = left > 0 !== right > 0
  const sure = unlike
    ? Math.abs(right - left) > deviation / 2
    : Math.min(Math.abs(left), Math.abs(right)) > deviation / 8
  if (sure || deviation < 8 * curve.noise) {
    if (unlike) found.push({ from, to })
    return
  }
  const middle = (from + to) / 2
  const value = evaluate(curve.series, middle)
  search(found, curve, from, middle, left, value)
  search(found, curve, middle, to, value, right)
}
