/**
 * A second route to E² and its integrals, in different variables and with different rules than the engine's: composite Gauss–Legendre
 * with ten points, halved until two halves agree with their whole.
 */
import type { Solution } from '../../lib/solve'

/** Abramowitz & Stegun 1964, table 25.4, n = 10. */
const RULE = [
  [0.1488743389816312, 0.2955242247147529],
  [0.4333953941292472, 0.2692667193099963],
  [0.6794095682990244, 0.219086362515982],
  [0.8650633666889845, 0.1494513491505806],
  [0.9739065285171717, 0.0666713443086881],
] as const

function panel(f: (x: number) => number, from: number, to: number): number {
  const [centre, half] = [(from + to) / 2, (to - from) / 2]
  return half * RULE.reduce((sum, [x, weight]) => sum + weight * (f(centre - half * x) + f(centre + half * x)), 0)
}

/** Halved until two halves agree with their whole to 1e-14 of all; noise that never agrees costs a hundred panels at most. */
export function quadrature(f: (x: number) => number, from: number, to: number): number {
  const all = panel(f, from, to)
  let panels = 0
  const refine = (low: number, high: number, whole: number): number => {
    const middle = (low + high) / 2
    const [left, right] = [panel(f, low, middle), panel(f, middle, high)]
    if (Math.abs(left + right - whole) <= 1e-14 * Math.abs(all) || ++panels > 100) return left + right
    return refine(low, middle, left) + refine(middle, high, right)
  }
  return refine(from, to, all)
}

/** Nodes and weights of ∫ x² g(x)/(eˣ + 1) dx by the trapezoid rule in u with x = exp(u − e^−u) (Takahasi & Mori 1974). */
const NEUTRINO = Array.from({ length: 140 }, (_, k) => {
  const u = -4 + k / 16
  const x = Math.exp(u - Math.exp(-u))
  return [x, (x ** 3 * (1 + Math.exp(-u))) / (Math.exp(x) + 1)] as const
})
const MASSLESS = NEUTRINO.reduce((sum, [x, weight]) => sum + weight * x, 0)

/** F(y)/F(0), F(y) = ∫ x² √(x² + y²)/(eˣ + 1) dx. */
function neutrinoRatio(y: number): number {
  let sum = 0
  for (const [x, weight] of NEUTRINO) sum += weight * Math.sqrt(x * x + y * y)
  return sum / MASSLESS
}

export interface Friedmann {
  /** E² at scale a. */
  squared(a: number): number
  /** Σ|terms| over E²: how often rounding of the terms counts in E². */
  condition(a: number): number
}

/** Friedmann's equation with today's densities, written out anew; `held`: w of today at all a. */
export function friedmannOf({ budget, scenario }: Solution, held = false): Friedmann {
  const { w = -1, w0 = w, wa = 0 } = scenario.law as { w?: number; w0?: number; wa?: number }
  const slope = held ? 0 : wa
  const dark = (a: number) => a ** (-3 * (1 + w0 + slope)) * Math.exp(3 * slope * (a - 1))
  const terms = (a: number): readonly number[] => [
    (budget.photons + budget.masslessNeutrinos) / a ** 4,
    ...budget.states.map((one) => (one.masslessDensity / a ** 4) * neutrinoRatio(one.y * a)),
    budget.coldMatter / a ** 3,
    budget.curvature / a ** 2,
    budget.dark === 0 ? 0 : budget.dark * dark(a),
  ]
  const squared = (a: number) => terms(a).reduce((sum, one) => sum + one, 0)
  return { squared, condition: (a) => terms(a).reduce((sum, one) => sum + Math.abs(one), 0) / Math.abs(squared(a)) }
}

/** ∫ da/(aE) and ∫ da/(a²E) between two scales: in √a below one, in 1/√a above. */
export function timeBetween({ squared }: Friedmann, from: number, to: number): number {
  if (to <= 1) return quadrature((v) => 2 / (v * Math.sqrt(squared(v * v))), Math.sqrt(from), Math.sqrt(to))
  return quadrature((v) => 2 / (v * Math.sqrt(squared(1 / (v * v)))), 1 / Math.sqrt(to), 1 / Math.sqrt(from))
}
export function conformalBetween({ squared }: Friedmann, from: number, to: number): number {
  if (to <= 1) return quadrature((v) => 2 / (v ** 3 * Math.sqrt(squared(v * v))), Math.sqrt(from), Math.sqrt(to))
  return quadrature((v) => (2 * v) / Math.sqrt(squared(1 / (v * v))), 1 / Math.sqrt(to), 1 / Math.sqrt(from))
}
