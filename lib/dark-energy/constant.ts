import { type Family, numberOf } from './law'
import { powerLaw } from './power-law'

export const constant: Family = {
  key: 'constant',
  label: 'constant w',
  formula: 'w constant',
  clause: 'has a constant equation of state',
  meaning: 'Pressure over density stays the same for ever; below −1 the density grows (phantom).',
  source: 'Turner & White 1997, Phys. Rev. D 56, R4439',
  caution: 'A constant w is a description of measurements up to now; run forward it is an assumption.',
  parameters: [
    {
      kind: 'number',
      key: 'w',
      symbol: 'w',
      label: 'equation of state',
      unit: '',
      meaning: 'Pressure over energy density of dark energy.',
      min: -20,
      max: 20,
      fallback: -1,
      slider: { min: -2, max: 0.4, step: 0.01 },
    },
  ],
  law: (values) => powerLaw(numberOf(values, 'w')),
}
