/** The readings by what they tell, for whoever chooses among them. */
import type { ColumnKey } from '../quantities/column'
import type { ExtraKey } from './keys'

export interface ReadingGroup {
  readonly title: string
  readonly keys: readonly (ColumnKey | ExtraKey)[]
}

export const READING_GROUPS: readonly ReadingGroup[] = [
  { title: 'Epoch', keys: ['redshift', 'scale', 'time', 'age', 'lookback', 'temperature'] },
  {
    title: 'Distances',
    keys: ['comoving', 'transverse', 'angular', 'luminosity', 'modulus'],
  },
  {
    title: 'Angles and volumes',
    keys: ['arcsecond', 'angle', 'comovingAngle', 'volume', 'skyVolume', 'volumeElement'],
  },
  { title: 'Light', keys: ['observedLine', 'drift', 'recessionNow', 'recessionThen'] },
  { title: 'Rate', keys: ['hubble', 'recession', 'deceleration', 'jerk', 'hubbleRadius', 'criticalDensity'] },
  {
    title: 'Contents',
    keys: ['omegaMatter', 'omegaRadiation', 'omegaNeutrino', 'omegaCurvature', 'omegaDark', 'w'],
  },
  { title: 'Horizons', keys: ['conformal', 'particleHorizon', 'eventHorizon'] },
  { title: 'Growth', keys: ['growth', 'growthRate'] },
]
