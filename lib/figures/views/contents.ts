/** Of what: the share of each component in the scenario in focus, and the law of dark energy of all. */
import type { ColumnKey } from '../../quantities/column'
import { columnOf } from '../../quantities/columns'
import { extrapolates } from '../../words/beyond'
import { columnAlong } from '../along'
import type { Chart } from '../chart'
import { readingsOf } from '../readings'
import { linearRange } from '../scale'
import { againstOf, alternativeOf, futureOf } from './describe'
import { curveOf, quantityChart, type Vertical } from './quantity-chart'
import { type Asked, focusOf, rangeOf, type View } from './view'

const BY = ['logscale', 'scale', 'time', 'logtime', 'lookback', 'redshift', 'logredshift']

const PARTS: readonly { readonly key: ColumnKey; readonly tone: string; readonly name: string }[] = [
  { key: 'omegaDark', tone: 'part-dark', name: 'dark energy' },
  { key: 'omegaMatter', tone: 'part-matter', name: 'cold matter' },
  { key: 'omegaRadiation', tone: 'part-radiation', name: 'radiation' },
  { key: 'omegaNeutrino', tone: 'part-neutrino', name: 'massive neutrinos' },
  { key: 'omegaCurvature', tone: 'part-curvature', name: 'curvature' },
]

const STEPS = 160
/** A share that never reaches this is not drawn. */
const NOTHING = 5e-4
/** Near a turning point the shares have no bounds. */
const MOST = 2

function shares(asked: Asked): Chart {
  const solution = focusOf(asked)
  const x = rangeOf({ ...asked, solutions: [solution] }, true)
  const all = PARTS.map((part, dash) => ({
    ...part,
    dash,
    values: columnAlong(columnOf(part.key), solution, asked.by),
  }))
  const first = readingsOf(
    all.map(({ values }) => values),
    x,
    [asked.by.now],
    STEPS,
  )
  const seen = all.filter((_, i) => first.values[i]?.some((value) => value !== null && Math.abs(value) >= NOTHING))
  const readings = {
    places: first.places,
    values: first.values.filter((_, i) => seen.includes(all[i] as (typeof all)[0])),
  }
  const bounded = readings.values.flat().map((value) => Math.max(-MOST, Math.min(MOST, value ?? 0)))
  const [least, most] = [Math.min(0, ...bounded), Math.max(1, ...bounded)]
  const y = linearRange(least < -0.01 ? least * 1.05 : 0, most > 1.01 ? most * 1.05 : 1.02)
  const axes = {
    x: { ...asked.by.quantity, ...x },
    y: { quantity: 'share', label: 'share of the critical density', symbol: '', unit: '', ...y },
  }
  const curves = seen.map(({ values, tone, dash, name }) => {
    const curve = curveOf(values, { x, y }, { tone, dash, name, strong: true })
    return curve.finish === null ? curve : { ...curve, finish: { ...curve.finish, edge: 'along' as const } }
  })
  return {
    title: `Contents of ${solution.label}`,
    ...axes,
    curves,
    references: [],
    spots: [],
    ribbons: [],
    now: asked.by.now,
    future: futureOf(asked.by, extrapolates(solution.scenario)),
    readings,
    caption: `Density of each component of ${solution.label} over the critical density, against ${againstOf(axes.x)}. Radiation: photons and massless neutrinos.`,
    alternative: alternativeOf(axes.x, axes.y, curves, readings),
  }
}

function law(): Vertical {
  const column = columnOf('w')
  const { label, symbol, unit } = column
  const divide = { axis: 'y', at: -1, label: '' } as const
  return {
    quantity: 'w',
    label,
    symbol,
    unit,
    factors: [column],
    past: false,
    logarithmic: false,
    divide,
    bounds: [-1, 1],
  }
}

export const CONTENTS: View = {
  key: 'contents',
  title: 'Contents',
  choice: 'Show',
  shows: [
    { key: 'shares', word: 'density fractions', by: BY, compare: [], alone: true },
    { key: 'w', word: 'w of dark energy', by: BY, compare: ['difference'] },
  ],
  chart: (asked) => (asked.show.key === 'w' ? quantityChart(asked, law()) : shares(asked)),
}
