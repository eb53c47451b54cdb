import type { Shown } from '../../lib/figures/picture'
import { fractionOf } from '../../lib/figures/scale'
import { placeText, readingsAt } from './reading-text'
import { Symbols } from './symbol'

interface Props {
  readonly figure: Shown
  readonly index: number
  readonly lit: number | null
  /** Of the plot on the screen. */
  readonly width: number
}

/** Between the line of the cursor and its read-out, in pixels. */
const GAP = 12

/** Stands beside the cursor, on the side that has more room. */
export function Readout({ figure, index, lit, width }: Props) {
  const { x, y, readings } = figure
  const at = readings.places[index] ?? 0
  const left = fractionOf(x, at) * width
  const place = left < width / 2 ? { left: left + GAP } : { right: width - left + GAP }
  const scale = y.quantity === 'scale'
  return (
    <div className="readout" style={place} aria-hidden="true">
      <table>
        <thead>
          <tr>
            <th>{placeText(x, at)}</th>
            <th>
              <Symbols markup={y.symbol} />
              {y.symbol && y.unit ? ', ' : ''}
              {y.unit}
            </th>
            {scale && (
              <th>
                <i>z</i>
              </th>
            )}
          </tr>
        </thead>
        <tbody>
          {readingsAt(figure, index).map(({ tone, name, value, redshift }, i) => (
            <tr key={tone} className={tone} data-quiet={lit !== null && lit !== i ? '' : undefined}>
              <th>{name}</th>
              <td>{value ?? '–'}</td>
              {scale && <td>{redshift ?? '–'}</td>}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  )
}
