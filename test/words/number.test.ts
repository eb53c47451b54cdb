import { describe, expect, it } from 'vitest'
import type { Moment } from '../../lib/solve'
import { momentWords } from '../../lib/words/moments'
import { fixed, signed, significant } from '../../lib/words/number'
import { runsOf } from '../../lib/words/symbol'
import { duration, fromNow } from '../../lib/words/time'
import { moment } from './told'

describe('numbers', () => {
  it.each([
    [13.7871, '13.79'],
    [-0.004, '0.00'],
    [-13.789, '−13.79'],
    [12345.678, '12\u202f345.68'],
    [1234.5, '1234.50'],
    [2.5e9, '2.50\u202f×\u202f10⁹'],
  ])('%d to two decimals is %s', (value, text) => expect(fixed(value, 2)).toBe(text))

  it.each([
    [16.58, '16.6'],
    [9.999, '10.0'],
    [123456, '123\u202f000'],
    [0, '0'],
    [-0.5289, '−0.529'],
    [0.0000123, '1.23\u202f×\u202f10⁻⁵'],
    [3402.3, '3400'],
  ])('%d to three digits is %s', (value, text) => expect(significant(value, 3)).toBe(text))

  it('bears a sign where it is a time from now', () => {
    expect([fromNow(53.28), fromNow(-13.789), fromNow(0)]).toEqual([
      '+53.28\u00a0Gyr',
      '−13.79\u00a0Gyr',
      '0.00\u00a0Gyr',
    ])
    expect(signed('0')).toBe('0')
    // A time so near that a hundredth of a Gyr says nothing of it.
    expect([fromNow(0.00321), fromNow(-0.0004), fromNow(0.1)]).toEqual([
      '+3.21\u00a0Myr',
      '−400\u00a0kyr',
      '+0.10\u00a0Gyr',
    ])
  })

  it.each([
    [13.789, '13.79\u00a0Gyr'],
    [0.11, '110\u00a0Myr'],
    [0.06, '60.0\u00a0Myr'],
    [0.000371, '371\u00a0kyr'],
    [1e-9 / 365.25, '1.00\u00a0days'],
  ])('%d Gyr is %s', (gyr, text) => expect(duration(gyr)).toBe(text))
})

describe('symbols', () => {
  it.each([
    [
      'Ω_m',
      [
        ['plain', 'Ω'],
        ['sub', 'm'],
      ],
    ],
    [
      'w_0 + w_a (1 − a)',
      [
        ['plain', 'w'],
        ['sub', '0'],
        ['plain', ' + w'],
        ['sub', 'a'],
        ['plain', ' (1 − a)'],
      ],
    ],
    [
      'a^{−3(1+w)}',
      [
        ['plain', 'a'],
        ['sup', '−3(1+w)'],
      ],
    ],
    [
      'Ω_b h²',
      [
        ['plain', 'Ω'],
        ['sub', 'b'],
        ['plain', ' h²'],
      ],
    ],
  ])('%s', (markup, runs) => expect(runsOf(markup).map(({ kind, text }) => [kind, text])).toEqual(runs))
})

describe('moments', () => {
  const rows = (...moments: Moment[]) => momentWords({ moments })

  it('carry redshift behind and scale factor ahead', () => {
    expect(rows(moment('acceleration-start', -6.1, 0.615))).toMatchObject([{ when: '−6.10\u00a0Gyr', where: 'z 0.63' }])
    expect(rows(moment('turnaround', 33.28, 2.748))).toMatchObject([{ when: '+33.28\u00a0Gyr', where: 'a 2.75' }])
    expect(rows(moment('origin', null, 0))).toMatchObject([{ when: '−∞', where: '' }])
    expect(rows(moment('end', null))).toMatchObject([{ when: '+∞', where: '' }])
    expect(rows(moment('now', 0, 1))).toMatchObject([{ when: 'now', label: 'today', where: '' }])
  })

  it('tell how close to the origin or the end they are', () => {
    expect(rows(moment('recombination', -13.789 + 3.7e-4, 1 / 1091))).toMatchObject([
      { label: 'recombination, after 370\u00a0kyr', where: 'z 1090' },
    ])
    expect(rows(moment('unbinding-galaxy', 39.94, 100, 40))).toMatchObject([
      { label: 'unbinding-galaxy, 60.0\u00a0Myr before' },
    ])
  })
})
