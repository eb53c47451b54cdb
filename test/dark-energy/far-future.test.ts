/** Where the laws lead: what must win as a → 0 and a → ∞, and histories with closed forms at the far end. */
import { describe, expect, test } from 'vitest'
import { sinceNow } from '../../lib/history/event'
import { expectRelative } from '../world/published'
import { atScale, gyr, scaleAtTime, universe } from '../world/universe'

describe('origin and end', () => {
  test.each([
    // w → −∞ like −wa a: faster than any constant w.
    ['matter:0.3,eos:cpl,w0:-0.9,wa:0.3', 'big-bang', 'rip'],
    // f dies like e^(−3|wa|a): matter is left, or curvature.
    ['matter:0.3,eos:cpl,w0:-1.1,wa:-0.3', 'big-bang', 'decelerating'],
    ['matter:0.3,dark:0.5,eos:cpl,w0:-0.9,wa:-0.3', 'big-bang', 'coasting'],
    ['matter:0.3,dark:0.8,eos:cpl,w0:-0.9,wa:-0.3', 'big-bang', 'crunch'],
    ['matter:0.3,eos:jbp,w0:-0.9,wa:0.3', 'big-bang', 'rip'],
    ['matter:0.3,eos:jbp,w0:-1.1,wa:-0.3', 'big-bang', 'decelerating'],
    ['matter:0.3,eos:log,w0:-0.9,wa:0.1', 'big-bang', 'rip'],
    ['matter:0.3,eos:log,w0:-1.1,wa:-0.1', 'big-bang', 'decelerating'],
    // w returns to w0 = −0.9: H falls, slower than 1/t.
    ['matter:0.3,eos:ba,w0:-0.9,wa:0.5', 'big-bang', 'accelerating'],
    ['matter:0.3,eos:ba,w0:-1,wa:-0.5', 'big-bang', 'exponential'],
    ['matter:0.3,eos:ba,w0:-1.1,wa:0.5', 'big-bang', 'rip'],
    // A Chaplygin gas ends as a constant, without one as dust.
    ['matter:0.05,eos:chaplygin,b:0.8,alpha:0.3', 'big-bang', 'exponential'],
    ['matter:0.05,eos:chaplygin,b:0,alpha:0.3', 'big-bang', 'decelerating'],
    ['matter:0.05,eos:chaplygin,b:0.000001,alpha:-0.99', 'big-bang', 'exponential'],
    ['matter:0.3,eos:nodes,at:0.5_1_2,w:-0.5_-1_-1.2', 'big-bang', 'rip'],
    ['matter:0.3,eos:nodes,at:0.5_1_2,w:-0.5_-1_0.1', 'big-bang', 'decelerating'],
    ['matter:0.3,eos:nodes,at:0.5_1_2,w:-0.5_-1_-0.5', 'big-bang', 'accelerating'],
    // w of today from today on.
    ['matter:0.3,eos:cpl,w0:-1,wa:0.3,beyond:hold', 'big-bang', 'exponential'],
    ['matter:0.3,eos:log,w0:-1.1,wa:-0.3,beyond:hold', 'big-bang', 'rip'],
    ['matter:0.3,eos:jbp,w0:-0.8,wa:1,beyond:hold', 'big-bang', 'accelerating'],
    ['matter:0.3,eos:nodes,at:0.5_1_2,w:-0.5_-1_-1.2,beyond:hold', 'big-bang', 'exponential'],
    ['matter:0.3,eos:barotropic,excess:0.1,alpha:2,beyond:hold', 'big-bang', 'rip'],
    ['matter:0.3,eos:chaplygin,b:0.5,beyond:hold', 'big-bang', 'accelerating'],
    // wa > 0 of the logarithmic law rules as a → 0 too; below zero it makes a bounce.
    ['matter:0.3,dark:-0.5,eos:log,w0:-0.9,wa:1', 'oscillating', 'oscillating'],
    // Curvature bounds it below, since early dark energy is softer than a⁻², and above, since it dies.
    ['matter:0,cmb:0,dark:1.5,eos:cpl,w0:-1,wa:-1', 'oscillating', 'oscillating'],
    ['matter:0,cmb:0,dark:1.5,eos:jbp,w0:-1,wa:-1', 'oscillating', 'oscillating'],
    ['matter:0,cmb:0,dark:1.5,eos:log,w0:-1,wa:-0.3', 'oscillating', 'oscillating'],
    // Dark energy alone.
    ['matter:0,cmb:0,eos:cpl,w0:-1,wa:-1', 'eternal', 'decelerating'],
    ['matter:0,cmb:0,eos:log,w0:-1,wa:-1', 'eternal', 'decelerating'],
    ['matter:0,cmb:0,eos:log,w0:-1,wa:1', 'big-bang', 'rip'],
  ])('%s: %s, %s', (code, origin, end) => {
    const solution = universe(code)
    expect([solution.origin.kind, solution.end.kind]).toEqual([origin, end])
  })
})

describe('the logarithmic law alone: E² = e^(3wa N²/2) for w0 = −1', () => {
  test.each([1, 0.01, 1e-4, 1e-6, 1e-10])('wa = %d: √(π/3wa) on each side, even where a leaves the doubles', (wa) => {
    const solution = universe(`matter:0,cmb:0,eos:log,w0:-1,wa:${wa}`)
    expect([solution.origin.kind, solution.end.kind]).toEqual(['big-bang', 'rip'])
    // ∫ e^(−3wa N²/4) dN from 0; beyond a = e^700 an integral of logarithms, good to eps |ln E|.
    const half = Math.sqrt(Math.PI / (3 * wa))
    expectRelative((solution.end.time ?? Number.NaN) / gyr(solution), half, 1e-12)
    expectRelative((solution.origin.time ?? Number.NaN) / gyr(solution), -half, 1e-12)
  })
})

test('dark energy that comes and goes: what lies behind it is not lost', () => {
  // f = e^(−63N − 7.5N²) rises to e^132 at a = 0.015 and is gone at a = 0.0002, where matter rules again.
  const solution = universe('matter:0.3,cmb:0,eos:log,w0:20,wa:-5')
  const early = atScale(solution, 1e-7)
  const t = solution.history.past.time.total + sinceNow(solution.history, early, 'time')
  // t = (2/3) a^(3/2)/√Ω_m there; the age itself is 0.03, so that its rounding is 1e-17 beside 4e-11.
  expectRelative(t, ((2 / 3) * 1e-7 ** 1.5) / Math.sqrt(0.3), 1e-5)
})

test('dark energy that vanishes after a burst: the expansion does not end there', () => {
  const { end } = universe('matter:0.3,cmb:0,eos:jbp,w0:-9.85,wa:-1e-14')
  expect(end).toMatchObject({ kind: 'decelerating', time: null })
})

test('a turning point beyond the doubles is told as such', () => {
  // −0.01 a⁻² meets e^(−0.0015 N²) near ln a = 1335.
  const { end } = universe('matter:0.3,cmb:0,curvature:-0.01,eos:log,w0:-1,wa:-0.001')
  expect(end).toMatchObject({ kind: 'crunch', time: null, turnaround: null })
  expect(end.because).toContain('floating-point')
})

test('swings repeat: after a whole period the scale factor is that of today', () => {
  const solution = universe('matter:0,cmb:0,dark:1.5,eos:cpl,w0:-1,wa:-1')
  const { past, future } = solution.history
  const period = 2 * (past.time.total + future.time.total)
  expectRelative(scaleAtTime(solution, period), 1, 1e-12)
  expectRelative(scaleAtTime(solution, -3 * period), 1, 1e-11)
})
