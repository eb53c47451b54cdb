/** How fast: the expansion rate over 1 + z, and how the expansion slows or speeds up. */
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
  spelled: 'H/(1 + z)',
  unit: HUBBLE.unit,
  past: false,
  logarithmic: true,
  factors: [HUBBLE, column('scale')],
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
