/**
 * Writes lib/neutrinos/table.ts, the polynomials of the energy integral of a massive neutrino: `node scripts/neutrino-table.mjs`.
 *
 * The integrals ∫ x² g(x, y)/(eˣ + 1) dx are sums by the trapezoid rule in u, x = exp(u − e^(−u)) (Takahasi & Mori 1974:
 * the integrand falls off double exponentially on the left and like exp(−eᵘ) on the right, so the rule converges
 * exponentially). All arithmetic is in whole numbers of 2^−192, so the result is the same on every machine; the rule with
 * half the step agrees to better than 1e-30. Each function is interpolated at Chebyshev points of the first kind
 * (Trefethen, Approximation Theory and Approximation Practice, 2013, chapter 3), cut at TERMS and rewritten in powers of the
 * panel's own variable −1 ≤ t ≤ 1. The powers are well conditioned here because the coefficients fall by a factor ten or so.
 */
import { readFileSync, writeFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'

const BITS = 192n
const ONE = 1n << BITS
const STEP_DENOMINATOR = 48n
const PANELS = 17
const WIDTH = 20n
const SHIFT = 4n
const TERMS = 12
const NODES = 20

/** @param {bigint} a @param {bigint} b */
const times = (a, b) => (a * b) >> BITS
/** @param {bigint} a @param {bigint} b */
const over = (a, b) => (a << BITS) / b
/** @param {bigint} p @param {bigint} q */
const fraction = (p, q) => (p << BITS) / q
/** @param {bigint} a */
const toNumber = (a) => Number(a) / 2 ** Number(BITS)

/** Square root by Newton's iteration. @param {bigint} a */
function root(a) {
  const target = a << BITS
  let guess = BigInt(Math.floor(Math.sqrt(Number(target)))) + 1n
  for (let i = 0; i < 4; i++) guess = (guess + target / guess) >> 1n
  return guess
}

/** Exponential: the argument is divided by 2^16, summed as a Taylor series and squared back. @param {bigint} a @returns {bigint} */
function exponential(a) {
  if (a < 0n) return over(ONE, exponential(-a))
  const small = a >> 16n
  let term = ONE
  let sum = ONE
  for (let k = 1n; term > 0n; k++) {
    term = times(term, small) / k
    sum += term
  }
  for (let i = 0; i < 16; i++) sum = times(sum, sum)
  return sum
}

/** Natural logarithm by Newton's iteration. @param {bigint} a */
function logarithm(a) {
  let guess = BigInt(Math.round(Math.log(toNumber(a)) * 2 ** 48)) << (BITS - 48n)
  for (let i = 0; i < 3; i++) guess += times(a, exponential(-guess)) - ONE
  return guess
}

/** arctan(1/n). @param {bigint} n */
function arctanOfInverse(n) {
  let power = ONE / n
  let sum = 0n
  for (let k = 1n; power !== 0n; k += 2n) {
    sum += power / k
    power /= -n * n
  }
  return sum
}

/** π by Machin's formula. */
const PI = 16n * arctanOfInverse(5n) - 4n * arctanOfInverse(239n)
const FOURTH_POWER = times(times(PI, PI), times(PI, PI))
/** F(0) = 7π⁴/120, and the closed coefficients of y² and y⁴ ln y in R. */
const MASSLESS = (7n * FOURTH_POWER) / 120n
const SQUARE = over(fraction(5n, 7n), times(PI, PI))
const LOGARITHM = over(fraction(15n, 14n), FOURTH_POWER)

/** cos(a) by its Taylor series. @param {bigint} a */
function cosine(a) {
  let term = ONE
  let sum = 0n
  for (let k = 1n; term !== 0n; k += 2n) {
    sum += term
    term = -times(times(term, a), a) / (k * (k + 1n))
  }
  return sum
}

/** x² and the weight h x² dx/du/(eˣ + 1) of every point of the trapezoid rule that counts. @param {bigint} denominator */
function trapezoid(denominator) {
  const points = []
  for (let k = -4n * denominator; k < 5n * denominator; k++) {
    const u = fraction(k, denominator)
    const fall = exponential(-u)
    const x = exponential(u - fall)
    if (x >> BITS > 110n) break
    const jacobian = times(x, ONE + fall) / denominator
    const square = times(x, x)
    const weight = over(times(square, jacobian), exponential(x) + ONE)
    if (weight > 0n) points.push({ square, weight })
  }
  return points
}

/**
 * R, its derivatives D = y dR/dy and DD = y dD/dy, and P = R − D (three times the pressure), all over F(0) and
 * each a sum of positive terms: with e² = x² + y² they weigh e, y²/e, (2x² + y²) y²/e³ and x²/e.
 * @param {bigint} y @param {ReturnType<typeof trapezoid>} points
 */
function integrals(y, points) {
  const mass = times(y, y)
  let [ratio, first, second, pressure] = [0n, 0n, 0n, 0n]
  for (const { square, weight } of points) {
    const total = square + mass
    const energy = root(total)
    const perEnergy = over(weight, energy)
    ratio += times(weight, energy)
    first += times(perEnergy, mass)
    second += over(times(times(perEnergy, mass), total + square), total)
    pressure += times(perEnergy, square)
  }
  return { ratio, first, second, pressure }
}

/**
 * What the panels tabulate for y ≥ 3/4, as functions of e = 4/(y + 4): R/(y + 4), (1 − s)/e² and (ds/d ln y)/e².
 * The limits at e = 0 are left to the interpolation, whose points are inside the panels.
 * @param {bigint} e @param {ReturnType<typeof trapezoid>} points
 */
function panelFunctions(e, points) {
  const y = over(SHIFT << BITS, e) - (SHIFT << BITS)
  const { ratio, first, second, pressure } = integrals(y, points)
  const slope = over(first, ratio)
  const derivative = over(second, ratio) - times(slope, slope)
  const square = times(e, e)
  return [
    over(over(ratio, y + (SHIFT << BITS)), MASSLESS),
    over(over(pressure, ratio), square),
    over(derivative, square),
  ]
}

/**
 * What stays of R, D and DD for y < 3/4 after the terms in y² and y⁴ ln y, over y⁴.
 * @param {bigint} y @param {ReturnType<typeof trapezoid>} points
 */
function remainders(y, points) {
  const { ratio, first, second } = integrals(y, points)
  const square = times(y, y)
  const fourth = times(square, square)
  const bySquare = times(SQUARE, square)
  const byLog = times(LOGARITHM, logarithm(y))
  return [
    over(over(ratio, MASSLESS) - ONE - bySquare, fourth) - byLog,
    over(over(first, MASSLESS) - 2n * bySquare, fourth) - 4n * byLog - LOGARITHM,
    over(over(second, MASSLESS) - 4n * bySquare, fourth) - 16n * byLog - 8n * LOGARITHM,
  ]
}

/** cos(π (k + 1/2) j / NODES). @param {number} j @param {number} k */
const chebyshevCosine = (j, k) => cosine((PI * BigInt((j * (2 * k + 1)) % (4 * NODES))) / BigInt(2 * NODES))
const COSINES = Array.from({ length: NODES }, (_, j) => Array.from({ length: NODES }, (_, k) => chebyshevCosine(j, k)))

/** The Chebyshev coefficients from values at the points of the first kind. @param {bigint[]} values */
const chebyshevCoefficients = (values) =>
  COSINES.map((row, j) => {
    const sum = row.reduce((total, cosine, k) => total + times(cosine, values[k]), 0n)
    return (sum * (j === 0 ? 1n : 2n)) / BigInt(NODES)
  })

/** The first TERMS Chebyshev terms in powers of t, by T_(j+1) = 2t T_j − T_(j−1). @param {bigint[]} coefficients */
function powers(coefficients) {
  const sum = new Array(TERMS).fill(0n)
  let before = [1n]
  let polynomial = [1n]
  for (let j = 0; j < TERMS; j++) {
    polynomial.forEach((factor, k) => {
      sum[k] += factor * coefficients[j]
    })
    const next = [0n, ...polynomial.map((factor) => (j === 0 ? 1n : 2n) * factor)]
    if (j > 0)
      before.forEach((factor, k) => {
        next[k] -= factor
      })
    before = polynomial
    polynomial = next
  }
  return sum.map(toNumber)
}

/** A polynomial with the rounded coefficients, summed exactly. @param {number[]} coefficients @param {bigint} t */
const exactly = (coefficients, t) =>
  coefficients.reduceRight(
    (sum, coefficient) => times(sum, t) + BigInt(coefficient * 2 ** 120) * 2n ** (BITS - 120n),
    0n,
  )

/**
 * The polynomials of several functions on [centre − half, centre + half], and how far each is off at most half way between
 * the interpolation points (absolute).
 * @param {(x: bigint) => bigint[]} functions @param {bigint} centre @param {bigint} half
 */
function expand(functions, centre, half) {
  const rows = COSINES[1].map((t) => functions(centre + times(half, t)))
  const polynomials = rows[0].map((_, f) => powers(chebyshevCoefficients(rows.map((row) => row[f]))))
  const errors = polynomials.map(() => 0)
  for (let k = 1; k < NODES; k++) {
    const t = cosine((PI * BigInt(k)) / BigInt(NODES))
    functions(centre + times(half, t)).forEach((value, f) => {
      errors[f] = Math.max(errors[f], Math.abs(toNumber(value - exactly(polynomials[f], t))))
    })
  }
  return { polynomials, errors }
}

/** @param {number[][]} rows */
const literal = (rows) => `new Float64Array([\n${rows.map((row) => `  ${row.join(', ')},\n`).join('')}])`

/** The text of lib/neutrinos/table.ts. */
export function neutrinoTable() {
  const points = trapezoid(STEP_DENOMINATOR)
  const half = fraction(1n, 2n * WIDTH)
  const panels = Array.from({ length: PANELS }, (_, i) =>
    expand((e) => panelFunctions(e, points), BigInt(2 * i + 1) * half, half),
  )
  const small = expand((y) => remainders(y, points), fraction(3n, 8n), fraction(3n, 8n))
  /** @param {number} f */
  const rows = (f) => literal([...panels, small].map(({ polynomials }) => polynomials[f]))
  /** @param {number} f */
  const worst = (f) => Math.max(...panels.map(({ errors }) => errors[f])).toExponential(1)
  return `// Written by scripts/neutrino-table.mjs, which says how; do not edit.
// ${PANELS} panels of width 1/${WIDTH} in e = ${SHIFT}/(y + ${SHIFT}), from e = 0 up, then one row for 0 ≤ y ≤ 3/4; in a row the
// coefficients of the powers of t, which goes from −1 to 1 across the panel.
// Measured error, with the coefficients rounded as printed, half way between the interpolation points (absolute):
// panels: ratio ${worst(0)}, pressure ${worst(1)}, slope ${worst(2)};
// row for y ≤ 3/4: ${small.errors.map((error) => error.toExponential(1)).join(', ')}, to be multiplied by y⁴.

/** Coefficients in a row. */
export const TERMS = ${TERMS}
/** Panels; the row of this number is the one for y ≤ 3/4. */
export const PANELS = ${PANELS}
/** Panels in one unit of e. */
export const PANELS_PER_UNIT = ${WIDTH}
/** y at e = 1/2. */
export const SHIFT = ${SHIFT}

/** R/(y + ${SHIFT}); last row (R − 1 − a y² − b y⁴ ln y)/y⁴. */
export const RATIO = ${rows(0)}
/** (1 − s)/e²; last row the same remainder of dR/d ln y. */
export const FIRST = ${rows(1)}
/** (ds/d ln y)/e²; last row the same remainder of d²R/(d ln y)². */
export const SECOND = ${rows(2)}
`
}

const target = fileURLToPath(new URL('../lib/neutrinos/table.ts', import.meta.url))
if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const text = neutrinoTable()
  if (process.argv.includes('--check')) process.exitCode = readFileSync(target, 'utf8') === text ? 0 : 1
  else writeFileSync(target, text)
}
