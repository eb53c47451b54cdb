/** Readings at one epoch that need more than the epoch, or say of a distance what a column does not. */
import { isMissing, type Missing, missing } from '../measures/outcome'
import { INTEGRAL, ROUNDING } from '../quantities/accuracy'
import type { ColumnKey } from '../quantities/column'
import { columnOf } from '../quantities/columns'
import { HOGG, HORIZONS, significant } from '../quantities/quantity'
import { hubbleLengthMpc } from '../units'
import { observed, SQUARE_DEGREES, WHOLE_SKY } from './given'
import type { ExtraKey } from './keys'
import type { Epoch, Reading } from './reading'

/** Arcseconds in a radian. */
const ARCSECONDS = 648000 / Math.PI

/** A column of tables at the epoch. */
export function columnAt(key: ColumnKey, { subject, instant }: Pick<Epoch, 'subject' | 'instant'>): number | Missing {
  return columnOf(key).value(subject, instant)
}

const through = (value: number | Missing, make: (x: number) => number | Missing): number | Missing =>
  isMissing(value) ? value : make(value)

/** θ = L/D, in arcseconds; the whole circle is the most that a length can fill. */
const angleAt = (key: ColumnKey) => (epoch: Epoch) =>
  through(columnAt(key, epoch), (distance) =>
    distance > 0 ? (ARCSECONDS * epoch.given.length) / distance : missing('the distance is 0: no angle is defined'),
  )

const finite = (make: Reading['value']): Reading['value'] => {
  return (epoch) => {
    const value = make(epoch)
    if (typeof value !== 'number' || Number.isFinite(value)) return value
    return missing('the value is outside the range of floating-point numbers')
  }
}

const ALL: readonly (Reading & { readonly key: ExtraKey })[] = [
  {
    key: 'recession',
    symbol: 'v(L)',
    label: 'recession across the length',
    unit: 'km/s',
    digits: significant(5),
    meaning: 'Rate at which a proper length grows with the expansion at this epoch.',
    formula: 'v = H L',
    source: 'Harrison 1993, ApJ 403, 28',
    accuracy: ROUNDING,
    value: (epoch) => through(columnAt('hubble', epoch), (rate) => rate * epoch.given.length),
  },
  {
    key: 'recessionNow',
    symbol: 'v_0',
    label: 'recession today',
    unit: 'c',
    digits: significant(4),
    meaning: 'Recession velocity today of what is seen at this epoch, over the speed of light.',
    formula: 'v_0 = H_0 D_C',
    source: HORIZONS,
    accuracy: INTEGRAL,
    value: (epoch) =>
      through(columnAt('comoving', epoch), (distance) => distance / hubbleLengthMpc(epoch.subject.scenario.h0)),
  },
  {
    key: 'recessionThen',
    symbol: 'v_em',
    label: 'recession at emission',
    unit: 'c',
    digits: significant(4),
    meaning: 'Recession velocity that what is seen at this epoch had then, over the speed of light.',
    formula: 'v_em = H D_C/(1 + z)',
    source: HORIZONS,
    accuracy: INTEGRAL,
    value: (epoch) =>
      through(columnAt('comoving', epoch), (distance) =>
        through(
          columnAt('hubble', epoch),
          (rate) => (distance * epoch.instant.scale) / hubbleLengthMpc(Math.max(rate, Number.MIN_VALUE)),
        ),
      ),
  },
  {
    key: 'angle',
    symbol: 'θ(L)',
    label: 'angle of the length, proper',
    unit: '″',
    digits: significant(5),
    meaning: 'Angle under which a proper length across the line of sight is seen.',
    formula: 'θ = L/D_A',
    source: `${HOGG}, eq. 18`,
    accuracy: INTEGRAL,
    value: angleAt('angular'),
  },
  {
    key: 'comovingAngle',
    symbol: 'θ_C(L)',
    label: 'angle of the length, comoving',
    unit: '″',
    digits: significant(5),
    meaning: 'Angle under which a comoving length across the line of sight is seen.',
    formula: 'θ_C = L/D_M',
    source: `${HOGG}, eq. 16`,
    accuracy: INTEGRAL,
    value: angleAt('transverse'),
  },
  {
    key: 'observedLine',
    symbol: 'λ_obs',
    label: 'observed line',
    unit: '',
    digits: significant(6),
    meaning: 'Wavelength, or frequency, at which a line emitted at this epoch is observed today.',
    formula: 'λ_obs = (1 + z) λ_rest',
    source: HOGG,
    accuracy: ROUNDING,
    unitOf: ({ line }) => line.unit,
    value: ({ instant, given }) =>
      instant.phase === 'past'
        ? observed(given.line, instant.redshift)
        : missing('no light from there is observed today through the expansion alone'),
  },
  {
    key: 'skyVolume',
    symbol: 'V(Ω)',
    label: 'survey volume',
    unit: 'Gpc³',
    digits: significant(5),
    meaning: 'Comoving volume over the sky area, from here out to this epoch.',
    formula: 'V = V_C Ω/4π',
    source: `${HOGG}, eq. 29`,
    accuracy: INTEGRAL,
    value: (epoch) => through(columnAt('volume', epoch), (volume) => (volume * epoch.given.sky) / WHOLE_SKY),
  },
  {
    key: 'volumeElement',
    symbol: 'dV/dz',
    label: 'volume per redshift',
    unit: 'Gpc³',
    digits: significant(5),
    meaning: 'Comoving volume per unit redshift over the sky area at this epoch.',
    formula: 'dV/dz = Ω D_M^2 c/H',
    source: `${HOGG}, eq. 28`,
    accuracy: INTEGRAL,
    value: (epoch) =>
      through(columnAt('transverse', epoch), (across) =>
        through(columnAt('hubble', epoch), (rate) =>
          rate > 0
            ? ((epoch.given.sky / SQUARE_DEGREES) * across ** 2 * hubbleLengthMpc(rate)) / 1e9
            : missing('the expansion stands still here: redshift does not grow with distance'),
        ),
      ),
  },
]

export const EXTRA_READINGS: readonly Reading[] = ALL.map((one) => ({ ...one, value: finite(one.value) }))
