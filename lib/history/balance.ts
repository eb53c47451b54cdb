/**
 * The terms of E² = P − M, P the positive and M the negative ones, weighed against each other: h = ln P − ln M at one N, how far
 * rounding may have moved it, and how fast it can fall on from there. Every bound is widened by the rounding of what it is made from.
 */
import { logOfPower, roundingOfPower, type Term } from '../components'

export type Direction = 1 | -1

/** More than any scenario has: four densities, three neutrino states, two parts of a law. */
const MOST_TERMS = 12
/** Logarithms of the terms that were added up last. */
const logs = new Float64Array(MOST_TERMS)
const rates = new Float64Array(MOST_TERMS)

export class Balance {
  /** ln P − ln M at N: Infinity where M is nothing. */
  h = Number.NaN
  /** |true h − h| is at most this. */
  error = 0
  /** Is every exponent the same at all times, so that a bound for any step is one for all? */
  readonly steady: boolean
  readonly #plus: readonly Term[]
  readonly #minus: readonly Term[]
  readonly #direction: Direction
  /** Share of each positive term in P. */
  readonly #weights: number[] = []
  /** Share of each negative term in M. */
  readonly #minusWeights: number[] = []
  /** Relative rounding of the weights, in units of eps. */
  #rounding = 0
  // What `#rates` found: of ln P its fall, of ln M its rise, and what rounding may have moved them by.
  #fall = 0
  /** Share in P of what falls no faster than M can rise. */
  #lasting = 0
  #meanRise = 0
  #leastRise = 0
  #mostRise = 0
  #fallSpread = 0
  #fallSizes = 0
  #meanSizes = 0
  #N = Number.NaN

  constructor(terms: readonly Term[], direction: Direction) {
    this.#plus = terms.filter((one) => one.omega > 0)
    this.#minus = terms.filter((one) => one.omega < 0)
    this.#direction = direction
    this.steady = terms.every(isSteady)
  }

  /** Is there anything that E² could vanish by? */
  get signed(): boolean {
    return this.#minus.length > 0
  }

  /** Weighs the terms at N. */
  weigh(N: number): void {
    this.#N = N
    const minus = this.#logSum(this.#minus, this.#minusWeights)
    const minusRounding = this.#rounding
    const plus = this.#logSum(this.#plus, this.#weights)
    this.h = plus - minus
    this.#rounding = Math.max(this.#rounding, minusRounding)
    if (!Number.isFinite(this.h)) {
      this.error = 0
      return
    }
    // The error in nearly equal sums is that of their largest terms; each of the logarithms rounds once more.
    this.error = Number.EPSILON * (2 * this.#rounding + 2 * Math.abs(plus) + 2 * Math.abs(minus) + 4)
  }

  /** ln of the sum of terms, with the share of each in `weights` and the rounding of its terms in `#rounding`. */
  #logSum(terms: readonly Term[], weights: number[]): number {
    const N = this.#N
    let largest = Number.NEGATIVE_INFINITY
    let sum = 0
    let rounding = 0
    for (let i = 0; i < terms.length; i++) {
      const { power } = terms[i]
      const log = power ? logOfPower(power, N) : terms[i].logSize(N)
      logs[i] = log
      if (!(log <= largest)) largest = log
    }
    this.#rounding = 0
    if (!Number.isFinite(largest)) {
      for (let i = 0; i < terms.length; i++) weights[i] = Number.NaN
      return largest
    }
    for (let i = 0; i < terms.length; i++) {
      const below = largest - logs[i]
      const size = Math.exp(-below)
      weights[i] = size
      // What is e⁶⁰ times smaller than the largest moves nothing, nor does its error.
      if (below > 60) continue
      sum += size
      const { power } = terms[i]
      const own = power ? roundingOfPower(power, logs[i]) : terms[i].rounding(N, logs[i])
      rounding += size * (own + 4)
    }
    for (let i = 0; i < terms.length; i++) weights[i] /= sum
    this.#rounding = rounding / sum + 4
    return largest + Math.log(sum)
  }

  /**
   * How far on h, known to be at least `h`, stays above zero, given that exponents are bounded on the next `length`; Infinity where
   * that is all of it. Over a step s, ln P falls by at most s ⟨n⟩_P (Jensen: P is a sum of exponentials). ln M rises by at most s
   * times its largest growth g, and by at most s ⟨g⟩_M + s² (g_max − g_min)²/8 (Hoeffding 1963, J. Am. Stat. Assoc. 58, 13, eq. 4.16).
   */
  reach(h: number, length: number): number {
    this.#rates(length, true)
    // What of P thins out no faster than any negative term outweighs M for ever, if it does so here.
    if (this.#lasting > 0 && h + Math.log(this.#lasting) > this.error) return Number.POSITIVE_INFINITY
    const plain = h / Math.max(0, this.#fall + this.#mostRise + this.#slackWith(this.#mostRise, 0))
    const spread = this.#mostRise - this.#leastRise
    if (this.#minus.length < 2 || !Number.isFinite(spread))
      return Number.isNaN(plain) ? /* v8 ignore next -- only where rates leave the doubles */ 0 : plain
    const closing = this.#fall + this.#meanRise + this.#slackWith(this.#meanSizes, spread)
    const bent = (2 * h) / (closing + Math.sqrt(closing * closing + 0.5 * h * spread * spread))
    /* v8 ignore next -- 0 only where rates leave the doubles */
    return Math.max(plain, bent) || 0
  }

  /** The slowest that h falls outwards on the next `length`: above zero, h falls on all of it. For short steps only. */
  falling(length: number): number {
    this.#rates(length, false)
    return this.#fall + this.#leastRise - this.#slackWith(this.#leastRise, 0)
  }

  /**
   * What rounding may have moved a sum of rates by, of which those of M have this size and differ by this much in a mean. Weights add
   * up to 1, so that their errors move a mean by no more than the rates differ.
   */
  #slackWith(rise: number, spread: number): number {
    return Number.EPSILON * (2 * this.#rounding * (this.#fallSpread + spread) + 16 * (this.#fallSizes + Math.abs(rise)))
  }

  /** Bounds of the rates on the next `length`: the fastest that h could fall, or the slowest. */
  #rates(length: number, fastest: boolean): void {
    const outwards = this.#direction > 0
    const [from, to] = outwards ? [this.#N, this.#N + length] : [this.#N - length, this.#N]
    const high = fastest === outwards
    let fall = 0
    let sizes = 0
    let [slowest, steepest] = [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY]
    for (let i = 0; i < this.#plus.length; i++) {
      const n = boundOf(this.#plus[i], from, to, high)
      const rate = outwards ? n : -n
      rates[i] = rate
      const weight = this.#weights[i]
      if (weight === 0) continue
      fall += weight * rate
      sizes += weight * Math.abs(rate)
      if (rate < slowest) slowest = rate
      if (rate > steepest) steepest = rate
    }
    let mean = 0
    let meanSizes = 0
    let least = Number.POSITIVE_INFINITY
    let most = Number.NEGATIVE_INFINITY
    for (let i = 0; i < this.#minus.length; i++) {
      const n = boundOf(this.#minus[i], from, to, !high)
      const rate = outwards ? -n : n
      if (rate < least) least = rate
      if (rate > most) most = rate
      if (this.#minusWeights[i] === 0) continue
      mean += this.#minusWeights[i] * rate
      meanSizes += this.#minusWeights[i] * Math.abs(rate)
    }
    let lasting = 0
    for (let i = 0; i < this.#plus.length; i++) if (rates[i] + most <= 0) lasting += this.#weights[i]
    this.#fall = fall
    this.#lasting = lasting
    this.#meanRise = mean
    this.#leastRise = least
    this.#mostRise = most
    this.#fallSpread = steepest > slowest ? steepest - slowest : 0
    this.#fallSizes = sizes
    this.#meanSizes = meanSizes
  }
}

/** The highest or the lowest exponent of a term on [from, to]. */
function boundOf(term: Term, from: number, to: number, high: boolean): number {
  if (term.power) return term.power.exponent
  const range = term.exponentRange(from, to)
  return high ? range[1] : range[0]
}

function isSteady({ power, exponentRange }: Term): boolean {
  if (power) return true
  const range = exponentRange(Number.NEGATIVE_INFINITY, Number.POSITIVE_INFINITY)
  return range[0] === range[1]
}
