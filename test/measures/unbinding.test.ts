/** When systems come apart: the cases that the published formula does not reach (test/world/rips.test.ts has the others). */
import { expect, test } from 'vitest'
import { JULIAN_YEAR } from '../../lib/constants'
import { eventAtScale } from '../../lib/history/event'
import { accelerationAt } from '../../lib/measures/rates'
import { UNBOUND_SYSTEMS, unbinding } from '../../lib/measures/unbinding'
import { hubbleTimeGyr } from '../../lib/units'
import { erfc } from '../world/erfc'
import { expectRelative } from '../world/published'
import { known, universe } from '../world/universe'

const [cluster, galaxy, planet, , atom] = UNBOUND_SYSTEMS

test.each([
  ['matter:0.3,cmb:0,eos:constant,w:-1.2', 1e-12],
  ['matter:0.3,eos:cpl,w0:-0.9,wa:0.4', 1e-12],
  ['matter:0.3,eos:cpl,w0:-1.1,wa:-0.3,beyond:hold', 1e-12],
  // Singular at ln a = 4/3, where f = u⁻²: eps in ln a counts 1/u ≈ 1e11 times before planets go.
  ['matter:0.3,cmb:0,eos:barotropic,excess:0.5,alpha:1.5', 1e-4],
])('%s: ä/a = (2π/P)² at the event that is found', (code, tolerance) => {
  const { history, scenario } = universe(code)
  for (const system of [cluster, galaxy, planet]) {
    const found = unbinding(history, scenario.h0, system)
    if (!found) throw new Error(system.kind)
    const periods = (hubbleTimeGyr(scenario.h0) * 1e9 * JULIAN_YEAR) / system.period
    const event = known(eventAtScale(history, found.N, 'expanding'))
    // The logarithm of ä/a, up to 60 here, is good to eps of itself, and E² to |n N| eps.
    expectRelative(accelerationAt(event), (2 * Math.PI * periods) ** 2, tolerance)
    expect(found.time).toBeGreaterThan(0)
    expect(found.time).toBeLessThanOrEqual(history.end.time ?? Number.NaN)
  }
})

test('before a little rip ln a grows without bound: Frampton, Ludwick & Scherrer 2011, u = e^(3A√Ω t/2)', () => {
  // f = u² with u = 1 + 3AN/2 and ä/a = Ω u² (1 + 3A/2u); between systems ln u grows by (3/2) A √Ω_DE Δt once matter is gone.
  const { history, scenario, budget } = universe('matter:0.3,cmb:0,eos:barotropic,excess:0.1,alpha:0.5')
  expect(history.end.kind).toBe('little-rip')
  const found = UNBOUND_SYSTEMS.map(
    (system) => unbinding(history, scenario.h0, system) ?? { N: Number.NaN, time: Number.NaN },
  )
  found.forEach(({ N, time }, k) => {
    const periods = (hubbleTimeGyr(scenario.h0) * 1e9 * JULIAN_YEAR) / UNBOUND_SYSTEMS[k].period
    const u = 1 + 0.15 * N
    // ln ä/a, up to 160, is good to some eps of itself.
    expectRelative(budget.dark * u * u * (1 + 0.15 / u), (2 * Math.PI * periods) ** 2, 1e-12)
    const pace = 0.15 * Math.sqrt(budget.dark)
    if (k > 0) expectRelative(pace * (time - found[k - 1].time), Math.log(u / (1 + 0.15 * found[k - 1].N)), 1e-12)
  })
})

test('what is left to a rip keeps its digits down to the atom: Caldwell, Kamionkowski & Weinberg 2003, P √(2|1+3w|)/(6π|1+w|)', () => {
  const { history, scenario } = universe('matter:0.3,eos:constant,w:-1.5')
  for (const system of [planet, UNBOUND_SYSTEMS[3], atom]) {
    const found = unbinding(history, scenario.h0, system)
    const periods = ((found?.remaining ?? Number.NaN) * hubbleTimeGyr(scenario.h0) * 1e9 * JULIAN_YEAR) / system.period
    // Exact for dark energy alone; matter is down by a^-4.5 and less than 1e-14 by then.
    expectRelative(periods, Math.sqrt(2 * 3.5) / (6 * Math.PI * 0.5), 1e-10)
  }
})

test('the looser a system, the earlier it goes', () => {
  const { history, scenario } = universe('matter:0.3,eos:constant,w:-1.3')
  const scales = UNBOUND_SYSTEMS.map((system) => unbinding(history, scenario.h0, system)?.N ?? Number.NaN)
  expect(scales).toEqual(scales.toSorted((one, other) => one - other))
})

test('not bound even today: a cluster where H₀ is 1000 and w is −20', () => {
  // ä/a = −½(1 + 3w) Ω_DE H₀² is 29 H₀² against (2π · 0.978/3.6)² = 2.9.
  const { history, scenario } = universe('h0:1000,matter:0,cmb:0,eos:constant,w:-20')
  expect(unbinding(history, scenario.h0, cluster)).toBe(null)
  expect(unbinding(history, scenario.h0, galaxy)).not.toBe(null)
})

test('before a rip that is 1e16 Hubble times away', () => {
  const { history, scenario, end } = universe('matter:0.3,cmb:0,eos:constant,w:-1.0000000000000002')
  expect(end.kind).toBe('rip')
  // Dark energy alone, E² = Ω e^(2pN) with p = 3ε/2: t = (1 − e^(−pN))/(p√Ω); matter makes that 1 in 1e15 shorter.
  const p = 1.5 * 2 ** -52
  for (const system of [cluster, galaxy, atom]) {
    const found = unbinding(history, scenario.h0, system)
    if (!found) throw new Error(system.kind)
    expectRelative(found.time, -Math.expm1(-p * found.N) / (p * Math.sqrt(0.7)), 1e-13)
  }
})

test('where dark energy stays as it is for ever, no rip and no moment', () => {
  const { history, scenario } = universe('matter:0.3,cmb:0,eos:constant,w:-1')
  expect(unbinding(history, scenario.h0, atom)).toBe(null)
})

test('dark energy that waits for e^464 before it gathers', () => {
  const { history, scenario } = universe('matter:0.3,cmb:0,eos:cpl,w0:-1,wa:1e-200')
  const found = unbinding(history, scenario.h0, atom)
  // f = e^(3 wa (a − 1 − ln a)): with ä/a = f Ω_DE (1 + 3 wa a/2 …) the exponent is all that matters.
  const periods = (hubbleTimeGyr(scenario.h0) * 1e9 * JULIAN_YEAR) / atom.period
  const needed = 2 * Math.log(2 * Math.PI * periods)
  const N = found?.N ?? Number.NaN
  // ln ä/a = ln 0.7 + 3 wa a + ln(1 + 3 wa a/2) to wa ln a = 1e-197.
  const x = 3e-200 * Math.exp(N)
  expectRelative(Math.log(0.7) + x + Math.log1p(x / 2), needed, 1e-11)
})

test('held at w = −1 or above there is none', () => {
  const { history, scenario } = universe('matter:0.3,cmb:0,eos:cpl,w0:-0.99,wa:1,beyond:hold')
  for (const system of UNBOUND_SYSTEMS) expect(unbinding(history, scenario.h0, system)).toBe(null)
})

test('what is left where dark energy outgrows every power: ∫ √a e^(−3(a−1)/2) da = (2/3)^(3/2) e^(3/2) Γ(3/2, 3a/2) for w0 = −1, wa = 1 alone', () => {
  const { history, scenario } = universe('matter:0,cmb:0,eos:cpl,w0:-1,wa:1')
  for (const system of [planet, UNBOUND_SYSTEMS[3], atom]) {
    const found = unbinding(history, scenario.h0, system)
    const x = 1.5 * Math.exp(found?.N ?? Number.NaN)
    // Abramowitz & Stegun 1964, 6.5.31: Γ(s, x) = e^(−x) x^s / (x + 1 − s − 1(1 − s)/(x + 3 − s − 2(2 − s)/(x + 5 − s − …)).
    let rest = 0
    for (let k = 60; k > 0; k--) rest = (k * (k - 1.5)) / (x + 2 * k - 0.5 - rest)
    const gamma = (Math.exp(1.5 - x) * x ** 1.5) / (x - 0.5 - rest)
    // e^(−x) multiplies the eps of a by x, up to some hundred.
    expectRelative(found?.remaining ?? Number.NaN, (2 / 3) ** 1.5 * gamma, 1e-12)
  }
})

test('before a rip so late that times from today are not followed to it: dark energy alone, ln E = bN² − cN, is an integral of Gauss', () => {
  const [c, b] = [1.5 * 0.66, 0.75 * 0.001]
  const { history, scenario } = universe('matter:0,cmb:0,eos:log,w0:-0.34,wa:0.001')
  // ∫ e^(cN − bN²) dN = √(π/b) e^(c²/4b) erfc(√b (N − c/2b))/2. From today it is all but 1e-143 of √(π/b) e^(c²/4b).
  const whole = Math.sqrt(Math.PI / b) * Math.exp((c * c) / (4 * b))
  const ends = history.end.time ?? Number.NaN
  expectRelative(ends, whole, 1e-13)
  for (const system of UNBOUND_SYSTEMS) {
    const found = unbinding(history, scenario.h0, system)
    const x = Math.sqrt(b) * ((found?.N ?? Number.NaN) - c / (2 * b))
    // e^(−x²) multiplies the eps of N by 2x√b N, up to some thousand.
    expectRelative(found?.remaining ?? Number.NaN, (whole / 2) * erfc(x), 1e-11)
    expect(found?.time).toBe(ends)
  }
})
