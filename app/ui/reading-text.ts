/** What the cursor reads, in words and rounded numbers. */
import type { LongView } from '../../lib/figures/long-view'
import { fixed, signed, significant } from '../../lib/words/number'

export function timeText(time: number): string {
  return time === 0 ? 'now' : `${signed(fixed(time, 2))} Gyr`
}

export interface Reading {
  readonly slot: number
  readonly name: string
  /** Null where the curve is not there. */
  readonly scale: string | null
  readonly redshift: string | null
}

export function readingsAt({ curves, readings }: LongView, index: number): readonly Reading[] {
  return curves.map(({ slot, name }) => {
    const scale = readings.scales[slot]?.[index] ?? null
    return { slot, name, scale: scale === null ? null : significant(scale, 3), redshift: redshiftText(scale) }
  })
}

/** None at the origin itself. */
function redshiftText(scale: number | null): string | null {
  if (scale === null || scale === 0) return null
  const redshift = 1 / scale - 1
  return redshift < 20 ? fixed(redshift, 2) : significant(redshift, 3)
}

/** For a voice: the curve that stands out, or all. */
export function readingText(view: LongView, index: number, lit: number | null): string {
  const told = readingsAt(view, index).filter(({ slot }) => lit === null || slot === lit)
  const parts = told.map(({ name, scale, redshift }) => {
    if (scale === null) return `${name}: nothing`
    return `${name}: a ${scale}${redshift === null ? '' : `, z ${redshift}`}`
  })
  return `${timeText(view.readings.times[index] ?? 0)}. ${parts.join('; ')}.`
}
