/** What dominates when, against closed forms (any textbook): flat matter with a constant, and the cycloid of matter alone. */
import { expect, it } from 'vitest'
import { entryOf } from '../../lib/figures/entry'
import type { Range } from '../../lib/figures/scale'
import { solve } from '../../lib/solve'
import { hubbleTimeGyr } from '../../lib/units'
import { read } from '../bench/scenarios'

const HUBBLE_TIME = hubbleTimeGyr(70)
const linear = (from: number, to: number): Range => ({ scaling: 'linear', from, to, linear: 1 })
/** A hundredth of a pixel of a thousand. */
const FINE = 1e-5

it.each([0.05, 0.3, 0.6])(
  'matter gives way to a constant, before which the expansion speeds up: Ω_m = %f',
  (matter) => {
    const rest = 1 - matter
    const timeAt = (a: number) =>
      (2 / 3 / Math.sqrt(rest)) * HUBBLE_TIME * Math.asinh(Math.sqrt(rest / matter) * a ** 1.5)
    const sinceNow = (a: number) => timeAt(a) - timeAt(1)
    const x = linear(-30, 50)
    const { dominant, accelerating } = eras(`h0:70,matter:${matter},cmb:0`, x)
    const within = FINE * (x.to - x.from)
    expect(dominant.map(({ value }) => value)).toEqual(['matter', 'dark energy'])
    expect(Math.abs((dominant[0]?.from ?? 0) - sinceNow(0))).toBeLessThan(within)
    expect(Math.abs((dominant[0]?.to ?? 0) - sinceNow(Math.cbrt(matter / rest)))).toBeLessThan(within)
    expect(dominant[1]).toMatchObject({ from: dominant[0]?.to, to: x.to })
    expect(accelerating).toHaveLength(1)
    expect(Math.abs((accelerating[0]?.from ?? 0) - sinceNow(Math.cbrt(matter / rest / 2)))).toBeLessThan(within)
  },
)

it('over a turn and back, from beginning to end', () => {
  // Ω_m = 2: a = 1 − cos θ, t = (θ − sin θ)/H₀, and now is θ = π/2.
  const x = linear(-20, 100)
  const { dominant, accelerating } = eras('h0:70,matter:2,dark:0,cmb:0', x)
  expect(accelerating).toEqual([])
  expect(dominant.map(({ value }) => value)).toEqual(['matter'])
  const age = (Math.PI / 2 - 1) * HUBBLE_TIME
  const within = FINE * (x.to - x.from)
  expect(Math.abs((dominant[0]?.from ?? 0) + age)).toBeLessThan(within)
  expect(Math.abs((dominant[0]?.to ?? 0) - (2 * Math.PI * HUBBLE_TIME - age))).toBeLessThan(within)
})

function eras(code: string, x: Range) {
  const found = entryOf(solve(read(code))).eras?.(x)
  if (!found) throw new Error('no eras')
  return found
}
