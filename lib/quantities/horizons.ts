/** Columns of conformal time and of what light can reach, as seen from the epoch. */
import { sinceOrigin } from '../history/event'
import { isMissing, type Missing, missing } from '../measures/outcome'
import { eventHorizon, particleHorizon } from '../measures/sight'
import { hubbleLengthGly } from '../units'
import { INTEGRAL } from './accuracy'
import type { Column } from './column'
import type { ColumnSubject } from './instant'
import { HORIZONS, significant } from './quantity'

const inGly = (value: number | Missing, { scenario }: ColumnSubject): number | Missing =>
  isMissing(value) ? value : value * hubbleLengthGly(scenario.h0)

export const HORIZON_COLUMNS: readonly Column[] = [
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
    value: (subject, instant) => {
      const since = sinceOrigin(subject.history, instant, 'conformal')
      return Number.isFinite(since)
        ? inGly(since, subject)
        : missing('light has had unlimited conformal time since the origin')
    },
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
    value: (subject, instant) => inGly(particleHorizon(subject.history, instant), subject),
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
    value: (subject, instant) => inGly(eventHorizon(subject.history, instant), subject),
  },
]
