/** A family that exists nowhere but here: reader, writer and mender must take any without change. */
import { describe, expect, test } from 'vitest'
import { FAMILIES } from '../../lib/dark-energy'
import { lambda } from '../../lib/dark-energy/lambda'
import type { Family } from '../../lib/dark-energy/law'
import type { NumberParameter } from '../../lib/parameter'
import { mendScenario } from '../../lib/scenario/mend'
import { OWN_KEYS } from '../../lib/scenario/parameters'
import { readQuery } from '../../lib/scenario/query'
import { writeScenario } from '../../lib/scenario/write'
import { decoded, opened, refused } from './helpers'

const described = { symbol: 'x', label: 'made up', unit: '', meaning: 'Made up.' }
const amount = { ...described, kind: 'number', slider: { min: 0, max: 1, step: 0.1 } } as const
const steep: NumberParameter = { ...amount, key: 'steep', min: -20, max: 20, fallback: 1 }

const madeUp: Family = {
  ...lambda,
  key: 'madeup',
  parameters: [
    {
      ...described,
      kind: 'choice',
      key: 'shape',
      fallback: 'round',
      choices: ['round', 'square', 'jagged'].map((value) => ({ value, label: value })),
    },
    { ...steep, only: { key: 'shape', values: ['round', 'square'] } },
    // The same key with other limits beside another word.
    { ...steep, min: 0, above: true, only: { key: 'shape', values: ['jagged'] } },
    { ...amount, key: 'size', min: 0.01, max: 1e22, fallback: 1, only: { key: 'shape', values: ['square'] } },
    {
      ...described,
      kind: 'list',
      key: 'at',
      min: 1e-6,
      max: 1e6,
      fallback: null,
      least: 2,
      most: 12,
      ascending: true,
    },
    {
      ...described,
      kind: 'list',
      key: 'height',
      min: -20,
      max: 20,
      fallback: [0, 1],
      least: 2,
      most: 12,
      ascending: false,
    },
  ],
  conflict: ({ at, height }) =>
    Array.isArray(at) && Array.isArray(height) && at.length === height.length
      ? null
      : { key: 'height', allowed: 'as many numbers as `at`' },
}
const families = [...FAMILIES, madeUp]
const keysAtFault = (text: string) => refused(text, families).map((one) => one.parameter)
const canonical = (text: string) => writeScenario(opened(text, families), families)

describe('a new family', () => {
  test('defaults are filled in, keys of other words left out', () => {
    expect(opened('eos:madeup,at:0.5_1', families).law).toEqual({
      shape: 'round',
      steep: 1,
      at: [0.5, 1],
      height: [0, 1],
    })
    expect(opened('at:0.5_1,size:2,shape:square,eos:madeup', families).law).toMatchObject({ shape: 'square', size: 2 })
  })
  test.each([
    ['eos:madeup,at:0.5_1', 'h0:67.66,matter:0.3111,eos:madeup,at:0.5_1'],
    ['height:0_1,at:5e-1_1.0,shape:round,eos:madeup,steep:1', 'h0:67.66,matter:0.3111,eos:madeup,at:0.5_1'],
    [
      'height:1_0_-0,at:1e-6_1_1e6,steep:0.5,shape:jagged,eos:madeup,beyond:hold',
      'h0:67.66,matter:0.3111,eos:madeup,shape:jagged,steep:0.5,at:0.000001_1_1000000,height:1_0_0,beyond:hold',
    ],
    // String(1e21) has a plus sign, which must survive the address.
    ['eos:madeup,shape:square,size:1e21,at:1_2', 'h0:67.66,matter:0.3111,eos:madeup,shape:square,size:1e%2B21,at:1_2'],
  ])('%s', (text, code) => {
    expect(canonical(text)).toBe(code)
    expect(opened(decoded(code), families)).toEqual(opened(text, families))
  })
  test.each([
    ['eos:madeup', 'at'],
    ['eos:madeup,at:1', 'at'],
    ['eos:madeup,at:2_1', 'at'],
    ['eos:madeup,at:1_1', 'at'],
    ['eos:madeup,at:1_2e6', 'at'],
    ['eos:madeup,at:1_2_3', 'height'],
    ['eos:madeup,at:1_2_3,height:1_2', 'height'],
    [`eos:madeup,at:${Array.from({ length: 13 }, (_, i) => i + 1).join('_')}`, 'at'],
    ['eos:madeup,at:1_2,size:2', 'size'],
    ['eos:madeup,at:1_2,shape:jagged,size:2', 'size'],
    ['eos:madeup,at:1_2,shape:jagged,steep:0', 'steep'],
    ['eos:madeup,at:1_2,shape:jagged,steep:-1', 'steep'],
    ['eos:madeup,at:1_2,shape:oval,size:2', 'shape'],
    ['eos:madeup,at:1_2,w:-1', 'w'],
    ['eos:cpl,shape:round', 'shape'],
    ['at:1_2', 'at'],
  ])('%s is refused for %s', (text, key) => expect(keysAtFault(text)).toEqual([key]))
  test('a key says which word it belongs to', () => {
    expect(refused('eos:madeup,at:1_2,size:2', families)[0].allowed).toBe('only with shape:square')
    expect(refused('eos:madeup,at:1_2_3', families)[0]).toMatchObject({ value: '', allowed: 'as many numbers as `at`' })
  })
  test('it goes through the query and the mender', () => {
    expect(readQuery(['eos:madeup,at:1_2'], families).ok).toBe(true)
    const mended = mendScenario('eos:MadeUp,at:1_2,shape:jagged,steep:-3,size:4', families)
    expect(mended?.code).toBe('h0:67.66,matter:0.3111,eos:madeup,shape:jagged,at:1_2')
    expect(mendScenario('eos:madeup,h0:70', families)?.code).toBe('h0:70,matter:0.3111')
  })
})

describe.each(FAMILIES)('the family $key', ({ parameters }) => {
  test('has no key of the scenario', () => {
    for (const { key } of parameters) expect(OWN_KEYS.has(key)).toBe(false)
  })
  test('names a choice before the keys that it rules', () => {
    parameters.forEach(({ only }, i) => {
      if (only) expect(parameters.slice(0, i).some((one) => one.key === only.key && one.kind === 'choice')).toBe(true)
    })
  })
})
