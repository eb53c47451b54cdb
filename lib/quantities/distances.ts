/** Columns along our line of sight: distances, angles, volume, drift. All follow light through the expansion that holds today. */
import { JULIAN_YEAR, SPEED_OF_LIGHT } from '../constants'
import { antipode, comovingVolume, transverseDistance } from '../measures/distances'
import { type Missing, missing } from '../measures/outcome'
import type { Model } from '../model'
import { hubbleLengthMpc, perSecond } from '../units'
import { INTEGRAL, ROUNDING } from './accuracy'
import { type Block, expansionIn, nothing, shared, sightIn, times } from './block'
import type { Definition } from './column'
import { fixed, HOGG, significant } from './quantity'

const IN_THE_FUTURE = missing('it lies in the future: no line of sight leads there')
const CONTRACTING = missing('lines of sight are followed only through the expansion that holds today')

/** No line of sight leads there. */
const unseen = ({ phase }: Block): Missing | null =>
  phase === 'past' ? null : phase === 'future' ? IN_THE_FUTURE : CONTRACTING

/** D_C in Mpc. */
const comovingIn = shared((block) => times(block, sightIn(block), hubbleLengthMpc(block.subject.scenario.h0)))

/** D_M in Mpc. */
const transverseIn = shared((block) => {
  const { scenario, budget } = block.subject
  if (budget.curvature === 0) return comovingIn(block)
  const [out, chi, mpc] = [block.take(), sightIn(block), hubbleLengthMpc(scenario.h0)]
  for (let i = 0; i < block.count; i++) out[i] = transverseDistance(chi[i], budget.curvature) * mpc
  return out
})

const angularIn = shared((block) => {
  const [out, distance] = [block.take(), transverseIn(block)]
  for (let i = 0; i < block.count; i++) out[i] = distance[i] / (1 + block.redshift[i])
  return out
})

const luminosityIn = shared((block) => {
  const [out, distance] = [block.take(), transverseIn(block)]
  for (let i = 0; i < block.count; i++) out[i] = distance[i] * (1 + block.redshift[i])
  return out
})

function modulusIn(block: Block): Float64Array {
  const [out, distance] = [block.take(), luminosityIn(block)]
  for (let i = 0; i < block.count; i++) out[i] = 5 * Math.log10(distance[i]) + 25
  return out
}

function volumeIn(block: Block): Float64Array {
  const { scenario, budget } = block.subject
  const [out, chi, unit] = [block.take(), sightIn(block), (hubbleLengthMpc(scenario.h0) / 1e3) ** 3]
  for (let i = 0; i < block.count; i++) out[i] = comovingVolume(chi[i], budget.curvature) * unit
  return out
}

/** Near today 1 − aE is formed from E² − 1 and a² − 1, which are known without cancellation there. */
export const NEAR_TODAY = 0.7
const NOTHING_TODAY = { N: 0, value: 0 } as const

/** c H₀ in cm/s per Julian year. */
export const driftUnit = (h0: number): number => 100 * SPEED_OF_LIGHT * perSecond(h0) * JULIAN_YEAR

/** c H₀ (1 − E/(1 + z)) in cm/s per Julian year. */
function driftIn(block: Block): Float64Array {
  if (unseen(block)) return nothing(block)
  const { arm, N, scale, redshift } = block
  const [out, squared] = [block.take(), expansionIn(block)]
  const unit = driftUnit(block.subject.scenario.h0)
  for (let i = 0; i < block.count; i++) {
    const rate = Math.sqrt(Math.max(0, squared[i])) / (1 + redshift[i])
    out[i] =
      unit * (Math.abs(N[i]) < NEAR_TODAY ? lagNearToday(arm.model, N[i], scale[i], redshift[i], rate) : 1 - rate)
  }
  return out
}

/** 1 − aE = (1 − a²E²)/(1 + aE), with a²E² − 1 = a²(E² − 1) + a² − 1 and a² − 1 = −a z (1 + a). */
const lagNearToday = (model: Model, N: number, a: number, z: number, rate: number): number =>
  -(a * a * model.expansionFrom(NOTHING_TODAY, N) - a * z * (1 + a)) / (1 + rate)

/** Whether light from there has passed the point opposite to us in a closed space. */
const pastAntipode = (block: Block, i: number): boolean =>
  block.phase === 'past' && sightIn(block)[i] > antipode(block.subject.budget.curvature)

const remarkOf =
  (text: string): Definition['remark'] =>
  (block, i) =>
    pastAntipode(block, i) ? text : null

const FOLDED = remarkOf('the light comes from beyond the antipode of the closed space, whose distances shrink again')
const WHOLE = remarkOf('the light comes from beyond the antipode of the closed space; the volume is that of all space')

export const DISTANCE_COLUMNS: readonly Definition[] = [
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
    values: comovingIn,
    why: unseen,
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
    values: transverseIn,
    why: unseen,
    remark: FOLDED,
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
    values: angularIn,
    why: unseen,
    remark: FOLDED,
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
    values: luminosityIn,
    why: unseen,
    remark: FOLDED,
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
    values: modulusIn,
    why: (block, i) =>
      unseen(block) ?? (luminosityIn(block)[i] > 0 ? null : missing('the distance is 0, which has no logarithm')),
    remark: FOLDED,
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
    values: (block) => times(block, angularIn(block), (1e3 * Math.PI) / 648000),
    why: unseen,
    remark: FOLDED,
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
    values: volumeIn,
    why: unseen,
    remark: WHOLE,
  },
]

export const DRIFT: Definition = {
  key: 'drift',
  symbol: 'v̇',
  label: 'redshift drift',
  unit: 'cm/s per year',
  digits: significant(4),
  meaning: 'Change per year of observer of the velocity that a source seen at this epoch appears to have.',
  formula: 'v̇ = c [H_0 − H/(1 + z)]',
  source: 'Sandage 1962, ApJ 136, 319; Loeb 1998, ApJ 499, L111',
  accuracy: ROUNDING,
  values: driftIn,
  why: unseen,
}
