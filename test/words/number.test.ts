import { describe, expect, it } from 'vitest'
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
    expect([fromNow(53.28), fromNow(-13.789), fromNow(0)]).toEqual(['+53.28 Gyr', '−13.79 Gyr', '0.00 Gyr'])
    expect(signed('0')).toBe('0')
  })

  it.each([
    [13.789, '13.79 Gyr'],
    [0.11, '0.11 Gyr'],
    [0.06, '60.0 Myr'],
    [0.000371, '371 kyr'],
    [1e-9 / 365.25, '1.00 days'],
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
  it('carry redshift behind and scale factor ahead', () => {
    expect(momentWords(moment('acceleration-start', -6.1, 0.615))).toMatchObject({ when: '−6.10 Gyr', where: 'z 0.63' })
    expect(momentWords(moment('matter-radiation-equality', -13.78, 1 / 3403))).toMatchObject({ where: 'z 3402' })
    expect(momentWords(moment('turnaround', 53.28, 2.748))).toMatchObject({ when: '+53.28 Gyr', where: 'a 2.75' })
    expect(momentWords(moment('origin', null, 0))).toMatchObject({ when: '−∞', where: '' })
    expect(momentWords(moment('end', null))).toMatchObject({ when: '+∞', where: '' })
    expect(momentWords(moment('now', 0, 1))).toMatchObject({ when: 'now', where: '' })
  })
})
