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
    const size = Math.exp(ofDark - largest)
    let [sum, sizes] = [dark < 0 ? -size : size, size]
    for (const { sign, log, n } of known) {
      const one = Math.exp(log - n * N - largest)
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

/** Distance in ln a of the k-th place from today. */
const distance = (k: number): number =>
  k <= EVENLY ? (k * EVEN) / EVENLY : EVEN * (FARTHEST / EVEN) ** ((k - EVENLY) / (POINTS - EVENLY))

/** The first place where E² is negative beyond rounding, or null; no farther than `limit`. */
export function firstNegative(budget: Budget, law: OtherLaw, direction: 1 | -1, limit: number): number | null {
  const share = shareOf(budget, law)
  const plain = plainEnergy(budget, law)
  for (let k = 1; k <= POINTS; k++) {
    const m = distance(k)
    if (m > limit) return null
    const N = direction * m
    // Within the doubles the sum itself tells where it is not worth a closer look.
    if (m <= EVEN && plain(N) > 0) continue
    if (share(N) < -ROUNDING * (1 + m)) return N
  }
  return null
}

function plainEnergy(budget: Budget, law: OtherLaw): Energy {
  const { coldMatter, curvature, dark } = budget
  const radiation = budget.photons + budget.masslessNeutrinos
  return (N) => {
    const a = Math.exp(N)
    const x = 1 / a
    return ((radiation * x + coldMatter) * x + curvature) * x * x + dark * Math.exp(law.log(N, a))
  }
}

/** Sizes of logarithms at extreme parameters times eps. */
export const ROUNDING = 1e-11
