/** How fast: the expansion rate over 1 + z, and how the expansion slows or speeds up. */
import { isMissing } from '../../measures/outcome'
import type { Column } from '../../quantities/column'
import { columnNamed } from '../../quantities/columns'
import { quantityChart, type Vertical } from './quantity-chart'
import type { View } from './view'

const BY = ['redshift', 'logredshift', 'time', 'logtime', 'lookback', 'scale', 'logscale']

const column = (key: string): Column => {
  const found = columnNamed(key)
  if (!found) throw new Error(`there is no column ${key}`)
  return found
}

const HUBBLE = column('hubble')
const DECELERATION = column('deceleration')

const PACE: Vertical = {
  quantity: 'pace',
  label: 'expansion rate',
  symbol: 'H/(1 + z)',
  unit: HUBBLE.unit,
  past: false,
  logarithmic: true,
  value: (solution, instant) => {
    const rate = HUBBLE.value(solution, instant)
    return isMissing(rate) ? rate : rate * instant.scale
  },
}

const SLOWING: Vertical = {
  quantity: 'deceleration',
  label: 'deceleration',
  symbol: 'q',
  unit: '',
  past: false,
  logarithmic: false,
  divide: { axis: 'y', at: 0, label: '' },
  value: (solution, instant) => DECELERATION.value(solution, instant),
}

export const RATE: View = {
  key: 'rate',
  title: 'Rate',
  choice: 'Show',
  shows: [
    { key: 'pace', word: 'H/(1 + z)', by: BY, compare: ['ratio', 'difference'] },
    { key: 'q', word: 'deceleration q', by: BY, compare: ['difference'] },
  ],
  chart: (asked) => quantityChart(asked, asked.show.key === 'q' ? SLOWING : PACE),
}
