/** What the cursor reads, in words and rounded numbers. */
import type { Axis, Chart } from '../../lib/figures/chart'
import { fixed, signed, significant, withUnit } from '../../lib/words/number'

export function timeText(time: number): string {
  return time === 0 ? 'now' : `${signed(fixed(time, 2))} Gyr`
}

/** A value of the horizontal axis. */
export function placeText({ quantity, symbol, unit }: Axis, value: number): string {
  if (quantity === 'time') return timeText(value)
  if (quantity === 'lookback') return value === 0 ? 'now' : `${withUnit(fixed(value, 2), unit)} ago`
  if (quantity === 'redshift') return `z ${redshiftText(value)}`
  if (quantity === 'scale') return `a ${significant(value, 3)}`
  return `${symbol.replace(/_/g, '')} ${withUnit(signed(significant(value, 3)), unit)}`
}

export function rangeText(x: Axis): string {
  return `Range: ${placeText(x, x.from)} to ${placeText(x, x.to)}.`
}

export interface Reading {
  readonly tone: string
  readonly name: string
  /** Null where the curve is not there. */
  readonly value: string | null
  /** Beside a scale factor. */
  readonly redshift: string | null
}

/** What is read of a figure. */
export type Read = Pick<Chart, 'x' | 'y' | 'readings'> & {
  readonly curves: readonly Pick<Chart['curves'][number], 'tone' | 'name'>[]
}

export function readingsAt({ curves, readings, y }: Read, index: number): readonly Reading[] {
  return curves.map(({ tone, name }, i) => {
    const value = readings.values[i]?.[index] ?? null
    const redshift = y.quantity !== 'scale' || value === null || value === 0 ? null : redshiftText(1 / value - 1)
    return { tone, name, value: value === null ? null : significant(value, y.quantity === 'scale' ? 3 : 4), redshift }
  })
}

function redshiftText(redshift: number): string {
  return redshift < 20 ? fixed(redshift, 2) : significant(redshift, 3)
}

/** For a voice: the curve that stands out, or all. */
export function readingText(figure: Read, index: number, lit: number | null): string {
  const { x, y, readings } = figure
  const told = readingsAt(figure, index).filter((_, i) => lit === null || i === lit)
  const symbol = y.quantity === 'scale' ? 'a ' : ''
  const parts = told.map(({ name, value, redshift }) => {
    if (value === null) return `${name}: nothing`
    return `${name}: ${symbol}${withUnit(value, y.unit)}${redshift === null ? '' : `, z ${redshift}`}`
  })
  return `${placeText(x, readings.places[index] ?? 0)}. ${parts.join('; ')}.`
}
