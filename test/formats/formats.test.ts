import { expect, test } from 'vitest'
import { FORMATS } from '../../lib/formats'
import { MOST_ROWS } from '../../lib/formats/format'

test('CSV is the default', () => expect(FORMATS[0].key).toBe('csv'))
test('keys and extensions are different and fit for a file name', () => {
  expect(new Set(FORMATS.map(({ key }) => key)).size).toBe(FORMATS.length)
  expect(new Set(FORMATS.map(({ extension }) => extension)).size).toBe(FORMATS.length)
  for (const { key, extension } of FORMATS) expect(key + extension).toMatch(/^[a-z]+$/)
})
test.each(FORMATS.map((one) => [one.key, one] as const))('%s is complete', (_, { label, mediaType, mostRows }) => {
  expect(label).not.toBe('')
  expect(mediaType).toMatch(/^(?:text|application)\/[a-z.+-]+(?:; [a-z]+=[a-z0-9-]+)*$/)
  expect(mostRows).toBeGreaterThanOrEqual(2)
  expect(mostRows).toBeLessThanOrEqual(MOST_ROWS)
})
