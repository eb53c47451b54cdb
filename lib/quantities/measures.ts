/** Every measure of a scenario once, in the order of the page. */
import type { Quantity } from './quantity'

export const MEASURE_KEYS = [
  'age',
  'hubbleTime',
  'hubbleRadius',
  'particleHorizon',
  'eventHorizon',
  'reachRedshift',
  'superluminalRedshift',
  'futureVisibility',
  'deceleration',
  'jerk',
  'accelerationOnset',
  'equalityMatterRadiation',
  'equalityMatterDark',
  'curvatureRadius',
  'recombinationRedshift',
  'dragRedshift',
  'soundHorizonDrag',
  'acousticAngle',
  'asymptoticHubble',
] as const
export type MeasureKey = (typeof MEASURE_KEYS)[number]
export type MeasureQuantity = Quantity & { readonly key: MeasureKey }
