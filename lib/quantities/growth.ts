/** Columns of the growth of structure. */
import { missing } from '../measures/outcome'
import type { Column } from './column'
import { fixed } from './quantity'

const NOT_YET = missing('growth is not computed yet')
const SOURCE = 'Peebles 1980, The Large-Scale Structure of the Universe, Princeton, sections 10 and 11'

export const GROWTH_COLUMNS: readonly Column[] = [
  {
    key: 'growth',
    symbol: 'D',
    label: 'growth',
    unit: '',
    digits: fixed(4),
    meaning: 'Linear density contrast over that of today.',
    formula: 'D″ + (2 + (ln E)′) D′ = (3/2) Ω_s D, primes by ln a, D = 1 today',
    source: SOURCE,
    value: () => NOT_YET,
  },
  {
    key: 'growthRate',
    symbol: 'f',
    label: 'growth rate',
    unit: '',
    digits: fixed(4),
    meaning: 'Logarithmic slope of growth by the scale factor.',
    formula: 'f = d ln D/d ln a',
    source: SOURCE,
    value: () => NOT_YET,
  },
]
