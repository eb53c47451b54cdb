import { describe, expect, test } from 'vitest'
import { budgetOf } from '../../lib/scenario/budget'
import { noticesOf } from '../../lib/scenario/notices'
import type { Scenario } from '../../lib/scenario/scenario'
import { opened } from './helpers'

const notices = (scenario: Scenario) => noticesOf(scenario, budgetOf(scenario))
const of = (text: string) => notices(opened(text))

describe('a small closing density that nobody meant', () => {
  test.each([
    // Photons 0.0000540 and two massless states 0.0000249 (budget.test.ts), with the other sign.
    ['matter:1', 'Ω_DE = −0.000079', 'h0:67.66,matter:1,cmb:0'],
    ['matter:0.3,dark:0.7', 'Ω_k = −0.000079', 'h0:67.66,matter:0.3'],
    ['matter:0.1,curvature:0.9', 'Ω_DE = −0.000079', 'h0:67.66,matter:0.1,curvature:0.9,cmb:0'],
    ['matter:1,radiation:0.0001', 'Ω_DE = −0.0001', 'h0:67.66,matter:1,cmb:0'],
    ['matter:1,masses:0,h0:100', 'Ω_DE = −0.000042', 'h0:100,matter:1,cmb:0'],
  ])('%s', (text, size, code) => {
    const found = of(text)
    expect(found).toHaveLength(1)
    expect(found[0].message).toContain(size)
    expect(found[0].code).toBe(code)
    // What is offered has no such notice.
    expect(of(decodeURIComponent(code))).toEqual([])
  })
  test.each(['matter:0.3', 'matter:0.3,dark:0.69', 'matter:1,cmb:0', 'matter:1,radiation:0.5', 'matter:1.0001'])(
    'not for %s',
    (text) => expect(of(text)).toEqual([]),
  )
  test('none at all where dark:0 was given', () => {
    expect(of('matter:1,dark:0')[0].code).toBe('h0:67.66,matter:1,cmb:0')
  })
})

describe('baryons that look like Ω_b', () => {
  test('0.049 at h = 0.6766 is Ω_b h² = 0.02243', () => {
    expect(of('baryons:0.049')).toEqual([
      {
        message: 'baryons is Ω_b h²; 0.049 looks like Ω_b, which would be Ω_b h² = 0.02243.',
        code: 'h0:67.66,matter:0.3111,baryons:0.02243',
      },
    ])
  })
  test('no code where the guess does not fit either', () => {
    expect(of('baryons:0.05,h0:5,masses:0')[0].code).toBe(null)
    expect(of('baryons:0.05,h0:100')[0].code).toBe(null)
  })
  test('not up to 0.03', () => expect(of('baryons:0.03')).toEqual([]))
})

test('a Chaplygin gas beside the usual matter', () => {
  // Built by hand, so that the notice is tested with or without the family.
  const gas = (b: number, matter: number): Scenario => ({
    ...opened(`matter:${matter}`),
    eos: 'chaplygin',
    law: { b, alpha: 0 },
  })
  expect(notices(gas(0.8, 0.3))).toHaveLength(1)
  expect(notices(gas(0.8, 0.3))[0].code).toContain('matter:0.05')
  expect(notices(gas(1, 0.3))).toEqual([])
  expect(notices(gas(0.8, 0.05))).toEqual([])
})
