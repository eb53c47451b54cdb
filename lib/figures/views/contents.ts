/** Of what: the share of each component in the scenario in focus, and the law of dark energy of all. */
import { isMissing, type Missing } from '../../measures/outcome'
import type { ColumnKey } from '../../quantities/column'
import { columnNamed } from '../../quantities/columns'
import { type Instant, isInstant } from '../../quantities/instant'
import type { Solution } from '../../solve'
import { extrapolates } from '../../words/beyond'
import type { Chart } from '../chart'
import { readingsOf } from '../readings'
import { remembered } from '../remembered'
import { linearRange } from '../scale'
import { alternativeOf, futureOf } from './describe'
import { curveOf, quantityChart, type Values, type Vertical } from './quantity-chart'
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

function valuesOf(solution: Solution, instantAtPlace: (place: number) => Instant | Missing, key: ColumnKey): Values {
  const column = columnNamed(key)
  return (places) =>
    places.map((place) => {
      const instant = instantAtPlace(place)
      const value = isInstant(instant) && column ? column.value(solution, instant) : null
      return value === null || isMissing(value) ? null : value
    })
}

function shares(asked: Asked): Chart {
  const solution = focusOf(asked)
  const x = rangeOf({ ...asked, solutions: [solution] }, true)
  const instantAtPlace = remembered((place) => asked.by.instant(solution, place))
  const all = PARTS.map((part, dash) => ({ ...part, dash, values: valuesOf(solution, instantAtPlace, part.key) }))
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
    caption: `Density of each component of ${solution.label} over the critical density, against ${axes.x.label}. Radiation: photons and massless neutrinos.`,
    alternative: alternativeOf(axes.x, axes.y, curves, readings),
  }
}

function law(): Vertical {
  const column = columnNamed('w')
  if (!column) throw new Error('there is no column w')
  const { label, symbol, unit, value } = column
  const divide = { axis: 'y', at: -1, label: '' } as const
  return { quantity: 'w', label, symbol, unit, value, past: false, logarithmic: false, divide }
}

export const CONTENTS: View = {
  key: 'contents',
  title: 'Contents',
  choice: 'Show',
  shows: [
    { key: 'shares', word: 'density fractions', by: BY, compare: [] },
    { key: 'w', word: 'w of dark energy', by: BY, compare: ['difference'] },
  ],
  chart: (asked) => (asked.show.key === 'w' ? quantityChart(asked, law()) : shares(asked)),
}
