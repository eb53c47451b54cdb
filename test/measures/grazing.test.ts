/**
 * Changes of the sign of ä next to a double root: where they are by 50 digits (decimal.js) from the same densities, against the bound
 * that is stated. In matter and w = w0 + wa (1 − a), (ä/a)/½H₀² = −Ω_m a⁻³ − (1 + 3w) Ω_DE f, f = a^(−3(1 + w0 + wa)) e^(−3 wa (1 − a)).
 */
import Decimal from 'decimal.js'
import { describe, expect, it } from 'vitest'
import { accelerationChanges } from '../../lib/measures/epochs'
import { subjectOf } from '../../lib/quantities/quantity'
import { readScenario } from '../../lib/scenario/read'

const D = Decimal.clone({ precision: 50 })
const [MATTER, WA] = [0.3, 1]

function changesOf(w0: number) {
  const reading = readScenario(`matter:${MATTER},cmb:0,eos:cpl,w0:${w0},wa:${-WA}`, 0)
  if (!reading.ok) throw new Error(JSON.stringify(reading.problems))
  const { history, budget } = subjectOf(reading.value)
  return { list: accelerationChanges(history), matter: budget.coldMatter, dark: budget.dark }
}

/** ln of what accelerates over what decelerates, and its slope. */
function excess(N: Decimal, w0: number, matter: number, dark: number): Decimal {
  const a = N.exp()
  const w = new D(w0).minus(new D(WA).times(new D(1).minus(a)))
  const log = N.times(new D(w0).minus(WA).plus(1))
    .times(-3)
    .plus(new D(3 * WA).times(new D(1).minus(a)))
  return log.exp().times(w.times(3).plus(1)).times(-dark).minus(a.pow(-3).times(matter))
}

/** The root nearest to a place, by secants. */
function rootNear(N: number, f: (N: Decimal) => Decimal): Decimal {
  let [one, other] = [new D(N), new D(N).plus('1e-12')]
  let [f1, f2] = [f(one), f(other)]
  for (let k = 0; k < 80 && !f2.isZero() && !f2.eq(f1); k++) {
    const next = other.minus(f2.times(other.minus(one)).div(f2.minus(f1)))
    ;[one, f1, other] = [other, f2, next]
    f2 = f(other)
    if (other.minus(one).abs().lt('1e-30')) break
  }
  return other
}

/** The w0 above which it never accelerates. */
function tangent(): number {
  let [low, high] = [-0.4, -0.2]
  if (changesOf(low).list.length === 0 || changesOf(high).list.length > 0)
    throw new Error('no double root lies between')
  while (high - low > 4 * Number.EPSILON) {
    const middle = (low + high) / 2
    if (changesOf(middle).list.length > 0) low = middle
    else high = middle
  }
  return low
}

describe('changes of the sign of ä next to a double root', () => {
  const edge = tangent()
  it.each([1e-2, 1e-4, 1e-6, 1e-8, 1e-10, 1e-12, 1e-13])('%f away', (away) => {
    const w0 = edge - away
    const { list, matter, dark } = changesOf(w0)
    expect(list).toHaveLength(2)
    for (const { N, blur } of list) {
      const root = rootNear(N, (at) => excess(at, w0, matter, dark))
      expect(root.minus(N).abs().toNumber()).toBeLessThanOrEqual(blur + Number.EPSILON * Math.abs(N))
      // Two roots √away apart of each other: the bound goes like eps/√away, and never beyond √eps.
      expect(blur).toBeLessThan((400 * Number.EPSILON) / Math.sqrt(away) + 20 * Number.EPSILON)
    }
  })
})
