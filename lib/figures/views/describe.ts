/** Words in place of a figure, and what lies right of today. */
import { significant, withUnit } from '../../words/number'
import type { Axis, Chart, Curve } from '../chart'
import type { Horizontal } from '../horizontal'
import type { Readings } from '../readings'

export function futureOf({ future }: Horizontal, hatched: boolean): Chart['future'] {
  if (future === 'none') return 'none'
  return hatched ? 'hatched' : 'tint'
}

/** The horizontal axis in a caption. */
export const againstOf = ({ label, scaling }: Axis): string => `${label}${scaling === 'linear' ? '' : ', logarithmic'}`

export function alternativeOf(x: Axis, y: Axis, curves: readonly Curve[], readings: Readings): string {
  const frame = `Line chart of ${y.label} from ${told(y, y.from)} to ${told(y, y.to)} against ${x.label} from ${told(x, x.from)} to ${told(x, x.to)}.`
  return [frame, ...curves.flatMap(({ name }, i) => ends(name, x, y, readings.places, readings.values[i] ?? []))].join(
    ' ',
  )
}

const told = ({ unit }: Axis, value: number): string => withUnit(significant(value, 3), unit)

/** First and last value. */
function ends(name: string, x: Axis, y: Axis, places: readonly number[], values: readonly (number | null)[]): string[] {
  const known = values.flatMap((value, i) => (value === null ? [] : [{ value, place: places[i] ?? 0 }]))
  const [first, last] = [known[0], known.at(-1)]
  if (!first || !last) return [`${name}: nothing here.`]
  const at = ({ value, place }: typeof first) => `${told(y, value)} at ${told(x, place)}`
  return [`${name}: ${at(first)}, ${at(last)}.`]
}
