import { memo, useMemo } from 'react'
import type { Explorer } from '../../lib/answers/explorer'
import { useSteadyHeight } from '../live/use-steady-height'
import { Choices } from './choices'
import { FigureTable } from './figure-table'
import { Plate } from './plate'
import { ZoomLinks } from './zoom-links'

interface Props {
  readonly view: Explorer
  /** Id of the frame that is seen; null until the page is alive. */
  readonly shown: string | null
}

/** The long view. */
export const Figure = memo(function Figure({ view, shown }: Props) {
  const { long, scenarios } = view
  const { figure, zoom, clocks } = long
  const caption = useSteadyHeight(String(figure.curves.length))
  const links = useMemo(() => scenarios.map(({ link }) => link), [scenarios])
  return (
    <figure className="long-view">
      <Plate
        figure={figure}
        box="frame"
        label="Time at the cursor"
        template={zoom.template}
        reset={zoom.reset}
        links={links}
        shown={shown}
      />
      <figcaption ref={caption}>
        <div className="choices">
          <Choices choice={{ label: 'Time', options: clocks }} />
          <ZoomLinks zoom={zoom} of="the long view" later="Later" earlier="Earlier" />
        </div>
        {figure.caption}
      </figcaption>
      <FigureTable figure={figure} />
    </figure>
  )
})
