/**
 * Distances along a line of sight, in c/H₀, from the comoving distance χ.
 * Formulas: Hogg 1999, arXiv:astro-ph/9905116, eqs. 16, 18, 21, 25, 29; |sin| past the antipode of a closed universe.
 */

/** Radius of curvature (c/H₀)/√|Ω_k|, or Infinity when flat. */
export const curvatureRadius = (curvature: number): number => 1 / Math.sqrt(Math.abs(curvature))

/** Comoving distance to the antipode of a closed universe, Infinity otherwise. */
export const antipode = (curvature: number): number =>
  curvature < 0 ? Math.PI * curvatureRadius(curvature) : Number.POSITIVE_INFINITY

/** Transverse comoving distance |R sin(χ/R)|, χ or R sinh(χ/R), for Ω_k below, at or above zero. */
export function transverseDistance(chi: number, curvature: number): number {
  if (curvature === 0) return chi
  const radius = curvatureRadius(curvature)
  return curvature < 0 ? Math.abs(radius * Math.sin(chi / radius)) : radius * Math.sinh(chi / radius)
}

/** A power takes ten times as long. */
const cube = (x: number): number => x * x * x

/** Comoving volume over the whole sky out to χ, in (c/H₀)³; in a closed universe it stops at the whole sphere 2π²R³. */
export function comovingVolume(chi: number, curvature: number): number {
  if (curvature === 0) return (4 * Math.PI * cube(chi)) / 3
  const reach = Math.min(chi, antipode(curvature))
  const angle = reach / curvatureRadius(curvature)
  const sign = Math.sign(-curvature)
  if (angle < 0.7) return 4 * Math.PI * cube(reach) * smallAngleVolume(sign * angle * angle)
  const radius = curvatureRadius(curvature)
  const doubled = sign > 0 ? angle - Math.sin(2 * angle) / 2 : Math.sinh(2 * angle) / 2 - angle
  return 2 * Math.PI * cube(radius) * doubled
}

/**
 * ½ (x − ½ sin 2x)/x³ as a function of x² (of −x² for sinh): Σ (−1)^k 2^(2k+1) x^(2k)/(2k + 3)!, which keeps its digits as x → 0.
 */
function smallAngleVolume(square: number): number {
  let [term, sum] = [1 / 3, 1 / 3]
  for (let k = 1; k < 14; k++) {
    term *= (-4 * square) / ((2 * k + 2) * (2 * k + 3))
    sum += term
  }
  return sum
}
