import { expect, test } from 'vitest'
import { askAt } from '../../lib/answers/at'
import { askTable } from '../../lib/answers/table'
import { COLUMN_KEYS } from '../../lib/quantities/column'
import { answerOf, problemsOf, questionOf } from './ask'

const askAtHome = (pairs: URLSearchParams) => askTable(pairs, { version: '9.8.7', base: '' })
const at = (query: string) => answerOf(askAt, query).scenarios[0]

test('bounds=1 puts the error bound of each column behind it', () => {
  const { columns, rows } = at('s=h0:70&z=0.5&columns=age,w&bounds=1')
  expect(columns.map(({ name, unit }) => [name, unit])).toEqual([
    ['age', 'Gyr'],
    ['ageError', 'Gyr'],
    ['w', ''],
    ['wError', ''],
  ])
  const [age, error] = rows[0]
  expect(error).toBeGreaterThan(0)
  expect(error).toBeLessThan(1e-12 * Number(age))
})

test('without it, or with bounds=0, the columns are those that were asked for', () => {
  for (const flag of ['', '&bounds=0']) {
    expect(at(`s=h0:70&z=0.5&columns=age${flag}`).columns).toHaveLength(1)
    expect(questionOf(askAt, `s=h0:70&z=1${flag}`).canonical).toBe(questionOf(askAt, 's=h0:70&z=1').canonical)
  }
  expect(problemsOf(askAt, 's=h0:70&z=1&bounds=yes')).toHaveLength(1)
})

test('every column has a bound wherever it has a value, in every phase and by every variable', () => {
  const epochs = ['z=0,0.3,1000,-0.5', 'scale=0.5&branch=contracting', 'time=-3,0,2', 'age=1']
  const codes = ['h0:70', 'matter:2,dark:0,cmb:0', 'matter:0.1,dark:2,cmb:0', 'h0:70,eos:cpl,w0:-0.9,wa:-0.4']
  for (const code of codes) {
    for (const one of epochs.filter((epoch) => !epoch.includes('contracting') || code.includes(',cmb:0'))) {
      for (const row of at(`s=${code}&${one}&bounds=1`).rows) {
        COLUMN_KEYS.forEach((key, k) => {
          const [value, bound] = [row[2 * k], row[2 * k + 1]]
          expect(bound === null, `${code} ${one} ${key}: ${value} ± ${bound}`).toBe(value === null)
          if (bound !== null) expect(bound, `${code} ${one} ${key}`).toBeGreaterThanOrEqual(0)
        })
      }
    }
  }
})

test('what was asked for does not err', () => {
  expect(at('s=h0:70&time=-3&columns=time&bounds=1').rows).toEqual([[-3, 0]])
  expect(at('s=h0:70&age=3&columns=age&bounds=1').rows).toEqual([[3, 0]])
})

test('a table has them too, and its own address keeps them', () => {
  const text = [...answerOf(askAtHome, 's=h0:70&rows=3&columns=time&bounds=1').pieces()].join('')
  expect(text).toContain('time,timeError')
  expect(text).toContain('bounds=1')
})
