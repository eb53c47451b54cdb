import { describe, expect, test } from 'vitest'
import { askAt, atAnswer } from '../../lib/answers/at'
import { COLUMN_KEYS } from '../../lib/quantities/column'
import { COLUMNS, columnNamed } from '../../lib/quantities/columns'
import { writeScenario } from '../../lib/scenario/write'
import { ENGINE, solve } from '../../lib/solve'
import { REFERENCES, type Reference, scenarioOf } from '../reference/set-a'
import { answerOf, problemsOf, questionOf } from './ask'

const at = (query: string) => answerOf(askAt, query)
const row = (query: string) => at(query).scenarios[0].rows[0]

describe('what comes back', () => {
  test('one entry for each s, one row for each value, in the order asked', () => {
    const answer = at('s=h0:70&s=h0:60&z=2,0,0.5&columns=redshift,hubble')
    expect(answer.engine).toBe(ENGINE)
    expect(answer.scenarios.map(({ code }) => code)).toEqual(['h0:70,matter:0.3111', 'h0:60,matter:0.3111'])
    for (const { rows, notes } of answer.scenarios) {
      expect(rows.map(([z]) => z)).toEqual([2, 0, 0.5])
      expect(notes).toEqual([])
    }
    expect(answer.scenarios[0].columns).toEqual([
      { name: 'redshift', unit: '', label: 'redshift' },
      { name: 'hubble', unit: 'km/s/Mpc', label: 'expansion rate' },
    ])
  })
  test('all columns in their order where none are named', () => {
    expect(at('z=1').scenarios[0].columns.map(({ name }) => name)).toEqual(COLUMN_KEYS)
  })
  test('without s, the demo', () => expect(at('z=0').scenarios).toHaveLength(3))
  test('a value outside the history is a row of nulls with a note', () => {
    const { rows, notes } = at('s=h0:70&time=-20,1&columns=scale,age').scenarios[0]
    expect(rows[0]).toEqual([null, null])
    expect(rows[1].every((one) => typeof one === 'number')).toBe(true)
    expect(notes).toEqual([{ row: 0, column: null, because: 'this is before the origin' }])
  })
  test('every null has a note that says why', () => {
    const { columns, rows, notes } = at('s=h0:70&z=-0.5,0,3').scenarios[0]
    const nulls = rows.flatMap((cells, row) =>
      cells.flatMap((cell, i) => (cell === null ? [[row, columns[i].name]] : [])),
    )
    expect(nulls.length).toBeGreaterThan(0)
    expect(notes.map(({ row, column }) => [row, column])).toEqual(nulls)
    expect(notes.every(({ because }) => because.length > 10)).toBe(true)
  })
  test('beyond the antipode values have notes', () => {
    const { rows, notes } = at('s=matter:0.3,dark:1.7,cmb:0&z=1e6&columns=comoving,angular').scenarios[0]
    expect(rows[0].every((one) => typeof one === 'number')).toBe(true)
    expect(notes).toEqual([{ row: 0, column: 'angular', because: expect.stringContaining('antipode') }])
  })
  test('the same epoch by z, scale, time and age', () => {
    const [z, age] = row('s=h0:70&time=-5&columns=redshift,age') as [number, number]
    const columns = 'columns=hubble,comoving'
    const expected = row(`s=h0:70&time=-5&${columns}`) as number[]
    for (const query of [`z=${z}`, `scale=${1 / (1 + z)}`, `age=${age}`]) {
      const found = row(`s=h0:70&${query}&${columns}`) as number[]
      // Each way round costs a few roundings of a time of 14 with errors of 5: 64 eps.
      found.forEach((value, i) => {
        expect(Math.abs(value / expected[i] - 1)).toBeLessThan(64 * Number.EPSILON)
      })
    }
  })
  test('contracting leads to the way back, or before a bounce', () => {
    const [time, hubble] = row('s=matter:2,dark:0,cmb:0&z=1&branch=contracting&columns=time,hubble') as number[]
    expect(time).toBeGreaterThan(0)
    expect(hubble).toBeLessThan(0)
    expect(row('s=matter:0.1,dark:2,cmb:0&scale=1&branch=contracting&columns=age')[0]).toBeLessThan(0)
  })
  test('a universe that never contracts has no such branch', () => {
    const { rows, notes } = at('s=h0:70&z=1&branch=contracting&columns=time').scenarios[0]
    expect(rows).toEqual([[null]])
    expect(notes[0].because).toContain('no contracting branch')
  })
  test('the plain function says the same as the question', () => {
    const solution = solve(scenarioOf(REFERENCES[0]))
    const epochs = { variable: 'z', values: [1], branch: 'expanding', columns: COLUMNS } as const
    const asked = at(`s=${encodeURIComponent(decodeURIComponent(solution.code))}&z=1`)
    expect(atAnswer([solution], epochs)).toEqual(asked)
  })
})

describe('what is refused', () => {
  const refusals: readonly (readonly [string, string, string, string])[] = [
    ['no epoch', 's=h0:70', 'z', ''],
    ['two variables', 'z=1&time=2', 'time', '2'],
    ['the horizon of z', 'z=-1', 'z', '-1'],
    ['a = 0', 'scale=0', 'scale', '0'],
    ['a negative a', 'scale=-1', 'scale', '-1'],
    ['an a that is 0 as a double', 'scale=1e-400', 'scale', '1e-400'],
    ['no value', 'z=', 'z', ''],
    ['an empty place', 'z=1,,2', 'z', ''],
    ['NaN', 'z=NaN', 'z', 'NaN'],
    ['Infinity', 'time=Infinity', 'time', 'Infinity'],
    ['beyond the doubles', 'age=1e999', 'age', '1e999'],
    ['hexadecimal', 'z=0x1', 'z', '0x1'],
    ['a blank', 'z=%201', 'z', ' 1'],
    ['other digits', 'z=%D9%A1', 'z', '١'],
    ['two signs', 'z=--1', 'z', '--1'],
    ['an unknown branch', 'z=1&branch=up', 'branch', 'up'],
    ['a branch beside a time', 'time=1&branch=expanding', 'branch', 'expanding'],
    ['an unknown column', 'z=1&columns=age,size', 'columns', 'size'],
    ['a column twice', 'z=1&columns=age,age', 'columns', 'age'],
    ['no column', 'z=1&columns=', 'columns', ''],
    ['a column of the prototype', 'z=1&columns=constructor', 'columns', 'constructor'],
    ['an unknown key', 'z=1&rows=3', 'rows', '3'],
    ['a key twice', 'z=1&z=2', 'z', '2'],
  ]
  test.each(refusals)('%s', (_, query, parameter, value) => {
    const problems = problemsOf(askAt, query)
    expect(problems).toHaveLength(1)
    expect(problems[0]).toMatchObject({ parameter, value, scenario: null })
    expect(problems[0].allowed).not.toBe('')
    expect(problems[0].message).toMatch(/^[A-Za-z].*\.$/)
  })
  test('a plus sign in an address is a blank, and the message says so', () => {
    expect(problemsOf(askAt, 'z=1e+3')[0].message).toContain('%2B')
    expect(row('s=h0:70&z=1e%2B3&columns=redshift')).toEqual([1000])
  })
  test('1000 values are taken, 1001 are not', () => {
    const values = (n: number) => Array.from({ length: n }, (_, i) => i).join(',')
    expect(at(`s=h0:70&z=${values(1000)}&columns=time`).scenarios[0].rows).toHaveLength(1000)
    expect(problemsOf(askAt, `s=h0:70&z=${values(1001)}`)[0]).toMatchObject({ parameter: 'z' })
  })
  test('scenarios are named by their index', () => {
    expect(problemsOf(askAt, 's=h0:70&s=matter:x&z=1')).toMatchObject([
      { parameter: 'matter', scenario: 1, value: 'x' },
    ])
  })
  test('everything wrong is said at once', () => {
    const parameters = problemsOf(askAt, 's=h0:x&z=a,b&foo=1').map(({ parameter }) => parameter)
    expect(parameters.toSorted()).toEqual(['foo', 'h0', 'z', 'z'])
  })
})

describe('canonical form', () => {
  const canonical = (query: string) => questionOf(askAt, query).canonical
  test('the same for spellings of the same request', () => {
    const one = canonical('s=matter:0.30,h0:70&z=0.5,1')
    expect(canonical('z=5e-1,1.0&s=h0:7e1,matter:.3')).toBe(one)
    expect(canonical('s=matter:0.3,h0:70&z=0.5,1&branch=expanding')).toBe(one)
    expect(canonical('s=matter:0.3,h0:70&z=1,0.5')).not.toBe(one)
  })
  test('it asks for the same again', () => {
    const one = canonical('s=h0:70,as:a%26b&z=1e22&columns=age,w')
    expect(canonical(one)).toBe(one)
  })
})

/** Reference values to 25 digits (test/reference), read through the answer: 1e-12 and 16 × 2⁻⁵³ × their conditioning. */
describe('reference values', () => {
  const NAMES: Readonly<Record<string, string>> = { 'D_L_Mpc(z': 'luminosity', 'q(a': 'deceleration', 'j(a': 'jerk' }
  const cases = REFERENCES.filter(({ params }) => (params.de?.type ?? params.de?.kind ?? 'lambda') === 'lambda')
    .slice(0, 12)
    .flatMap((one: Reference) =>
      Object.entries(one.quantities).flatMap(([name, quantity]) => {
        const match = /^(.*\(([za]))=([\d.e+-]+)\)$/.exec(name)
        return match && match[1] in NAMES ? [[one, NAMES[match[1]], match[2], match[3], quantity] as const] : []
      }),
    )
  test('there are some', () => expect(cases.length).toBeGreaterThan(30))
  test.each(cases.map((one) => [`${one[0].id} ${one[1]} at ${one[2]} = ${one[3]}`, one] as const))(
    '%s',
    (_, [reference, column, letter, value, quantity]) => {
      const code = writeScenario(scenarioOf(reference))
      const expected =
        Math.abs(Number(quantity.value)) * (column === 'luminosity' ? 1 : Math.sign(Number(quantity.value)))
      const actual = row(`s=${code}&${letter === 'z' ? 'z' : 'scale'}=${value}&columns=${column}`)[0]
      const sens = quantity.sens ?? 4 * Math.max(1, Math.abs(expected))
      expect(columnNamed(column)).toBeDefined()
      expect(Math.abs((actual as number) - expected)).toBeLessThanOrEqual(
        1e-12 * Math.abs(expected) + 16 * 2 ** -53 * sens,
      )
    },
  )
})
