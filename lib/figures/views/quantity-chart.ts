/** One quantity of every scenario against another: as it is, or compared with the scenario in focus. */
import type { Column } from '../../quantities/column'
import type { Solution } from '../../solve'
import { extrapolates } from '../../words/beyond'
import { capital } from '../../words/sentence'
import { columnAlong, type Values } from '../along'
import type { Axis, Chart, Curve, Reference } from '../chart'
import { finishOf } from '../long-view'
import { readingsOf } from '../readings'
import { placesAlong, type Ranges, sampleCurve, steady } from '../sample'
import type { Range } from '../scale'
import { type Extent, spanOf } from '../span'
import { fitted } from '../text-width'
import { againstOf, alternativeOf, futureOf } from './describe'
import { type Asked, focusOf, rangeOf } from './view'

/** A vertical quantity. */
export interface Vertical {
  readonly quantity: string
  readonly label: string
  readonly symbol: string
  /** The symbol of what is compared, where the label alone would not say it. */
  readonly spelled?: string
  readonly unit: string
  /** Columns whose product it is. */
  readonly factors: readonly Column[]
  /** Seen only along a line of sight: the horizontal axis stops today. */
  readonly past: boolean
  /** A value that divides, as q = 0. */
  readonly divide?: Reference
  /** Where a curve stays within them, all of it is shown. */
  readonly bounds?: Extent
  /** False where a logarithm would make no sense. */
  readonly logarithmic: boolean
}

const STEPS = 160

export function quantityChart(asked: Asked, vertical: Vertical): Chart {
  const { solutions, by, focus, compare } = asked
  const x = rangeOf(asked, !vertical.past)
  const all = solutions.map((one) => compared(asked, vertical, one))
  const readings = readingsOf(all, x, [by.now], STEPS)
  const divide = dividerOf(asked, vertical)
  const today = all.flatMap((values) => values([by.now]))
  const y = spanOf(readings.values, {
    bounds: compare === 'value' ? vertical.bounds : undefined,
    steady: steadyOf(by.now >= x.from && by.now <= x.to ? today : [], divide),
    kind: compare !== 'value' ? compare : vertical.logarithmic && x.scaling !== 'linear' ? 'size' : 'value',
  })
  const axes = { x: { ...by.quantity, ...x }, y: { ...titled(asked, vertical), ...y } }
  const curves = all.map((values, slot) =>
    curveOf(
      values,
      { x, y },
      { tone: `slot-${slot}`, dash: slot, name: solutions[slot]?.label ?? '', strong: slot === focus },
    ),
  )
  return {
    title: capital(vertical.label),
    ...axes,
    curves,
    references: divide && divide.at > y.from && divide.at < y.to ? [divide] : [],
    spots: [],
    ribbons: [],
    now: by.now,
    future: futureOf(
      by,
      solutions.some(({ scenario }) => extrapolates(scenario)),
    ),
    readings,
    caption: captionOf(asked, axes.x, `${vertical.label} ${vertical.symbol}`),
    alternative: alternativeOf(axes.x, axes.y, curves, readings),
  }
}

function compared(asked: Asked, vertical: Vertical, solution: Solution): Values {
  const own = valuesOf(asked, vertical, solution)
  const { compare } = asked
  if (compare === 'value') return own
  const reference = valuesOf(asked, vertical, focusOf(asked))
  return (places) => {
    const base = reference(places)
    return own(places).map((value, i) => {
      const other = base[i] ?? null
      if (value === null || other === null) return null
      if (compare === 'difference') return known(value - other, value, other)
      return other === 0 ? null : value / other
    })
  }
}

/** What differs by less in parts of itself differs by rounding alone. */
const ALIKE = 1e-11

const known = (difference: number, value: number, other: number): number =>
  Math.abs(difference) <= ALIKE * Math.max(Math.abs(value), Math.abs(other)) ? 0 : difference

function valuesOf({ by }: Asked, { factors }: Vertical, solution: Solution): Values {
  const all = factors.map((column) => columnAlong(column, solution, by))
  return (places) => {
    const [first = [], ...others] = all.map((values) => values(places))
    return others.reduce((product, other) => product.map((value, i) => times(value, other[i] ?? null)), first)
  }
}

const times = (one: number | null, other: number | null): number | null =>
  one === null || other === null ? null : one * other

/** Today's values are seen whatever is cut, where today is seen, and so is what divides. */
function steadyOf(today: readonly (number | null)[], divide: Reference | null): number[] {
  return [...today.filter((value) => value !== null), ...(divide ? [divide.at] : [])]
}

function dividerOf(asked: Asked, { divide }: Vertical): Reference | null {
  const { compare } = asked
  if (compare === 'value') return divide ?? null
  return { axis: 'y', at: compare === 'ratio' ? 1 : 0, label: '' }
}

function titled(asked: Asked, { quantity, label, symbol, spelled, unit }: Vertical): Omit<Axis, keyof Range> {
  const { compare } = asked
  if (compare === 'value') return { quantity, label, symbol, unit }
  const name = fitted(focusOf(asked).label, 1, 14)
  const how = compare === 'ratio' ? 'ratio to' : 'minus that of'
  return {
    quantity: compare,
    label: `${spelled ?? label}, ${how} ${name}`,
    ...(spelled ? { lead: spelled } : {}),
    symbol: '',
    unit: compare === 'ratio' ? '' : unit,
  }
}

interface Look {
  readonly tone: string
  readonly dash: number
  readonly name: string
  readonly strong: boolean
  readonly special?: readonly number[]
}

export function curveOf(values: Values, ranges: Ranges, { tone, dash, name, strong, special = [] }: Look): Curve {
  const segments = sampleCurve({ places: placesAlong(ranges.x, special), values }, ranges)
  return {
    tone,
    dash,
    name,
    strong,
    segments: steady(segments, ranges),
    marks: [],
    note: '',
    finish: finishOf(segments, ranges),
    asymptote: null,
  }
}

function captionOf({ compare, solutions, focus }: Asked, x: Axis, what: string): string {
  const how = { value: '', ratio: ', as a ratio to', difference: ', minus that of' }[compare]
  return `${capital(what)}${how && `${how} ${solutions[focus]?.label},`} against ${againstOf(x)}.`
}
