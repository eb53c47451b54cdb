/** E² to twice the digits, against decimals of 60 digits (decimal.js) of the same doubles. */
import { Decimal } from 'decimal.js'
import { expect, it } from 'vitest'
import { familyOf } from '../../lib/dark-energy/index'
import { preciseExpansion } from '../../lib/history/precise'
import { modelOf } from '../../lib/model'
import { budgetOf } from '../../lib/scenario/budget'
import { readScenario } from '../../lib/scenario/read'

const Long = Decimal.clone({ precision: 60 })
/** All digits of a double; its shortest ones would name the double, but are not it. */
const exactly = (x: number) => new Long(x.toPrecision(100))

function modelFor(code: string) {
  const reading = readScenario(code, null)
  if (!reading.ok) throw new Error(code)
  const scenario = reading.value
  return modelOf(budgetOf(scenario), familyOf(scenario.eos).law(scenario.law))
}

// Ω of matter, curvature (which closes the budget) and dark energy, and the exponent of the last.
it.each([
  ['without dark energy', 'matter:2,dark:0,cmb:0', [2, -1, 0, 0]],
  ['dark energy as matter', 'matter:1.5,dark:0.25,cmb:0,eos:constant,w:0', [1.5, -0.75, 0.25, 3]],
  ['dark energy as radiation', 'matter:1.5,dark:-0.25,cmb:0,eos:constant,w:0.3333333333333333', [1.5, -0.25, -0.25, 4]],
  ['a cosmological constant', 'matter:1.5,dark:0.25,cmb:0', [1.5, -0.75, 0.25, 0]],
] as const)('%s', (_, code, [matter, curvature, dark, n]) => {
  for (const N of [-3, -0.4, 0.1, 0.69, 2]) {
    const a = exactly(N).exp()
    const expected = new Long(matter)
      .div(a.pow(3))
      .plus(new Long(curvature).div(a.pow(2)))
      .plus(new Long(dark).div(a.pow(n)))
    const { value, error } = preciseExpansion(modelFor(code), N)
    const off = exactly(value[0]).plus(exactly(value[1])).minus(expected).abs().toNumber()
    expect(off).toBeLessThanOrEqual(error)
    // A bound worth having: 64 bits below that of doubles.
    expect(error).toBeLessThan(2 ** -84 * 8 * Math.exp(4 * Math.abs(N)))
  }
})

it('what leaves the doubles is unknown', () => {
  // ln f = −3(1 + w) N = 2520 at N = −140.
  expect(preciseExpansion(modelFor('matter:0.3,cmb:0,eos:constant,w:5'), -140).error).toBe(Number.POSITIVE_INFINITY)
})
