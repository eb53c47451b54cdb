/** Columns that say when: times, and the size of the universe. */
import { missing } from '../measures/outcome'
import { INTEGRAL, ROOT } from './accuracy'
import { ageIn, timeIn, times } from './block'
import type { Definition } from './column'
import { FRIEDMANN, fixed, HOGG, significant } from './quantity'

export const TIME_COLUMNS: readonly Definition[] = [
  {
    key: 'time',
    symbol: 't − t_0',
    label: 'time from now',
    unit: 'Gyr',
    digits: fixed(3),
    meaning: 'Cosmic time from now; the past is negative.',
    formula: 't − t_0 = ∫ da/(a H), from today',
    source: FRIEDMANN,
    accuracy: INTEGRAL,
    values: timeIn,
  },
  {
    key: 'age',
    symbol: 't',
    label: 'age',
    unit: 'Gyr',
    digits: significant(5),
    meaning: 'Cosmic time since the origin, the Big Bang or the last bounce; negative before a bounce.',
    formula: 't = ∫ da/(a H), from the origin',
    source: FRIEDMANN,
    accuracy: INTEGRAL,
    values: ageIn,
    why: () => missing('the past is infinite, so no age can be counted'),
  },
  {
    key: 'lookback',
    symbol: 't_L',
    label: 'lookback time',
    unit: 'Gyr',
    digits: fixed(3),
    meaning: 'How long ago; negative in the future.',
    formula: 't_L = t_0 − t',
    source: `${HOGG}, eq. 30`,
    accuracy: INTEGRAL,
    values: (block) => times(block, timeIn(block), -1),
  },
  {
    key: 'scale',
    symbol: 'a',
    label: 'scale factor',
    unit: '',
    digits: significant(5),
    meaning: 'Size of all cosmic distances over their size today.',
    formula: 'a = 1/(1 + z)',
    source: FRIEDMANN,
    accuracy: ROOT,
    values: ({ scale }) => scale,
  },
  {
    key: 'redshift',
    symbol: 'z',
    label: 'redshift',
    unit: '',
    digits: significant(5),
    meaning: 'Stretching since then of light that arrives today, less one; negative where space is larger than today.',
    formula: 'z = 1/a − 1',
    source: `${HOGG}, eq. 11`,
    accuracy: ROOT,
    values: ({ redshift }) => redshift,
  },
]
