/**
 * The energy density of one massive neutrino state that kept the momentum distribution of a relativistic Fermi gas:
 *   R(y) = F(y)/F(0),  F(y) = ∫₀^∞ x² √(x² + y²)/(eˣ + 1) dx,  F(0) = 7π⁴/120,  y = m c²/(k_B T_ν),
 * its logarithmic slope s = d ln R/d ln y = 1 − 3p/ρ, and ds/d ln y. (The integral: Lesgourgues & Pastor 2006,
 * Phys. Rep. 429, 307, section 2; what follows is derived here.)
 *
 * For certainty: with g = y²/(x² + y²) and ⟨⟩ the mean weighted by energy, s = ⟨g⟩ and ds/d ln y = 2s − s² − ⟨g²⟩. As
 * s² ≤ ⟨g²⟩ ≤ s, it lies between s(1 − s) and 2s(1 − s): s rises strictly from 0 (massless) to 1 (cold), ln R is convex in
 * ln y, and ln(s/(1 − s)) rises with ln y at a rate between 1 and 2.
 *
 * Domain 0 ≤ y ≤ 1e300; infinity gives the limit, a negative number NaN. For y ≥ 3/4 polynomials in e = 4/(y + 4), which
 * reach y = ∞ at e = 0; for y < 3/4 the known terms in y² and y⁴ ln y and a polynomial for the rest. See table.ts.
 */
import { FIRST, PANELS, PANELS_PER_UNIT, RATIO, SECOND, SHIFT, TERMS } from './table'

/** R = 1 + a y² + b y⁴ ln y + O(y⁴): a = 5/(7π²), and b = 15/(14π⁴) from the occupation 1/2 at zero momentum. */
const SQUARE = 5 / (7 * Math.PI ** 2)
const LOGARITHM = 15 / (14 * Math.PI ** 4)
/** Below this the square alone is right to 1e-17 of itself. */
const TINY = 1e-9
/** Where the two forms meet. */
const JOIN = 0.75
const LAST_ROW = PANELS * TERMS

/** Row of a table at t, in two chains that a processor works on side by side. */
function polynomial(c: Float64Array, k: number, t: number): number {
  const u = t * t
  const even = c[k] + u * (c[k + 2] + u * (c[k + 4] + u * (c[k + 6] + u * (c[k + 8] + u * c[k + 10]))))
  const odd = c[k + 1] + u * (c[k + 3] + u * (c[k + 5] + u * (c[k + 7] + u * (c[k + 9] + u * c[k + 11]))))
  return even + t * odd
}

/** The panel of e, and the place −1 ≤ t ≤ 1 in it. JOIN lies inside the last panel. */
const panelOf = (e: number) => (PANELS_PER_UNIT * e) | 0
const placeIn = (panel: number, e: number) => 2 * (PANELS_PER_UNIT * e - panel) - 1

/** R − 1 for y < 3/4, to 4 eps of itself. */
function smallExcess(y: number): number {
  const square = y * y
  if (!(y >= TINY)) return y >= 0 ? SQUARE * square : Number.NaN
  return square * (SQUARE + square * (LOGARITHM * Math.log(y) + polynomial(RATIO, LAST_ROW, (8 / 3) * y - 1)))
}

/** dR/d ln y for y < 3/4, to 4 eps of itself. */
function smallFirst(y: number): number {
  const square = y * y
  if (!(y >= TINY)) return y >= 0 ? 2 * SQUARE * square : Number.NaN
  const rest = LOGARITHM * (4 * Math.log(y) + 1) + polynomial(FIRST, LAST_ROW, (8 / 3) * y - 1)
  return square * (2 * SQUARE + square * rest)
}

/** d²R/(d ln y)² for y < 3/4, to 4 eps of itself. */
function smallSecond(y: number): number {
  const square = y * y
  if (!(y >= TINY)) return y >= 0 ? 4 * SQUARE * square : Number.NaN
  const rest = LOGARITHM * (16 * Math.log(y) + 8) + polynomial(SECOND, LAST_ROW, (8 / 3) * y - 1)
  return square * (4 * SQUARE + square * rest)
}

/** R(y) = F(y)/F(0), dimensionless, from 1 up; to 4 eps of itself. */
export function energyRatio(y: number): number {
  if (!(y >= JOIN)) return 1 + smallExcess(y)
  const e = SHIFT / (y + SHIFT)
  const panel = panelOf(e)
  return (y + SHIFT) * polynomial(RATIO, panel * TERMS, placeIn(panel, e))
}

/** R(y) − 1, without cancellation for small y: to 4 eps of itself for y < 3/4, to 4 eps of R above. */
export const energyExcess = (y: number): number => (y >= JOIN ? energyRatio(y) - 1 : smallExcess(y))

/** s = d ln R/d ln y = 1 − 3p/ρ, from 0 to 1; to 4 eps of itself for y < 3/4, to 3 eps absolutely above. */
export function logSlope(y: number): number {
  if (!(y >= JOIN)) return smallFirst(y) / (1 + smallExcess(y))
  const e = SHIFT / (y + SHIFT)
  const panel = panelOf(e)
  return 1 - e * e * polynomial(FIRST, panel * TERMS, placeIn(panel, e))
}

/** ds/d ln y, from 0 through its peak of 0.447 near y = 3.2 back to 0; to 8 eps of itself. */
export function logSlopeDerivative(y: number): number {
  if (!(y >= JOIN)) {
    const ratio = 1 + smallExcess(y)
    const slope = smallFirst(y) / ratio
    return smallSecond(y) / ratio - slope * slope
  }
  const e = SHIFT / (y + SHIFT)
  const panel = panelOf(e)
  return e * e * polynomial(SECOND, panel * TERMS, placeIn(panel, e))
}

/** Writes R, s and ds/d ln y to the first three places of `out`: the same numbers in less time than three calls. */
export function energyDerivatives(y: number, out: Float64Array): void {
  if (y >= JOIN) {
    const e = SHIFT / (y + SHIFT)
    const panel = panelOf(e)
    const t = placeIn(panel, e)
    out[0] = (y + SHIFT) * polynomial(RATIO, panel * TERMS, t)
    out[1] = 1 - e * e * polynomial(FIRST, panel * TERMS, t)
    out[2] = e * e * polynomial(SECOND, panel * TERMS, t)
    return
  }
  const ratio = 1 + smallExcess(y)
  const slope = smallFirst(y) / ratio
  out[0] = ratio
  out[1] = slope
  out[2] = smallSecond(y) / ratio - slope * slope
}

/** Positive points and weights of the Gauss-Legendre rules of 4 and 10 points on (−1, 1) (Abramowitz & Stegun 1964, table 25.4). */
const RULE = {
  points: [0.33998104358485626, 0.8611363115940526],
  weights: [0.6521451548625461, 0.34785484513745385],
}
/** Up to this |d| the rule errs by less than 1e-16 of the integral: the nearest singularities of s lie π/2 off in Im ln y. */
const SHORT_REACH = 0.05

/** ∫ s d ln y from ln y to ln y + d: ln of R(y e^d)/R(y). */
function slopeIntegral(y: number, d: number): number {
  const half = d / 2
  let sum = 0
  for (let i = 0; i < RULE.points.length; i++) {
    const step = half * RULE.points[i]
    sum += RULE.weights[i] * (logSlope(y * Math.exp(half + step)) + logSlope(y * Math.exp(half - step)))
  }
  return half * sum
}

/**
 * R(y e^d)/R(y) − 1, how the energy of a neutrino state beyond its massless law changes over d in ln a, without cancellation
 * for small d or small y. Dimensionless; domain y ≥ 0 with y and y e^d up to 1e300; relative error below 1e-14.
 */
export function energyRatioChange(y: number, d: number): number {
  const reach = Math.abs(d)
  if (reach <= SHORT_REACH) return Math.expm1(slopeIntegral(y, d))
  const before = energyExcess(y)
  return (energyExcess(y * Math.exp(d)) - before) / (1 + before)
}
