/** Columns of the growth of structure. */
import type { Event } from '../history/event'
import type { History } from '../history/history'
import { growthAt, growthRateAt } from '../measures/growth'
import { isMissing, type Missing, type Outcome } from '../measures/outcome'
import { GROWTH } from './accuracy'
import { type Block, eventIn } from './block'
import type { Definition } from './column'
import { fixed } from './quantity'

type Reading = (history: History, event: Event) => Outcome

const readings =
  (read: Reading) =>
  (block: Block): Float64Array => {
    const out = block.take()
    for (let i = 0; i < block.count; i++) {
      const one = read(block.subject.history, eventIn(block, i))
      out[i] = isMissing(one) ? Number.NaN : one.value
    }
    return out
  }

const reason =
  (read: Reading) =>
  (block: Block, i: number): Missing | null => {
    const one = read(block.subject.history, eventIn(block, i))
    return isMissing(one) ? one : null
  }

const SOURCE = 'Peebles 1980, The Large-Scale Structure of the Universe, Princeton, sections 10 and 11'

export const GROWTH_COLUMNS: readonly Definition[] = [
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
    values: readings(growthAt),
    why: reason(growthAt),
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
    values: readings(growthRateAt),
    why: reason(growthRateAt),
  },
]
