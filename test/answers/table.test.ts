import { describe, expect, test } from 'vitest'
import { askTable } from '../../lib/answers/table'
import { COLUMN_KEYS } from '../../lib/quantities/column'
import { answerOf, problemsOf, questionOf } from './ask'

const ask = (pairs: URLSearchParams) => askTable(pairs, { version: '9.8.7', base: 'https://a.example' })
const text = (query: string) => [...answerOf(ask, query).pieces()].join('')
const rows = (query: string) =>
  text(query)
    .split('\r\n')
    .filter((line) => line !== '' && !line.startsWith('#'))
    .map((line) => line.split(','))
/** The cells of one column as numbers. */
const cells = (query: string) =>
  rows(query)
    .slice(1)
    .map(([cell]) => Number(cell))

describe('rows', () => {
  test('200 of them, equal steps in ln a from 0.001 to 1, all columns', () => {
    const [head, ...body] = rows('s=h0:70')
    expect(head).toEqual([...COLUMN_KEYS])
    const scales = body.map((row) => Number(row[COLUMN_KEYS.indexOf('scale')]))
    expect(scales).toHaveLength(200)
    expect([scales[0], scales[199]]).toEqual([0.001, 1])
    expect(Math.log(scales[100]) - Math.log(scales[99])).toBeCloseTo(Math.log(1000) / 199, 12)
  })
  test('both ends exactly, by each variable', () => {
    expect(cells('s=h0:70&by=logscale&from=0.1&to=0.7&rows=7&columns=scale')).toMatchObject({ 0: 0.1, 6: 0.7 })
    expect(cells('s=h0:70&by=scale&from=0.1&to=0.7&rows=7&columns=scale')).toMatchObject({ 0: 0.1, 6: 0.7 })
    expect(cells('s=h0:70&by=time&from=-3.3&to=7.1&rows=7&columns=time')).toMatchObject({ 0: -3.3, 6: 7.1 })
    expect(cells('s=h0:70&by=redshift&from=1100&to=-0.3&rows=7&columns=redshift')).toMatchObject({ 0: 1100, 6: -0.3 })
  })
  test('equal steps', () => {
    expect(cells('s=h0:70&by=redshift&to=2&rows=5&columns=redshift')).toEqual([0, 0.5, 1, 1.5, 2])
    expect(cells('s=h0:70&by=scale&rows=4&columns=scale')).toEqual([0.25, 0.5, 0.75, 1])
  })
  test('by time, from one step after the origin to now', () => {
    const ages = cells('s=h0:70&by=time&rows=5&columns=age')
    ages.forEach((age, i) => {
      expect(age / ages[4]).toBeCloseTo((i + 1) / 5, 12)
    })
  })
  test('by time, where there is no origin', () => {
    expect(cells('s=matter:0,cmb:0,h0:100&by=time&rows=4&columns=time')[0]).toBeCloseTo(-3 * 9.77792221, 6)
  })
  test('a row outside the history says where it would be, and nothing else', () => {
    expect(rows('s=h0:70&by=time&from=-50&to=0&rows=2&columns=time,age')[1]).toEqual(['-50', ''])
  })
  test('several scenarios have a first column with their codes', () => {
    const lines = text('s=h0:70,matter:0.3&s=h0:60,as:x%22y&rows=2&columns=scale').split('\r\n').slice(-6)
    expect(lines).toEqual([
      'scenario,scale',
      '"h0:70,matter:0.3",0.001',
      '"h0:70,matter:0.3",1',
      '"h0:60,matter:0.3111,as:x%22y",0.001',
      '"h0:60,matter:0.3111,as:x%22y",1',
      '',
    ])
  })
})

describe('where it comes from', () => {
  const remarks = text('s=h0:70,as:a%26b&columns=time,w&rows=3')
    .split('\r\n')
    .filter((line) => line.startsWith('# '))
  test('code, link, versions, units, citation', () => {
    expect(remarks).toEqual([
      expect.stringMatching(/^# Longhence 9\.8\.7, engine \S+$/),
      '# scenario: h0:70,matter:0.3111,as:a%26b',
      expect.stringMatching(/^# link: https:\/\/a\.example\/\?s=h0:70,matter:0\.3111,as:a%26b&engine=\d+$/),
      '# table: https://a.example/api/table?s=h0:70,matter:0.3111,as:a%26b&format=csv&by=logscale&rows=3&columns=time,w',
      '# time: time from now, Gyr',
      '# w: equation of state of dark energy',
      expect.stringMatching(/^# cite as: The Longhence authors, Longhence 9\.8\.7, engine \S+, https:\/\/a\.example\//),
    ])
  })
  test('the address of the table makes the same table', () => {
    const query = remarks[3].split('?')[1]
    expect(text(query)).toBe(text('s=h0:70,as:a%26b&columns=time,w&rows=3'))
  })
  test('a large number in that address', () => {
    const { canonical } = questionOf(ask, 's=h0:70&by=redshift&to=1e22&rows=2')
    expect(canonical).toContain('to=1e%2B22')
    expect(questionOf(ask, canonical).canonical).toBe(canonical)
  })
})

describe('the file', () => {
  test('is called by the names of the scenarios, in letters that every system takes', () => {
    expect(answerOf(ask, 's=h0:70,as:Steady%20light&format=json').fileName).toBe('longhence-steady-light.json')
    expect(answerOf(ask, 's=h0:70').fileName).toBe('longhence-table.csv')
  })
  test('JSON says the same', () => {
    const json = JSON.parse(text('s=h0:70&s=h0:60&format=json&rows=3&columns=age,modulus'))
    expect(json.scenarios.map(({ code }: { code: string }) => code)).toEqual([
      'h0:70,matter:0.3111',
      'h0:60,matter:0.3111',
    ])
    expect(json.scenarios[0].columns[0]).toEqual({ name: 'age', unit: 'Gyr', label: 'age' })
    const csv = rows('s=h0:70&rows=3&columns=age,modulus').slice(1)
    expect(json.scenarios[0].rows).toEqual(csv.map((row) => row.map((cell) => (cell === '' ? null : Number(cell)))))
  })
})

describe('what is refused', () => {
  const refusals: readonly (readonly [string, string, string, string])[] = [
    ['an unknown format', 'format=xls', 'format', 'xls'],
    ['an unknown variable', 'by=age', 'by', 'age'],
    ['one row', 'rows=1', 'rows', '1'],
    ['too many rows', 'rows=1000001', 'rows', '1000001'],
    ['half a row', 'rows=2.5', 'rows', '2.5'],
    ['rows without a number', 'rows=', 'rows', ''],
    ['rows in other words', 'rows=many', 'rows', 'many'],
    ['a = 0', 'by=scale&from=0', 'from', '0'],
    ['a negative a', 'to=-1', 'to', '-1'],
    ['z = −1', 'by=redshift&from=-1', 'from', '-1'],
    ['NaN', 'by=time&from=NaN', 'from', 'NaN'],
    ['beyond the doubles', 'by=time&to=1e999', 'to', '1e999'],
    ['no length', 'by=time&from=1&to=1', 'to', '1'],
    ['an unknown column', 'columns=size', 'columns', 'size'],
    ['an unknown key', 'z=1', 'z', '1'],
    ['a key twice', 'rows=3&rows=4', 'rows', '4'],
  ]
  test.each(refusals)('%s', (_, query, parameter, value) => {
    expect(problemsOf(ask, `s=h0:70&${query}`)).toMatchObject([{ parameter, value, scenario: null }])
  })
  test('the formats that there are stand in the problem', () => {
    expect(problemsOf(ask, 'format=xls')[0].allowed).toMatch(/^one of csv, json, votable, latex/)
  })
})

test('rows are made while they are read', () => {
  const pieces = answerOf(ask, 's=h0:70&rows=1000000').pieces()[Symbol.iterator]()
  const begin = performance.now()
  for (let i = 0; i < 40; i++) pieces.next()
  pieces.return?.()
  // All of them would take several seconds.
  expect(performance.now() - begin).toBeLessThan(500)
})
