/**
 * Sums without rounding error: a list of doubles that do not overlap and add up to exactly the sum
 * (Shewchuk 1997, Discrete Comput. Geom. 18, 305, Grow-Expansion).
 */

/** The sum of finite terms as `high`, correctly rounded but for exact ties, and `low`, what `high` misses. */
export function exactSum(terms: readonly number[]): { readonly high: number; readonly low: number } {
  let parts: number[] = []
  for (const term of terms) parts = grow(parts, term)
  let high = 0
  let low = 0
  for (const part of parts.reverse()) {
    const sum = high + part
    low += part - (sum - high)
    high = sum
  }
  return { high: high + low, low: low - (high + low - high) }
}

/** Parts of ascending size that add up to exactly the old parts and the term. */
function grow(parts: readonly number[], term: number): number[] {
  const grown: number[] = []
  let sum = term
  for (const part of parts) {
    const [larger, smaller] = Math.abs(sum) < Math.abs(part) ? [part, sum] : [sum, part]
    const next = larger + smaller
    const rest = smaller - (next - larger)
    if (rest !== 0) grown.push(rest)
    sum = next
  }
  grown.push(sum)
  return grown
}

/** Whether the shortest decimals of finite numbers, as people type them, add up to exactly zero. */
export const decimalsCancel = (terms: readonly number[]): boolean =>
  wholeMultiples(terms).reduce((sum, one) => sum + one, 0n) === 0n

/** The shortest decimals of finite numbers as whole multiples of one power of ten. */
export function wholeMultiples(terms: readonly number[]): readonly bigint[] {
  const decimals = terms.map(decimalOf)
  const finest = Math.min(...decimals.map((one) => one.exponent))
  return decimals.map((one) => one.digits * 10n ** BigInt(one.exponent - finest))
}

/** x = digits · 10^exponent, exactly as String(x) shows it. */
function decimalOf(x: number): { readonly digits: bigint; readonly exponent: number } {
  const [mantissa, exponent = '0'] = String(x).split('e')
  const [whole, fraction = ''] = mantissa.split('.')
  return { digits: BigInt(whole + fraction), exponent: Number(exponent) - fraction.length }
}
