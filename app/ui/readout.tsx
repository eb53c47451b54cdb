import type { LongView } from '../../lib/figures/long-view'
import { readingsAt, timeText } from './reading-text'

interface Props {
  readonly view: LongView
  readonly index: number
  readonly lit: number | null
  /** Of the plot on the screen. */
  readonly width: number
}

/** Between the line of the cursor and its read-out, in pixels. */
const GAP = 12

/** Stands beside the cursor, on the side that has more room. */
export function Readout({ view, index, lit, width }: Props) {
  const { times } = view.readings
  const { from, to } = view.window
  const time = times[index] ?? 0
  const x = ((time - from) / (to - from)) * width
  const place = x < width / 2 ? { left: x + GAP } : { right: width - x + GAP }
  return (
    <div className="readout" style={place} aria-hidden="true">
      <table>
        <thead>
          <tr>
            <th>{time === 0 ? 'now' : timeText(time)}</th>
            <th>
              <i>a</i>
            </th>
            <th>
              <i>z</i>
            </th>
          </tr>
        </thead>
        <tbody>
          {readingsAt(view, index).map(({ slot, name, scale, redshift }) => (
            <tr key={slot} className={`slot-${slot}`} data-quiet={lit !== null && lit !== slot ? '' : undefined}>
              <th>{name}</th>
              <td>{scale ?? '–'}</td>
              <td>{redshift ?? '–'}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  )
}
