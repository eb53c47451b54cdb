import { memo } from 'react'
import type { Explorer } from '../../lib/answers/explorer'
import { useSteadyHeight } from '../live/use-steady-height'
import { Choices } from './choices'
import { FigureTable } from './figure-table'
import { Galaxy } from './galaxy'
import { Plate } from './plate'
import { Sentence } from './symbol'
import { ZoomLinks } from './zoom-links'

interface Props {
  readonly view: Explorer
  readonly shown: string | null
}

/** One view at a time, chosen by links. */
export const Views = memo(function Views({ view, shown }: Props) {
  const { key, tabs, choices, notes, galaxy, zoom, figure } = view.panel
  // A view of fewer choices must not pull up what stands below it while someone goes through them.
  const section = useSteadyHeight('')
  return (
    <section className="views" id="view" ref={section} aria-labelledby="views">
      <h2 id="views" className="spoken">
        Views
      </h2>
      <nav className="ways" aria-label="Views">
        {tabs.map(({ word, link, chosen }) => (
          <a key={word} href={`${link}#view`} rel="nofollow" aria-current={chosen ? 'page' : undefined}>
            {word}
          </a>
        ))}
      </nav>
      <div className="choices">
        {choices.map((choice) => (
          <Choices key={choice.label} choice={anchored(choice)} />
        ))}
        <ZoomLinks zoom={zoom} of="the view" earlier="Left" later="Right" />
      </div>
      <figure key={key}>
        <Plate
          figure={figure}
          box="sheet"
          label={`Cursor: ${figure.x.label}`}
          template={zoom.template}
          reset={zoom.reset}
          links={null}
          shown={shown}
        />
        <figcaption>
          <p>
            <Sentence text={figure.caption} />
          </p>
          {notes.map((note) => (
            <p key={note} className="told">
              {note}
            </p>
          ))}
          {galaxy && <Galaxy key={galaxy.redshift} view={view} galaxy={galaxy} live={shown !== null} />}
        </figcaption>
        <FigureTable figure={figure} />
      </figure>
    </section>
  )
})

/** Without scripts a link loads the page anew: it comes back to where the choice was made. */
function anchored<C extends Explorer['panel']['choices'][number]>(choice: C): C {
  return { ...choice, options: choice.options.map((one) => ({ ...one, link: `${one.link}#view` })) }
}
