/** A universe that comes to rest, long after ln a tells times no longer apart. Values: test/reference/static.py (mpmath, 40 digits). */
import { expect, test } from 'vitest'
import { askAt } from '../../lib/answers/at'
import { askHistory } from '../../lib/answers/history'

const RESTS = 's=h0:70,matter:6.75,dark:1,cmb:0'

function rowsOf(query: string) {
  const reading = askAt(new URLSearchParams(query))
  const answer = reading.ok ? reading.value.answer() : reading
  if (!answer.ok) throw new Error(JSON.stringify(answer.problems))
  const [{ columns, rows, notes }] = answer.value.scenarios
  return { rows: rows.map((row) => Object.fromEntries(row.map((cell, i) => [columns[i].name, cell]))), notes }
}

test.each([
  [20, 25.895803591939764, 3.1254014509071562, 29.392655186042123],
  [100, 105.89580359193975, 1.4741414512845866e-4, 82.86111193283729],
  [293, 298.89580359193974, 5.959809586549802e-15, 211.52778513647581],
  [500, 505.89580359193974, 4.246273158165183e-26, 349.52778513647581],
  [1e6, 1000005.8958035919, 0, 666682.8611184699],
])('at rest within 1e-10 after %d Gyr', (time, age, hubble, conformal) => {
  const [row] = rowsOf(`${RESTS}&time=${time}&columns=age,hubble,conformal&bounds=1`).rows
  for (const [key, value] of Object.entries({ age, hubble, conformal })) {
    expect(Math.abs(Number(row[key]) - value), key).toBeLessThanOrEqual(Number(row[`${key}Error`]))
    expect(Number(row[`${key}Error`]), key).toBeLessThanOrEqual(1e-10 * value)
  }
})

test('the state of rest itself is never reached', () => {
  const { rows, notes } = rowsOf(`${RESTS}&scale=1.5&columns=time`)
  expect(rows).toEqual([{ time: null }])
  expect(notes[0].because).toMatch('infinitely far away in time')
})

test('in the past as in the future: χ grows by c Δt/a', () => {
  const { rows } = rowsOf('s=h0:70,matter:0.5,dark:2,cmb:0&time=-1000,-2000&columns=particleHorizon,comoving,scale')
  // Mpc in Gly: 1e9 Julian years of light.
  const gly = 299792.458 / (3.085677581491367e19 / 31557600e9)
  expect(Number(rows[1].comoving) - Number(rows[0].comoving)).toBeCloseTo(gly * (1000 / 0.5), 5)
})

test.each([
  // The field inflates beyond a = 1e308, and then swings about V = 0 like dust (Turner 1983, Phys. Rev. D 28, 1243).
  ['h0:70,matter:0.3,cmb:0,eos:field,v:cosine,width:10,start:0.3', /unlimited conformal time/],
  ['h0:70,matter:0.3,cmb:0,curvature:-0.1,eos:field,v:cosine,width:10,start:0.3', /beyond the range/],
  // a_t = 5.8e136, where E² is no double.
  ['h0:70,matter:1,eos:constant,w:-0.01', /beyond the range/],
])('an end beyond the doubles is no horizon: %s', (code, because) => {
  const reading = askHistory(new URLSearchParams(`s=${code}`))
  const answer = reading.ok ? reading.value.answer() : reading
  if (!answer.ok) throw new Error(JSON.stringify(answer.problems))
  const { eventHorizon, futureVisibility } = answer.value.scenarios[0].measures
  for (const one of [eventHorizon, futureVisibility]) {
    expect(one.value).toBe(null)
    expect(one.because).toMatch(because)
  }
})

test('so near to an origin that a leaves the doubles', () => {
  // a ∝ t^(2/n) with n = 0.3: 10^(−60 × 6.7).
  const { rows, notes } = rowsOf('s=h0:70,matter:0,cmb:0,eos:constant,w:-0.9&age=1e-60,0&columns=scale')
  expect(rows).toEqual([{ scale: null }, { scale: null }])
  expect(notes.map(({ because }) => because)).toEqual([
    expect.stringContaining('outside the range'),
    expect.stringContaining('the origin itself'),
  ])
})

test('what the doubles do not hold is no number', () => {
  const { rows } = rowsOf('s=h0:70,matter:1,cmb:0&scale=1e90,1e108&columns=hubble,deceleration,time')
  // H = H₀ a^(−3/2), q = ½, t = (2/3) (a^(3/2) − 1)/H₀.
  expect(Number(rows[0].hubble) / 70e-135).toBeCloseTo(1, 12)
  expect(rows[1]).toMatchObject({ hubble: null, deceleration: null })
  expect(rowsOf('s=h0:70,matter:1,eos:constant,w:-0.01&scale=1e130&columns=time').rows).toEqual([{ time: null }])
})
