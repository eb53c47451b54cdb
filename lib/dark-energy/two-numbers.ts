/** What the families with w_0 and w_a share: their two parameters. */
import type { NumberParameter } from '../parameter'

export const W_TODAY: NumberParameter = {
  kind: 'number',
  key: 'w0',
  symbol: 'w_0',
  label: 'w today',
  unit: '',
  meaning: 'Pressure over energy density of dark energy today.',
  min: -20,
  max: 20,
  fallback: -1,
  slider: { min: -2, max: 0.4, step: 0.01 },
}

const SLOPE = {
  kind: 'number',
  key: 'wa',
  symbol: 'w_a',
  label: 'slope of w',
  unit: '',
  min: -20,
  max: 20,
  fallback: 0,
  slider: { min: -3, max: 2, step: 0.01 },
} as const

export const wSlopeParameter = (meaning: string): NumberParameter => ({ ...SLOPE, meaning })
