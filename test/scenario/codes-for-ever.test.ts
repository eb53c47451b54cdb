import { createHash } from 'node:crypto'
import { readFileSync } from 'node:fs'
import { describe, expect, test } from 'vitest'
import { readScenario } from '../../lib/scenario/read'
import { writeScenario } from '../../lib/scenario/write'
import { decoded, opened } from './helpers'

const text = readFileSync(new URL('./codes-for-ever.txt', import.meta.url), 'utf8')
const lines = text.trimEnd().split('\n')
const codes = lines.filter((line) => !line.startsWith('#')).map((line) => line.split(' '))

/** SHA-256 of the lines up to the given one: what has been promised cannot be edited, only added to. */
const PROMISED = { lines: 75, digest: 'a927c02df11dfe79bed349d5cc8a1ec57c6f7e3f373f5bbdedf111e4180a2913' }

test('no line has changed', () => {
  const promised = lines.slice(0, PROMISED.lines).join('\n')
  expect(createHash('sha256').update(promised).digest('hex')).toBe(PROMISED.digest)
})

describe.each(codes)('%s', (code, canonical) => {
  test('opens with its meaning', () => {
    expect(writeScenario(opened(decoded(code)))).toBe(canonical)
  })
  test('its canonical form is its own and means the same', () => {
    expect(writeScenario(opened(decoded(canonical)))).toBe(canonical)
    expect(readScenario(decoded(canonical), 0)).toEqual(readScenario(decoded(code), 0))
  })
})
