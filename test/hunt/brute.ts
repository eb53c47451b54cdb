/** E² at a hundred thousand places between today and the ends, by the formulas of laws.ts. */
import type { Budget } from '../../lib/scenario/budget'
import type { OtherLaw } from './laws'

export type Energy = (N: number) => number

/** E² over the sum of the sizes of its terms, from −1 to 1: its sign needs no more, and it never leaves the doubles. */
export function shareOf({ photons, masslessNeutrinos, coldMatter, curvature, dark }: Budget, law: OtherLaw): Energy {
  const terms = [photons + masslessNeutrinos, coldMatter, curvature].map((omega, i) => ({
    sign: Math.sign(omega),
    log: Math.log(Math.abs(omega)),
    n: 4 - i,
  }))
  const known = terms.filter((one) => one.sign !== 0)
  const logDark = Math.log(Math.abs(dark))
  return (N) => {
    const ofDark = dark === 0 ? Number.NEGATIVE_INFINITY : logDark + law.log(N, Math.exp(N))
    if (ofDark === Number.POSITIVE_INFINITY) return Math.sign(dark)
    let largest = ofDark
    for (const { log, n } of known) largest = Math.max(largest, log - n * N)
    if (largest === Number.NEGATIVE_INFINITY) return 0
    const size = quickExp(ofDark - largest)
    let [sum, sizes] = [dark < 0 ? -size : size, size]
    for (const { sign, log, n } of known) {
      const one = quickExp(log - n * N - largest)
      sum += sign * one
      sizes += one
    }
    return sum / sizes
  }
}

const POINTS = 50_000
/** Evenly up to this ln a, then by equal factors: what turns round at scale factors that no double holds turns round too. */
const [EVEN, FARTHEST] = [30, 1e7]
const EVENLY = 0.9 * POINTS

/** Distances in ln a of the places from today, and e to each up to `EVEN`. */
const DISTANCES = Float64Array.from({ length: POINTS }, (_, i) =>
  i < EVENLY ? ((i + 1) * EVEN) / EVENLY : EVEN * (FARTHEST / EVEN) ** ((i + 1 - EVENLY) / (POINTS - EVENLY)),
)
const GROWN = DISTANCES.map((m) => (m <= EVEN ? Math.exp(m) : Number.NaN))
const SHRUNK = GROWN.map((grown) => 1 / grown)

/** The first place where E² is negative beyond rounding, or null; no farther than `limit`. */
export function firstNegative(budget: Budget, law: OtherLaw, direction: 1 | -1, limit: number): number | null {
  const { photons, masslessNeutrinos, coldMatter, curvature, dark } = budget
  const radiation = photons + masslessNeutrinos
  const positive = [radiation, coldMatter, curvature, dark].every((omega) => omega >= 0)
  const share = shareOf(budget, law)
  for (let k = 0; k < POINTS; k++) {
    const m = DISTANCES[k]
    if (m > limit) return null
    const N = direction * m
    // Within the doubles the sum itself tells where it is not worth a closer look, and a density is positive whatever it is.
    if (m <= EVEN) {
      const [a, x] = direction > 0 ? [GROWN[k], SHRUNK[k]] : [SHRUNK[k], GROWN[k]]
      const rest = ((radiation * x + coldMatter) * x + curvature) * x * x
      if (dark >= 0 && rest > 0) continue
      if (rest + dark * quickExp(law.log(N, a)) > 0) continue
    } else if (positive) return null
    if (share(N) < -ROUNDING * (1 + m)) return N
  }
  return null
}

const PARTS = 512
const FRACTIONS = Float64Array.from({ length: PARTS }, (_, i) => 2 ** (i / PARTS))

/** eˣ to 1e-13, far quicker: whatever lies closer to zero than that is looked at again. */
function quickExp(x: number): number {
  if (x < -700) return 0
  if (!(x < 700)) return Math.exp(x)
  const steps = Math.round((x * PARTS) / Math.LN2)
  const rest = x - (steps * Math.LN2) / PARTS
  const whole = steps >> 9
  const near = FRACTIONS[steps & (PARTS - 1)] * (1 + rest * (1 + rest * (1 / 2 + rest * (1 / 6))))
  return near * POWERS[whole + 1100]
}

const POWERS = Float64Array.from({ length: 2200 }, (_, i) => 2 ** (i - 1100))

/** Sizes of logarithms at extreme parameters times eps. */
export const ROUNDING = 1e-11
