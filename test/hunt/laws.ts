/**
 * ln f of each law by the formulas of its publication (see the families' own sources), in doubles and in decimals of 45 digits:
 * the other route of the hunt. Parameters are exact doubles.
 */
import { Decimal } from 'decimal.js'
import type { Chance } from './chance'

/** E² is told from zero down to its 1e-30th part: fifteen digits more than that. */
Decimal.set({ precision: 45, toExpNeg: -40, toExpPos: 40 })

/** A double as it is, not as the shortest decimal that is read as it. */
export function exactly(x: number): Decimal {
  if (x === 0) return new Decimal(0)
  const exponent = Math.floor(Math.log2(Math.abs(x))) - 60
  // In two steps, since 2 to the whole may leave the doubles.
  const half = Math.trunc(exponent / 2)
  const whole = x * 2 ** -half * 2 ** (half - exponent)
  return new Decimal(BigInt(whole).toString()).times(new Decimal(2).pow(exponent))
}

export interface OtherLaw {
  /** The law in the scenario code. */
  readonly code: string
  /** ln f at N, a = e^N; −∞ where f = 0. */
  log(N: number, a: number): number
  /** The same, and n = 3(1 + w), in decimals; absent where only doubles are known. */
  exact?(N: Decimal): { readonly log: Decimal; readonly n: Decimal }
  /** Where the law ends. */
  readonly edge: number | null
}

const D = exactly
/** Typed as a person would, or with all digits. */
const typed = (chance: Chance, from: number, to: number): number => {
  const x = chance.between(from, to)
  return chance.pick([true, false]) ? Number(x.toFixed(2)) : x
}
const wOf = (chance: Chance) => (chance.between(0, 1) < 0.7 ? typed(chance, -2, 0.5) : typed(chance, -20, 20))
const waOf = (chance: Chance) => (chance.between(0, 1) < 0.7 ? typed(chance, -2, 1) : typed(chance, -20, 20))
const noEdge = { edge: null }

function constant(chance: Chance): OtherLaw {
  const w = wOf(chance)
  const n = D(w).plus(1).times(3)
  const code = `eos:constant,w:${w}`
  return { code, log: (N) => -3 * (1 + w) * N, exact: (N) => ({ log: n.times(N).neg(), n }), ...noEdge }
}

const lambda = (): OtherLaw => ({
  code: 'eos:lambda',
  log: () => 0,
  exact: () => ({ log: D(0), n: D(0) }),
  ...noEdge,
})

function cpl(chance: Chance): OtherLaw {
  const [w0, wa] = [wOf(chance), waOf(chance)]
  return {
    code: `eos:cpl,w0:${w0},wa:${wa}`,
    log: (N, a) => -3 * (1 + w0 + wa) * N - 3 * wa * (1 - a),
    exact: (N) => {
      const rest = D(1).minus(N.exp())
      const early = D(w0).plus(D(wa)).plus(1)
      const log = early.times(N).plus(D(wa).times(rest)).times(-3)
      return { log, n: D(w0).plus(1).plus(D(wa).times(rest)).times(3) }
    },
    ...noEdge,
  }
}

function jbp(chance: Chance): OtherLaw {
  const [w0, wa] = [wOf(chance), waOf(chance)]
  return {
    code: `eos:jbp,w0:${w0},wa:${wa}`,
    log: (N, a) => -3 * (1 + w0) * N + 1.5 * wa * (1 - a) ** 2,
    exact: (N) => {
      const a = N.exp()
      const rest = D(1).minus(a)
      const log = D(w0).plus(1).times(-3).times(N).plus(D(wa).times(1.5).times(rest).times(rest))
      return { log, n: D(w0).plus(1).plus(D(wa).times(a).times(rest)).times(3) }
    },
    ...noEdge,
  }
}

function ba(chance: Chance): OtherLaw {
  const [w0, wa] = [wOf(chance), waOf(chance)]
  return {
    code: `eos:ba,w0:${w0},wa:${wa}`,
    log: (N, a) => -3 * (1 + w0) * N + 1.5 * wa * (a < 1e-100 ? -2 * N : Math.log(1 + (1 / a - 1) ** 2)),
    exact: (N) => {
      const z = N.neg().exp().minus(1)
      const growth = z.times(z).plus(1)
      const log = D(w0)
        .plus(1)
        .times(-3)
        .times(N)
        .plus(growth.ln().times(D(wa)).times(1.5))
      return {
        log,
        n: D(w0)
          .plus(1)
          .plus(z.times(z.plus(1)).div(growth).times(D(wa)))
          .times(3),
      }
    },
    ...noEdge,
  }
}

function logarithmic(chance: Chance): OtherLaw {
  const [w0, wa] = [wOf(chance), waOf(chance)]
  return {
    code: `eos:log,w0:${w0},wa:${wa}`,
    log: (N) => -3 * (1 + w0) * N + 1.5 * wa * N * N,
    exact: (N) => {
      const log = D(w0).plus(1).times(-3).times(N).plus(D(wa).times(1.5).times(N).times(N))
      return {
        log,
        n: D(w0)
          .plus(1)
          .minus(N.times(D(wa)))
          .times(3),
      }
    },
    ...noEdge,
  }
}

function chaplygin(chance: Chance): OtherLaw {
  const [b, alpha] = [chance.between(0.01, 0.99), typed(chance, -0.5, 3)]
  return {
    code: `eos:chaplygin,b:${b},alpha:${alpha}`,
    log: (N) => {
      const x = -3 * (1 + alpha) * N
      const log = x > 600 ? Math.log(1 - b) + x : Math.log(b + (1 - b) * Math.exp(x))
      return log / (1 + alpha)
    },
    exact: (N) => {
      const whole = D(alpha).plus(1)
      const dust = D(1).minus(D(b)).times(whole.times(N).times(-3).exp())
      const bracket = dust.plus(D(b))
      return { log: bracket.ln().div(whole), n: dust.div(bracket).times(3) }
    },
    ...noEdge,
  }
}

function barotropic(chance: Chance): OtherLaw {
  const [excess, alpha] = [typed(chance, -1, 1), chance.pick([0.25, 0.5, 0.75, 1.5, typed(chance, -2, 3)])]
  const rate = 3 * excess * (1 - alpha)
  return {
    code: `eos:barotropic,excess:${excess},alpha:${alpha}`,
    log: (N) => {
      if (rate === 0) return 3 * excess * N
      // f = u for α = 0: either sign, which the hunt leaves to the edge.
      return Math.log(Math.max(0, 1 + rate * N)) / (1 - alpha)
    },
    edge: rate === 0 ? null : -1 / rate,
  }
}

/** The families that this route knows, and how often each is drawn. */
const FAMILIES: Readonly<Record<string, (chance: Chance) => OtherLaw>> = {
  lambda,
  constant,
  cpl,
  jbp,
  ba,
  log: logarithmic,
  chaplygin,
  barotropic,
}

export const FAMILY_KEYS = Object.keys(FAMILIES)
export const otherLaw = (key: string, chance: Chance): OtherLaw => FAMILIES[key](chance)
