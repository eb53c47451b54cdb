/** Times and distances against an independent integration (second-route.ts): random universes, held laws, bounces. */
import { describe, expect, test, vi } from 'vitest'
import { type Branch, eventAtAge, eventAtTime, sinceNow, sinceOrigin, untilEnd } from '../../lib/history/event'
import type { Solution } from '../../lib/solve'
import { everywhere } from './any-universe'
import { expectNear, expectRelative } from './published'
import { conformalBetween, type Friedmann, friedmannOf, quadrature, timeBetween } from './second-route'
import { atScale, known, timeAtScale, universe } from './universe'

// Hundreds of whole histories per test: seconds on a busy machine.
vi.setConfig({ testTimeout: 60_000 })

/** How far from today, in ln a, an arm reaches; a turning point itself is left to closed forms. */
const reach = (solution: Solution, arm: 'past' | 'future', most: number): number => {
  const { end } = solution.history[arm]
  return end.kind === 'none' ? most : Math.min(most, 0.9 * Math.abs(end.N))
}

/** E² of the second route is a plain sum, which rounds as often as its terms cancel, and exponents n|ln a| times. */
function worst(friedmann: Friedmann, from: number, to: number): number {
  let largest = 1
  for (let k = 0; k <= 40; k++) largest = Math.max(largest, friedmann.condition(from * (to / from) ** (k / 40)))
  return largest
}

test('times and distances in random universes, back and ahead, the law held where it says so', () => {
  everywhere(false, 300, (solution, { part, arm }) => {
    const a = Math.exp(solution.history[arm].direction * part * reach(solution, arm, arm === 'past' ? 7 : 3))
    const [from, to] = [Math.min(a, 1), Math.max(a, 1)]
    const friedmann = friedmannOf(solution, arm === 'future' && solution.scenario.beyond === 'hold')
    // The scale factor itself is good to eps, over its distance from one.
    const tolerance = 1e-11 + 1e-14 * worst(friedmann, from, to) + (4 * Number.EPSILON) / Math.abs(Math.log(a))
    const event = atScale(solution, a)
    expectRelative(Math.abs(sinceNow(solution.history, event, 'time')), timeBetween(friedmann, from, to), tolerance)
    expectRelative(
      Math.abs(sinceNow(solution.history, event, 'conformal')),
      conformalBetween(friedmann, from, to),
      tolerance,
    )
  })
})

describe('the law held from today on', () => {
  const code = 'matter:0.3,h0:70,cmb:0,eos:cpl,w0:-0.9,wa:-0.8'
  const [held, followed, constant] = [
    universe(`${code},beyond:hold`),
    universe(code),
    universe('matter:0.3,h0:70,cmb:0,eos:constant,w:-0.9'),
  ]
  test('the past is that of the law, the future that of a constant w', () => {
    for (const a of [1e-6, 0.01, 0.5, 0.99]) expect(timeAtScale(held, a)).toBe(timeAtScale(followed, a))
    for (const a of [1.01, 2, 100, 1e6]) expect(timeAtScale(held, a)).toBe(timeAtScale(constant, a))
    expect(held.end.kind).toBe('accelerating')
    expect(followed.end.kind).toBe('decelerating')
    expect(held.measures.age.value).toBe(followed.measures.age.value)
  })
  test.each([1.001, 1.5, 10, 1e4])('a = %s by direct integration', (a) => {
    const friedmann = friedmannOf(held, true)
    expectRelative(timeAtScale(held, a), timeBetween(friedmann, 1, a), 1e-12)
    expectRelative(sinceNow(held.history, atScale(held, a), 'conformal'), conformalBetween(friedmann, 1, a), 1e-12)
  })
  test('a rip that holding brings', () => {
    const rip = universe('matter:0.3,h0:70,cmb:0,eos:cpl,w0:-1.3,wa:-1,beyond:hold')
    expect(rip.end.kind).toBe('rip')
    // ∫ from a = 1 to ∞ in v = 1/√a: E ∝ v^−0.9, so that 2/(vE) ∝ v^−0.1; v = x^10 takes the power away.
    const { squared } = friedmannOf(rip, true)
    const left = quadrature((x) => 20 / (x * Math.sqrt(squared(x ** -20))), 1e-3, 1)
    // Below x = 1e-3 matter is gone: 20 x^9/√Ω_DE dx, to x^9/… of the whole, 1e-27.
    expectRelative(rip.history.future.time.total, left, 1e-12)
  })
  test('after a turnaround the way home is held too', () => {
    const crunch = universe('matter:0.4,cmb:0,dark:-0.5,eos:cpl,w0:-0.8,wa:-0.9,beyond:hold')
    expect(crunch.end.kind).toBe('crunch')
    const friedmann = friedmannOf(crunch, true)
    const back = (a: number) =>
      sinceNow(crunch.history, atScale(crunch, a, 'contracting'), 'time') -
      sinceNow(crunch.history, atScale(crunch, 1, 'contracting'), 'time')
    for (const a of [0.9, 0.5, 0.1, 1e-3]) expectRelative(back(a), timeBetween(friedmann, a, 1), 1e-12)
    // And not by the law of the past.
    expect(Math.abs(back(0.1) / timeBetween(friedmannOf(crunch), 0.1, 1) - 1)).toBeGreaterThan(1e-3)
  })
})

describe.each([
  [0.1, 1.5],
  [0.3, 2],
  [0.3, 1.8],
  [1, 2.7],
  [0.01, 40],
])('the bounce of Ω_m = %s, Ω_Λ = %s', (matter, lambda) => {
  const solution = universe(`matter:${matter},cmb:0,dark:${lambda}`)
  const { curvature } = solution.budget
  // Ω_m + Ω_k a + Ω_Λ a³ = Ω_Λ (a − b)(a² + b a + c) with the largest root b below one, by Newton from today.
  let b = 1
  for (let step = 0; step < 60; step++)
    b -= (matter + curvature * b + lambda * b ** 3) / (curvature + 3 * lambda * b * b)
  const c = curvature / lambda + b * b
  /** ∫ from b to a with a = b + u², which leaves nothing that cancels; E² = Ω_Λ u² (a² + b a + c)/a³. */
  const since = (a: number, weight: (x: number) => number) =>
    quadrature(
      (u) => {
        const x = b + u * u
        return (2 * weight(x)) / Math.sqrt(lambda * (x * x + b * x + c))
      },
      0,
      Math.sqrt(a - b),
    )
  const time = (a: number) => since(a, Math.sqrt)
  const conformal = (a: number) => since(a, (x) => 1 / Math.sqrt(x))
  // The root moves by rounding of the terms over the slope of the cubic there.
  const tolerance = 1e-13 + (16 * Number.EPSILON * lambda) / Math.abs(curvature + 3 * lambda * b * b)

  test('where and when', () => {
    expect(solution.origin.kind).toBe('bounce')
    expectRelative(solution.origin.scale, b, tolerance)
    expectRelative(solution.history.past.time.total, time(1), 10 * tolerance)
    expectRelative(solution.history.past.conformal.total, conformal(1), 10 * tolerance)
  })
  test.each([1.0001, 1.01, 1.1, 1.5, 4, 100])('phases at %s times the least scale', (times) => {
    const a = b * times
    const phase = (branch: Branch) => {
      const event = atScale(solution, a, branch)
      return [sinceOrigin(solution.history, event, 'time'), sinceOrigin(solution.history, event, 'conformal')]
    }
    // Near the bounce ln a − ln b carries rounding eps over ln(a/b), of which time takes the root.
    const near = 10 * tolerance + Number.EPSILON / Math.log(times)
    expectRelative(phase('expanding')[0], time(a), near)
    expectRelative(phase('expanding')[1], conformal(a), near)
    expectRelative(phase('contracting')[0], -time(a), near)
    expectRelative(phase('contracting')[1], -conformal(a), near)
  })
  test.each([-3, -1, -0.1, -1e-3, 1e-3])('from the age %s back to a', (age) => {
    const event = known(eventAtAge(solution.history, age))
    expect(event.sign).toBe(Math.sign(age))
    expectRelative(time(Math.exp(event.place.N)), Math.abs(age), 100 * tolerance + 1e-15 / age ** 2)
    const same = known(eventAtTime(solution.history, age - solution.history.past.time.total))
    expectNear(same.place.N, event.place.N, 100 * tolerance)
    expect(untilEnd(solution.history, event, 'time')).toBe(Number.POSITIVE_INFINITY)
  })
})
