import type { RulerRow, RulerView } from '../../lib/answers/ruler-view'
import { Key } from './key'
import { Means } from './means'
import { Sentence, Symbols } from './symbol'

interface Props {
  readonly view: RulerView
  readonly rows: readonly RulerRow[]
  /** The kind of entry that the page of methods has for a row. */
  readonly of: 'reading' | 'between'
  readonly caption: string
}

/** A row for each reading, a column for each scenario. */
export function RulerTable({ view, rows, of, caption }: Props) {
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: wide tables scroll, and so must the keyboard
    <section className="wide-table" aria-label={caption} tabIndex={0}>
      <table>
        <caption>{caption}</caption>
        <thead>
          <tr>
            <td colSpan={2} />
            {view.scenarios.map(({ slot, name }) => (
              <th key={slot} scope="col" className={`ink-${slot}`}>
                <Key slot={slot} />
                {name}
              </th>
            ))}
            <td />
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <Row key={row.key} row={row} of={of} />
          ))}
        </tbody>
      </table>
    </section>
  )
}

function Row({ row, of }: { readonly row: RulerRow; readonly of: Props['of'] }) {
  const { key, symbol, label, unit, cells } = row
  const entry = `${of}-${key}`
  return (
    <tr data-reading={key}>
      <td className="symbol" data-means={entry}>
        <Symbols markup={symbol} />
      </td>
      <th scope="row">
        <Means of={entry}>{label}</Means>
        {unit && (
          <span className="unit beside">
            {' '}
            <Sentence text={unit} />
          </span>
        )}
      </th>
      {cells.map((cell, slot) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: the column of a scenario is its place
        <td key={slot} className="value" data-means={entry}>
          {cell === null ? '–' : <b>{cell}</b>}
        </td>
      ))}
      <td className="unit">
        <Sentence text={unit} />
      </td>
    </tr>
  )
}
