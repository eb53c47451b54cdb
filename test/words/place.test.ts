/** Places as addresses name them. */
import { describe, expect, it } from 'vitest'
import { PLACE_KEYS, PLAIN_PLACE, type Place, placePairs, readPlace } from '../../lib/words/place'

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

/** Everything that a place may say at once, with numbers that are not written as plain decimals of few digits. */
const FULL: Place = {
  ...PLAIN_PLACE,
  focus: 2,
  theme: 'night',
  view: 'reach',
  show: 'own',
  by: 'time',
  compare: 'ratio',
  galaxy: 5e-7,
  time: 'log',
  from: -5e-7,
  to: 1e6,
  left: -0.1234567890123456,
  right: 1.5e-300,
  epoch: 'z',
  at: '1,5',
  until: '2',
  read: 'age,H',
  length: '10 kpc',
  line: 'Hα',
  sky: '100',
  units: 'h',
}

it('says as an address what it says when it is read', () => {
  const written = placePairs(FULL)
  expect(written.map(([key]) => key)).toEqual(PLACE_KEYS)
  expect(readPlace((key) => new Map(written).get(key), 3)).toEqual(FULL)
})

it.each(['1e7', '-1000001', '1e999', 'NaN', '0x10', '', ' 5', '١'])('no end of a range: %j', (text) => {
  expect(read({ from: text, galaxy: text })).toMatchObject({ from: null, galaxy: null })
})
