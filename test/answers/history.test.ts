import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { askHistory } from '../../lib/answers/history'
import { MEASURE_KEYS } from '../../lib/quantities/measures'
import { ENGINE } from '../../lib/solve'
import { anyCode, plainCode } from '../quantities/codes'
import { answerOf, problemsOf, questionOf } from './ask'

const KINDS: Readonly<Record<string, string>> = {
  'expands for ever': 's=h0:70,matter:0.3',
  'turns round': 's=h0:70,matter:0.3,dark:-0.1',
  rips: 's=h0:70,matter:0.3,eos:constant,w:-1.25',
  bounces: 's=h0:70,matter:0.1,dark:2,cmb:0',
  'has no beginning': 's=h0:70,matter:0,cmb:0',
  'is empty': 's=h0:70,matter:0,dark:0,cmb:0',
}
const history = (query: string) => answerOf(askHistory, query).scenarios[0]

describe.each(Object.entries(KINDS))('a universe that %s', (_, query) => {
  const one = history(query)

  test('has every key', () => {
    expect(Object.keys(one)).toEqual(['code', 'label', 'densities', 'origin', 'end', 'measures', 'moments', 'series'])
    expect(Object.keys(one.origin)).toEqual(['kind', 'time', 'scale'])
    expect(Object.keys(one.end)).toEqual(['kind', 'time', 'scale', 'turnaround', 'proven', 'because'])
    expect(Object.keys(one.measures)).toEqual([...MEASURE_KEYS])
  })
  test('has densities that add up to 1', () => {
    const densities = Object.values(one.densities)
    // Six densities of size up to 2, each rounded once: 8 eps.
    expect(Math.abs(densities.reduce((sum, value) => sum + value, 0) - 1)).toBeLessThan(8 * Number.EPSILON)
  })
  test('gives a reason where a measure has no value', () => {
    for (const { value, error, because } of Object.values(one.measures)) {
      expect(value === null).toBe(because !== null)
      expect(value === null).toBe(error === null)
    }
  })
  test('survives JSON', () => expect(JSON.parse(JSON.stringify(one))).toEqual(one))

  describe('its series', () => {
    const { columns, rows } = one.series
    test('has 200 to 300 rows of time and scale, in the order of time', () => {
      expect(columns.map(({ name }) => name)).toEqual(['time', 'scale'])
      expect(rows.length).toBeGreaterThanOrEqual(200)
      expect(rows.length).toBeLessThanOrEqual(300)
      rows.forEach(([time], i) => {
        if (i > 0) expect(time).toBeGreaterThan(rows[i - 1][0])
      })
    })
    test('holds today', () => expect(rows).toContainEqual([0, 1]))
    test('begins and ends where the history does', () => {
      if (one.origin.kind === 'big-bang') expect(rows[0]).toEqual([expect.closeTo(one.origin.time ?? 0, 4), 0])
      if (one.end.kind === 'crunch') expect(rows.at(-1)).toEqual([expect.closeTo(one.end.time ?? 0, 4), 0])
      if (one.end.kind === 'rip') expect(rows.at(-1)?.[0]).toBeGreaterThan(0.99 * (one.end.time ?? 0))
    })
    test('bends in small steps', () => {
      const shown = one.end.kind === 'rip' ? rows.filter(([time]) => time <= 0) : rows
      const span = shown[shown.length - 1][0] - shown[0][0]
      const top = Math.max(...shown.map(([, scale]) => scale))
      shown.forEach(([time, scale], i) => {
        if (i === 0) return
        // A twelfth of the whole: each arm has at least 40 points, a third of whose steps belongs to each of the three.
        expect(time - shown[i - 1][0]).toBeLessThan(span / 12)
        expect(Math.abs(scale - shown[i - 1][1])).toBeLessThan(top / 12)
      })
    })
  })
})

describe('the question', () => {
  test('engine, and one entry for each s; without s the demo', () => {
    expect(answerOf(askHistory, 's=h0:70&s=h0:60')).toMatchObject({ engine: ENGINE, scenarios: [{}, {}] })
    expect(answerOf(askHistory, '').scenarios).toHaveLength(3)
  })
  test('canonical spelling', () => {
    expect(questionOf(askHistory, 's=matter:.30,h0:7e1,as:a%2Cb').canonical).toBe('s=h0:70,matter:0.3,as:a%2Cb')
  })
  test('a seventh scenario, an empty one and unknown keys are refused', () => {
    expect(problemsOf(askHistory, Array(7).fill('s=h0:70').join('&'))).toMatchObject([{ parameter: 's', scenario: 6 }])
    expect(problemsOf(askHistory, 's=')).toMatchObject([{ parameter: 's', scenario: 0 }])
    expect(problemsOf(askHistory, 'z=1')).toMatchObject([{ parameter: 'z', scenario: null }])
  })
  test('a legal scenario without a solution is a problem that says why', () => {
    const { answer } = questionOf(askHistory, 's=h0:70&s=matter:0.1,dark:0.9,cmb:0,eos:field,slope:3')
    expect(answer()).toEqual({
      ok: false,
      problems: [
        {
          parameter: 'dark',
          scenario: 1,
          value: '0.9',
          allowed: expect.any(String),
          // What the field can reach at most.
          message: expect.stringMatching(/Ω_DE = 0\.\d+ .* at most/),
        },
      ],
    })
  })
})

const finite = (value: unknown): boolean =>
  typeof value === 'number'
    ? Number.isFinite(value)
    : typeof value !== 'object' || value === null || Object.values(value).every(finite)

/** A scenario without an answer is a problem, so that nothing but finite numbers gets out. */
function finiteOrRefused(code: string) {
  const answer = questionOf(askHistory, `s=${encodeURIComponent(code)}`).answer()
  if (answer.ok) expect(finite(answer.value), code).toBe(true)
  else expect(answer.problems[0].message).not.toBe('')
}

test('legal codes give finite numbers, or a reason for the whole', () => {
  fc.assert(fc.property(plainCode, finiteOrRefused), { numRuns: 200 })
}, 60_000)

test('so do those with any double that is allowed', () => {
  fc.assert(fc.property(anyCode, finiteOrRefused), { numRuns: 200 })
}, 60_000)
