/** ∫ f over a finite interval, adaptive, with an error bound. */
import { coefficientsInto, NODE_COUNT, NODES, relativeTail } from './chebyshev'

const samples = new Float64Array(NODE_COUNT)
const coefficients = new Float64Array(NODE_COUNT)

export interface Integral {
  readonly value: number
  readonly error: number
}

interface Stretch extends Integral {
  /** What the series leaves out, from its last two coefficients. */
  readonly left: number
  readonly resolved: boolean
}

const RESOLVED = 1e-14
/** Of the whole integral: a panel that leaves out less needs no halving. */
const NEGLIGIBLE = 1e-15
const DEEPEST = 30
/** Enough for every integrand but noise, which no halving resolves. */
const MOST_PANELS = 2000

/**
 * Panels of sixteen Chebyshev nodes, halved until resolved to 1e-14 of the panel or 1e-15 of the whole (Clenshaw & Curtis 1960, with
 * first-kind nodes). For piecewise smooth f, also with a root at an end; where the halving has to stop, the bound says so.
 */
export function integrate(f: (x: number) => number, from: number, to: number): Integral {
  const whole = panelOver(f, from, to)
  let panels = 1
  const refine = (panel: Stretch, low: number, high: number, depth: number): Integral => {
    const fine = panel.resolved || panel.left <= NEGLIGIBLE * Math.abs(whole.value)
    if (fine || depth === DEEPEST || panels >= MOST_PANELS) return panel
    panels += 2
    const centre = (low + high) / 2
    const left = refine(panelOver(f, low, centre), low, centre, depth + 1)
    const right = refine(panelOver(f, centre, high), centre, high, depth + 1)
    return { value: left.value + right.value, error: left.error + right.error }
  }
  const { value, error } = refine(whole, from, to, 0)
  return { value, error }
}

function panelOver(f: (x: number) => number, from: number, to: number): Stretch {
  const [centre, half] = [(from + to) / 2, (to - from) / 2]
  for (let k = 0; k < NODE_COUNT; k++) samples[k] = f(centre + half * NODES[k])
  coefficientsInto(coefficients, samples)
  // ∫ T_j over [−1, 1] is 2/(1 − j²) for even j and zero for odd j.
  let sum = 0
  for (let j = 0; j < NODE_COUNT; j += 2) sum += (2 * coefficients[j]) / (1 - j * j)
  const value = half * sum
  const left = Math.abs(half) * (Math.abs(coefficients[NODE_COUNT - 1]) + Math.abs(coefficients[NODE_COUNT - 2]))
  const error = left + 4 * Number.EPSILON * Math.abs(value)
  return { value, error, left, resolved: relativeTail(coefficients) <= RESOLVED }
}
