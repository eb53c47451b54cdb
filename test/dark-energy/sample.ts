/** Parameter values of the families: within what their sliders offer, where the laws bend gently, and at their limits. */
import fc from 'fast-check'
import { FAMILIES } from '../../lib/dark-energy'
import type { Family, Law } from '../../lib/dark-energy/law'
import type { NumberParameter, ParameterValues } from '../../lib/parameter'

/** The families that are functions of a alone. */
export const EXPLICIT: readonly Family[] = FAMILIES.filter((one) => one.key !== 'field')

/** Away from where u of a barotropic law is nearly zero, and where 1 − α is. */
const gently = ({ slider }: NumberParameter) =>
  fc.double({ min: slider.min, max: slider.max, noNaN: true }).map((x) => Number(x.toFixed(3)) + 0)

const wildly = ({ min, max, fallback }: NumberParameter) =>
  fc.oneof(fc.double({ min, max, noNaN: true }), fc.constantFrom(min, max, fallback))

function valuesOf(family: Family, number: typeof gently): fc.Arbitrary<ParameterValues> {
  if (family.key === 'nodes') return nodeValues
  const each = family.parameters.map((one) => {
    if (one.kind !== 'number') throw new TypeError(`${one.key} is not a number`)
    return number(one).map((value) => [one.key, value] as const)
  })
  return fc.tuple(...each).map((pairs) => Object.fromEntries(pairs))
}

const nodeValues: fc.Arbitrary<ParameterValues> = fc
  .array(fc.tuple(fc.double({ min: -2, max: 1, noNaN: true }), fc.double({ min: -2, max: 0.4, noNaN: true })), {
    minLength: 2,
    maxLength: 6,
  })
  .map((pairs) => pairs.map(([x, w]) => [Number(Math.exp(x).toFixed(2)), w] as const).filter(([at]) => at > 0))
  .map((pairs) => [...new Map(pairs).entries()].toSorted(([one], [other]) => one - other))
  .filter((pairs) => pairs.length > 1)
  .map((pairs) => ({ at: pairs.map(([at]) => at), w: pairs.map(([, w]) => w) }))

export const gentleLaws = (family: Family): fc.Arbitrary<Law> => valuesOf(family, gently).map(family.law)
export const wildLaws = (family: Family): fc.Arbitrary<Law> => valuesOf(family, wildly).map(family.law)

/** Inside by so much that the law has all its derivatives from N − r to N + r. */
export function isSmooth(law: Law, N: number, r: number): boolean {
  const edges = [law.past, law.future].flatMap((one) => (one.kind === 'logarithmic' && one.edge ? [one.edge.N] : []))
  if ([...law.breaks, ...edges].some((x) => Math.abs(x - N) <= r)) return false
  const beyond = [law.past, law.future].some((one) => one.kind === 'logarithmic' && 1 + one.rate * N <= 0 && one.edge)
  return !beyond && Math.abs(law.w(N)) < 30
}
