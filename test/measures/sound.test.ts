/** The sound horizon against its closed form, and where the fits of recombination are refused. */
import { describe, expect, test } from 'vitest'
import { eventAtScale } from '../../lib/history/event'
import { transverseDistance } from '../../lib/measures/distances'
import { isMissing, type Outcome } from '../../lib/measures/outcome'
import { comovingDistance } from '../../lib/measures/sight'
import { acousticAngle, dragRedshift, recombinationRedshift, soundHorizon } from '../../lib/measures/sound'
import { expectPrinted, expectRelative } from '../world/published'
import { known, sure, universe } from '../world/universe'

function number(outcome: Outcome): number {
  if (isMissing(outcome)) throw new Error(outcome.because)
  return outcome.value
}

describe('matter and radiation: the closed form', () => {
  // Eisenstein & Hu 1998, ApJ 496, 605, eq. 6, with its constants kept whole:
  // ∫ da/√(3(1 + Ka)(Ω_r + Ω_m a)) = 2/√(3KΩ_m) ln[(√(Ω_m(1 + Ka)) + √(K(Ω_r + Ω_m a)))/(√Ω_m + √(KΩ_r))].
  test.each([10, 100, 1059.94, 3400, 1e5, 1e8])('z = %s', (z) => {
    const solution = universe('h0:40,matter:0.9,masses:0,baryons:0.0224,dark:0')
    const { budget, scenario, history } = solution
    const radiation = budget.photons + budget.masslessNeutrinos
    const load = (0.75 * 0.0224) / (0.16 * budget.photons)
    const upper = (a: number) => Math.sqrt(0.9 * (1 + load * a)) + Math.sqrt(load * (radiation + 0.9 * a))
    const a = 1 / (1 + z)
    // ln of a ratio near one, as ln(1 + x) with the difference of roots written without cancellation.
    const rise =
      (0.9 * load * a) / (Math.sqrt(0.9 * (1 + load * a)) + Math.sqrt(0.9)) +
      (0.9 * load * a) / (Math.sqrt(load * (radiation + 0.9 * a)) + Math.sqrt(load * radiation))
    const closed = (2 / Math.sqrt(2.7 * load)) * Math.log1p(rise / upper(0))
    const found = soundHorizon(history, scenario, { value: z, error: 0 })
    // Curvature, 0.1 a² beside 0.9 a + 8e-5, is left out: it is small where a is.
    const left = (0.1 * a * a) / (radiation + 0.9 * a)
    expectRelative(number(found), closed, 1e-13 + left)
    if (left < 1e-3) expect(Math.abs(number(found) / closed - 1)).toBeLessThan(left)
  })
})

test('Hu & Sugiyama 1996 and Aizpuru, Arjona & Nesseris 2021 at ω_b = 0.02237, ω_m = 0.1430', () => {
  const { scenario } = universe('h0:100,matter:0.1430,baryons:0.02237')
  // Values of the two formulas recomputed outside this project; the first times our calibration.
  expectPrinted(number(recombinationRedshift(scenario)) / 0.99818, '1091.907')
  expectPrinted(number(dragRedshift(scenario)), '1059.895')
})

describe('refused outside the range of the fits', () => {
  test.each([
    ['matter:0.3,cmb:0', 'without a photon temperature'],
    ['matter:0.3,radiation:0.0001', 'without a photon temperature'],
    ['matter:0.3,cmb:2.69', 'photon temperature'],
    ['matter:0.3,cmb:2.76', 'photon temperature'],
    ['matter:0.3,nu:1.9', 'number of neutrinos'],
    ['matter:0.3,nu:4.6', 'number of neutrinos'],
    ['matter:0.3,baryons:0.0149', 'Ω_b h²'],
    ['matter:0.3,baryons:0.0301', 'Ω_b h²'],
    ['matter:0.17', 'Ω_m h²'],
    ['matter:0.56', 'Ω_m h²'],
  ])('%s', (code, why) => {
    const { scenario, measures, history } = universe(code)
    for (const fit of [recombinationRedshift(scenario), dragRedshift(scenario), acousticAngle(history, scenario)]) {
      expect(fit).toMatchObject({ because: expect.stringContaining(why) })
    }
    for (const key of ['recombinationRedshift', 'dragRedshift', 'soundHorizonDrag', 'acousticAngle'] as const) {
      expect(measures[key].value).toBe(null)
    }
  })
  test('the limits themselves are inside', () => {
    for (const code of [
      'matter:0.3,cmb:2.7',
      'matter:0.3,cmb:2.75',
      'matter:0.3,nu:2',
      'matter:0.3,nu:4.5',
      'matter:0.3,baryons:0.015',
      'matter:0.3,baryons:0.03',
      'h0:100,matter:0.08',
      'h0:100,matter:0.25',
    ]) {
      expect(isMissing(recombinationRedshift(universe(code).scenario))).toBe(false)
    }
  })
  test('after a bounce there was no recombination to hear', () => {
    const { measures, origin } = universe('matter:0.3,dark:2.5')
    expect(origin.kind).toBe('bounce')
    expect(measures.soundHorizonDrag).toMatchObject({ value: null, because: expect.stringContaining('did not begin') })
    expect(measures.acousticAngle.value).toBe(null)
  })
})

describe('errors', () => {
  test.each(['matter:0.3', 'matter:0.3,curvature:0.4', 'matter:0.3,curvature:-0.3'])(
    '%s: the angle covers the shift of z*',
    (code) => {
      const { history, scenario, budget } = universe(code)
      const z = recombinationRedshift(scenario)
      const angle = acousticAngle(history, scenario)
      if (isMissing(z) || isMissing(angle)) throw new Error('refused')
      // θ* at z* ± its error, from the sound horizon there and E D_M′: the bound must hold, and not be far too wide.
      const shifted = [-1, 1].map((sign) => {
        const at = z.value + sign * z.error
        const sound = number(soundHorizon(history, scenario, { value: at, error: 0 }))
        return sound / transverseAt(code, at, budget.curvature)
      })
      const shift = Math.max(...shifted.map((one) => Math.abs(one - angle.value)))
      // The bound is of first order; the second is 2e-4 of it here.
      expect(angle.error).toBeGreaterThanOrEqual(0.999 * shift)
      expect(angle.error).toBeLessThan(2 * shift)
    },
  )
})

function transverseAt(code: string, z: number, curvature: number): number {
  const { history } = universe(code)
  const event = known(eventAtScale(history, -Math.log1p(z), 'expanding'))
  return transverseDistance(sure(comovingDistance(history, event)), curvature)
}

test('where dark energy all but cancels radiation, the integral ends', () => {
  // E² early is a difference that leaves 1%: noise of 1e-14 that no narrower panel resolves.
  const { photons, masslessNeutrinos } = universe('matter:0.3,masses:0').budget
  const code = `matter:0.3,masses:0,dark:${-0.99 * (photons + masslessNeutrinos)},eos:constant,w:0.3333333333333333`
  const { measures } = universe(code)
  // The same universe with a hundredth of the radiation, to the digits in which 1/3 is a double.
  expect(measures.soundHorizonDrag.value).toBeGreaterThan(200)
  expect(measures.soundHorizonDrag.error).toBeLessThan(0.01)
})

describe('the errors of the fits hold within their ranges', () => {
  // N_eff, Ω_b h², Ω_m h², T_CMB, z_* and z_d by test/reference/recombination.py, which is itself good to some 0.05.
  test.each([
    [2, 0.015, 0.08, 2.7255, 1095.07, 1034.45],
    [2, 0.015, 0.143, 2.7, 1113.58, 1052.36],
    [2, 0.015, 0.143, 2.7255, 1103.84, 1040.89],
    [2, 0.015, 0.143, 2.75, 1094.66, 1030.09],
    [2, 0.015, 0.25, 2.7255, 1115.02, 1048.96],
    [2, 0.0224, 0.08, 2.7255, 1083.09, 1054.37],
    [2, 0.0224, 0.143, 2.7, 1099.24, 1071.38],
    [2, 0.0224, 0.143, 2.7255, 1089.43, 1059.65],
    [2, 0.0224, 0.143, 2.75, 1080.18, 1048.6],
    [2, 0.0224, 0.25, 2.7255, 1097.58, 1066.37],
    [2, 0.03, 0.08, 2.7255, 1076.72, 1070.15],
    [2, 0.03, 0.143, 2.7, 1091.53, 1086.62],
    [2, 0.03, 0.143, 2.7255, 1081.68, 1074.68],
    [2, 0.03, 0.143, 2.75, 1072.39, 1063.43],
    [2, 0.03, 0.25, 2.7255, 1088.06, 1080.49],
    [3.046, 0.015, 0.08, 2.7255, 1095.91, 1035.02],
    [3.046, 0.015, 0.143, 2.7, 1114.22, 1052.79],
    [3.046, 0.015, 0.143, 2.7255, 1104.5, 1041.33],
    [3.046, 0.015, 0.143, 2.75, 1095.34, 1030.54],
    [3.046, 0.015, 0.25, 2.7255, 1115.52, 1049.29],
    [3.046, 0.0224, 0.08, 2.7255, 1083.65, 1054.82],
    [3.046, 0.0224, 0.143, 2.7, 1099.67, 1071.73],
    [3.046, 0.0224, 0.143, 2.7255, 1089.88, 1060.01],
    [3.046, 0.0224, 0.143, 2.75, 1080.65, 1048.97],
    [3.046, 0.0224, 0.25, 2.7255, 1097.93, 1066.65],
    [3.046, 0.03, 0.08, 2.7255, 1077.12, 1070.53],
    [3.046, 0.03, 0.143, 2.7, 1091.85, 1086.92],
    [3.046, 0.03, 0.143, 2.7255, 1082.01, 1074.98],
    [3.046, 0.03, 0.143, 2.75, 1072.73, 1063.74],
    [3.046, 0.03, 0.25, 2.7255, 1088.32, 1080.72],
    [4.5, 0.015, 0.08, 2.7255, 1097.05, 1035.79],
    [4.5, 0.015, 0.143, 2.7, 1115.09, 1053.38],
    [4.5, 0.015, 0.143, 2.7255, 1105.4, 1041.94],
    [4.5, 0.015, 0.143, 2.75, 1096.27, 1031.16],
    [4.5, 0.015, 0.25, 2.7255, 1116.22, 1049.75],
    [4.5, 0.0224, 0.08, 2.7255, 1084.42, 1055.44],
    [4.5, 0.0224, 0.143, 2.7, 1100.27, 1072.21],
    [4.5, 0.0224, 0.143, 2.7255, 1090.5, 1060.5],
    [4.5, 0.0224, 0.143, 2.75, 1081.28, 1049.47],
    [4.5, 0.0224, 0.25, 2.7255, 1098.41, 1067.03],
    [4.5, 0.03, 0.08, 2.7255, 1077.68, 1071.04],
    [4.5, 0.03, 0.143, 2.7, 1092.29, 1087.33],
    [4.5, 0.03, 0.143, 2.7255, 1082.46, 1075.39],
    [4.5, 0.03, 0.143, 2.75, 1073.2, 1064.16],
    [4.5, 0.03, 0.25, 2.7255, 1088.68, 1081.05],
  ])('N_eff = %d, ω_b = %d, ω_m = %d, T = %d', (nu, baryons, matter, cmb, scattering, drag) => {
    const { scenario } = universe(`h0:100,matter:${matter},baryons:${baryons},nu:${nu},cmb:${cmb}`)
    const fits = [
      [recombinationRedshift(scenario), scattering],
      [dragRedshift(scenario), drag],
    ] as const
    for (const [fit, expected] of fits) {
      if (isMissing(fit)) throw new Error(fit.because)
      expect(Math.abs(fit.value - expected)).toBeLessThan(fit.error)
      // No bound that says nothing: the farthest corner is off by twelve.
      expect(fit.error).toBeLessThan(16)
    }
  })
})
