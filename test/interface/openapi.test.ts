/** The document is judged by the published schemas of OpenAPI 3.1, and our answers by its own. */

import { readdirSync } from 'node:fs'
import { dirname, join } from 'node:path'
import { Validator } from '@seriousme/openapi-schema-validator'
import { Ajv2020 } from 'ajv/dist/2020'
import { describe, expect, test } from 'vitest'
import { askRuler, askRulerTable } from '../../lib/answers/ask-ruler'
import { askAt } from '../../lib/answers/at'
import { answerLine, linesOf } from '../../lib/answers/batch'
import { AT_FIELDS } from '../../lib/answers/epochs'
import { askHistory } from '../../lib/answers/history'
import { TABLE_FIELDS } from '../../lib/answers/layout'
import { askNeighbours } from '../../lib/answers/neighbours'
import { askTable } from '../../lib/answers/table'
import { askWords } from '../../lib/answers/words'
import { openApi } from '../../lib/interface/openapi'
import { ROUTES } from '../../lib/interface/routes'
import type { SCHEMAS } from '../../lib/interface/schemas'
import { COLUMN_KEYS } from '../../lib/quantities/column'
import { MEASURE_KEYS } from '../../lib/quantities/measures'
import { DEMO } from '../../lib/scenario/demo'
import { RULER_KEYS } from '../../lib/words/place'
import { problemDocument } from '../../scripts/front/problem.mjs'
import { answerOf, problemsOf } from '../answers/ask'

/** Every law, several endings and origins, and what leaves measures without a value. */
const CODES = [
  'h0:70',
  'eos:constant,w:-1.2',
  'eos:cpl,w0:-0.83,wa:-0.75',
  'eos:jbp,w0:-0.9,wa:0.5',
  'eos:ba,w0:-0.9,wa:0.2',
  'eos:log,w0:-0.9,wa:0.3',
  'eos:nodes,at:0.5_1,w:-0.8_-1',
  'eos:barotropic,excess:0.1,alpha:0.5',
  'eos:chaplygin,b:0.75,matter:0.05',
  'eos:field,v:linear,slope:1',
  'matter:1,cmb:0',
  'matter:0,cmb:0',
  'matter:2,dark:0',
  'matter:0.1,dark:1.7,cmb:0',
  'matter:0.3,dark:-0.5,radiation:0.0001',
]

const HOME = { version: '1.0.0', base: '' }
const document = openApi(HOME)

/** What a schema of the document finds wrong. */
function complaints(name: keyof typeof SCHEMAS, value: unknown): string {
  const ajv = new Ajv2020({ strict: false, allErrors: true })
  ajv.addSchema(document, 'document')
  const check = ajv.getSchema(`document#/components/schemas/${name}`)
  if (!check) throw new Error(`there is no schema ${name}`)
  return check(JSON.parse(JSON.stringify(value))) ? '' : ajv.errorsText(check.errors).slice(0, 500)
}

test('it is an OpenAPI 3.1 document', async () => {
  const validator = new Validator()
  expect(await validator.validate(structuredClone(document))).toEqual({ valid: true })
  expect(validator.version).toBe('3.1')
  const broken = { ...document, info: { title: 'no version' } }
  expect(await new Validator().validate(broken)).toMatchObject({ valid: false })
})

test('PUBLIC_URL is its server', () => {
  expect(openApi({ version: '1', base: 'https://a.example' }).servers).toEqual([{ url: 'https://a.example' }])
})

test('it knows every query key, column and measure', () => {
  const keys = (path: string) => ROUTES.find((one) => one.path === path)?.parameters.map(({ name }) => name)
  expect(keys('/api/at')).toEqual(['s', ...Object.keys(AT_FIELDS)])
  expect(keys('/api/table')).toEqual(['s', ...Object.keys(TABLE_FIELDS)])
  expect(keys('/api/ruler')).toEqual(['s', ...RULER_KEYS])
  expect(keys('/api/ruler/table')).toEqual(['s', ...RULER_KEYS, 'format'])
  const text = JSON.stringify(document)
  for (const key of [...COLUMN_KEYS, ...MEASURE_KEYS]) expect(text).toContain(`"${key}"`)
  for (const { parameters } of ROUTES) {
    for (const { description, schema } of parameters) {
      expect(description).not.toBe('')
      expect(Object.keys(schema).length).toBeGreaterThan(0)
    }
  }
})

/** Routes that are not for scripts: the document itself, what the live page asks for, and the answer to what is no route. */
const APART = ['/api/openapi.json', '/api/explorer', '/api/[...path]']

test('every route of the server is in it', () => {
  const app = new URL('../../app', import.meta.url).pathname
  const files = readdirSync(join(app, 'api'), { recursive: true, encoding: 'utf8' })
  const served = files.filter((one) => one.endsWith('route.ts')).map((one) => `/api/${dirname(one)}`)
  expect(served.filter((one) => !APART.includes(one)).sort()).toEqual(ROUTES.map(({ path }) => path).sort())
  for (const one of APART) expect(served).toContain(one)
})

describe('answers are as it says', () => {
  const s = (codes: readonly string[]) => codes.map((code) => `s=${encodeURIComponent(code)}`).join('&')
  test.each([...DEMO.codes, ...CODES])('history of %s', (code) => {
    expect(complaints('Histories', answerOf(askHistory, s([code])))).toBe('')
  })
  test.each([...DEMO.codes, ...CODES])('neighbours of %s', (code) => {
    expect(complaints('Neighbourhoods', answerOf(askNeighbours, s([code])))).toBe('')
  })
  test('epochs, with notes', () => {
    const answer = answerOf(askAt, `${s([...DEMO.codes])}&time=-100,-5,0,40`)
    expect(answer.scenarios[0].notes.length).toBeGreaterThan(0)
    expect(complaints('Epochs', answer)).toBe('')
  })
  test('epochs with error bounds', () => {
    expect(complaints('Epochs', answerOf(askAt, `${s(['h0:70'])}&z=1&bounds=1`))).toBe('')
  })
  test.each(['', 'at=0.5&until=2', 'at=x&line=0', 'epoch=age&at=30&units=h', 'read=none'])('ruler: %s', (keys) => {
    const answer = answerOf(askRuler, `${s([...DEMO.codes])}&${keys}`)
    expect(complaints('Ruler', answer)).toBe('')
    expect(complaints('Ruler', { ...answer, complaints: { epoch: '' } })).not.toBe('')
  })
  test('table of the ruler', () => {
    const ask = (pairs: URLSearchParams) => askRulerTable(pairs, HOME)
    const { pieces } = answerOf(ask, `${s([...DEMO.codes])}&at=1&until=-0.5&format=json`)
    const answer = JSON.parse([...pieces()].join(''))
    expect(answer.scenarios).toHaveLength(DEMO.codes.length)
    expect(complaints('RulerTable', answer)).toBe('')
  })
  test('words', () => {
    expect(
      complaints(
        'Words',
        answerOf((pairs: URLSearchParams) => askWords(pairs, HOME), s([...DEMO.codes])),
      ),
    ).toBe('')
  })
  test('tables', () => {
    const { pieces } = answerOf((pairs: URLSearchParams) => askTable(pairs, HOME), `${s([...DEMO.codes])}&format=json`)
    expect(complaints('Table', JSON.parse([...pieces()].join('')))).toBe('')
  })
  test('lines of a batch, good and bad', () => {
    const [good, bad] = linesOf('"h0:70"\n"h0:0"\n')
    const fine = answerLine(good)
    expect(complaints('BatchResult', { index: 0, ...(fine.ok ? fine.value : {}) })).toBe('')
    const { ok, ...rest } = answerLine(bad)
    const errors = 'problems' in rest ? rest.problems : []
    expect(ok).toBe(false)
    expect(
      complaints('BatchResult', { index: 1, problem: problemDocument({ status: 400, detail: 'x', errors }, '/') }),
    ).toBe('')
    expect(complaints('BatchLine', 'h0:70') + complaints('BatchLine', { s: 'h0:70' })).toBe('')
  })
  test('problems', () => {
    const errors = problemsOf(askAt, 's=h0:0&z=x')
    expect(complaints('Problem', problemDocument({ status: 400, detail: 'x', errors }, '/api/at'))).toBe('')
  })
  test('and the schemas refuse what is otherwise', () => {
    const answer = answerOf(askHistory, 's=h0:70')
    expect(complaints('Histories', { ...answer, more: 1 })).not.toBe('')
    const [scenario] = answer.scenarios
    expect(complaints('History', { ...scenario, end: { ...scenario.end, kind: 'unheard-of' } })).not.toBe('')
    const { age: _, ...others } = scenario.measures
    expect(complaints('History', { ...scenario, measures: others })).not.toBe('')
  })
})
