/**
 * Where the fate flips in universes of matter, Λ and curvature: Carroll, Press & Turner 1992, ARA&A 30, 499, eqs. 11 and 12
 * (CPT1, CPT2), and the static states on the boundaries (EINST, LOITER of published.json).
 */
import { describe, expect, test } from 'vitest'
import { noBigBang, recollapse } from './dust-boundaries'
import { expectNear, expectPrinted, expectRelative, PUBLISHED, printed } from './published'
import { measure, universe } from './universe'

const dust = (matter: number, lambda: number) => universe(`matter:${matter},cmb:0,dark:${lambda}`)
const MATTERS = [0.1, 0.3, 0.45, 0.499, 0.5, 0.501, 0.7, 1, 1.0625, 1.5, 2, 3, 4.2, 5]
const STEPS = [1e-3, 1e-6, 1e-9]

describe('the boundaries themselves, to the digits of the table', () => {
  test.each(Object.entries(PUBLISHED.CPT1.recomputed))('no big bang at Ω_m = %s', (matter, value) => {
    expectPrinted(noBigBang(Number(matter)), value)
  })
  test.each(Object.entries(PUBLISHED.CPT2.recomputed))('collapse at Ω_m = %s', (matter, value) => {
    expectPrinted(recollapse(Number(matter)), value)
  })
})

// The formulas lose at most some 1e-15 of Ω_Λ here (acos near its ends, Ω_m = 1/2), so that steps of 1e-9 fall on the right side.
describe.each(MATTERS)('Ω_m = %s', (matter) => {
  test.each(STEPS)('no big bang from the boundary on, ± %s', (step) => {
    const boundary = noBigBang(matter)
    expect(dust(matter, boundary + step).origin).toMatchObject({ kind: 'bounce' })
    expect(dust(matter, boundary - step).origin).toMatchObject({ kind: 'big-bang', scale: 0 })
    expect(dust(matter, boundary + step).end.kind).toBe('exponential')
  })
  test.each(STEPS)('collapse up to the boundary, ± %s', (step) => {
    const boundary = recollapse(matter)
    expect(dust(matter, boundary - step).end).toMatchObject({ kind: 'crunch', scale: 0 })
    expect(dust(matter, boundary + step).end).toMatchObject({ kind: 'exponential', scale: null })
    expect(dust(matter, boundary - step).origin.kind).toBe('big-bang')
  })
  test('the turning point nears the double root like √step', () => {
    // E² ≈ A + ½ B d² with A = step (1 − 1/a²) and B = 6 Ω_Λ at the double root: d = √(2A/B), and the next order is 4d/3.
    const boundary = noBigBang(matter)
    const static_ = Math.cbrt(matter / (2 * boundary))
    const d = Math.sqrt((2e-9 * (static_ ** -2 - 1)) / (6 * boundary))
    const bounce = dust(matter, boundary + 1e-9).origin.scale
    // Rounding of Ω_Λ moves step by 4e-16 / 1e-9, half of that in d.
    expectNear(Math.log(bounce / static_), d, 2 * d * d + 1e-6 * d)
  })
})

describe('static states', () => {
  // Exact double roots in decimals, and the first two in doubles: a³ = Ω_m/2Ω_Λ, Ω_Λ = 1/((1 − a)² (1 + 2a)).
  test.each([
    [0.5, 2, 0.5],
    [6.75, 1, 1.5],
    [5.4, 6.4, 0.75],
    [3.2, 0.2, 2],
  ])('Ω_m = %s, Ω_Λ = %s rests at a = %s', (matter, lambda, scale) => {
    const { origin, end, budget } = dust(matter, lambda)
    expect(scale < 1 ? origin.kind : end.kind).toBe('static')
    expect(scale < 1 ? origin.time : end.time).toBe(null)
    const found = scale < 1 ? origin.scale : (end.scale ?? Number.NaN)
    // Where E² and its slope vanish together the slope fixes a, and its own slope 6 Ω_Λ is of order one.
    expectRelative(found, scale, 1e-14)
    // Einstein 1917: ρ_Λ = ρ_m/2 and Λ = 1/R², in H₀²/c²: 3 Ω_Λ = −Ω_k/a².
    expectRelative(budget.dark, (0.5 * budget.coldMatter) / found ** 3, 1e-13)
    expectRelative(3 * budget.dark, -budget.curvature / found ** 2, 1e-13)
    // Exact in decimals, and proven by exact arithmetic on them.
    expect(end.proven).toBe(true)
    if (scale > 1) expect(end.because).toContain('Exactly so')
  })
  test.each([
    [1, 4],
    [4, 1],
    [9, 4],
    [2.25, 0.25],
  ])('radiation %s and Λ %s: a⁴ = Ω_r/Ω_Λ', (radiation, lambda) => {
    // E² = (√Ω_r a⁻² − √Ω_Λ)²: a double root, exact in doubles.
    const { origin, end } = universe(`matter:0,radiation:${radiation},dark:${lambda}`)
    const scale = (radiation / lambda) ** 0.25
    expect(end.proven).toBe(true)
    expect(scale < 1 ? origin.kind : end.kind).toBe('static')
    expectRelative(scale < 1 ? origin.scale : (end.scale ?? Number.NaN), scale, 1e-14)
  })
})

describe('loitering (Sahni, Feldman & Stebbins 1992)', () => {
  const { dark, scale, z } = PUBLISHED.LOITER.recomputed
  test('where the expansion waits', () => {
    expectPrinted(noBigBang(0.3), dark)
    const waits = Math.cbrt(0.3 / (2 * noBigBang(0.3)))
    expectPrinted(waits, scale)
    // Computed from a that was rounded to six digits: 5e-7/a² in z.
    expectPrinted(1 / waits - 1, z, 2.5e-6)
    // A bounce 1e-9 above the boundary happens there, but for √1e-9 (see above).
    expectNear(dust(0.3, noBigBang(0.3) + 1e-9).origin.scale, printed(scale).value, 1e-4)
  })
  test('the wait grows like ln(1/step)/√(3 Ω_Λ)', () => {
    // t ≈ ∫ dd/√(A + ½ B d²) with A ∝ step: each factor of 100 adds ln 100/√(B/2), B = 6 Ω_Λ. Corrections are of order step ln step.
    const age = (step: number) => dust(0.3, noBigBang(0.3) - step).history.past.time.total
    const expected = Math.log(100) / Math.sqrt(3 * noBigBang(0.3))
    expectRelative(age(1e-8) - age(1e-6), expected, 1e-4)
    // Rounding of Ω_Λ at 4e-16 over 1e-10 moves ln step by 4e-6.
    expectRelative(age(1e-10) - age(1e-8), expected, 1e-5)
  })
})

test('the fit to the age (eq. 17) is exact for flat universes and good to 3% for open ones', () => {
  const { recomputed } = PUBLISHED.CPT4
  const fit = (matter: number, lambda: number): number => {
    const effective = matter - 0.3 * (matter + lambda) + 0.3
    const root = Math.sqrt(Math.abs(1 - effective))
    const angle = Math.sqrt(Math.abs(1 - effective) / effective)
    return (2 / 3 / root) * (effective <= 1 ? Math.asinh(angle) : Math.asin(angle))
  }
  const exact = (matter: number, lambda: number) => dust(matter, lambda).history.past.time.total
  expectPrinted(fit(0.3, 0.7), recomputed['0.3/0.7 fit'])
  expectPrinted(exact(0.3, 0.7), recomputed['0.3/0.7 exact'])
  expectPrinted(fit(0.3, 0), recomputed['0.3/0 fit'])
  expectPrinted(exact(0.3, 0), recomputed['0.3/0 exact'])
  for (const matter of [0.1, 0.2, 0.3, 0.5, 0.9]) {
    expectRelative(exact(matter, 1 - matter), fit(matter, 1 - matter), 1e-13)
    expectRelative(exact(matter, 0), fit(matter, 0), 0.03)
  }
  expect(measure(dust(0.3, 0.7), 'age')).toBeGreaterThan(measure(dust(0.3, 0), 'age'))
})
