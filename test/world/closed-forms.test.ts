/**
 * Universes whose histories are closed forms: Einstein–de Sitter, Milne, the cycloid, matter and Λ, radiation, de Sitter (EDS, MILNE, CLOSEDDUST,
 * LCDMAGE of published.json; textbook). Everything to some 1e-13; where the condition of the problem allows less, the reason stands there.
 */
import { describe, expect, test } from 'vitest'
import { eventAtAge, sinceNow } from '../../lib/history/event'
import { deceleration, hubbleRate, jerk } from '../../lib/measures/rates'
import { particleHorizon } from '../../lib/measures/sight'
import { brent } from '../../lib/numerics/roots'
import { expectNear, expectPrinted, expectRelative, PUBLISHED } from './published'
import {
  atRedshift,
  atScale,
  comoving,
  known,
  lookback,
  measure,
  scaleAtTime,
  sure,
  timeAtScale,
  transverse,
  universe,
} from './universe'

const REDSHIFTS = [1e-9, 1e-6, 0.001, 0.1, 0.5, 1, 1.25, 3, 10, 100, 1100, 1e4, 1e6, 1e9]
/** Sums over some forty panels, each rounded to eps, and E² to a few eps. */
const CLOSE = 2e-14

describe('Einstein–de Sitter', () => {
  const solution = universe('matter:1,cmb:0')
  test.each(REDSHIFTS)('z = %s', (z) => {
    expectRelative(rateOf(z), (1 + z) ** 1.5, CLOSE)
    // −expm1 and −2 expm1 keep 1 − (1+z)^−p for small z.
    expectRelative(lookback(solution, z), (-2 / 3) * Math.expm1(-1.5 * Math.log1p(z)), CLOSE)
    expectRelative(comoving(solution, z), -2 * Math.expm1(-0.5 * Math.log1p(z)), CLOSE)
  })
  const rateOf = (z: number) => hubbleRate(atRedshift(solution, z))
  test('a = (3t/2)^(2/3), from a billionth of the age to a billion times it', () => {
    for (let power = -9; power <= 9; power += 0.75) {
      const event = known(eventAtAge(solution.history, (2 / 3) * 10 ** power))
      // From age to a: eps of the age counts 2/3; near the age itself, age − t is formed with eps of the age.
      expectRelative(Math.exp(event.place.N), 10 ** ((2 * power) / 3), 1e-13)
    }
  })
  test('rates, horizons, angular distance', () => {
    const event = atScale(solution, 0.01)
    expectRelative(sure(deceleration(event)), 0.5, CLOSE)
    expectRelative(sure(jerk(event)), 1, CLOSE)
    expectRelative(solution.history.past.time.total, 2 / 3, CLOSE)
    expectRelative(sure(particleHorizon(solution.history, atScale(solution, 1))), 2, CLOSE)
    expectRelative(measure(solution, 'superluminalRedshift'), 3, CLOSE)
    expect(solution.measures.eventHorizon.value).toBe(null)
    expect(solution.end).toMatchObject({ kind: 'decelerating', time: null, scale: null, proven: true })
    expect(measure(solution, 'asymptoticHubble')).toBe(0)
  })
  test('the angular distance is largest at z = 1.25, 8/27', () => {
    const angular = (z: number) => transverse(solution, z) / (1 + z)
    expectRelative(angular(1.25), 8 / 27, CLOSE)
    for (const step of [1e-3, 0.01, 0.3]) {
      expect(angular(1.25 + step)).toBeLessThan(angular(1.25))
      expect(angular(1.25 - step)).toBeLessThan(angular(1.25))
    }
  })
})

describe('Milne', () => {
  const solution = universe('matter:0,cmb:0,dark:0')
  test.each(REDSHIFTS)('z = %s', (z) => {
    expectRelative(hubbleRate(atRedshift(solution, z)), 1 + z, CLOSE)
    expectRelative(lookback(solution, z), z / (1 + z), CLOSE)
    expectRelative(comoving(solution, z), Math.log1p(z), CLOSE)
    // sinh ln(1+z) multiplies an error of ln(1+z) by its own size: ln 1e9 = 21.
    expectRelative(transverse(solution, z), (z * (2 + z)) / (2 * (1 + z)), CLOSE * (1 + Math.log1p(z)))
  })
  test('ages, horizons and end', () => {
    expectRelative(solution.history.past.time.total, 1, CLOSE)
    expectRelative(measure(solution, 'superluminalRedshift'), Math.E - 1, CLOSE)
    expect(solution.measures.particleHorizon.value).toBe(null)
    expect(solution.measures.eventHorizon.value).toBe(null)
    expect(solution.end.kind).toBe('coasting')
    expect(solution.origin).toMatchObject({ kind: 'big-bang', scale: 0 })
    for (const t of [-0.999999, -0.5, -1e-9, 1e-9, 1, 1e6]) {
      // A time from now is good to eps of itself, whatever is left to the origin.
      expectNear(scaleAtTime(solution, t), 1 + t, CLOSE * (1 + t) + 2 * Number.EPSILON * Math.abs(t))
    }
  })
})

describe('de Sitter', () => {
  const solution = universe('matter:0,cmb:0')
  test('a = exp t, for ever', () => {
    expect(solution.origin).toMatchObject({ kind: 'eternal', time: null, scale: 0 })
    expect(solution.end.kind).toBe('exponential')
    expect(solution.measures.age.value).toBe(null)
    // a is e^t: an error of eps in t counts |t| times.
    for (const t of [-600, -30, -1, -1e-8, 1e-8, 1, 30, 600])
      expectRelative(scaleAtTime(solution, t), Math.exp(t), CLOSE * (1 + Math.abs(t)))
    for (const z of REDSHIFTS) expectRelative(comoving(solution, z), z, CLOSE)
    for (const z of REDSHIFTS) expectRelative(lookback(solution, z), Math.log1p(z), CLOSE)
    expectRelative(solution.history.future.conformal.total, 1, CLOSE)
  })
})

describe('radiation alone', () => {
  const solution = universe('matter:0,radiation:1')
  test('a = √(2t), χ = 1 − a', () => {
    expectRelative(solution.history.past.time.total, 0.5, CLOSE)
    for (const t of [-0.4999, -0.1, -1e-9, 1e-9, 1, 1e9])
      expectRelative(scaleAtTime(solution, t), Math.sqrt(1 + 2 * t), 1e-13)
    for (const z of REDSHIFTS) expectRelative(comoving(solution, z), z / (1 + z), CLOSE)
  })
})

describe.each([1.001, 1.1, 1.5, 2, 3, 10, 1000, 10000])('the cycloid of Ω_m = %s', (matter) => {
  const solution = universe(`matter:${matter},cmb:0,dark:0`)
  const size = matter / (2 * (matter - 1))
  const pace = matter / (2 * (matter - 1) ** 1.5)
  /** θ today: cos θ = 1 − 1/size, by the half angle that keeps its digits. */
  const today = 2 * Math.asin(Math.sqrt(0.5 / size))
  const age = pace * cycloid(today)
  // Ω_m − 1 loses the digits that Ω_m shares with one.
  const tolerance = 1e-13 + (4 * Number.EPSILON * matter) / (matter - 1)

  test('times along it, out and back, from a and from θ', () => {
    for (let k = 1; k < 60; k++) {
      const theta = (2 * Math.PI * k) / 60
      const a = 2 * size * Math.sin(theta / 2) ** 2
      const t = pace * cycloid(theta) - age
      // a stands still at the turning point: there dt/da is large and t from a is only good to √eps; a from t is always good.
      expectNear(scaleAtTime(solution, t), a, tolerance * 2 * size + 4 * Number.EPSILON * age)
      if (k === 30) continue
      const event = atScale(solution, a, k < 30 ? 'expanding' : 'contracting')
      // a = size (1 − cos θ): an error of eps in ln a moves t by eps a dt/da = eps pace (1 − cos θ)²/sin θ.
      const condition = (pace * (1 - Math.cos(theta)) ** 2) / Math.abs(Math.sin(theta))
      expectNear(sinceNow(solution.history, event, 'time'), t, tolerance * (pace * 2 * Math.PI + condition))
      // dη = dθ √(Ω_k)... in units of c/H₀: θ/√(Ω_m − 1).
      const eta = (theta - today) / Math.sqrt(matter - 1)
      const conditionEta = Math.abs((1 - Math.cos(theta)) / Math.sin(theta) / Math.sqrt(matter - 1))
      expectNear(
        sinceNow(solution.history, event, 'conformal'),
        eta,
        tolerance * ((2 * Math.PI) / Math.sqrt(matter - 1) + conditionEta),
      )
    }
  })
  test('turnaround, lifetime, age', () => {
    const { end, history } = solution
    expectRelative(end.turnaround?.scale ?? Number.NaN, matter / (matter - 1), tolerance)
    expectRelative(history.end.turnaround?.time ?? Number.NaN, Math.PI * pace - age, tolerance * 10)
    expectRelative((history.end.time ?? Number.NaN) + history.past.time.total, 2 * Math.PI * pace, tolerance * 10)
    expectRelative(history.past.time.total, age, tolerance)
    expect(end).toMatchObject({ kind: 'crunch', scale: 0, proven: true })
  })
  test('light goes once round by the crunch', () => {
    const { past, future, home } = solution.history
    const circumference = (2 * Math.PI) / Math.sqrt(matter - 1)
    expectRelative(
      past.conformal.total + 2 * future.conformal.total + home.conformal.total,
      circumference,
      tolerance * 10,
    )
  })
})

/** θ − sin θ, by its series where it cancels. */
function cycloid(theta: number): number {
  if (theta > 0.5) return theta - Math.sin(theta)
  let [term, sum] = [theta ** 3 / 6, 0]
  for (let k = 2; term !== 0 && k < 20; k++) {
    sum += term
    term *= -(theta * theta) / (2 * k * (2 * k + 1))
  }
  return sum
}

test('the closed dust universe of Ω_m = 2', () => {
  const { history, end } = universe('matter:2,cmb:0,dark:0')
  expectRelative(history.past.time.total, Math.PI / 2 - 1, CLOSE)
  expectRelative((history.end.time ?? Number.NaN) + history.past.time.total, 2 * Math.PI, CLOSE)
  expectRelative(end.turnaround?.scale ?? Number.NaN, 2, CLOSE)
})

describe.each([0.001, 0.05, 0.3, 0.5, 0.9, 0.999])('matter and Λ, flat, Ω_m = %s', (matter) => {
  const solution = universe(`matter:${matter},cmb:0`)
  const lambda = solution.budget.dark
  const root = Math.sqrt(lambda)
  const size = Math.cbrt(matter / lambda)
  const age = (2 / (3 * root)) * Math.asinh(Math.sqrt(lambda / matter))
  /** The age at which the universe has scale a. */
  const ageAt = (a: number) => (2 / (3 * root)) * Math.asinh((a / size) ** 1.5)
  // Ω_Λ = 1 − Ω_m is exact to half an ulp of itself.
  test('age', () => expectRelative(solution.history.past.time.total, age, 1e-13))
  test('a(t) at many ages', () => {
    for (let power = -6; power <= 1.5; power += 0.125) {
      const t = age * 10 ** power
      const a = size * Math.sinh(1.5 * root * t) ** (2 / 3)
      // Late a grows like exp(√Ω_Λ t): eps in t counts that often.
      expectRelative(Math.exp(known(eventAtAge(solution.history, t)).place.N), a, 1e-13 * (1 + root * t))
      expectRelative(scaleAtTime(solution, t - age), a, 1e-13 * (1 + root * t) + (4 * Number.EPSILON * age) / t)
    }
  })
  test('t(a) at many scales', () => {
    for (let N = -14; N <= 14; N += 0.7) {
      const a = Math.exp(N)
      expectNear(timeAtScale(solution, a), ageAt(a) - age, 1e-13 * Math.max(age, Math.abs(ageAt(a) - age)))
    }
  })
  test('milestones', () => {
    expectRelative(1 + measure(solution, 'equalityMatterDark'), 1 / size, 1e-14)
    expectRelative(1 + measure(solution, 'accelerationOnset'), Math.cbrt(2) / size, 1e-14)
    expectRelative(measure(solution, 'asymptoticHubble'), 67.66 * root, 1e-14)
    expectRelative(measure(solution, 'deceleration'), 1.5 * matter - 1, 1e-13)
    expectRelative(measure(solution, 'jerk'), 1, 1e-13)
  })
})

test('milestones of 0.3 and 0.7 to the printed digits', () => {
  const solution = universe('matter:0.3,cmb:0')
  for (const [key, value] of Object.entries(PUBLISHED.LCDMAGE.recomputed)) {
    expectPrinted(measure(solution, key as keyof typeof PUBLISHED.LCDMAGE.recomputed), value)
  }
})

describe('matter and negative Λ, flat', () => {
  // a = (Ω_m/|Ω_Λ|)^(1/3) sin^(2/3)(3/2 √|Ω_Λ| t), textbook: crunch after 2π/(3√|Ω_Λ|).
  test.each([-0.0001, -0.1, -1, -50])('Ω_Λ = %s', (lambda) => {
    const solution = universe(`matter:${1 - lambda},cmb:0,curvature:0`)
    const { dark, coldMatter } = solution.budget
    const root = Math.sqrt(-dark)
    const age = (2 / (3 * root)) * Math.asin(Math.sqrt(-dark / coldMatter))
    // Ω_Λ is what Ω_m leaves of 1.
    const tolerance = 1e-13 + (4 * Number.EPSILON) / -dark
    expectRelative(solution.history.past.time.total, age, tolerance)
    expectRelative(age + (solution.history.end.time ?? Number.NaN), (2 * Math.PI) / (3 * root), tolerance)
    expectRelative(solution.end.turnaround?.scale ?? Number.NaN, Math.cbrt(coldMatter / -dark), tolerance)
    for (let k = 1; k < 40; k++) {
      const phase = (Math.PI * k) / 40
      const a = Math.cbrt(coldMatter / -dark) * Math.sin(phase) ** (2 / 3)
      const t = (2 * phase) / (3 * root)
      expectRelative(
        scaleAtTime(solution, t - age),
        a,
        tolerance * 10 + (8 * Number.EPSILON * age) / Math.min(t, (2 * Math.PI) / (3 * root) - t),
      )
    }
  })
})

describe('matter and radiation, flat', () => {
  // χ = 2[√(Ω_r + Ω_m) − √(Ω_r + Ω_m a)]/Ω_m; t from the same root (textbook).
  test.each([1e-5, 0.01, 0.5, 0.99])('Ω_r = %s', (radiation) => {
    const matter = 1 - radiation
    const solution = universe(`matter:${matter},radiation:${radiation},dark:0`)
    for (const z of REDSHIFTS) {
      const root = Math.sqrt(radiation + matter / (1 + z))
      expectRelative(comoving(solution, z), (2 * z) / (1 + z) / (1 + root), 1e-13)
    }
    const s = Math.sqrt(radiation)
    // ∫₀¹ a da/√(Ω_r + Ω_m a) = (2/3)(1 + 2s)/(1 + s)², s = √Ω_r: no cancellation in this form.
    expectRelative(solution.history.past.time.total, ((2 / 3) * (1 + 2 * s)) / (1 + s) ** 2, 1e-13)
  })
})

describe('Λ and curvature: bounces and big bangs without matter', () => {
  test.each([1.001, 1.5, 3, 50])('closed, Ω_Λ = %s: a = cosh/√…', (lambda) => {
    const solution = universe(`matter:0,cmb:0,dark:${lambda}`)
    const root = Math.sqrt(lambda)
    const least = Math.sqrt((lambda - 1) / lambda)
    const since = Math.acosh(1 / least) / root
    // Ω_Λ − 1 loses digits near one; acosh near 1 takes the root of what is left.
    const tolerance = 1e-13 + (8 * Number.EPSILON * lambda) / (lambda - 1)
    expect(solution.origin.kind).toBe('bounce')
    expectRelative(solution.origin.scale, least, tolerance)
    expectNear(solution.history.past.time.total, since, tolerance * since + 1e-13)
    for (const t of [-3, -1, -0.3, 0, 0.3, 1, 3]) {
      // From the bounce; t < 0 is the contraction before it.
      const a = least * Math.cosh(root * t)
      const event = known(eventAtAge(solution.history, t))
      expectRelative(Math.exp(event.place.N), a, tolerance * (1 + root * Math.abs(t)))
      if (t !== 0) expect(event.sign).toBe(Math.sign(t))
    }
  })
  test.each([0.001, 0.5, 0.999])('open, Ω_Λ = %s: a = sinh', (lambda) => {
    const solution = universe(`matter:0,cmb:0,dark:${lambda}`)
    const root = Math.sqrt(lambda)
    const open = Math.sqrt((1 - lambda) / lambda)
    const age = Math.asinh(1 / open) / root
    const tolerance = 1e-13 + (4 * Number.EPSILON) / (1 - lambda)
    expectRelative(solution.history.past.time.total, age, tolerance)
    for (const t of [1e-6, 0.1, 1, 5, 20])
      expectRelative(
        Math.exp(known(eventAtAge(solution.history, t)).place.N),
        open * Math.sinh(root * t),
        tolerance * (1 + root * t),
      )
  })
  test('negative Λ in an open universe swings as a sine to the crunch', () => {
    const solution = universe('matter:0,cmb:0,dark:-1')
    // E² = 2a⁻² − 1: a = √2 sin t.
    expectRelative(solution.history.past.time.total, Math.PI / 4, CLOSE)
    expectRelative(solution.history.end.time ?? Number.NaN, (3 * Math.PI) / 4, CLOSE)
    expect(solution.end.kind).toBe('crunch')
  })
})

test('constant w beside nothing: a^(3(1+w)/2) grows linearly', () => {
  for (const w of [-0.9, -0.5, 0.2, 1, 5]) {
    const solution = universe(`matter:0,cmb:0,eos:constant,w:${w}`)
    const p = 1.5 * (1 + w)
    for (const t of [-0.9, -0.1, 1, 100])
      expectRelative(scaleAtTime(solution, t / p), (1 + t) ** (1 / p), 1e-13 * (1 + 1 / p))
  }
})

test('the cycloid helper itself', () => {
  // θ − sin θ at 0.5 by both forms, and at 0.001 by its first terms.
  expectRelative(cycloid(0.5), 0.5 - Math.sin(0.5), 1e-14)
  expectRelative(cycloid(1e-3), 1e-9 / 6 - 1e-15 / 120, 1e-14)
  expect(brent((x) => cycloid(x) - 1, 0, 3)).toBeCloseTo(1.934563, 5)
})
