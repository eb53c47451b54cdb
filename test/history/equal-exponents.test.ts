/** Dark energy that thins out exactly like matter, radiation or curvature is added to it before anything is decided. */
import { describe, expect, it } from 'vitest'
import { readScenario } from '../../lib/scenario/read'
import { solve } from '../../lib/solve'
import { hubbleTimeGyr } from '../../lib/units'

function solved(code: string) {
  const reading = readScenario(code, null)
  if (!reading.ok) throw new Error(reading.problems[0].message)
  return solve(reading.value)
}

/** Milne's universe by its closed form: a = H₀t, so the age is 1/H₀, for whatever cancels exactly. */
const MILNE = [
  'matter:1,dark:-1,cmb:0,eos:constant,w:0',
  'matter:0.5,dark:-0.5,cmb:0,eos:constant,w:0',
  'matter:0,radiation:1,dark:-1,eos:constant,w:0.3333333333333333',
  'matter:0,dark:2,cmb:0,eos:constant,w:-0.3333333333333333',
]

describe.each(MILNE)('%s', (code) => {
  const { origin, end, measures } = solved(code)
  it('is an empty universe', () => {
    expect([origin.kind, end.kind]).toEqual(['big-bang', 'coasting'])
    // One rounding of 1/H₀ and the panel sums: a few eps.
    expect(Math.abs((measures.age.value ?? 0) / hubbleTimeGyr(67.66) - 1)).toBeLessThan(1e-14)
  })
})

it('matter less dark energy of the same exponent grows like the remainder', () => {
  const [sum, parts] = [solved('matter:0.3,curvature:0.7,cmb:0'), solved('matter:0.5,dark:-0.2,cmb:0,eos:constant,w:0')]
  expect(Math.abs((parts.measures.age.value ?? 0) / (sum.measures.age.value ?? 1) - 1)).toBeLessThan(1e-14)
})
