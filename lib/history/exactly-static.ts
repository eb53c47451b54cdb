/** Double roots of E² for a cosmological constant and typed densities, by exact arithmetic on the decimals as they were typed. */
import type { Law } from '../dark-energy/law'
import type { Budget } from '../scenario/budget'
import { wholeMultiples } from '../scenario/exact-sum'

/**
 * True where Λ a⁴ + Ω_k a² + Ω_m a + Ω_r has a double root at some a > 0, for the decimals of the densities and the closing one as
 * their exact remainder: where its discriminant vanishes (the textbook formula, from memory; the tests build double roots), and
 * Euclid's algorithm, derived here, gives the root.
 */
export function exactlyStatic(budget: Budget, law: Law): boolean {
  if (!budget.typed || law.exponent !== 0) return false
  const { photons, coldMatter, curvature, dark, closes } = budget
  const given = closes === 'dark' ? curvature : dark
  const [one, r, m, g] = wholeMultiples([1, photons, coldMatter, given])
  const closing = one - r - m - g
  const [k, lambda] = closes === 'dark' ? [g, closing] : [closing, g]
  return lambda !== 0n && discriminant(lambda, k, m, r) === 0n && doubleRootIsPositive(lambda, k, m, r)
}

/** Of a x⁴ + c x² + d x + e. */
const discriminant = (a: bigint, c: bigint, d: bigint, e: bigint): bigint =>
  a *
  (256n * a ** 2n * e ** 3n -
    128n * a * c ** 2n * e ** 2n +
    144n * a * c * d ** 2n * e -
    27n * a * d ** 4n +
    16n * c ** 4n * e -
    4n * c ** 3n * d ** 2n)

/** The root is −d (12 a e + c²)/(9 a d² − 8 a c e + 2 c³); for d = 0 both of ±√(−c/2a) are double. */
function doubleRootIsPositive(a: bigint, c: bigint, d: bigint, e: bigint): boolean {
  if (d === 0n) return e !== 0n && a * c < 0n
  const numerator = -d * (12n * a * e + c * c)
  const denominator = 9n * a * d * d - 8n * a * c * e + 2n * c ** 3n
  return numerator * denominator > 0n
}
