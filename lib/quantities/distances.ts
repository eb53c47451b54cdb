/** Columns along our line of sight: distances, angles, volume, drift. All follow light through the expansion that holds today. */
import { JULIAN_YEAR, SPEED_OF_LIGHT } from '../constants'
import { antipode, comovingVolume, transverseDistance } from '../measures/distances'
import { isMissing, type Missing, missing } from '../measures/outcome'
import { hubbleLengthMpc, perSecond } from '../units'
import { INTEGRAL, ROUNDING } from './accuracy'
import type { Column } from './column'
import type { ColumnSubject, Instant } from './instant'
import { fixed, HOGG, significant } from './quantity'

const IN_THE_FUTURE = missing('it lies in the future: no line of sight leads there')
const CONTRACTING = missing('lines of sight are followed only through the expansion that holds today')

/** χ in c/H₀. */
function chiOf({ phase, conformal }: Instant): number | Missing {
  if (phase === 'future') return IN_THE_FUTURE
  return phase === 'past' ? -conformal : CONTRACTING
}

/** D_M in Mpc. */
function transverseOf({ scenario, budget }: ColumnSubject, instant: Instant): number | Missing {
  const chi = chiOf(instant)
  return isMissing(chi) ? chi : transverseDistance(chi, budget.curvature) * hubbleLengthMpc(scenario.h0)
}

const times = (value: number | Missing, factor: number): number | Missing => (isMissing(value) ? value : value * factor)

const angularOf = (subject: ColumnSubject, instant: Instant): number | Missing =>
  times(transverseOf(subject, instant), 1 / (1 + instant.redshift))

const luminosityOf = (subject: ColumnSubject, instant: Instant): number | Missing =>
  times(transverseOf(subject, instant), 1 + instant.redshift)

function modulusOf(subject: ColumnSubject, instant: Instant): number | Missing {
  const distance = luminosityOf(subject, instant)
  if (isMissing(distance)) return distance
  return distance > 0 ? 5 * Math.log10(distance) + 25 : missing('the distance is 0, which has no logarithm')
}

function volumeOf({ scenario, budget }: ColumnSubject, instant: Instant): number | Missing {
  const chi = chiOf(instant)
  return times(isMissing(chi) ? chi : comovingVolume(chi, budget.curvature), (hubbleLengthMpc(scenario.h0) / 1e3) ** 3)
}

/** Near today 1 − aE is formed from E² − 1 and a² − 1, which are known without cancellation there. */
const NEAR_TODAY = 0.7
const NOTHING_TODAY = { N: 0, value: 0 } as const

/** c H₀ (1 − E/(1 + z)) in cm/s per Julian year. */
function driftOf({ scenario }: ColumnSubject, instant: Instant): number | Missing {
  const chi = chiOf(instant)
  if (isMissing(chi)) return chi
  const rate = Math.sqrt(Math.max(0, instant.expansion)) / (1 + instant.redshift)
  const { N, arm } = instant.place
  const excess = Math.exp(2 * N) * arm.model.expansionFrom(NOTHING_TODAY, N) + Math.expm1(2 * N)
  const lag = Math.abs(N) < NEAR_TODAY ? -excess / (1 + rate) : 1 - rate
  return 100 * SPEED_OF_LIGHT * perSecond(scenario.h0) * JULIAN_YEAR * lag
}

/** Whether light from there has passed the point opposite to us in a closed space. */
const pastAntipode = ({ budget }: ColumnSubject, instant: Instant): boolean => {
  const chi = chiOf(instant)
  return !isMissing(chi) && chi > antipode(budget.curvature)
}

const noteOn =
  (text: string): Column['note'] =>
  (subject, instant) =>
    pastAntipode(subject, instant) ? text : null

const FOLDED = noteOn('the light comes from beyond the antipode of the closed space, whose distances shrink again')
const WHOLE = noteOn('the light comes from beyond the antipode of the closed space; the volume is that of all space')

export const DISTANCE_COLUMNS: readonly Column[] = [
  {
    key: 'comoving',
    symbol: 'D_C',
    label: 'comoving distance',
    unit: 'Mpc',
    digits: significant(6),
    meaning: 'Proper distance today to what is seen at this epoch.',
    formula: 'D_C = ∫ c dt/a, from then to today',
    source: `${HOGG}, eq. 15`,
    accuracy: INTEGRAL,
    value: ({ scenario }, instant) => times(chiOf(instant), hubbleLengthMpc(scenario.h0)),
  },
  {
    key: 'transverse',
    symbol: 'D_M',
    label: 'transverse comoving distance',
    unit: 'Mpc',
    digits: significant(6),
    meaning: 'Comoving length across the line of sight over the angle under which it is seen.',
    formula: 'D_M = |R sin(D_C/R)|, D_C or R sinh(D_C/R), with R = (c/H_0)/√|Ω_k|',
    source: `${HOGG}, eq. 16`,
    accuracy: INTEGRAL,
    value: transverseOf,
    note: FOLDED,
  },
  {
    key: 'angular',
    symbol: 'D_A',
    label: 'angular diameter distance',
    unit: 'Mpc',
    digits: significant(6),
    meaning: 'Proper length across the line of sight over the angle under which it is seen.',
    formula: 'D_A = D_M/(1 + z)',
    source: `${HOGG}, eq. 18`,
    accuracy: INTEGRAL,
    value: angularOf,
    note: FOLDED,
  },
  {
    key: 'luminosity',
    symbol: 'D_L',
    label: 'luminosity distance',
    unit: 'Mpc',
    digits: significant(6),
    meaning: 'Distance by which the flux follows from the luminosity as in static flat space.',
    formula: 'D_L = (1 + z) D_M',
    source: `${HOGG}, eq. 21`,
    accuracy: INTEGRAL,
    value: luminosityOf,
    note: FOLDED,
  },
  {
    key: 'modulus',
    symbol: 'μ',
    label: 'distance modulus',
    unit: 'mag',
    digits: fixed(4),
    meaning: 'Apparent less absolute bolometric magnitude.',
    formula: 'μ = 5 log_10(D_L/Mpc) + 25',
    source: `${HOGG}, eq. 25`,
    accuracy: INTEGRAL,
    value: modulusOf,
    note: FOLDED,
  },
  {
    key: 'arcsecond',
    symbol: 'ℓ(1″)',
    label: 'length of an arcsecond',
    unit: 'kpc',
    digits: significant(5),
    meaning: 'Proper length seen under one arcsecond.',
    formula: 'ℓ = D_A π/648000',
    source: `${HOGG}, eq. 18`,
    accuracy: INTEGRAL,
    value: (subject, instant) => times(angularOf(subject, instant), (1e3 * Math.PI) / 648000),
    note: FOLDED,
  },
  {
    key: 'volume',
    symbol: 'V_C',
    label: 'comoving volume',
    unit: 'Gpc³',
    digits: significant(5),
    meaning: 'Comoving volume over the whole sky out to here.',
    formula: 'V_C = 4π ∫ D_M² dD_C',
    source: `${HOGG}, eq. 29`,
    accuracy: INTEGRAL,
    value: volumeOf,
    note: WHOLE,
  },
]

export const DRIFT: Column = {
  key: 'drift',
  symbol: 'v̇',
  label: 'redshift drift',
  unit: 'cm/s per year',
  digits: significant(4),
  meaning: 'Change per year of observer of the velocity that a source seen at this epoch appears to have.',
  formula: 'v̇ = c [H_0 − H/(1 + z)]',
  source: 'Sandage 1962, ApJ 136, 319; Loeb 1998, ApJ 499, L111',
  accuracy: ROUNDING,
  value: driftOf,
}
