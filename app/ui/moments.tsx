import { memo } from 'react'
import type { Explorer } from '../../lib/answers/explorer'
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
          {view.moments.map(({ kind, label, when, where }) => (
            <tr key={`${kind}${when}${label}`} className={kind === 'now' ? 'present' : undefined}>
              <td className="when" data-means={`moment-${kind}`}>
                {when}
              </td>
              <th scope="row">
                <Means of={`moment-${kind}`}>{label}</Means>
              </th>
              <td className="where" data-means={`moment-${kind}`}>
                {where}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      <p className="because">
        <Sentence text={scenario?.because ?? ''} />
      </p>
    </section>
  )
})
