/** Whatever variable an epoch is typed in, it is the same epoch; in closed forms it is the one of the formula. */
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { isMissing } from '../../lib/measures/outcome'
import { columnNamed } from '../../lib/quantities/columns'
import { type Instant, isInstant } from '../../lib/quantities/instant'
import { EPOCH_VARIABLES, epochVariable } from '../../lib/ruler/epochs'
import { EPOCH_KEYS, type EpochKey } from '../../lib/ruler/keys'
import { expectNear, expectRelative } from '../world/published'
import { gyr, mpc, universe } from '../world/universe'

const EDS = universe('h0:70,matter:1,cmb:0')
const TODAY = universe('h0:67.66,matter:0.3111')
const BOUNCE = universe('h0:70,matter:0.1,dark:2,cmb:0')

function at(solution: typeof EDS, key: EpochKey, value: number): Instant {
  const found = epochVariable(key).at(solution, value)
  if (!isInstant(found)) throw new Error(found.because)
  return found
}

test('every key has its record, in order', () => {
  expect(EPOCH_VARIABLES.map(({ key }) => key)).toEqual(EPOCH_KEYS)
  for (const { symbol, label, meaning } of EPOCH_VARIABLES) {
    expect(symbol).not.toBe('')
    expect(label).not.toBe('')
    expect(meaning).toMatch(/^[A-Z].*\.$/)
  }
})

describe('Einstein–de Sitter: D_C = 2 (1 − 1/√(1 + z)) c/H₀ and t = (2/3)(1 + z)^(−3/2)/H₀ (textbook)', () => {
  test.each([0.001, 0.5, 1.9, 10, 1100])('z = %s', (z) => {
    // ln a to 1e-13; the lookback time, rounded to eps, moves it by E = (1 + z)^1.5 times that.
    const tolerance = 1e-13 + 4 * Number.EPSILON * (1 + z) ** 1.5
    const close = (found: number) => expectNear(found / (1 + z), z / (1 + z), tolerance)
    close(at(EDS, 'comoving', -2 * Math.expm1(-0.5 * Math.log1p(z)) * mpc(EDS)).redshift)
    close(at(EDS, 'lookback', (-2 / 3) * Math.expm1(-1.5 * Math.log1p(z)) * gyr(EDS)).redshift)
    close(at(EDS, 'age', (2 / 3) * (1 + z) ** -1.5 * gyr(EDS)).redshift)
  })
})

test('a temperature is T₀ (1 + z) (Tolman 1934)', () => {
  expectRelative(at(TODAY, 'temperature', 2.7255 * 2.9).redshift, 1.9, 8 * Number.EPSILON)
  expect(epochVariable('temperature').at(EDS, 3)).toHaveProperty('because')
})

test('a lookback of 0 is now, and a negative one lies ahead', () => {
  expect(at(TODAY, 'lookback', 0)).toMatchObject({ time: 0, redshift: 0 })
  expect(at(TODAY, 'lookback', -5)).toMatchObject({ time: 5, phase: 'future' })
})

test('beyond all that light could cross, and beyond the origin, there is a reason', () => {
  for (const [key, value] of [
    ['comoving', 1e6],
    ['age', -1],
    ['lookback', 20],
  ] as const) {
    expect(epochVariable(key).at(TODAY, value)).toEqual({ because: expect.stringMatching(/\w/) })
  }
  expect(isInstant(epochVariable('age').at(BOUNCE, -1))).toBe(true)
})

test('typed in any variable it is the same epoch', () => {
  const keys = ['scale', 'time', 'age', 'lookback', 'temperature', 'comoving'] as const
  fc.assert(
    fc.property(fc.double({ min: 1e-3, max: 30, noNaN: true }), fc.constantFrom(...keys), (z, key) => {
      const value = columnNamed(key)?.value(TODAY, at(TODAY, 'z', z))
      if (value === undefined || isMissing(value)) throw new Error(`no ${key} at ${z}`)
      // Today's differences: a time of eps of the age moves z by eps (1 + z) E times the age over the lookback time.
      expectNear(at(TODAY, key, value).redshift, z, 2e-12 * (1 + z) ** 2.5)
    }),
  )
})
