import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { fractionOf, linearRange, type Range, valueAt } from '../../lib/figures/scale'
import { type Tick, ticksOf } from '../../lib/figures/ticks'
import { aside, between, closer, wider } from '../../lib/figures/zoom'

const RANGES: readonly Range[] = [
  linearRange(-13.8, 40),
  { scaling: 'log', from: 1e-5, to: 100, linear: 1 },
  { scaling: 'signed-log', from: -13.8, to: 5000, linear: 1 },
]

describe.each(RANGES)('an axis that is $scaling', (range) => {
  it('leads from values to parts and back', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 1, noNaN: true }), (part) => {
        // A few eps of ln of the largest value in units of the linear part, at most 30.
        expect(Math.abs(fractionOf(range, valueAt(range, part)) - part)).toBeLessThan(256 * Number.EPSILON)
      }),
    )
    expect([valueAt(range, 0), valueAt(range, 1)]).toEqual([range.from, range.to])
  })

  it('is zoomed about a part that stays where it is, and back', () => {
    const near = { ...range, ...closer(range, 0.25) }
    // Links hold three digits of the range.
    expect(fractionOf(near, valueAt(range, 0.25))).toBeCloseTo(0.25, 1)
    const back = wider(near, 0.25)
    expect(fractionOf(range, back.from)).toBeCloseTo(0, 1)
    expect(fractionOf(range, back.to)).toBeCloseTo(1, 1)
  })

  it('is moved aside and brushed either way', () => {
    expect(fractionOf(range, aside(range, 1).from)).toBeCloseTo(0.25, 1)
    expect(between(range, 0.7, 0.2)).toEqual(between(range, 0.2, 0.7))
  })

  it('has ticks in order, apart from each other, today among them', () => {
    const axis = { ...range, quantity: 'time', label: 'time', symbol: '', unit: 'Gyr' }
    const now = range.scaling === 'log' ? 1 : 0
    const ticks = ticksOf(axis, now, 8, () => 0.06)
    expect(ticks.length).toBeGreaterThan(3)
    expect(ticks.find(({ text }) => text === 'now')?.at).toBe(now)
    ticks.slice(1).forEach((tick, i) => {
      expect(fractionOf(range, tick.at) - fractionOf(range, (ticks[i] as Tick).at)).toBeGreaterThanOrEqual(0.06)
    })
  })
})

describe('an even axis', () => {
  const textsOf = (from: number, to: number) =>
    ticksOf(
      { ...linearRange(from, to), quantity: 'comoving', label: '', symbol: '', unit: 'Mpc' },
      null,
      5,
      () => 0,
    ).map(({ text }) => text)

  it('writes large numbers all in the same power of ten', () => {
    expect(textsOf(0, 2.1e6)).toEqual([
      '0',
      '0.5\u202f×\u202f10⁶',
      '1.0\u202f×\u202f10⁶',
      '1.5\u202f×\u202f10⁶',
      '2.0\u202f×\u202f10⁶',
    ])
    expect(textsOf(0, 2e5)).toEqual(['0', '50\u202f000', '100\u202f000', '150\u202f000', '200\u202f000'])
  })
})
