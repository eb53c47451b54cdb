import type { NumberParameter, ParameterValues } from '../parameter'
import { type Family, type Law, numberOf } from './law'
import { cosine, exponential, inverse, linear, type Potential, type PotentialKind } from './potential'

const CHOICES: readonly { readonly value: PotentialKind; readonly label: string }[] = [
  { value: 'exponential', label: 'V ∝ e^(−sφ)' },
  { value: 'linear', label: 'V ∝ 1 − sφ' },
  { value: 'inverse', label: 'V ∝ φ^(−s)' },
  { value: 'cosine', label: 'V ∝ 1 + cos(φ/f)' },
]

const slope: Omit<NumberParameter, 'only' | 'min'> = {
  kind: 'number',
  key: 'slope',
  symbol: 's',
  label: 'slope of the potential',
  unit: '',
  meaning: 'How steep the potential is: the slope of ln V or of V where the field starts, or the power of 1/φ.',
  max: 20,
  fallback: 1,
  slider: { min: 0.05, max: 3, step: 0.01 },
}

export const field: Family = {
  key: 'field',
  label: 'scalar field',
  formula: 'w = (½ φ̇² − V)/(½ φ̇² + V)',
  meaning:
    'A canonical scalar field φ, at rest until a = 10⁻⁶, rolls on its potential V, whose height is the smallest that gives Ω_DE today.',
  source:
    'Ratra & Peebles 1988, Phys. Rev. D 37, 3406; Wetterich 1988, Nucl. Phys. B 302, 668; Frieman, Hill, Stebbins & Waga 1995, Phys. Rev. Lett. 75, 2077; Kallosh, Kratochvil, Linde, Linder & Shmakova 2003, JCAP 10, 015',
  caution: 'No potential has been measured: each is an example of what a field could do.',
  parameters: [
    {
      kind: 'choice',
      key: 'v',
      symbol: 'V',
      label: 'potential',
      unit: '',
      meaning: 'Shape of the potential; φ in reduced Planck masses.',
      fallback: 'exponential',
      choices: CHOICES,
    },
    { ...slope, min: -20, only: { key: 'v', values: ['exponential', 'linear'] } },
    { ...slope, min: 0, above: true, only: { key: 'v', values: ['inverse'] } },
    {
      kind: 'number',
      key: 'width',
      symbol: 'f',
      label: 'width of the cosine',
      unit: 'M_P',
      meaning: 'By how much φ moves for V to change its phase by 1.',
      min: 0.01,
      max: 100,
      fallback: 1,
      slider: { min: 0.2, max: 3, step: 0.01 },
      only: { key: 'v', values: ['cosine'] },
    },
    {
      kind: 'number',
      key: 'start',
      symbol: 'φ_i',
      label: 'φ at rest',
      unit: 'M_P',
      meaning: 'Where the field rests in the early universe.',
      min: 0.001,
      max: 100,
      fallback: 0.5,
      slider: { min: 0.01, max: 3, step: 0.01 },
      only: { key: 'v', values: ['inverse', 'cosine'] },
    },
  ],
  law: (values) => boundsOnly(potentialOf(values)),
  potential: potentialOf,
}

function potentialOf(values: ParameterValues): Potential {
  switch (values.v) {
    case 'linear':
      return linear(numberOf(values, 'slope'))
    case 'inverse':
      return inverse(numberOf(values, 'slope'), numberOf(values, 'start'))
    case 'cosine':
      return cosine(numberOf(values, 'width'), numberOf(values, 'start'))
    default:
      return exponential(numberOf(values, 'slope'))
  }
}

/** Without the rest of the universe a field has no law; only that 0 ≤ n, and n ≤ 6 while V ≥ 0. */
function boundsOnly(potential: Potential): Law {
  const still = potential.slope(potential.start) === 0
  const range = [0, still ? 0 : potential.positive ? 6 : Number.POSITIVE_INFINITY] as const
  const missing = (): never => {
    throw new TypeError('the density of a scalar field follows from its history')
  }
  const unknown = { kind: 'power', exponent: 0, logCoefficient: 0, settled: Number.POSITIVE_INFINITY } as const
  return {
    density: missing,
    logDensity: missing,
    change: missing,
    bend: missing,
    derivativesInto: missing,
    w: missing,
    exponentRange: () => range,
    past: unknown,
    future: unknown,
    breaks: [],
  }
}
