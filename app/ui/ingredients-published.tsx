import { memo } from 'react'
import type { ShelvedSet } from '../../lib/answers/shelf'
import type { Desk } from '../../lib/words/desk'
import { Sentence, Symbols } from './symbol'

interface Props {
  readonly desk: Desk
  readonly sets: readonly ShelvedSet[]
}

const queryOf = ({ links }: Desk): string => links.here.replace(/^\/\?/, '')

/** Sets of parameters from the literature, each a link that gives them to the scenario in focus. */
export const Published = memo(function Published({ desk, sets }: Props) {
  const own = desk.scenarios[desk.place.focus]?.plainCode.replace(/,as:.*$/s, '')
  const chosen = sets.find(({ plain }) => plain !== null && plain === own)
  const query = queryOf(desk)
  return (
    <div className="published">
      <details className="group">
        <summary>Published parameter sets</summary>
        <ul>
          {sets.map((one) => (
            <li key={one.key}>
              <a
                href={`/compose/preset?${query}&set=${one.key}`}
                rel="nofollow"
                aria-current={one === chosen ? 'true' : undefined}
              >
                <Symbols markup={one.title} />
              </a>
              <span>
                <Symbols markup={one.values} />
              </span>
              <small>
                <Sentence text={one.cited} />
              </small>
            </li>
          ))}
        </ul>
      </details>
      {chosen && (
        <p className="law">
          As published: <Symbols markup={chosen.title} />. <Sentence text={chosen.cited} />
        </p>
      )}
    </div>
  )
})

/** Links that change H₀ alone, so that the angle or the age is that of another scenario or of a published set. */
export const Retune = memo(function Retune({ desk, sets }: Props) {
  const { scenarios, place } = desk
  const others = scenarios.filter(({ slot }) => slot !== place.focus)
  const models = [
    ...others.map(({ slot, name }) => ({ of: String(slot + 1), name })),
    ...sets.filter(({ retunes }) => retunes).map(({ key, title }) => ({ of: key, name: title })),
  ]
  const query = queryOf(desk)
  const links = (keep: string) =>
    models.map(({ of, name }) => (
      <a key={of} href={`/compose/retune?${query}&keep=${keep}&of=${of}`} rel="nofollow">
        {name}
      </a>
    ))
  return (
    <details className="retune">
      <summary>
        Retune <Symbols markup="H_0" />
      </summary>
      <p>to keep the acoustic angle of {links('acousticAngle')}</p>
      <p>to keep the age of {links('age')}</p>
    </details>
  )
})
