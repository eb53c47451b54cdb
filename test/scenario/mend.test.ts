import { describe, expect, test } from 'vitest'
import { mendQuery, mendScenario } from '../../lib/scenario/mend'

describe('the nearest good reading', () => {
  test.each([
    ['h0:0.5,matter:0.3', 'h0:1,matter:0.3,masses:0'],
    ['h0:20000', 'h0:1000,matter:0.3111'],
    ['matter:-1,cmb:0', 'h0:67.66,matter:0,cmb:0'],
    ['matter:1e999', 'h0:67.66,matter:10000'],
    ['matter:0.3,foo:1,h0:70', 'h0:70,matter:0.3'],
    ['__proto__:1,h0:70', 'h0:70,matter:0.3111'],
    ['matter:0,3,h0:70,5', 'h0:70.5,matter:0.3'],
    ['h0:70,matter:.3,5', 'h0:70,matter:0.3'],
    ['masses:0,05_0,1,h0:70', 'h0:70,matter:0.3111,masses:0.05_0.1'],
    ['eos:constant,w:-0,9', 'h0:67.66,matter:0.3111,eos:constant,w:-0.9'],
    ['matter=0.3;h0=70', 'h0:70,matter:0.3'],
    ['?s=matter:0.3,h0:70', 'h0:70,matter:0.3'],
    ['matter%3A0.3%2Ch0%3A70', 'h0:70,matter:0.3'],
    [' Matter : 0.3 , H0:70,', 'h0:70,matter:0.3'],
    ['eos:Constant,w:−1.2', 'h0:67.66,matter:0.3111,eos:constant,w:-1.2'],
    ['matter:1e 00', 'h0:67.66,matter:1'],
    ['h0:70,h0:80', 'h0:70,matter:0.3111'],
    ['curvature:0.1,dark:0.7', 'h0:67.66,matter:0.3111,curvature:0.1'],
    ['dark:0.7,curvature:0.1', 'h0:67.66,matter:0.3111,dark:0.7'],
    ['nu:3,radiation:0.001', 'h0:67.66,matter:0.3111,nu:3'],
    ['radiation:0.001,nu:3,masses:0', 'h0:67.66,matter:0.3111,radiation:0.001'],
    ['cmb:0,nu:3', 'h0:67.66,matter:0.3111,cmb:0'],
    ['masses:0.1,cmb:0', 'h0:67.66,matter:0.3111,masses:0.1'],
    ['matter:0', 'h0:67.66,matter:0,masses:0'],
    ['masses:10_10_10', 'h0:67.66,matter:0.3111,masses:0'],
    ['masses:0.1_x_0.05_0.2_0.3', 'h0:67.66,matter:0.3111,masses:0.05_0.1_0.2'],
    ['w0:-0.9,wa:0.1', 'h0:67.66,matter:0.3111,eos:cpl,w0:-0.9,wa:0.1'],
    ['eos:phantom,w:-1.2', 'h0:67.66,matter:0.3111,eos:constant,w:-1.2'],
    ['eos:lambda,w:-1.2', 'h0:67.66,matter:0.3111'],
    ['eos:nothing,h0:70', 'h0:70,matter:0.3111'],
    ['beyond:HOLD', 'h0:67.66,matter:0.3111,beyond:hold'],
    ['h0:x,as:Kept, as is', 'h0:67.66,matter:0.3111,as:Kept%2C%20as%20is'],
    ['as:cafe\u0301', 'h0:67.66,matter:0.3111,as:caf%C3%A9'],
    [`as:a\u202eb${'c'.repeat(80)}`, `h0:67.66,matter:0.3111,as:ab${'c'.repeat(58)}`],
  ])('%j', (text, code) => {
    const mended = mendScenario(text)
    expect(mended?.code).toBe(code)
    expect(mended?.changes.length).toBeGreaterThan(0)
    for (const change of mended?.changes ?? []) expect(change).toMatch(/\.$/)
  })
  test('a good code is left alone', () => {
    expect(mendScenario('matter:0.3')).toMatchObject({ code: 'h0:67.66,matter:0.3', changes: [] })
  })
  test.each(['', ',', 'garbage', 'foo:1', 'h0:x', 'matter:', '\ud800', '%', '%E0%A4%A:1', 'as:', '0,3'])(
    'nothing to save in %j',
    (text) => expect(mendScenario(text)).toBe(null),
  )
  test('says what it changed', () => {
    expect(mendScenario('h0:2000,matter:0,3')?.changes).toEqual([
      'The decimal comma is read as a point: matter:0.3.',
      'h0:2000 is read as 1000.',
    ])
  })
})

test('of several, those that can be saved, at most six', () => {
  expect(mendQuery(['h0:2000', 'garbage', 'h0:70'])?.map((one) => one.scenario.h0)).toEqual([1000, 70])
  expect(mendQuery(Array.from({ length: 9 }, () => 'h0:70'))?.length).toBe(6)
  expect(mendQuery(['', 'x'])).toBe(null)
})
