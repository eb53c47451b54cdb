/** The variables in which an epoch can be typed, and where each leads in a history. */
import type { Event } from '../history/event'
import { placeElapsed } from '../history/place'
import { type Missing, missing } from '../measures/outcome'
import { type ColumnSubject, type Instant, instantAt, instantOf } from '../quantities/instant'
import { hubbleLengthMpc } from '../units'
import type { EpochKey } from './keys'

export interface EpochVariable {
  readonly key: EpochKey
  /** In the markup of labels. */
  readonly symbol: string
  readonly label: string
  readonly unit: string
  /** One sentence. */
  readonly meaning: string
  at(subject: ColumnSubject, value: number): Instant | Missing
}

export const EPOCH_VARIABLES: readonly EpochVariable[] = [
  {
    key: 'z',
    symbol: 'z',
    label: 'redshift',
    unit: '',
    meaning: 'Redshift; negative where space is larger than today.',
    at: (subject, value) => instantAt(subject, 'z', value),
  },
  {
    key: 'scale',
    symbol: 'a',
    label: 'scale factor',
    unit: '',
    meaning: 'Size of all cosmic distances over their size today.',
    at: (subject, value) => instantAt(subject, 'scale', value),
  },
  {
    key: 'time',
    symbol: 't − t_0',
    label: 'time from now',
    unit: 'Gyr',
    meaning: 'Cosmic time from now; the past is negative.',
    at: (subject, value) => instantAt(subject, 'time', value),
  },
  {
    key: 'age',
    symbol: 't',
    label: 'age',
    unit: 'Gyr',
    meaning: 'Cosmic time since the origin; negative before a bounce.',
    at: (subject, value) => instantAt(subject, 'age', value),
  },
  {
    key: 'lookback',
    symbol: 't_L',
    label: 'lookback time',
    unit: 'Gyr',
    meaning: 'How long ago; negative in the future.',
    at: (subject, value) => instantAt(subject, 'time', value === 0 ? 0 : -value),
  },
  {
    key: 'temperature',
    symbol: 'T',
    label: 'photon temperature',
    unit: 'K',
    meaning: 'Temperature of the cosmic microwave background.',
    at: atTemperature,
  },
  {
    key: 'comoving',
    symbol: 'D_C',
    label: 'comoving distance',
    unit: 'Mpc',
    meaning: 'Comoving distance to what is seen at that epoch.',
    at: atDistance,
  },
]

/** Every key has its record. */
export function epochVariable(key: EpochKey): EpochVariable {
  const found = EPOCH_VARIABLES.find((one) => one.key === key)
  if (!found) throw new RangeError(`no epoch is typed in ${key}`)
  return found
}

function atTemperature(subject: ColumnSubject, value: number): Instant | Missing {
  const { radiation } = subject.scenario
  if (radiation.kind !== 'thermal') return missing('the scenario gives no photon temperature')
  return instantAt(subject, 'scale', radiation.cmb / value)
}

/** Along our past light path, through the expansion that holds today. */
function atDistance(subject: ColumnSubject, value: number): Instant | Missing {
  const { past } = subject.history
  const place = placeElapsed(past, 'conformal', value / hubbleLengthMpc(subject.scenario.h0))
  if (place === null) {
    return missing('the distance reaches beyond all that light could cross since the origin of the expansion')
  }
  const event: Event = { phase: 'past', place, sign: 1, swings: 0 }
  return instantOf(subject, event)
}
