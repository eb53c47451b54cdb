/**
 * Ways of a field that have no arm home, and the way through a turnaround, against another route: φ̈ = −3Hφ̇ − 3V′ and
 * Ḣ = ½ d(E²)/dN by the classical Runge–Kutta method (Kutta 1901) in time, from today's φ̇, V and V′ as the law tells them.
 */
import { describe, expect, it } from 'vitest'
import { eventAtScale, eventAtTime, isEvent, sinceNow, sinceOrigin, untilEnd } from '../../lib/history/event'
import { known, universe } from '../world/universe'

/** On a linear potential V′ is the same everywhere. */
function linearWay(code: string) {
  const { history } = universe(code)
  const { budget, law } = history.past.model
  const f = new Float64Array(3)
  law.derivativesInto(f, 0)
  // dρ/dN = −φ̇² and d²ρ/dN² = −2 φ̇ dφ̇/dN with dφ̇/dN = −3(φ̇ + V′) today, where H = 1.
  const square = -f[1] * budget.dark
  const speed = Math.sqrt(square)
  const push = (f[2] * budget.dark) / (6 * speed) - speed
  // N, H, φ̇ and the time.
  const slopes = ([N, H, v]: readonly number[]) => [
    H,
    -1.5 * budget.coldMatter * Math.exp(-3 * N) - budget.curvature * Math.exp(-2 * N) - 0.5 * v * v,
    -3 * (H * v + push),
  ]
  return { history, slopes, begin: [0, 1, speed] }
}

const moved = (y: readonly number[], k: readonly number[], h: number) => y.map((one, i) => one + h * k[i])

function followed({ slopes, begin }: ReturnType<typeof linearWay>) {
  let [y, time, turn]: [readonly number[], number, { time: number; scale: number } | null] = [begin, 0, null]
  while (y[1] > -1e6) {
    const h = 2e-3 / (1 + Math.abs(y[1]) + Math.abs(y[2]))
    const a = slopes(y)
    const b = slopes(moved(y, a, h / 2))
    const c = slopes(moved(y, b, h / 2))
    const d = slopes(moved(y, c, h))
    const next = y.map((one, i) => one + (h / 6) * (a[i] + 2 * b[i] + 2 * c[i] + d[i]))
    if (y[1] > 0 && next[1] <= 0) turn = { time: time + (h * y[1]) / (y[1] - next[1]), scale: Math.exp(next[0]) }
    ;[y, time] = [next, time + h]
  }
  // Driven by φ̇ alone, a ∝ (end − t)^(1/3).
  return { turn, end: time - 1 / (3 * y[1]) }
}

describe('densities that leave the doubles before a contracting universe is back at today’s size', () => {
  const way = linearWay('matter:0.485,curvature:-1.015,cmb:0,eos:field,v:linear,slope:0.08168')
  const { history } = way

  it('end when an independent integration ends', () => {
    const { turn, end } = followed(way)
    // Ours is good to 1e-8 of the derivatives it starts from; Kutta's to the fourth power of its step.
    expect(Math.abs((history.end.turnaround?.time ?? 0) / (turn?.time ?? 1) - 1)).toBeLessThan(1e-6)
    expect(Math.abs((history.end.turnaround?.scale ?? 0) / (turn?.scale ?? 1) - 1)).toBeLessThan(1e-5)
    expect(Math.abs((history.end.time ?? 0) / end - 1)).toBeLessThan(1e-6)
  })

  it('tell why nothing is told on the way', () => {
    const because = expect.stringContaining('range of floating-point numbers')
    const { turnaround, time } = history.end
    expect(eventAtScale(history, 0, 'contracting')).toMatchObject({ because })
    expect(eventAtTime(history, ((turnaround?.time ?? 0) + (time ?? 0)) / 2)).toMatchObject({ because })
    expect(eventAtTime(history, 1.001 * (time ?? 0))).toEqual({ because: 'this is after the end' })
  })

  it('leave what is left until the end', () => {
    const now = known(eventAtScale(history, 0, 'expanding'))
    expect(untilEnd(history, now, 'time')).toBeCloseTo(history.end.time ?? 0, 12)
  })
})

it('H changes its sign an odd number of times where it ends in a crunch', () => {
  const { history, end } = universe(
    'matter:0.02673,curvature:-0.5207,masses:0,eos:field,v:cosine,width:1.384,start:0.05332',
  )
  const turns = Number(end.because.match(/changes its sign (\d+) times/)?.[1])
  expect(turns).toBeGreaterThan(2)
  expect(turns % 2).toBe(1)
  expect(eventAtScale(history, -1, 'contracting')).toMatchObject({
    because: expect.stringContaining('another turning point'),
  })
})

it('swings like dust: the contraction takes as long as the expansion did', () => {
  const { history } = universe('matter:0.4047,curvature:-1.284,cmb:0,eos:field,v:cosine,width:1.615,start:0.03827')
  const now = known(eventAtScale(history, 0, 'expanding'))
  const turn = known(eventAtTime(history, history.future.time.total))
  // A cycloid is symmetric about its top.
  const [whole, half] = [
    sinceOrigin(history, now, 'time') + untilEnd(history, now, 'time'),
    sinceOrigin(history, turn, 'time'),
  ]
  expect(Math.abs(whole / (2 * half) - 1)).toBeLessThan(1e-14)
  expect(isEvent(eventAtScale(history, 0, 'contracting'))).toBe(false)
})

it('E² on the way home is what Friedmann’s equation makes of it', () => {
  const { history } = universe('h0:70,matter:0.3,cmb:0,eos:field,v:linear,slope:-1')
  for (const arm of [history.future, history.descent, history.home]) {
    for (const m of [0.1, 0.3, 0.5]) {
      const N = arm.direction * m
      const { budget, law } = arm.model
      const expected = budget.coldMatter * Math.exp(-3 * N) + budget.dark * law.density(N)
      // From H, whose error the voyage states as 1e-10 of E² and of what cancels in it.
      const size = budget.coldMatter * Math.exp(-3 * N) + Math.abs(budget.dark * law.density(N))
      expect(Math.abs(arm.model.expansion(N, Math.exp(-N)) - expected)).toBeLessThan(1e-9 * size)
      const out = new Float64Array(1)
      arm.model.expansionsInto(out, Float64Array.of(N), Float64Array.of(Math.exp(-N)), 0, 1)
      expect(Math.abs(out[0] - expected)).toBeLessThan(1e-9 * size)
      const event =
        arm === history.future
          ? known(eventAtScale(history, N, 'expanding'))
          : known(eventAtScale(history, N, 'contracting'))
      expect(sinceNow(history, event, 'time')).toBeGreaterThan(0)
      // n = 3(1 + w) at one place.
      expect(arm.model.law.exponentRange(N, N)[0]).toBeCloseTo(3 * (1 + arm.model.law.w(N)), 12)
    }
  }
})
