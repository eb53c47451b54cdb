/** What the ruler knows by name: the variables that an epoch is typed in, and what can be read there. */

export const EPOCH_KEYS = ['z', 'scale', 'time', 'age', 'lookback', 'temperature', 'comoving'] as const
export type EpochKey = (typeof EPOCH_KEYS)[number]

/** Read at one epoch, beside the columns of tables. */
export const EXTRA_KEYS = [
  'recession',
  'recessionNow',
  'recessionThen',
  'angle',
  'comovingAngle',
  'observedLine',
  'skyVolume',
  'volumeElement',
] as const
export type ExtraKey = (typeof EXTRA_KEYS)[number]

/** Read between two epochs. */
export const BETWEEN_KEYS = [
  'interval',
  'comovingBetween',
  'angularBetween',
  'shellVolume',
  'criticalSurfaceDensity',
] as const
export type BetweenKey = (typeof BETWEEN_KEYS)[number]

/** Read where nothing else is asked for, in the order of the groups. */
export const USUAL_READINGS = [
  'redshift',
  'age',
  'lookback',
  'comoving',
  'angular',
  'luminosity',
  'arcsecond',
  'skyVolume',
  'observedLine',
  'hubble',
] as const
