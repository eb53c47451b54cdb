import { type FormEvent, useState } from 'react'
import type { Explorer } from '../../lib/answers/explorer'
import type { Panel } from '../../lib/answers/panel'
import { FARTHEST_GALAXY } from '../../lib/words/place'
import { go } from '../live/address'

interface Props {
  readonly view: Explorer
  readonly galaxy: NonNullable<Panel['galaxy']>
  readonly live: boolean
}

/** The redshift of the galaxy that is followed. Until the page is alive a plain form. */
export function Galaxy({ view, galaxy, live }: Props) {
  const [text, setText] = useState(String(galaxy.redshift))
  const [wrong, setWrong] = useState(false)
  const take = (event: FormEvent) => {
    event.preventDefault()
    const redshift = Number(text.trim().replace(',', '.') || Number.NaN)
    const isGood = redshift > 0 && redshift <= FARTHEST_GALAXY
    setWrong(!isGood)
    if (isGood) go(galaxy.template.replace('GALAXY', String(redshift)))
  }
  return (
    <form className="galaxy" action="/" method="get" autoComplete="off" onSubmit={take}>
      {view.scenarios.map(({ slot, plainCode }) => (
        <input key={slot} type="hidden" name="s" value={plainCode} />
      ))}
      {view.placeFields
        .filter(([key]) => key !== 'galaxy')
        .map(([key, value]) => (
          <input key={key} type="hidden" name={key} value={value} />
        ))}
      <label>
        Galaxy seen at <i>z</i>{' '}
        <input
          type="text"
          inputMode="decimal"
          name="galaxy"
          value={text}
          aria-invalid={wrong || undefined}
          aria-describedby={wrong ? 'galaxy-complaint' : undefined}
          onChange={({ target }) => {
            setText(target.value)
            setWrong(false)
          }}
          onBlur={live ? take : undefined}
        />
      </label>
      <button type="submit" className="act">
        Follow
      </button>
      {wrong && (
        <p id="galaxy-complaint" className="complaint" role="alert">
          A redshift is a number above 0 and up to {FARTHEST_GALAXY}.
        </p>
      )}
    </form>
  )
}
