/** Readings at one epoch and between two, against published values and closed forms. */
import { describe, expect, test } from 'vitest'
import { isMissing } from '../../lib/measures/outcome'
import { columnNamed } from '../../lib/quantities/columns'
import { isInstant } from '../../lib/quantities/instant'
import { BETWEEN } from '../../lib/ruler/between'
import { epochVariable } from '../../lib/ruler/epochs'
import { type Given, observed, WHOLE_SKY } from '../../lib/ruler/given'
import { unitWithHubble, valueWithHubble, valueWithoutHubble } from '../../lib/ruler/hubble-units'
import { BETWEEN_KEYS, type BetweenKey, EXTRA_KEYS, USUAL_READINGS } from '../../lib/ruler/keys'
import { READINGS, readingNamed } from '../../lib/ruler/readings'
import { expectPrinted, expectRelative, PUBLISHED } from '../world/published'
import { mpc, universe } from '../world/universe'

const GIVEN: Given = { length: 1, line: { value: 1215.67, unit: 'Å' }, sky: WHOLE_SKY }
type Universe = ReturnType<typeof universe>

function instant(subject: Universe, z: number) {
  const found = epochVariable('z').at(subject, z)
  if (!isInstant(found)) throw new Error(found.because)
  return found
}

function read(subject: Universe, key: string, z: number, given: Partial<Given> = {}): number {
  const value = readingNamed(key)?.value({ subject, instant: instant(subject, z), given: { ...GIVEN, ...given } })
  if (value === undefined || isMissing(value)) throw new Error(`no ${key}: ${value?.because}`)
  return value
}

function between(subject: Universe, key: BetweenKey, from: number, to: number, given: Partial<Given> = {}) {
  const pair = { subject, one: instant(subject, from), other: instant(subject, to), given: { ...GIVEN, ...given } }
  const value = BETWEEN.find((one) => one.key === key)?.value(pair)
  if (value === undefined) throw new Error(`no ${key}`)
  return value
}

describe('the lists', () => {
  const all = [...READINGS, ...BETWEEN]
  test('name every key once', () => {
    expect(BETWEEN.map(({ key }) => key)).toEqual(BETWEEN_KEYS)
    expect(READINGS.map(({ key }) => key).slice(-EXTRA_KEYS.length)).toEqual(EXTRA_KEYS)
    expect(new Set(all.map(({ key }) => key)).size).toBe(all.length)
    for (const key of USUAL_READINGS) expect(readingNamed(key)).toBeDefined()
  })
  test.each(all.map((one) => [one.key, one] as const))('%s says what it is', (_, one) => {
    for (const text of [one.symbol, one.label, one.formula, one.source]) expect(text).not.toBe('')
    expect(one.meaning).toMatch(/^[A-Z].*\.$/)
  })
})

describe('recession (Davis & Lineweaver 2004, PASA 21, 97: DL6 and DL7)', () => {
  const solution = universe('h0:70,matter:0.3,cmb:0')
  const { DL6, DL7 } = PUBLISHED
  test('of what sent the background, now and then', () => {
    expectPrinted(read(solution, 'recessionNow', 1100), DL6.recomputed)
    expectPrinted(read(solution, 'recessionThen', 1100), DL7.recomputed)
  })
  test('across a length it is H times the length', () => {
    expect(read(solution, 'recession', 0, { length: 10 })).toBe(700)
  })
})

describe('angles, lines and volumes', () => {
  const eds = universe('h0:70,matter:1,cmb:0')
  const milne = universe('h0:70,matter:0,cmb:0,dark:0')
  /** Arcseconds in a radian. */
  const ARCSECONDS = 206264.80624709636

  test('Einstein–de Sitter: D_A is 8/27 c/H₀ at z = 1.25 (textbook)', () => {
    expectRelative(read(eds, 'angle', 1.25, { length: 0.5 }), (0.5 * ARCSECONDS * 27) / (8 * mpc(eds)), 1e-13)
    expectRelative(read(eds, 'comovingAngle', 1.25), ARCSECONDS / (2 * (1 - 2 / 3) * mpc(eds)), 1e-13)
  })
  test('a line is stretched by 1 + z, its frequency divided by it', () => {
    expectRelative(read(eds, 'observedLine', 1.9), 1215.67 * 2.9, 4 * Number.EPSILON)
    expect(observed({ value: 1420, unit: 'MHz' }, 1)).toBe(710)
  })
  test('a survey has its part of the sphere (4π/3) D_M³ (flat space)', () => {
    const sphere = ((4 * Math.PI) / 3) * (2 * (1 - 1 / Math.sqrt(2.9)) * mpc(eds)) ** 3 * 1e-9
    expectRelative(read(eds, 'skyVolume', 1.9, { sky: 1000 }), (sphere * 1000) / 41252.96124941927, 1e-13)
  })
  test.each(Object.entries(PUBLISHED.HOGG.recomputed))(
    'volume per redshift of Hogg 1999, Ω_m, Ω_Λ = %s',
    (pair, table) => {
      const [matter, lambda] = pair.split(' ')
      const solution = universe(`h0:70,matter:${matter},cmb:0,dark:${lambda}`)
      for (const [z, row] of Object.entries(table)) {
        const ours = read(solution, 'volumeElement', Number(z)) / (4 * Math.PI * (mpc(solution) / 1e3) ** 3)
        expectPrinted(ours, row.volumeElement)
      }
    },
  )
  test('Milne: D_M between two epochs is sinh of the difference of ln(1 + z) (textbook)', () => {
    expectRelative(
      between(milne, 'angularBetween', 1, 3) as number,
      (Math.sinh(Math.log(4) - Math.log(2)) * mpc(milne)) / 4,
      1e-13,
    )
  })
  test('Hogg 1999, eq. 19, for Ω_k of either sign below the antipode', () => {
    for (const code of ['h0:70,matter:0.3,dark:0.9,cmb:0', 'h0:70,matter:0.3,dark:0.4,cmb:0']) {
      const solution = universe(code)
      const across = (z: number) =>
        (columnNamed('transverse')?.value(solution, instant(solution, z)) as number) / mpc(solution)
      const { curvature } = solution.budget
      const [a, b] = [across(0.5), across(2)]
      const expected = (b * Math.sqrt(1 + curvature * a * a) - a * Math.sqrt(1 + curvature * b * b)) / 3
      expectRelative(between(solution, 'angularBetween', 0.5, 2) as number, expected * mpc(solution), 1e-12)
    }
  })
})

describe('between two epochs', () => {
  const eds = universe('h0:70,matter:1,cmb:0')
  const flat = universe('h0:67.66,matter:0.3111')
  const closed = universe('h0:70,matter:0.3,dark:0.9')

  test('the order does not matter', () => {
    for (const { key } of BETWEEN) expect(between(flat, key, 0.4, 1.9)).toBe(between(flat, key, 1.9, 0.4))
  })
  test('the interval of Einstein and de Sitter is that of (2/3)(1 + z)^(−3/2)/H₀', () => {
    // 1/(70 km/s/Mpc) is 13.968460309 Gyr: IAU parsec and Julian year, by hand.
    const interval = (2 / 3) * (2 ** -1.5 - 3 ** -1.5) * 13.968460309
    expectRelative(between(eds, 'interval', 1, 2) as number, interval, 1e-9)
  })
  test.each([flat, closed])('a shell is the difference of two spheres, and its part of the sky', (solution) => {
    const spheres = read(solution, 'volume', 2.1) - read(solution, 'volume', 1.7)
    expectRelative(
      between(solution, 'shellVolume', 1.7, 2.1, { sky: 14000 }) as number,
      (spheres * 14000) / WHOLE_SKY,
      1e-13,
    )
  })
  test('a thin shell is the volume per redshift', () => {
    const step = 1e-6
    const thin = between(flat, 'shellVolume', 1, 1 + step) as number
    // The element changes by some step over the shell; the distances differ by 1e-6 of themselves and keep ten digits.
    expectRelative(thin / step, read(flat, 'volumeElement', 1), 1e-5)
  })
  test('the critical density of a lens: c²/(4πG) D_S/(D_L D_LS)', () => {
    // By hand from c, the nominal G M☉ (IAU 2015 Resolution B3) and the parsec in metres.
    const [lens, source] = [read(eds, 'angular', 0.5), read(eds, 'angular', 2)]
    const apart = between(eds, 'angularBetween', 0.5, 2) as number
    const perParsec = (299792458 ** 2 * 3.085677581491367e16) / (4 * Math.PI * 1.3271244e20)
    expectRelative(
      between(eds, 'criticalSurfaceDensity', 0.5, 2) as number,
      (perParsec * source * 1e-6) / (lens * apart),
      1e-13,
    )
    // Textbook scale: 0.35 g/cm² times (D_L D_LS/D_S in Gpc)⁻¹ (Narayan & Bartelmann 1996, arXiv:astro-ph/9606001, eq. 17,
    // from memory); 1 g/cm² is 4787 M☉/pc².
    const scale = (4787 * 0.35 * 1e3 * source) / (lens * apart)
    expectRelative(between(eds, 'criticalSurfaceDensity', 0.5, 2) as number, scale, 0.02)
  })
  test('where nothing can be seen or bent there is a reason', () => {
    expect(between(eds, 'criticalSurfaceDensity', 0, 2)).toHaveProperty('because')
    expect(between(eds, 'criticalSurfaceDensity', 1, 1)).toHaveProperty('because')
    expect(between(flat, 'shellVolume', -0.5, 1)).toHaveProperty('because')
    expect(between(flat, 'interval', -0.5, 1)).toBeTypeOf('number')
  })
})

describe('units with h', () => {
  test('100 Mpc are 70 h⁻¹ Mpc where h = 0.7, and 1 Gpc³ is 0.343 h⁻³ Gpc³', () => {
    expectRelative(valueWithHubble(100, 'Mpc', 70), 70, 4e-16)
    expectRelative(valueWithHubble(1, 'Gpc³', 70), 0.343, 1e-15)
    expectRelative(valueWithHubble(0.7, 'M☉/pc²', 70), 1, 4e-16)
    expectRelative(valueWithoutHubble(70, 'Mpc', 70), 100, 4e-16)
    expect([unitWithHubble('Mpc'), unitWithHubble('Gpc³'), unitWithHubble('Gyr')]).toEqual([
      'h⁻¹ Mpc',
      'h⁻³ Gpc³',
      'Gyr',
    ])
  })
  test('distances in them are the same for every H₀ (closed forms scale with c/H₀)', () => {
    const [slow, fast] = ['h0:50,matter:0.3,cmb:0', 'h0:100,matter:0.3,cmb:0'].map(universe)
    const inUnits = (one: Universe) => valueWithHubble(read(one, 'comoving', 1), 'Mpc', one.scenario.h0)
    expectRelative(inUnits(slow), inUnits(fast), 1e-13)
  })
})
