import { expect, it } from 'vitest'
import { stretches } from '../../lib/figures/eras'
import { spread } from '../../lib/figures/spread'
import { fitted, textWidth } from '../../lib/figures/text-width'

const wish = (middle: number, length = 10) => ({ middle, length })

it('leaves alone what does not overlap', () => {
  expect(spread([wish(50), wish(20), wish(80)], 0, 100)).toEqual([50, 20, 80])
})

it('moves neighbours apart evenly, in the order of their wishes', () => {
  expect(spread([wish(50), wish(50)], 0, 100)).toEqual([45, 55])
  expect(spread([wish(52), wish(50), wish(51)], 0, 100)).toEqual([61, 41, 51])
})

it('keeps to the edges', () => {
  expect(spread([wish(-5), wish(0)], 0, 100)).toEqual([5, 15])
  expect(spread([wish(99), wish(100)], 0, 100)).toEqual([85, 95])
})

it('measures text by the font: advance widths of H, i and the space in Source Sans 3 Semibold', () => {
  expect(textWidth('Hi ', 1000)).toBe(663 + 262 + 200)
  expect(fitted('Gathering light', 10, 40)).toMatch(/^Gath.*…$/)
  expect(textWidth(fitted('Gathering light', 10, 40), 10)).toBeLessThanOrEqual(40)
})

it('finds stretches of one value with their boundaries', () => {
  const sign = (t: number) => (t < 0.3 ? null : t < 1.25 ? 'low' : 'high')
  const same = (t: number) => t
  const course = { at: same, timeOf: same, between: (one: number, other: number) => (one + other) / 2 }
  const found = stretches(course, [0, 0.5, 1, 1.5, 2], sign)
  expect(found.map(({ value }) => value)).toEqual(['low', 'high'])
  // 14 halvings of a step of 0.5
  expect(found[0]?.from).toBeCloseTo(0.3, 3)
  expect(found[0]?.to).toBeCloseTo(1.25, 3)
  expect(found[1]?.to).toBe(2)
})
