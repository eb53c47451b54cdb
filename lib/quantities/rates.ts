/** Columns that say how fast: the expansion rate, its changes, and the scales of length and density that it sets. */
import { GRAVITATION } from '../constants'
import { missing } from '../measures/outcome'
import { deceleration, hubbleRate, jerk } from '../measures/rates'
import { hubbleLengthGly, perSecond } from '../units'
import { ROUNDING } from './accuracy'
import type { Column } from './column'
import { FRIEDMANN, fixed, significant } from './quantity'

export const RATE_COLUMNS: readonly Column[] = [
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
    value: ({ scenario }, instant) => scenario.h0 * hubbleRate(instant, instant.expansion),
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
    value: (_, instant) => deceleration(instant, instant.expansion),
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
    value: (_, instant) => jerk(instant, instant.expansion),
  },
]

export const HUBBLE_RADIUS: Column = {
  key: 'hubbleRadius',
  symbol: 'c/|H|',
  label: 'Hubble radius',
  unit: 'Gly',
  digits: significant(5),
  meaning: 'Proper distance at which recession reaches the speed of light.',
  formula: 'c/|H|',
  source: 'Harrison 1993, ApJ 403, 28',
  accuracy: ROUNDING,
  value: ({ scenario }, { expansion }) =>
    expansion > 0
      ? hubbleLengthGly(scenario.h0) / Math.sqrt(expansion)
      : missing('the expansion stands still here, so the Hubble radius is infinite'),
}

export const CRITICAL_DENSITY: Column = {
  key: 'criticalDensity',
  symbol: 'ρ_c',
  label: 'critical density',
  unit: 'kg/m³',
  digits: significant(5),
  meaning: 'Density of a flat universe with this expansion rate.',
  formula: 'ρ_c = 3H²/(8πG)',
  source: FRIEDMANN,
  accuracy: ROUNDING,
  value: ({ scenario }, { expansion }) =>
    (3 * perSecond(scenario.h0) ** 2 * Math.max(0, expansion)) / (8 * Math.PI * GRAVITATION),
}
