/** Places as addresses name them. */
import { describe, expect, it } from 'vitest'
import { readPlace } from '../../lib/words/place'

const read = (keys: Readonly<Record<string, string>>) => readPlace((key) => keys[key], 1)

describe.each([
  ['from', 'to'],
  ['left', 'right'],
] as const)('%s and %s', (low, high) => {
  it('are one range from whichever end it is given', () => {
    expect(read({ [low]: '5', [high]: '-3' })).toMatchObject({ [low]: -3, [high]: 5 })
    expect(read({ [low]: '-3', [high]: '5' })).toMatchObject({ [low]: -3, [high]: 5 })
  })
  it('stay as they are where only one is given', () => {
    expect(read({ [low]: '5' })).toMatchObject({ [low]: 5, [high]: null })
    expect(read({ [high]: '-5' })).toMatchObject({ [low]: null, [high]: -5 })
  })
})
