/** Distances along the line of sight, and what follows from them. */
import type { ColumnKey } from '../../quantities/column'
import { columnOf } from '../../quantities/columns'
import { quantityChart, type Vertical } from './quantity-chart'
import type { Comparison, Show, View } from './view'

const BY = ['redshift', 'logredshift', 'lookback', 'scale', 'logscale']

const show = (key: ColumnKey, word: string, compare: readonly Comparison[] = ['ratio', 'difference']): Show => ({
  key,
  word,
  by: BY,
  compare,
})

function verticalOf(key: ColumnKey): Vertical {
  const column = columnOf(key)
  const { label, symbol, unit } = column
  return { quantity: key, label, symbol, unit, factors: [column], past: true, logarithmic: key !== 'modulus' }
}

export const DISTANCES: View = {
  key: 'distances',
  title: 'Distances',
  choice: 'Show',
  shows: [
    show('comoving', 'comoving'),
    show('transverse', 'transverse'),
    show('luminosity', 'luminosity'),
    show('angular', 'angular diameter'),
    show('modulus', 'modulus', ['difference']),
    show('volume', 'volume'),
    {
      key: 'lookback',
      word: 'lookback time',
      by: BY.filter((key) => key !== 'lookback'),
      compare: ['ratio', 'difference'],
    },
  ],
  // What it shows are columns, by their keys.
  chart: (asked) => quantityChart(asked, verticalOf(asked.show.key as ColumnKey)),
}
