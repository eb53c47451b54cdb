/** What is typed at the ruler, and where it stands in an address. */
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { READING_GROUPS } from '../../lib/ruler/groups'
import { EPOCH_KEYS, USUAL_READINGS } from '../../lib/ruler/keys'
import { READINGS } from '../../lib/ruler/readings'
import { rulerFormLink, rulerLink } from '../../lib/words/compose-ruler'
import { PLAIN_PLACE, placeKeys, readPlace } from '../../lib/words/place'
import { type RulerAsk, rulerAskOf, rulerPlaceOf } from '../../lib/words/ruler-ask'
import { lineOf, rulerTyped } from '../../lib/words/ruler-typed'

const USUAL = rulerAskOf(PLAIN_PLACE)
const opened = (link: string): RulerAsk => {
  const query = new URL(link, 'http://localhost').searchParams
  return rulerAskOf(readPlace((key) => query.get(key), 1))
}

describe('the address', () => {
  it('is silent about what holds anyway', () => {
    expect(placeKeys({ ...PLAIN_PLACE, ...rulerPlaceOf(USUAL) })).toEqual([])
    expect(USUAL.read).toEqual(USUAL_READINGS)
  })

  const typed = fc.stringMatching(/^[\p{L}\d.,+%&=#−-][\p{L}\d.,+%&=#− -]{0,20}[\p{L}\d]$/u)
  const ask = fc.record({
    variable: fc.constantFrom(...EPOCH_KEYS),
    at: typed,
    until: fc.oneof(fc.constant(''), typed),
    read: fc.subarray(READINGS.map(({ key }) => key)),
    length: typed,
    line: typed,
    sky: typed,
    hubble: fc.boolean(),
  })
  it('says everything else, and keeps what else it said', () => {
    fc.assert(
      fc.property(ask, (one) => {
        const link = rulerLink('/?s=h0:70,matter:0.3&focus=2&at=7&read=age&theme=night', PLAIN_PLACE, one)
        expect(opened(link)).toEqual(one)
        expect(link).toMatch(/^\/\?s=h0:70,matter:0\.3&focus=2&theme=night/)
      }),
    )
  })

  it('comes from the form with a key for each reading', () => {
    const form = new URLSearchParams('s=h0:70,matter:0.3,as:a, b&theme=night&epoch=age&at=3,5&read=age&read=volume')
    expect(rulerFormLink(form)).toBe('/?s=h0:70,matter:0.3,as:a%2C%20b&theme=night&epoch=age&at=3,5&read=age,volume')
    expect(opened(rulerFormLink(new URLSearchParams('s=h0:70&at=1')))).toMatchObject({ read: [], at: '1' })
  })
})

describe('what is typed', () => {
  it('may have a decimal comma, a true minus and a unit for the line', () => {
    const { at, given, complaints } = rulerTyped({ ...USUAL, at: '−0,5', length: '1e2', line: '158µm', sky: '14 000' })
    expect({ at, given, complaints }).toEqual({
      at: -0.5,
      given: { length: 100, line: { value: 158, unit: 'µm' }, sky: 14000 },
      complaints: {},
    })
  })
  it.each([
    ['1215.67', 1215.67, 'Å'],
    ['1215,67 Å', 1215.67, 'Å'],
    ['1.42e3 MHz', 1420, 'MHz'],
    ['21.106 cm', 21.106, 'cm'],
    ['1.3 um', 1.3, 'µm'],
  ])('%s is a line', (text, value, unit) => expect(lineOf(text)).toEqual({ value, unit }))
  it.each(['', 'Å', '-3 nm', '5 constructor', '5 parsec', '0', 'Infinity', '1e999 nm'])('%s is none', (text) =>
    expect(lineOf(text)).toBeNull(),
  )
  it.each([
    ['at', { at: '-1' }, /above −1/],
    ['at', { at: 'ten' }, /ten cannot be read here/],
    ['at', { variable: 'temperature', at: '0' }, /above 0 K/],
    ['until', { until: '-2' }, /above −1/],
    ['sky', { sky: '50000' }, /whole sky/],
    ['length', { length: '0' }, /above 0 Mpc/],
    ['line', { line: '5 pc' }, /MHz/],
  ] as const)('%s is refused beside its field: %o', (field, change, message) => {
    const { complaints } = rulerTyped({ ...USUAL, ...change } as RulerAsk)
    expect(Object.keys(complaints)).toEqual([field])
    expect(complaints[field]).toMatch(message)
  })
})

it('every reading stands in one group, and the usual ones in their order', () => {
  const grouped = READING_GROUPS.flatMap(({ keys }) => keys)
  expect(grouped.toSorted()).toEqual(READINGS.map(({ key }) => key).toSorted())
  expect(grouped.filter((key) => (USUAL_READINGS as readonly string[]).includes(key))).toEqual(USUAL_READINGS)
})
