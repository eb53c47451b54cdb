import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { type Budget, budgetOf } from '../../lib/scenario/budget'
import { neutrinoTemperature, photonDensity, STATE_RATIO } from '../../lib/scenario/radiation'
import { opened } from './helpers'

const EPS = Number.EPSILON
const of = (text: string): Budget => budgetOf(opened(text))

/** x/expected − 1. */
const relative = (x: number, expected: number): number => Math.abs(x / expected - 1)

/**
 * Multiprecision values (25 digits, here the nearest doubles) of the formulas at the head of radiation.ts with CODATA 2018 constants, the integral
 * F(y) by adaptive Gauss–Legendre at 220 bits and again by tanh-sinh at 50 digits; parameters at their exact doubles,
 * N_eff = 3.046. `sens` = Σ |p dQ/dp|: an error of eps in every parameter moves the value by eps · sens.
 */
const MULTIPRECISION = [
  {
    // matter = 0.3138 + 0.0014203196935322917…, the massive state of the same computation
    code: 'h0:67.4,matter:0.3152203196935323,nu:3.046',
    photons: 5.4437727916819e-5,
    neutrinos: 0.001445425244594284,
    neutrinoSens: 0.009762932922935952,
    closing: 0.6847001370274889,
    sens: 0.3238895592904369,
  },
  {
    code: 'h0:67.4,matter:0.315,nu:3.046,masses:0',
    photons: 5.4437727916819e-5,
    neutrinos: 3.765832659298852e-5,
    neutrinoSens: 0.00026360828615093094,
    closing: 0.6849079039454902,
    sens: 0.3155902346536519,
  },
  {
    // matter = 0.3 + 0.0065836340534837737…
    code: 'h0:70,matter:0.30658363405348377,dark:0.68,nu:3.046,masses:0.1_0.1_0.1',
    photons: 5.046888425947117e-5,
    neutrinos: 0.0065836340534837735,
    neutrinoSens: 0.0444395901652269,
    closing: 0.013365897062256717,
    sens: 1.024742403470784,
  },
  {
    // matter = 0.25 + 0.038176600814336241…
    code: 'h0:65,matter:0.2881766008143362,nu:3.046,masses:0.5_1',
    photons: 5.853196044293698e-5,
    neutrinos: 0.038190097677430014,
    neutrinoSens: 0.25778654053258104,
    closing: 0.7117513703621271,
    sens: 0.5081377322952387,
  },
]

describe.each(MULTIPRECISION)('$code', ({ code, photons, neutrinos, neutrinoSens, closing, sens }) => {
  const budget = of(code)
  // Sixteen roundings of eps/2 each in a product of about as many factors, and the conditioning on the parameters.
  test('photons', () => expect(relative(budget.photons, photons)).toBeLessThan(8 * EPS))
  test('neutrinos', () => {
    const all = budget.masslessNeutrinos + budget.massiveNeutrinos
    expect(Math.abs(all - neutrinos)).toBeLessThan(8 * EPS * neutrinos + 2 * EPS * neutrinoSens)
  })
  test('the closing density', () => {
    const value = budget.closes === 'dark' ? budget.dark : budget.curvature
    expect(Math.abs(value - closing)).toBeLessThan(2 * EPS * (closing + sens))
  })
})

describe('published numbers', () => {
  test('Ω_γ h² = 2.473e-5 at 2.7255 K (Particle Data Group, table of astrophysical constants, from memory)', () => {
    // 2.472975e-5 follows from CODATA 2018; half a unit of its last digit.
    expect(photonDensity(2.7255, 100)).toBeCloseTo(2.472975e-5, 11)
    expect(relative(photonDensity(2.7255, 100), 2.473e-5)).toBeLessThan(0.0005 / 2.473)
  })
  test('(7/8) (4/11)^(4/3) = 0.2271073177, closed form', () => {
    expect(Math.abs(STATE_RATIO - 0.2271073177)).toBeLessThan(5e-11)
  })
  test('Ω_r h² of massless neutrinos, N_eff = 3.046: 4.183703e-5', () => {
    const { photons, masslessNeutrinos } = of('h0:100,nu:3.046,masses:0')
    expect(Math.abs(photons + masslessNeutrinos - 4.183703e-5)).toBeLessThan(5e-12)
  })
  test('T_ν = 1.945 K for N_eff = 3 (textbook value, e.g. Weinberg, Cosmology, 2008, section 3.1)', () => {
    expect(Math.abs(neutrinoTemperature(2.7255, 3) - 1.945)).toBeLessThan(0.0005)
  })
  test.each([
    [3, 94.06],
    [3.044, 93.04],
  ])(
    'Ω_ν h² = Σm/eV over 94.06 for N_eff = 3, 93.04 for 3.044 (instantaneous decoupling; tables quote 93.14 for a fuller one)',
    (nu, rule) => {
      const { massiveNeutrinos } = of(`h0:100,matter:1,nu:${nu},masses:10_10`)
      // Half a unit of the last figure given; a mass of 10 eV makes the kinetic energy negligible (1e-9).
      expect(Math.abs(20 / massiveNeutrinos - rule)).toBeLessThan(0.005)
    },
  )
  test('kinetic energy of a cold state: 1 + ⟨x²⟩/(2y²), ⟨x²⟩ = 15 ζ(5)/ζ(3)', () => {
    // Series of √(x² + y²) under the Fermi integral. The next term is −⟨x⁴⟩/(8y⁴), ⟨x⁴⟩ = (6!/2) (63/64) ζ(7)/((3/4) ζ(3)) < 500.
    const { states } = of('h0:100,matter:1,nu:3.046,masses:1')
    const cold = of('h0:100,matter:1,nu:3.046,masses:10').massiveNeutrinos / 10
    const y = states[0].y
    const mean = (15 * 1.03692775514337) / 1.202056903159594
    expect(Math.abs(states[0].density / cold - 1 - (mean / 2) * (1 / y ** 2 - 1 / (10 * y) ** 2))).toBeLessThan(
      500 / y ** 4,
    )
  })
})

describe('kinds of radiation', () => {
  test('none', () => {
    expect(of('matter:0.25,cmb:0')).toMatchObject({
      photons: 0.0,
      masslessNeutrinos: 0,
      massiveNeutrinos: 0,
      states: [],
      coldMatter: 0.25,
      curvature: 0,
      dark: 0.75,
      closes: 'dark',
      closingRemainder: 0,
    })
  })
  test('given', () => {
    const budget = of('matter:0.25,radiation:0.25,dark:0.25')
    expect(budget).toMatchObject({ photons: 0.25, masslessNeutrinos: 0, curvature: 0.25, closes: 'curvature' })
  })
  test('three states share N_eff', () => {
    const massless = of('masses:0')
    const massive = of('masses:0.05_0.1')
    expect(massive.states.map((one) => one.mass)).toEqual([0.05, 0.1])
    for (const state of massive.states) {
      expect(relative(3 * state.masslessDensity, massless.masslessNeutrinos)).toBeLessThan(2 * EPS)
      expect(
        relative(state.y, (state.mass * 1.602176634e-19) / (1.380649e-23 * neutrinoTemperature(2.7255, 3.044))),
      ).toBeLessThan(4 * EPS)
    }
    expect(relative(3 * massive.masslessNeutrinos, massless.masslessNeutrinos)).toBeLessThan(2 * EPS)
    expect(massive.coldMatter).toBe(0.3111 - massive.massiveNeutrinos)
    expect(massive.dark).toBeLessThan(massless.dark + massless.masslessNeutrinos)
  })
  test('no neutrinos, or next to none', () => {
    expect(of('nu:0')).toMatchObject({ masslessNeutrinos: 0, massiveNeutrinos: 0, states: [], coldMatter: 0.3111 })
    for (const code of [
      'nu:1e-323',
      'nu:1e-300',
      'cmb:1e-300',
      'cmb:1e-80',
      'cmb:1e-70,nu:1e-30',
      'h0:1000,cmb:1e-75',
    ]) {
      for (const value of Object.values(of(code))) if (typeof value === 'number') expect(value).not.toBeNaN()
    }
  })
})

describe('the budget closes', () => {
  test.each([
    'matter:0.3,dark:0.7',
    'matter:0.1,curvature:0.9',
    'matter:1.3,dark:-0.3',
    'matter:0.6,curvature:0.4',
    'matter:1',
  ])('typed decimals that add up to 1 leave exactly nothing: %s', (text) => {
    const { curvature, dark, closes, closingRemainder } = of(`${text},cmb:0`)
    expect(closes === 'dark' ? dark : curvature).toBe(0)
    expect(closingRemainder).toBe(0)
  })
  test('typed decimals that miss 1 by a hair leave that hair', () => {
    // 0.3 and 0.7 are off their doubles by up to 2^-55 and 2^-54.
    const hair = of('matter:0.3,dark:0.6999999999999999,cmb:0').curvature
    expect(Math.abs(hair - 1e-16)).toBeLessThan(2 ** -55 + 2 ** -54)
    expect(of('matter:0.3,dark:0.7000000000000001,cmb:0').curvature).toBeLessThan(0)
    expect(of('matter:0.3,dark:0.7,radiation:1e-300').curvature).not.toBe(0)
  })
  test('with its remainder to twice the digits of a double', () => {
    const density = fc.double({ min: 0, max: 10000, noNaN: true })
    const curvature = fc.double({ min: -100, max: 100, noNaN: true })
    fc.assert(
      fc.property(density, density, curvature, fc.boolean(), (matter, radiation, value, flat) => {
        const key = flat ? 'dark' : 'curvature'
        const budget = of(`matter:${matter},radiation:${radiation},${key}:${value}`)
        const closing = budget.closes === 'dark' ? budget.dark : budget.curvature
        const [high, low] = [closing, budget.closingRemainder].map(exactly)
        const exact = exactly(1) - exactly(matter) - exactly(radiation) - exactly(value)
        const miss = exact - high - low
        // Nothing closer than half a unit in the last place of the closing density, then of its remainder.
        expect(abs(low) <= abs(high) >> 53n).toBe(true)
        expect(abs(miss) <= abs(high) >> 105n).toBe(true)
      }),
      { numRuns: 500 },
    )
  })
  test('and the sum of all parts is 1', () => {
    for (const { code } of MULTIPRECISION) {
      const { photons, masslessNeutrinos, states, coldMatter, curvature, dark, ...rest } = of(code)
      const parts = [photons, masslessNeutrinos, ...states.map((one) => one.density), coldMatter, curvature, dark]
      const miss =
        [...parts, rest.coldRemainder, rest.closingRemainder].map(exactly).reduce((sum, one) => sum + one) - exactly(1)
      expect(abs(miss) <= exactly(1) >> 105n).toBe(true)
    }
  })
})

const abs = (x: bigint): bigint => (x < 0n ? -x : x)

/** x · 2^1074, an integer for every double. */
function exactly(x: number): bigint {
  const bits = new DataView(new ArrayBuffer(8))
  bits.setFloat64(0, x)
  const raw = bits.getBigUint64(0)
  const exponent = (raw >> 52n) & 0x7ffn
  const fraction = raw & 0xfffffffffffffn
  const size = exponent === 0n ? fraction : (fraction | 0x10000000000000n) << (exponent - 1n)
  return raw >> 63n === 0n ? size : -size
}
