/** Random legal scenario codes of the explicit laws, as a person might type them and as nobody would. */

import fc from 'fast-check'
import { isUnsolvable } from '../../lib/history/field/unsolvable'
import { readScenario } from '../../lib/scenario/read'
import type { Solution } from '../../lib/solve'
import { universe } from './universe'

/** Evenly between two numbers, as a short decimal or with all digits. */
const decimal = (min: number, max: number) =>
  fc.tuple(fc.integer({ min: 0, max: 2 ** 30 }), fc.boolean()).map(([k, short]) => {
    const x = min + ((max - min) * k) / 2 ** 30
    return short ? Number(x.toPrecision(3)) : x
  })
/** Evenly in the logarithm, between two powers of ten. */
const anySize = (low: number, high: number) => decimal(low, high).map((x) => 10 ** x)

const matter = fc.oneof(decimal(0, 2), anySize(-4, 4), fc.constant(0), fc.constant(1))
const signed = fc.oneof(
  decimal(-3, 3),
  fc.tuple(anySize(-6, 2), fc.constantFrom(-1, 1)).map(([x, sign]) => x * sign),
)
const closure = fc.oneof(
  fc.constant(''),
  signed.map((x) => `curvature:${x}`),
  signed.map((x) => `dark:${x}`),
)
const radiation = fc.oneof(
  fc.constant(''),
  fc.constant('cmb:0'),
  fc.constant('masses:0'),
  fc.oneof(decimal(0, 1), anySize(-6, 3)).map((x) => `radiation:${x}`),
  decimal(0.001, 1).map((x) => `masses:${x}`),
)
/** `wild` spans the limits of the parameters and all laws of w; else what data and textbooks allow of the simplest. */
const law = (wild: boolean) => {
  const w = wild ? decimal(-20, 20) : decimal(-2, 0.5)
  const wa = wild ? decimal(-20, 20) : decimal(-1.5, 1)
  const pair = (eos: string) => fc.tuple(w, wa).map(([w0, slope]) => `eos:${eos},w0:${w0},wa:${slope}`)
  const simple = [fc.constant(''), w.map((x) => `eos:constant,w:${x}`), pair('cpl')]
  if (!wild) return fc.oneof(...simple)
  const barotropic = fc
    .tuple(decimal(-2, 2), decimal(-2, 2))
    .map(([excess, alpha]) => `eos:barotropic,excess:${excess},alpha:${alpha}`)
  const gas = fc.tuple(decimal(0, 1), decimal(-0.9, 5)).map(([b, alpha]) => `eos:chaplygin,b:${b},alpha:${alpha}`)
  const nodes = fc.tuple(decimal(-2, 1), decimal(-2, 1)).map(([one, two]) => `eos:nodes,at:0.3_2,w:${one}_${two}`)
  return fc.oneof(...simple, pair('jbp'), pair('ba'), pair('log'), barotropic, gas, nodes)
}
const beyond = fc.constantFrom('', 'beyond:hold')

export const anyCode = (wild: boolean): fc.Arbitrary<string> =>
  fc
    .tuple(
      matter.map((x) => `matter:${x}`),
      closure,
      radiation,
      law(wild),
      beyond,
    )
    .map((parts) => parts.filter((part) => part !== '').join(','))
    .filter((code) => readScenario(code, 0).ok)

/** The engine gives some extreme codes up with a reason; null then. */
export function attempt(code: string): Solution | null {
  try {
    return universe(code)
  } catch (error) {
    if (isUnsolvable(error)) return null
    throw error
  }
}

/** A part of the way along an arm. */
export interface Where {
  readonly part: number
  readonly arm: 'past' | 'future'
}

/** Check a law in random universes, at random places; those that are given up are left out, and counted elsewhere. */
export function everywhere(wild: boolean, runs: number, check: (solution: Solution, where: Where) => void): void {
  const where = fc.record({
    part: fc.double({ min: 0.001, max: 1, noNaN: true }),
    arm: fc.constantFrom('past' as const, 'future' as const),
  })
  fc.assert(
    fc.property(anyCode(wild), where, (code, place) => {
      const solution = attempt(code)
      fc.pre(solution !== null)
      check(solution, place)
    }),
    { numRuns: runs, seed: 11 },
  )
}
