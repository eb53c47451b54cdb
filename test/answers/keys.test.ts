import { expect, test } from 'vitest'
import { readKeys } from '../../lib/answers/keys'

const keys = (query: string) => readKeys(new URLSearchParams(query), ['z', 'columns'])

test('every s in order, the others once', () => {
  const { codes, values, faults } = keys('s=b&z=1&s=a&columns=age')
  expect(codes).toEqual(['b', 'a'])
  expect([...values]).toEqual([
    ['z', '1'],
    ['columns', 'age'],
  ])
  expect(faults).toEqual([])
})
test.each(['foo', '', 'Z', 'constructor', '__proto__', 'toString', 's[]', 's\0'])('%j is unknown', (key) => {
  const { values, faults } = readKeys([[key, '1']], ['z'])
  expect(values.size).toBe(0)
  expect(faults).toEqual([
    { parameter: key, value: '1', allowed: 'one of s (up to 6 times), z', message: 'There is no such parameter.' },
  ])
})
test('a key that stands twice is refused, with its second value', () => {
  expect(keys('z=1&z=2').faults).toEqual([
    { parameter: 'z', value: '2', allowed: 'once', message: 'z stands more than once.' },
  ])
})
