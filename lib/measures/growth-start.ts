/**
 * Growth near a = 0, where E² is one power a^(−n) with small corrections δ_i a^(r_i): the solution that stays regular there has
 *   f = d ln D/d ln a = f₀ + Σ f_i a^(r_i),  f₀² + k f₀ = (3/2) Ω_s,  k = 2 − n/2,
 * to first order in the corrections of f′ + f² + (2 + (ln E)′) f = (3/2) Ω_s (Peebles 1980, section 11; for n = 4 and dust this is
 * the beginning of Mészáros' solution 1 + (3/2) a/a_eq, Astron. Astrophys. 37, 225, 1974).
 */
import type { Arm } from '../history/arm'
import { leadingExponent, type Tail, tailAt } from '../history/tail'
import type { Model } from '../model'
import { type State, sourceOver } from './growth-panels'

interface Term {
  readonly size: number
  readonly rate: number
}

export interface Start {
  readonly N: number
  /** From here on the answer is good; at N itself where the closed form holds there and before. */
  readonly goodFrom: number
  /** f₀. */
  readonly rate: number
  readonly terms: readonly Term[]
  readonly state: State
}

/** Corrections below this leave less than its square in D. */
const SMALL = 1e-8
const FAINT = 2e-9
/** Where f₀ vanishes, f itself is a correction, and good to a few times the others: e⁻⁹ of what is faint is below 1e-12. */
const EARLIER = 9
/**
 * Where powers lie so close that no correction is small within the doubles, f starts as if the steepest were alone.
 * What is wrong with that dies out like a^(−5/2) in matter, and is as small as f itself where radiation or the like leads.
 */
const FARTHEST = -170
const FORGOTTEN = -150

/** Past arms that reach back to a big bang with no exponent above 4. */
export function startOf(past: Arm): Start {
  /* v8 ignore next -- where there is matter there is an exponent */
  const exponent = leadingExponent(past.model, -1) ?? 3
  const tail = past.tail && earlierTail(past.model, past.tail, exponent)
  const small = tail && tail.N > FARTHEST && tail.corrections.every((one) => Math.abs(one.size) < SMALL)
  return small ? closedStart(past.model, tail, exponent) : balancedStart(past.model, exponent)
}

/** Where the corrections have died out to a part of what `startOf` allows. */
function earlierTail(model: Model, tail: Tail, exponent: number): Tail {
  const least = exponent === 3 ? FAINT : FAINT * Math.exp(-EARLIER)
  const ways = tail.corrections.map(
    ({ size, rate }) => Math.log(Math.abs(size) / least) / Math.min(1, exponent - 3 || 1, rate),
  )
  const earlier = Math.max(FARTHEST + 1, tail.N - Math.max(0, ...ways))
  if (!(earlier < tail.N)) return tail
  /* v8 ignore next -- earlier the corrections are smaller still, so there is a tail */
  return tailAt(model, -1, earlier) ?? tail
}

/** The root f ≥ 0 of f² + k f = source, for k ≥ 0. */
const balanced = (k: number, source: number): number =>
  source === 0 ? 0 : (2 * source) / (k + Math.sqrt(k * k + 4 * source))

function closedStart(model: Model, tail: Tail, n: number): Start {
  const x = Math.exp(-tail.N)
  const corrections = tail.corrections
  const expansion = tail.expansion(0)
  const leading = expansion / corrections.reduce((sum, one) => sum + one.size, 1)
  const k = 2 - n / 2
  const { coldMatter } = model.budget
  const cold = (1.5 * coldMatter * x ** 3) / leading
  const source = n === 3 ? cold : 0
  const rate = balanced(k, source)
  const damped = (forcing: number, r: number): Term => ({ size: forcing / (r + 2 * rate + k), rate: r })
  const terms = corrections.map((one) => damped(-one.size * (source + 0.5 * one.rate * rate), one.rate))
  if (n > 3) {
    terms.push(damped(cold, n - 3))
    // ρ − 3p of neutrinos that are still fast goes like a⁻².
    terms.push(damped((1.5 * sourceOver(model, x) * x * x) / leading - cold, n - 2))
  }
  const doubt = n === 3 ? 0 : 4 * Math.max(0, ...corrections.map((one) => Math.abs(one.size)))
  const present = terms.filter((one) => one.size !== 0)
  return startAt(tail.N, tail.N, rate, present, expansion, doubt)
}

function balancedStart(model: Model, n: number): Start {
  const x = Math.exp(-FARTHEST)
  const expansion = model.expansion(FARTHEST, x)
  const source = (1.5 * sourceOver(model, x) * x * x) / expansion
  return startAt(FARTHEST, FORGOTTEN, balanced(2 - n / 2, source), [], expansion, 0)
}

function startAt(
  N: number,
  goodFrom: number,
  rate: number,
  terms: readonly Term[],
  expansion: number,
  doubt: number,
): Start {
  const slope = terms.reduce((sum, one) => sum + one.size, rate)
  const flow = slope * Math.exp(2 * N) * Math.sqrt(expansion)
  return { N, goodFrom, rate, terms, state: { contrast: 1, flow, error: doubt + 4 * Number.EPSILON } }
}

/** ln D relative to where the panels start. */
export const logContrastBefore = ({ N: start, rate, terms }: Start, N: number): number =>
  terms.reduce((sum, one) => sum + (one.size * Math.expm1(one.rate * (N - start))) / one.rate, rate * (N - start))

/** f before the panels start. */
export const rateBefore = ({ N: start, rate, terms }: Start, N: number): number =>
  terms.reduce((sum, one) => sum + one.size * Math.exp(one.rate * (N - start)), rate)
