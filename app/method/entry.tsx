import type { MethodEntry } from '../../lib/answers/method'
import { Sentence, Symbols } from '../ui/symbol'
import { Formula } from './formula'

interface Props {
  readonly entry: MethodEntry
  readonly level: 3 | 4
}

/** Everything that is known of one quantity, law or parameter; also what the explorer shows beside a name. */
export function EntryOfMethod({ entry, level }: Props) {
  const { anchor, symbol, title, unit, formula, meaning, facts, parts } = entry
  const Heading = `h${level}` as const
  return (
    <article className={parts.length > 0 ? 'method-entry law-entry' : 'method-entry'} id={anchor}>
      <Heading>
        {symbol && (
          <span className="symbol">
            <Symbols markup={symbol} />
          </span>
        )}
        <a href={`#${anchor}`}>{title}</a>
        {unit && (
          <span className="unit">
            <Sentence text={unit} />
          </span>
        )}
      </Heading>
      <p>
        <Sentence text={meaning} />
      </p>
      {formula && <Formula text={formula} />}
      <dl>
        {facts.map(({ term, text }) => (
          <div key={term}>
            <dt>{term}</dt>
            <dd>
              <Sentence text={text} />
            </dd>
          </div>
        ))}
      </dl>
      {parts.length > 0 && (
        <div className="parts">
          {parts.map((one) => (
            <EntryOfMethod key={one.anchor} entry={one} level={4} />
          ))}
        </div>
      )}
    </article>
  )
}
