/** How fast: the expansion speed, which is H/(1 + z), and how the expansion slows or speeds up. */
import { columnOf } from '../../quantities/columns'
import { quantityChart, type Vertical } from './quantity-chart'
import type { View } from './view'

const BY = ['redshift', 'logredshift', 'time', 'logtime', 'lookback', 'scale', 'logscale']

const HUBBLE = columnOf('hubble')
const DECELERATION = columnOf('deceleration')

const PACE: Vertical = {
  quantity: 'pace',
  label: 'expansion speed',
  symbol: 'H/(1 + z)',
  spelled: 'H/(1 + z)',
  unit: HUBBLE.unit,
  past: false,
  logarithmic: true,
  factors: [HUBBLE, columnOf('scale')],
}

const SLOWING: Vertical = {
  quantity: 'deceleration',
  label: 'deceleration',
  symbol: 'q',
  unit: '',
  past: false,
  logarithmic: false,
  divide: { axis: 'y', at: 0, label: '' },
  factors: [DECELERATION],
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
