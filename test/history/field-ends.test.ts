/**
 * Where a field on an exponential potential goes: E² ∝ a^(−slope²), or along with what thins out slowest beside it (Copeland, Liddle &
 * Wands 1998, Phys. Rev. D 57, 4686), and a linear potential that has its zero beyond all doubles.
 */
import { expect, it } from 'vitest'
import { universe } from '../world/universe'

it.each([
  ['alone', 'matter:0,cmb:0,eos:field,v:exponential,slope:1', 'accelerating', '−1'],
  ['beside radiation', 'matter:0,radiation:0.9,eos:field,v:exponential,slope:-2.2', 'decelerating', '−4'],
  ['in closed space', 'matter:0.3,cmb:0,curvature:-0.01,eos:field,v:exponential,slope:0.5', 'accelerating', '−0.25'],
  ['beside matter', 'matter:0.9,cmb:0,eos:field,v:exponential,slope:-2', 'decelerating', '−3'],
] as const)('an exponential potential %s', (_, code, kind, power) => {
  const { end } = universe(code)
  expect(end.kind).toBe(kind)
  expect(end.because).toContain(`a to the power ${power}.`)
})

it('a linear potential of a faint slope becomes negative at last, since the field rolls without end', () => {
  expect(universe('matter:0.3,cmb:0,eos:field,v:linear,slope:-1e-6').end).toMatchObject({
    kind: 'crunch',
    time: null,
    scale: 0,
  })
})
