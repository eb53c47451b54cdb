/** Constants and conversions against the printed ones (sources in published.json, `constants`). */
import { describe, expect, test } from 'vitest'
import * as ours from '../../lib/constants'
import { photonDensity, radiationBudget, STATE_RATIO } from '../../lib/scenario/radiation'
import { hubbleLengthGly, hubbleLengthMpc, hubbleTimeGyr, perSecond } from '../../lib/units'
import { CONSTANTS, expectPrinted, expectRelative, printed } from './published'
import { universe } from './universe'

describe('constants as printed', () => {
  test.each([
    ['c', ours.SPEED_OF_LIGHT],
    ['G', ours.GRAVITATION],
    ['k_B', ours.BOLTZMANN],
    ['e', ours.ELECTRONVOLT],
    ['au', ours.ASTRONOMICAL_UNIT],
    ['pc', ours.PARSEC],
    ['julianYear', ours.JULIAN_YEAR],
    ['lightYear', ours.LIGHT_YEAR],
    ['h', ours.REDUCED_PLANCK * 2 * Math.PI],
  ] as const)('%s', (name, value) => {
    // All exact or taken over as they stand: two roundings at most.
    expectRelative(value, printed(CONSTANTS[name].value).value, 2 * Number.EPSILON)
  })
  test('ħ, which is printed cut off after ten digits', () => {
    const { value, half } = printed(CONSTANTS.hbar.value)
    expect(ours.REDUCED_PLANCK).toBeGreaterThanOrEqual(value)
    expect(ours.REDUCED_PLANCK).toBeLessThan(value + 2 * half)
  })
})

describe('derived constants to their printed digits', () => {
  const H100 = perSecond(100)
  const critical = (3 * H100 ** 2) / (8 * Math.PI * ours.GRAVITATION)
  const massless = (nu: number) => {
    const { photons, masslessNeutrinos } = radiationBudget({ kind: 'thermal', cmb: 2.7255, nu, masses: [] }, 100)
    return photons + masslessNeutrinos
  }
  test.each([
    ['megaparsec', (1e6 * ours.PARSEC) / ours.LIGHT_YEAR / 1e6],
    ['hubbleTime', hubbleTimeGyr(100)],
    ['hubbleLength', hubbleLengthMpc(100)],
    ['criticalDensity', critical],
    ['omega_gamma', photonDensity(2.7255, 100)],
    ['stateRatio', STATE_RATIO],
    ['omega_r 3.046', massless(3.046)],
    ['omega_r 3.044', massless(3.044)],
  ] as const)('%s', (name, value) => expectPrinted(value, CONSTANTS[name].value))

  test('1/H₀ in Gyr and c/H₀ in Gly are one number', () => {
    // Julian years on both sides, so only rounding may differ.
    for (const h0 of [1, 50, 67.66, 70, 1000])
      expectRelative(hubbleLengthGly(h0), hubbleTimeGyr(h0), 2 * Number.EPSILON)
  })
})

test.each([
  [3, 'omega_nu, N_eff = 3'],
  [3.044, 'omega_nu, N_eff = 3.044'],
] as const)('with N_eff = %s a mass of 1 eV weighs as printed in ω', (nu, name) => {
  // At 1 eV a state is cold to 6.5/y² = 2e-7, far below the printed digits.
  const { states } = radiationBudget({ kind: 'thermal', cmb: 2.7255, nu, masses: [1] }, 100)
  expectPrinted(1 / states[0].density, CONSTANTS[name].value)
})

test('with every parameter the budget adds up to one', () => {
  const { budget } = universe('matter:0.3,curvature:-0.02,masses:0.01_0.05_0.1,eos:cpl,w0:-0.9,wa:0.1')
  const { photons, masslessNeutrinos, massiveNeutrinos, coldMatter, curvature, dark } = budget
  expectRelative(photons + masslessNeutrinos + massiveNeutrinos + coldMatter + curvature + dark, 1, 4 * Number.EPSILON)
})
