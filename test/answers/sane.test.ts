import { expect, test } from 'vitest'
import { isSane } from '../../lib/answers/sane'
import { readScenario } from '../../lib/scenario/read'
import { type Solution, solve } from '../../lib/solve'

function solution(code: string): Solution {
  const reading = readScenario(code, null)
  if (!reading.ok) throw new Error(code)
  return solve(reading.value)
}

const good = solution('h0:70')

test.each(['h0:70', 'h0:70,dark:-0.1', 'matter:0.1,dark:2,cmb:0', 'matter:0,cmb:0', 'eos:constant,w:-1.5'])(
  '%s',
  (code) => expect(isSane(solution(code))).toBe(true),
)
test('a number that is none, or a time on the wrong side of today, is seen', () => {
  expect(isSane({ ...good, origin: { ...good.origin, time: Number.NaN } })).toBe(false)
  expect(isSane({ ...good, origin: { ...good.origin, time: 1 } })).toBe(false)
  expect(isSane({ ...good, end: { ...good.end, time: -1 } })).toBe(false)
  expect(isSane({ ...good, end: { ...good.end, time: 1, turnaround: { time: 2, scale: 3 } } })).toBe(false)
  expect(isSane({ ...good, end: { ...good.end, scale: Number.POSITIVE_INFINITY } })).toBe(false)
  const age = { value: 13, unit: 'Gyr', error: Number.NaN, because: null }
  expect(isSane({ ...good, measures: { ...good.measures, age } })).toBe(false)
  expect(isSane({ ...good, moments: [{ ...good.moments[0], redshift: Number.POSITIVE_INFINITY }] })).toBe(false)
})
