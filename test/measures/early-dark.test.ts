/** Dark energy at last scattering: f = a^(−3(1 + w0 + wa)) e^(−3 wa (1 − a)) for w = w0 + wa (1 − a) (Linder 2003, PRL 90, 091301). */
import { expect, test } from 'vitest'
import { readScenario } from '../../lib/scenario/read'
import { solve } from '../../lib/solve'

function noticesOf(code: string) {
  const reading = readScenario(code, 0)
  if (!reading.ok) throw new Error(JSON.stringify(reading.problems))
  return solve(reading.value)
}

test.each([
  [-1.1, 1.08],
  [-0.5, 0.6],
  [-0.9, 0.7],
  [-1, 0.8],
])('w0 = %d, wa = %d', (w0, wa) => {
  const { budget, measures, notices } = noticesOf(`h0:70,matter:0.3,eos:cpl,w0:${w0},wa:${wa}`)
  const a = 1 / (1 + (measures.recombinationRedshift.value ?? 0))
  const dark = budget.dark * a ** (-3 * (1 + w0 + wa)) * Math.exp(-3 * wa * (1 - a))
  const { photons, masslessNeutrinos, coldMatter, massiveNeutrinos } = budget
  // At z* neutrinos of 0.06 eV are radiation still; they are 1% of the sum, so that two digits of the share hold.
  const rest = (photons + 1.5 * masslessNeutrinos) / a ** 4 + coldMatter / a ** 3
  const share = dark / (dark + rest)
  expect(massiveNeutrinos).toBeGreaterThan(0)
  if (share < 0.01) expect(notices).toEqual([])
  else {
    const [, percent] = /Dark energy was ([\d.]+)% of the density at last scattering/.exec(notices[0].message) ?? []
    expect(Math.abs(Number(percent) / (100 * share) - 1)).toBeLessThan(0.03)
  }
})

test('where there are no fits nothing is said of them', () => {
  expect(noticesOf('h0:70,matter:0.3,cmb:0,eos:cpl,w0:-0.5,wa:0.6').notices).toEqual([])
})
