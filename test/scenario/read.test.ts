import { describe, expect, test } from 'vitest'
import { readScenario } from '../../lib/scenario/read'
import { opened, refused } from './helpers'

describe('what a good code means', () => {
  test('defaults', () => {
    expect(opened('matter:0.3')).toEqual({
      h0: 67.66,
      matter: 0.3,
      baryons: 0.02242,
      closure: { given: 'curvature', value: 0 },
      radiation: { kind: 'thermal', cmb: 2.7255, nu: 3.044, masses: [0.06] },
      eos: 'lambda',
      law: {},
      beyond: 'follow',
      name: null,
    })
  })
  test('every key', () => {
    const text =
      'masses:0.1_0_0.05,nu:3.1,cmb:2.7,dark:0.6,baryons:0.02,eos:cpl,wa:0.2,w0:-0.9,beyond:hold,h0:70,as:A, b:c%'
    expect(opened(text)).toEqual({
      h0: 70,
      matter: 0.3111,
      baryons: 0.02,
      closure: { given: 'dark', value: 0.6 },
      radiation: { kind: 'thermal', cmb: 2.7, nu: 3.1, masses: [0.05, 0.1] },
      eos: 'cpl',
      law: { w0: -0.9, wa: 0.2 },
      beyond: 'hold',
      name: 'A, b:c%',
    })
  })
  test('radiation of the three kinds', () => {
    expect(opened('cmb:0').radiation).toEqual({ kind: 'none' })
    expect(opened('radiation:0.01').radiation).toEqual({ kind: 'given', density: 0.01 })
    expect(opened('masses:0').radiation).toEqual({ kind: 'thermal', cmb: 2.7255, nu: 3.044, masses: [] })
  })
  test('a negative zero is zero', () => {
    expect(Object.is(opened('curvature:-0').closure.value, 0)).toBe(true)
    expect(Object.is(opened('eos:cpl,wa:-0.0').law.wa, 0)).toBe(true)
  })
  test('a number is the nearest double', () => {
    expect(opened('matter:0.1000000000000000055511151231257827').matter).toBe(0.1)
    expect(opened('matter:1e-400,masses:0').matter).toBe(0)
  })
  test.each([
    'x',
    'Ω_m = 0.3',
    'ένα',
    'שלום',
    '👩‍🔬',
    '한국어',
    'été',
    "it's (really) 100% *new*!",
    ' ',
    'as:as',
    'a'.repeat(60),
    '😀'.repeat(60),
  ])('the name %s', (name) => expect(opened(`as:${name}`).name).toBe(name.normalize('NFC')))
})

/** Code, and the keys at fault in the order reported. */
const BAD: readonly (readonly [string, ...string[]])[] = [
  ['', 's'],
  [',', 's', 's'],
  ['matter:0.3,', 's'],
  [',matter:0.3', 's'],
  ['matter:0.3,,h0:70', 's'],
  [':0.3', 's'],
  [':', 's'],
  ['matter', 'matter'],
  ['matter:', 'matter'],
  ['matter=0.3', 's'],
  ['matter:0,3', 's'],
  ['matter;0.3', 's'],
  ['nonsense', 's'],
  ['{"matter":0.3}', '{"matter"'],
  // numbers
  ...[
    'NaN',
    'nan',
    'Infinity',
    '-Infinity',
    '0x1f',
    '0b1',
    '0o7',
    '1_000',
    '1,000'.replace(',', '٬'),
    '٣',
    '０.３',
    '½',
  ].map((text) => [`matter:${text}`, 'matter'] as const),
  ...[
    ' 0.3',
    '0.3 ',
    '0 .3',
    '\t0.3',
    '0.3\n',
    '1e 2',
    ' 1',
    '−1',
    '--1',
    '+-1',
    '1e',
    'e1',
    '.',
    '-',
    '+',
    '1.2.3',
  ].map((text) => [`matter:${text}`, 'matter'] as const),
  ...['1e1.5', '1f', '0.3d0', '1n', 'true', 'null', '0.3:0.4', '30%', '1/3', '1e999', '-1e999'].map(
    (text) => [`matter:${text}`, 'matter'] as const,
  ),
  [`matter:${'9'.repeat(400)}`, 'matter'],
  // limits
  ['h0:0.999', 'h0'],
  ['h0:0', 'h0'],
  ['h0:1000.0001', 'h0'],
  ['matter:-0.001', 'matter'],
  ['matter:10000.1', 'matter'],
  ['baryons:0.0009', 'baryons'],
  ['baryons:0.11', 'baryons'],
  ['curvature:-100.1', 'curvature'],
  ['curvature:101', 'curvature'],
  ['dark:-101', 'dark'],
  ['dark:100.5', 'dark'],
  ['cmb:-1', 'cmb'],
  ['cmb:100.1', 'cmb'],
  ['nu:-0.1', 'nu'],
  ['nu:20.1', 'nu'],
  ['masses:-0.1', 'masses'],
  ['masses:10.1', 'masses'],
  ['masses:0.1_0.2_0.3_0.4', 'masses'],
  ['masses:', 'masses'],
  ['masses:_', 'masses'],
  ['masses:0.1_', 'masses'],
  ['masses:0.1__0.2', 'masses'],
  ['masses:0.1_x', 'masses'],
  ['radiation:-1', 'radiation'],
  ['radiation:10001', 'radiation'],
  ['eos:constant,w:-20.5', 'w'],
  ['eos:constant,w:21', 'w'],
  ['eos:cpl,w0:-21', 'w0'],
  ['eos:cpl,wa:21', 'wa'],
  // words
  ['eos:', 'eos'],
  ['eos:Lambda', 'eos'],
  ['eos:phantom', 'eos'],
  ['eos:__proto__', 'eos'],
  ['eos:constructor', 'eos'],
  ['beyond:', 'beyond'],
  ['beyond:Hold', 'beyond'],
  ['beyond:stop', 'beyond'],
  // keys
  ['omega:0.3', 'omega'],
  ['H0:70', 'H0'],
  [' h0:70', ' h0'],
  ['h0 :70', 'h0 '],
  ['v:2', 'v'],
  ['s:1', 's'],
  ['As:x', 'As'],
  ...['__proto__', 'constructor', 'prototype', 'toString', 'hasOwnProperty', 'valueOf', '__defineGetter__'].map(
    (key) => [`${key}:1`, key] as const,
  ),
  ['__proto__:1,__proto__:2', '__proto__', '__proto__'],
  ['h0:70,h0:70', 'h0'],
  ['h0:70,h0:71,h0:72', 'h0', 'h0'],
  ['eos:cpl,eos:cpl', 'eos'],
  // keys of another law
  ['w:-1', 'w'],
  ['w0:-1', 'w0'],
  ['eos:lambda,w:-1', 'w'],
  ['eos:constant,w0:-1,wa:0', 'w0', 'wa'],
  ['eos:cpl,w:-1', 'w'],
  // a wrong law: its keys are not held against the code, an unknown key is
  ['eos:clp,w0:-1,wa:0', 'eos'],
  ['eos:clp,w0:-1,vw:0', 'eos', 'vw'],
  // conflicts
  ['curvature:0,dark:0.7', 'dark'],
  ['dark:0.7,curvature:0', 'dark'],
  ['radiation:0.0001,cmb:2.7', 'radiation'],
  ['nu:3,radiation:0.0001', 'radiation'],
  ['masses:0,radiation:0.0001', 'radiation'],
  ['radiation:0.0001,cmb:0', 'radiation'],
  ['radiation:0,cmb:2.7,nu:3,masses:0', 'radiation'],
  ['cmb:0,nu:3.044', 'nu'],
  ['cmb:0,masses:0', 'masses'],
  ['masses:0.06,cmb:0.0,nu:3', 'nu', 'masses'],
  // massive neutrinos outweigh matter
  ['matter:0', 'matter'],
  ['matter:0.001', 'matter'],
  ['matter:0.1,masses:5_5_5', 'matter'],
  ['masses:10_10_10', 'masses'],
  ['h0:1', 'matter'],
  ['cmb:100', 'matter'],
  // names
  ['as:', 'as'],
  [`as:${'a'.repeat(61)}`, 'as'],
  [`as:${'😀'.repeat(61)}`, 'as'],
  ['as:cafe\u0301', 'as'],
  ['as:\u2126', 'as'],
  ['as:\ufb1d', 'as'],
  ['as:a\u0000b', 'as'],
  ['as:a\nb', 'as'],
  ['as:a\u007fb', 'as'],
  ['as:a\u0085b', 'as'],
  ['as:a\u202eb', 'as'],
  ['as:a\u202ab', 'as'],
  ['as:a\u2066b', 'as'],
  ['as:a\u2069b', 'as'],
  ['as:\ud800', 'as'],
  ['as:x\udc00y', 'as'],
  // all at once
  [
    'h0:0,matter:x,curvature:0,dark:200,eos:nothing,beyond:no,foo:1,as:',
    'h0',
    'matter',
    'dark',
    'dark',
    'foo',
    'eos',
    'beyond',
    'as',
  ],
]

describe('what a bad code is refused for', () => {
  test.each(BAD)('%j', (text, ...keys) => {
    const problems = refused(text)
    expect(problems.map((one) => one.parameter).toSorted()).toEqual([...keys].toSorted())
    for (const one of problems) {
      expect(one.allowed).not.toBe('')
      expect(one.message).toMatch(/\.$/)
      expect(one.scenario).toBe(0)
    }
  })
  test('a problem says what was given and what is allowed', () => {
    expect(refused('matter:0.3,h0:0.5')).toEqual([
      {
        parameter: 'h0',
        scenario: 0,
        value: '0.5',
        allowed: 'a number from 1 to 1000 km s⁻¹ Mpc⁻¹',
        message: 'h0 is outside its limits.',
      },
    ])
  })
  test('the index is passed on', () => {
    const reading = readScenario('h0:0', 4)
    expect(!reading.ok && reading.problems[0].scenario).toBe(4)
    const alone = readScenario('h0:0', null)
    expect(!alone.ok && alone.problems[0].scenario).toBe(null)
  })
  test('hints', () => {
    expect(refused('matter:1e 2')[0].message).toContain('%2B')
    expect(refused('matter:0,3')[0].message).toContain('point')
    expect(refused('matter:0')[0].message).toMatch(/masses:0.*cmb:0/)
    expect(refused('eos:lambda,w0:-1')[0].allowed).toBe('only with eos:cpl or eos:jbp or eos:ba or eos:log')
  })
  test('an answer stays small whatever is sent', () => {
    const long = refused(`h0:${'7'.repeat(20000)}`)
    expect(JSON.stringify(long).length).toBeLessThan(1000)
    const many = refused('x:1,'.repeat(5000))
    expect(many.length).toBe(50)
  })
  test('the time to refuse grows no faster than the text', () => {
    // A quadratic pattern would need minutes for these; the bound is loose for a slow machine.
    const start = performance.now()
    for (const unit of ['9', '1e', '_', ',', ':', '0.', ' ']) readScenario(`h0:${unit.repeat(200000)}x`, 0)
    expect(performance.now() - start).toBeLessThan(5000)
  })
})
