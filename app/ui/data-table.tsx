/** Numbers of a figure as a table, closed until it is asked for. */
import type { Chart } from '../../lib/figures/chart'
import { placeText, type Read, readingsAt } from './reading-text'
import { Sentence } from './symbol'

/** About so many rows: enough to follow a curve by ear; the whole is in the tables to take away. */
const ROWS = 24

type Figure = Read & Pick<Chart, 'title' | 'now'>

interface Props {
  readonly caption: string
  readonly columns: readonly string[]
  /** The first cell of each says what the row is about. */
  readonly rows: readonly (readonly string[])[]
}

export function DataTable({ caption, columns, rows }: Props) {
  return (
    <details className="figure-table">
      <summary>Figure as a table</summary>
      {/* biome-ignore lint/a11y/noNoninteractiveTabindex: what scrolls must be within reach of the keyboard */}
      <section className="figure-table-area" aria-label={caption} tabIndex={0}>
        <table>
          <caption>
            <Sentence text={caption} />
          </caption>
          <thead>
            <tr>
              {columns.map((column) => (
                <th key={column} scope="col">
                  <Sentence text={column} />
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {rows.map(([head, ...cells]) => (
              <tr key={head}>
                <th scope="row">{head}</th>
                {cells.map((cell, i) => (
                  <td key={columns[i + 1]}>{cell}</td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </section>
    </details>
  )
}

export function tableOf(figure: Figure): Props {
  const { title, x, y, curves } = figure
  return {
    caption: `${title}: ${y.label}${y.unit && `, ${y.unit}`}`,
    columns: [x.label, ...curves.map(({ name }) => name)],
    rows: rowsOf(figure),
  }
}

/** Evenly spaced readings, now among them, each told apart from the one before. */
function rowsOf(figure: Figure): string[][] {
  const { x, now, readings } = figure
  const last = readings.places.length - 1
  const even = Array.from({ length: ROWS }, (_, i) => Math.round((i * last) / (ROWS - 1)))
  const today = now === null ? -1 : readings.places.indexOf(now)
  const chosen = [...new Set([...even, ...(today >= 0 ? [today] : [])])].sort((one, other) => one - other)
  const rows = chosen.map((index) => [
    placeText(x, readings.places[index] ?? 0),
    ...readingsAt(figure, index).map(({ value }) => value ?? '–'),
  ])
  return rows.filter(([head], i) => head !== rows[i - 1]?.[0])
}
