import { memo } from 'react'
import type { Explorer } from '../../lib/answers/explorer'
import type { MomentWords } from '../../lib/words/moments'
import { Means } from './means'
import { Sentence } from './symbol'

export const Moments = memo(function Moments({ view }: { readonly view: Explorer }) {
  const scenario = view.scenarios[view.place.focus]
  return (
    <section aria-labelledby="moments">
      <h2 id="moments" className="heading">
        Moments of {scenario?.name}
      </h2>
      <table className="moments">
        <thead className="spoken">
          <tr>
            <th scope="col">From now</th>
            <th scope="col">Moment</th>
            <th scope="col">Redshift or scale factor</th>
          </tr>
        </thead>
        <tbody>
          {view.moments.map((moment, i) => (
            <Row key={keyOf(view.moments, i)} {...moment} />
          ))}
        </tbody>
      </table>
      <p className="because">
        <Sentence text={scenario?.because ?? ''} />
      </p>
    </section>
  )
})

/** The same for the same moment while its time changes. */
function keyOf(moments: readonly MomentWords[], index: number): string {
  const kind = moments[index]?.kind
  return `${kind}${moments.slice(0, index).filter((one) => one.kind === kind).length}`
}

const Row = memo(function Row({ kind, label, when, where }: MomentWords) {
  const entry = `moment-${kind}`
  return (
    <tr className={kind === 'now' ? 'present' : undefined}>
      <td className="when" data-means={entry}>
        {when}
      </td>
      <th scope="row">
        <Means of={entry}>{label}</Means>
      </th>
      <td className="where" data-means={entry}>
        {where}
      </td>
    </tr>
  )
})
