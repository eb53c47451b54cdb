import fc from 'fast-check'
import { expect, test } from 'vitest'
import { AFTER_PARTS, inLines, textWidth } from '../../lib/figures/text-width'

const CODES =
  'Longhence 1.0.0, engine 1: h0:67.66,matter:0.3111,as:Steady light; h0:67.66,matter:0.4,dark:0.85,eos:cpl,w0:-0.6,wa:-1.6'

test('lines hold a text whole, each no wider than it may be', () => {
  fc.assert(
    fc.property(fc.integer({ min: 200, max: 2000 }), (width) => {
      const lines = inLines(CODES, 10, width, 8, AFTER_PARTS)
      expect(lines.join('').replaceAll(' ', '')).toBe(CODES.replaceAll(' ', ''))
      for (const line of lines) expect(textWidth(line, 10)).toBeLessThanOrEqual(width)
    }),
  )
})

test('the last line there may be is cut', () => {
  const lines = inLines(CODES, 10, 200, 2, AFTER_PARTS)
  expect(lines).toHaveLength(2)
  expect(lines[1]).toMatch(/…$/)
  expect(textWidth(lines[1] ?? '', 10)).toBeLessThanOrEqual(200)
})
