import type { Refusal as Refused } from '../../lib/answers/explorer'
import { typeset } from '../../lib/words/number'
import { Sentence } from './symbol'

/** Names what is wrong with an address and says what is shown in its place. */
export function Refusal({ refusal }: { readonly refusal: Refused }) {
  const { problems, changes, link } = refusal
  return (
    <div className="refusal" role="alert">
      <h2>This link cannot be shown as written</h2>
      <ul>
        {problems.map(({ parameter, scenario, value, allowed, message }) => (
          <li key={`${scenario}${parameter}${message}`}>
            <b>{parameter}</b> {value && <q>{value}</q>} {scenario !== null && `in scenario ${scenario + 1}`}:{' '}
            <Sentence text={message} /> Allowed: {typeset(allowed)}.
          </li>
        ))}
      </ul>
      {link === null ? (
        <p>Nothing of it could be kept; the examples are shown instead.</p>
      ) : (
        <p>
          Shown is the nearest good reading: <Sentence text={changes.join(' ')} /> <a href={link}>Open that reading</a>
        </p>
      )}
    </div>
  )
}
