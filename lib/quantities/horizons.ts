/** Columns of conformal time and of what light can reach, as seen from the epoch. */
import { type Span, spanSinceOrigin, spanUntilEnd } from '../history/event'
import { missing } from '../measures/outcome'
import { NO_PARTICLE_HORIZON, noEventHorizon, particleHorizonSpan } from '../measures/sight'
import { hubbleLengthGly } from '../units'
import { INTEGRAL } from './accuracy'
import { type Block, nothing, spanIn, times } from './block'
import type { Definition } from './column'
import { HORIZONS, significant } from './quantity'

const inGly = (block: Block, span: Span): Float64Array =>
  times(block, spanIn(block, span, 'conformal'), hubbleLengthGly(block.subject.scenario.h0))

const conformalIn = (block: Block): Float64Array =>
  inGly(block, spanSinceOrigin(block.subject.history, block, 'conformal'))

function particleHorizonIn(block: Block): Float64Array {
  const span = particleHorizonSpan(block.subject.history, block)
  return 'because' in span ? nothing(block) : inGly(block, span)
}

export const HORIZON_COLUMNS: readonly Definition[] = [
  {
    key: 'conformal',
    symbol: 'c η',
    label: 'conformal time',
    unit: 'Gly',
    digits: significant(6),
    meaning: 'Comoving distance that light covers from the origin to this epoch; negative before a bounce.',
    formula: 'c η = ∫ c dt/a, from the origin',
    source: HORIZONS,
    accuracy: INTEGRAL,
    values: conformalIn,
    why: () => missing('light has had unlimited conformal time since the origin'),
  },
  {
    key: 'particleHorizon',
    symbol: 'χ_ph',
    label: 'particle horizon',
    unit: 'Gly',
    digits: significant(6),
    meaning: 'Comoving distance to the farthest matter whose light has arrived by this epoch.',
    formula: 'χ_ph = ∫ c dt/a, from the beginning; after a bounce the contraction counts',
    source: HORIZONS,
    accuracy: INTEGRAL,
    values: particleHorizonIn,
    why: (block) => {
      const span = particleHorizonSpan(block.subject.history, block)
      return 'because' in span ? span : NO_PARTICLE_HORIZON
    },
  },
  {
    key: 'eventHorizon',
    symbol: 'χ_eh',
    label: 'event horizon',
    unit: 'Gly',
    digits: significant(6),
    meaning: 'Comoving distance that light sent at this epoch can still cover before the end.',
    formula: 'χ_eh = ∫ c dt/a, to the end',
    source: HORIZONS,
    accuracy: INTEGRAL,
    values: (block) => inGly(block, spanUntilEnd(block.subject.history, block, 'conformal')),
    why: ({ subject }) => noEventHorizon(subject.history),
  },
]
