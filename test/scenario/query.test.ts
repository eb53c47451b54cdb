import { expect, test } from 'vitest'
import { DEMO } from '../../lib/scenario/demo'
import { readQuery } from '../../lib/scenario/query'
import type { Reading } from '../../lib/scenario/scenario'
import { linkQuery, writeScenario } from '../../lib/scenario/write'
import { opened } from './helpers'

const problemsOf = (reading: Reading<unknown>) => (reading.ok ? [] : reading.problems)
const six = ['h0:60', 'h0:61', 'h0:62', 'h0:63', 'h0:64', 'h0:65']

test('none is the demo', () => {
  expect(readQuery([])).toEqual(readQuery(DEMO.codes))
})

test('six scenarios are read in their order', () => {
  const reading = readQuery(six)
  expect(reading.ok && reading.value.map((one) => one.h0)).toEqual([60, 61, 62, 63, 64, 65])
})

test('a seventh is an error, whatever it says', () => {
  for (const seventh of ['h0:66', 'nonsense', '']) {
    const problems = problemsOf(readQuery([...six, seventh, 'h0:1e9']))
    expect(problems.map((one) => [one.parameter, one.scenario])).toEqual([['s', 6]])
  }
})

test('an empty one is an error', () => {
  expect(problemsOf(readQuery([''])).map((one) => [one.parameter, one.scenario])).toEqual([['s', 0]])
})

test('each problem knows its scenario', () => {
  const problems = problemsOf(readQuery(['h0:0', 'h0:70', 'matter:x,foo:1']))
  expect(problems.map((one) => [one.parameter, one.scenario])).toEqual([
    ['h0', 0],
    ['matter', 2],
    ['foo', 2],
  ])
})

test('a link opens what was linked', () => {
  const scenarios = ['matter:0.3,as:A & B = 1+1, 100% ünïcode ?#/\\', 'eos:cpl,wa:1e-9'].map((text) => opened(text))
  const url = new URL(`http://localhost/?${linkQuery(scenarios)}`)
  expect(readQuery(url.searchParams.getAll('s'))).toEqual({ ok: true, value: scenarios })
})

test('the demo is written as its canonical codes', () => {
  for (const code of DEMO.codes) {
    const scenario = opened(code)
    expect(decodeURIComponent(writeScenario(scenario))).toBe(code)
    expect(scenario.name).not.toBe(null)
  }
})
