/** Columns that say how fast: the expansion rate, its changes, and the scales of length and density that it sets. */
import { GRAVITATION } from '../constants'
import { type Missing, missing } from '../measures/outcome'
import { AT_REST } from '../measures/rates'
import { hubbleLengthGly, perSecond } from '../units'
import { ROUNDING } from './accuracy'
import { type Block, expansionIn, overExpansion, shared, slopesIn, times } from './block'
import type { Definition } from './column'
import { FRIEDMANN, fixed, significant } from './quantity'

/** |H|/H₀. */
const rateIn = shared((block) => {
  const [out, squared] = [block.take(), expansionIn(block)]
  for (let i = 0; i < block.count; i++) out[i] = Math.sqrt(Math.max(0, squared[i]))
  return out
})

/** Ratios to H² have no value where the expansion stands still. */
const atRest = (block: Block, i: number): Missing | null => (expansionIn(block)[i] <= 0 ? AT_REST : null)

/** −1 − ½ (E²)′/E², primes by ln a. */
function decelerations(block: Block): Float64Array {
  const [out, squared, { first }] = [block.take(), expansionIn(block), slopesIn(block)]
  for (let i = 0; i < block.count; i++) out[i] = -0.5 * first[i] - squared[i]
  return overExpansion(block, out)
}

/** 1 + (3/2)(E²)′/E² + ½ (E²)″/E². */
function jerks(block: Block): Float64Array {
  const [out, squared, { first, second }] = [block.take(), expansionIn(block), slopesIn(block)]
  for (let i = 0; i < block.count; i++) out[i] = squared[i] + 1.5 * first[i] + 0.5 * second[i]
  return overExpansion(block, out)
}

export const RATE_COLUMNS: readonly Definition[] = [
  {
    key: 'hubble',
    symbol: 'H',
    label: 'expansion rate',
    unit: 'km/s/Mpc',
    digits: significant(5),
    meaning: 'Rate of expansion; negative while the universe contracts.',
    formula: 'H = ȧ/a = H_0 E(a)',
    source: FRIEDMANN,
    accuracy: ROUNDING,
    values: (block) => times(block, rateIn(block), block.sign * block.subject.scenario.h0),
  },
  {
    key: 'deceleration',
    symbol: 'q',
    label: 'deceleration',
    unit: '',
    digits: fixed(4),
    meaning: 'Deceleration parameter; negative while the expansion accelerates.',
    formula: 'q = −(ä a)/ȧ²',
    source: FRIEDMANN,
    accuracy: ROUNDING,
    values: decelerations,
    why: atRest,
  },
  {
    key: 'jerk',
    symbol: 'j',
    label: 'jerk',
    unit: '',
    digits: fixed(4),
    meaning: 'Third derivative of the scale factor; 1 for matter and a cosmological constant in flat space.',
    formula: 'j = a² (d³a/dt³)/ȧ³',
    source: 'Visser 2004, Class. Quantum Grav. 21, 2603',
    accuracy: ROUNDING,
    values: jerks,
    why: atRest,
  },
]

export const HUBBLE_RADIUS: Definition = {
  key: 'hubbleRadius',
  symbol: 'c/|H|',
  label: 'Hubble radius',
  unit: 'Gly',
  digits: significant(5),
  meaning: 'Proper distance at which recession reaches the speed of light.',
  formula: 'c/|H|',
  source: 'Harrison 1993, ApJ 403, 28',
  accuracy: ROUNDING,
  values: (block) => {
    const [out, rate, length] = [block.take(), rateIn(block), hubbleLengthGly(block.subject.scenario.h0)]
    for (let i = 0; i < block.count; i++) out[i] = length / rate[i]
    return out
  },
  why: (block, i) =>
    expansionIn(block)[i] <= 0 ? missing('the expansion stands still here, so the Hubble radius is infinite') : null,
}

export const CRITICAL_DENSITY: Definition = {
  key: 'criticalDensity',
  symbol: 'ρ_c',
  label: 'critical density',
  unit: 'kg/m³',
  digits: significant(5),
  meaning: 'Density of a flat universe with this expansion rate.',
  formula: 'ρ_c = 3H²/(8πG)',
  source: FRIEDMANN,
  accuracy: ROUNDING,
  values: (block) => {
    const [out, squared] = [block.take(), expansionIn(block)]
    const today = (3 * perSecond(block.subject.scenario.h0) ** 2) / (8 * Math.PI * GRAVITATION)
    for (let i = 0; i < block.count; i++) out[i] = today * Math.max(0, squared[i])
    return out
  },
}
