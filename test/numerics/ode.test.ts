/** Dormand and Prince's method of order 8 against solutions in closed form. */
import { describe, expect, it } from 'vitest'
import { type Course, type Motion, type Step, travel, valueIn } from '../../lib/numerics/ode'
import { MOMENTS, RUNGS, STAGES } from '../../lib/numerics/ode-tableau'

/** A swing, y″ = −y, whose solution from (1, 0) is (cos x, −sin x). */
const swing: Motion = {
  size: 2,
  slopeInto(out, _, y) {
    out[0] = y[1]
    out[1] = -y[0]
  },
  weightsInto(out) {
    out.fill(1)
  },
}

function run(changes: Partial<Course> = {}) {
  const steps: Step[] = []
  const state = Float64Array.of(1, 0)
  const purse = { left: 100_000 }
  const after = (_x: number, _y: Float64Array, step: Step | null) => {
    if (step) steps.push(step)
    return false
  }
  const course = { from: 0, to: 20, state, tolerance: 1e-12, first: 0.1, after, dense: true, purse, ...changes }
  return { arrival: travel(swing, course), state: course.state, steps, purse: course.purse }
}

describe('coefficients', () => {
  it.each(RUNGS.map((row, i) => [i, row] as const))(
    'stage %i is consistent: its weights add up to its moment',
    (i, row) => {
      const sum = row.reduce((total, { weight }) => total + weight, 0)
      // Weights up to 43 in size cancel to a number below 1.
      expect(Math.abs(sum - MOMENTS[i])).toBeLessThan(1e-13)
    },
  )

  it('integrates powers up to x⁷ exactly: the order conditions of a quadrature of order 8', () => {
    for (let power = 0; power <= 7; power++) {
      const sum = RUNGS[STAGES].reduce((total, { stage, weight }) => total + weight * MOMENTS[stage] ** power, 0)
      expect(Math.abs(sum - 1 / (power + 1))).toBeLessThan(1e-14)
    }
  })
})

describe('a swing', () => {
  it('ends within the tolerance of all steps', () => {
    const { arrival, state, steps } = run()
    expect(arrival).toBe('there')
    expect(Math.hypot(state[0] - Math.cos(20), state[1] + Math.sin(20))).toBeLessThan(1e-12 * steps.length)
  })

  it('gains a factor of about 2⁸ per halved step, as order 8 does', () => {
    const errorOf = (width: number) => {
      const { state } = run({ tolerance: 1, first: width, widest: width, to: 4 })
      return Math.hypot(state[0] - Math.cos(4), state[1] + Math.sin(4))
    }
    const order = Math.log2(errorOf(0.8) / errorOf(0.4))
    expect(order).toBeGreaterThan(7.5)
    expect(order).toBeLessThan(9.5)
  })

  it('is right between the steps too', () => {
    for (const step of run().steps) {
      for (const part of [0, 0.13, 0.5, 0.77, 1]) {
        const x = step.from + part * (step.to - step.from)
        expect(Math.abs(valueIn(step, 0, x) - Math.cos(x))).toBeLessThan(1e-10)
      }
    }
  })

  it('runs backwards', () => {
    const { state } = run({ to: -20 })
    expect(Math.abs(state[0] - Math.cos(20))).toBeLessThan(1e-11)
  })

  it('stops where it is told to, and where the purse is empty', () => {
    expect(run({ after: (x) => x > 3 }).arrival).toBe('stopped')
    const { arrival, purse } = run({ purse: { left: 100 } })
    expect(arrival).toBe('spent')
    expect(purse.left).toBeGreaterThanOrEqual(0)
  })

  it('goes on from a state that was moved after a step', () => {
    let moved = false
    const { state } = run({
      to: 2 * Math.PI,
      dense: false,
      after(x, y) {
        if (!moved && x > 1) {
          y[0] = Math.cos(x) * 2
          y[1] = -Math.sin(x) * 2
          moved = true
        }
        return false
      },
    })
    expect(Math.abs(state[0] - 2)).toBeLessThan(1e-11)
  })
})

it('says that it is stuck where the slope is no number', () => {
  const wall: Motion = {
    size: 1,
    slopeInto(out, _, y) {
      out[0] = 1 / Math.sqrt(1 - y[0])
    },
    weightsInto(out) {
      out[0] = 1
    },
  }
  const course = {
    from: 0,
    to: 5,
    state: Float64Array.of(0),
    tolerance: 1e-8,
    first: 0.1,
    dense: false,
    purse: { left: 1e5 },
  }
  expect(travel(wall, course)).toBe('stuck')
})
