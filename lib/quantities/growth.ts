/** Columns of the growth of structure. */
import { growthAt, growthRateAt } from '../measures/growth'
import { isMissing, type Missing, type Outcome } from '../measures/outcome'
import { GROWTH } from './accuracy'
import type { Column } from './column'
import { fixed } from './quantity'

const numberIn = (outcome: Outcome): number | Missing => (isMissing(outcome) ? outcome : outcome.value)
const SOURCE = 'Peebles 1980, The Large-Scale Structure of the Universe, Princeton, sections 10 and 11'

export const GROWTH_COLUMNS: readonly Column[] = [
  {
    key: 'growth',
    symbol: 'D',
    label: 'growth',
    unit: '',
    digits: fixed(4),
    meaning: 'Linear density contrast over that of today, with smooth dark energy.',
    formula: 'D″ + (2 + (ln E)′) D′ = (3/2) Ω_s D, primes by ln a, D = 1 today',
    source: SOURCE,
    accuracy: GROWTH,
    value: ({ history }, instant) => numberIn(growthAt(history, instant)),
  },
  {
    key: 'growthRate',
    symbol: 'f',
    label: 'growth rate',
    unit: '',
    digits: fixed(4),
    meaning: 'Logarithmic slope of growth by the scale factor.',
    formula: 'f = (d ln D)/(d ln a)',
    source: SOURCE,
    accuracy: GROWTH,
    value: ({ history }, instant) => numberIn(growthRateAt(history, instant)),
  },
]
