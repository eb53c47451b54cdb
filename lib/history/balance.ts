/**
 * The terms of E² = P − M, P the positive and M the negative ones, weighed against each other: h = ln P − ln M at one N, how far
 * rounding may have moved it, and how fast it can fall on from there. Every bound is widened by the rounding of what it is made from.
 */
import type { Term } from '../components'

export type Direction = 1 | -1

/** More than any scenario has: four densities, three neutrino states, two parts of a law. */
const MOST_TERMS = 12
/** Logarithms of the terms that were added up last. */
const logs = new Float64Array(MOST_TERMS)

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
  /** Relative rounding of the weights, in units of eps. */
  #rounding = 0
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
    const minus = this.#logSum(this.#minus)
    const minusRounding = this.#rounding
    const plus = this.#logSum(this.#plus)
    for (let i = 0; i < this.#plus.length; i++) this.#weights[i] = Math.exp(logs[i] - plus)
    this.h = plus - minus
    if (!Number.isFinite(this.h)) {
      this.error = 0
      return
    }
    // The error in nearly equal sums is that of their largest terms; each of the logarithms rounds once more.
    this.error = Number.EPSILON * (this.#rounding + minusRounding + 2 * Math.abs(plus) + 2 * Math.abs(minus) + 4)
  }

  /** ln of the sum of terms, with the rounding of its terms in `#rounding` and their logarithms in `logs`. */
  #logSum(terms: readonly Term[]): number {
    const N = this.#N
    let largest = Number.NEGATIVE_INFINITY
    let sum = 0
    let rounding = 0
    for (let i = 0; i < terms.length; i++) {
      const log = terms[i].logSize(N)
      logs[i] = log
      if (!(log <= largest)) largest = log
    }
    this.#rounding = 0
    if (!Number.isFinite(largest)) return largest
    for (let i = 0; i < terms.length; i++) {
      const below = largest - logs[i]
      // What is e⁶⁰ times smaller than the largest moves nothing, nor does its error.
      if (below > 60) continue
      const size = Math.exp(-below)
      sum += size
      rounding += size * (terms[i].rounding(N, logs[i]) + 4)
    }
    this.#rounding = rounding / sum + 4
    return largest + Math.log(sum)
  }

  /**
   * The fastest that h can fall outwards, given that exponents are bounded on the next `length`: no root lies within h over this.
   * Zero where none lies on all of it, Infinity where nothing is known. ln P falls by at most s · ⟨n⟩_P over a step s (Jensen: P is
   * a sum of exponentials), ln M rises by at most s times its largest growth.
   */
  closing(length: number): number {
    return this.#change(length, true)
  }

  /** The slowest that h falls outwards on the next `length`: above zero, h falls on all of it. For short steps only. */
  falling(length: number): number {
    return this.#change(length, false)
  }

  #change(length: number, fastest: boolean): number {
    const outwards = this.#direction > 0
    const [from, to] = outwards ? [this.#N, this.#N + length] : [this.#N - length, this.#N]
    const high = fastest === outwards
    let [fall, sizes, steepest] = [0, 0, Number.NEGATIVE_INFINITY]
    for (let i = 0; i < this.#plus.length; i++) {
      const weight = this.#weights[i]
      const range = this.#plus[i].exponentRange(from, to)
      const n = high ? range[1] : range[0]
      const rate = outwards ? n : -n
      if (rate > steepest) steepest = rate
      if (weight === 0) continue
      fall += weight * rate
      sizes += weight * Math.abs(rate)
    }
    let rise = fastest ? Number.NEGATIVE_INFINITY : Number.POSITIVE_INFINITY
    for (const one of this.#minus) {
      const range = one.exponentRange(from, to)
      const n = high ? range[0] : range[1]
      const rate = outwards ? -n : n
      rise = fastest ? Math.max(rise, rate) : Math.min(rise, rate)
    }
    // Where no positive term thins out faster than a negative one, h cannot fall, whatever the weights.
    if (fastest && steepest + rise <= 0) return 0
    const slack = Number.EPSILON * (2 * this.#rounding + 16) * (sizes + Math.abs(rise))
    const closing = fastest ? fall + rise + slack : fall + rise - slack
    if (!fastest) return closing
    return Number.isNaN(closing) ? Number.POSITIVE_INFINITY : Math.max(0, closing)
  }
}

function isSteady({ exponentRange }: Term): boolean {
  const [low, high] = exponentRange(Number.NEGATIVE_INFINITY, Number.POSITIVE_INFINITY)
  return low === high
}
