import { memo } from 'react'
import type { Explorer } from '../../lib/answers/explorer'
import type { MeasureWords } from '../../lib/words/measures'
import { Means } from './means'
import { Sentence, Symbols } from './symbol'

export const Measures = memo(function Measures({ view }: { readonly view: Explorer }) {
  return (
    <section aria-labelledby="measures">
      <h2 id="measures" className="heading">
        Measures of {view.scenarios[view.place.focus]?.name} today
      </h2>
      <table className="measures">
        <thead className="spoken">
          <tr>
            <th scope="col">Symbol</th>
            <th scope="col">Measure</th>
            <th scope="col">Value</th>
          </tr>
        </thead>
        <tbody>
          {view.measures.map(({ key, ...words }) => (
            <Row key={key} of={key} {...words} />
          ))}
        </tbody>
      </table>
    </section>
  )
})

type RowProps = Omit<MeasureWords, 'key'> & { readonly of: MeasureWords['key'] }

const Row = memo(function Row({ of, label, symbol, value, unit, because }: RowProps) {
  const entry = `measure-${of}`
  return (
    <tr data-measure={of}>
      <td className="symbol" data-means={entry}>
        <Symbols markup={symbol} />
      </td>
      <th scope="row">
        <Means of={entry}>{label}</Means>
        {because && (
          <span className="reason">
            <Sentence text={because} />
          </span>
        )}
      </th>
      <td className="value" data-means={entry}>
        {value === null ? '–' : <Value value={value} unit={unit} />}
      </td>
    </tr>
  )
})

function Value({ value, unit }: { readonly value: string; readonly unit: string }) {
  return (
    <>
      <b>{value}</b>
      {unit && ` ${unit}`}
    </>
  )
}
