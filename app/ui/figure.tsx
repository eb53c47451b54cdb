import { memo, useDeferredValue, useMemo, useState, useSyncExternalStore } from 'react'
import type { Explorer } from '../../lib/answers/explorer'
import { drawLongView, heightOfView, plotOfView } from '../../lib/figures/draw-long-view'
import type { LongView } from '../../lib/figures/long-view'
import { FRAMES, type Frame } from '../../lib/figures/plot'
import { useSteadyHeight } from '../live/use-steady-height'
import { useStill } from '../live/use-still'
import { Cursor } from './cursor'
import { Drawing } from './drawing'

interface Props {
  readonly view: Explorer
  readonly live: boolean
  /** In the middle of a gesture. */
  readonly moving: boolean
}

/** The long view, drawn for three widths of which the page shows one; the others follow after a gesture, when there is time. */
export const Figure = memo(function Figure({ view, live, moving }: Props) {
  const { figure, scenarios } = view
  const later = useDeferredValue(useStill(figure, moving))
  const shown = useShownFrame()
  const caption = useSteadyHeight(String(figure.curves.length), figure)
  const links = useMemo(() => scenarios.map(({ link }) => link), [scenarios])
  return (
    <figure className="long-view">
      {FRAMES.map((frame) => (
        <Picture
          key={frame.id}
          view={shown === null || frame.id === shown ? figure : later}
          frame={frame}
          links={live && frame.id === shown ? links : null}
        />
      ))}
      <figcaption ref={caption}>{figure.caption}</figcaption>
    </figure>
  )
})

interface PictureProps {
  readonly view: LongView
  readonly frame: Frame
  /** Null where nobody can point at it. */
  readonly links: readonly string[] | null
}

const Picture = memo(function Picture({ view, frame, links }: PictureProps) {
  const [lit, light] = useState<number | null>(null)
  return (
    <div className={`frame ${frame.id}`} data-lit={lit ?? undefined}>
      <Drawn view={view} frame={frame} />
      {links && (
        <Cursor
          view={view}
          plot={plotOfView(view, frame)}
          size={{ width: frame.width, height: heightOfView(view, frame) }}
          links={links}
          lit={lit}
          light={light}
        />
      )}
    </div>
  )
})

const Drawn = memo(function Drawn({ view, frame }: Pick<PictureProps, 'view' | 'frame'>) {
  return <Drawing node={drawLongView(view, frame)} />
})

/** As the style sheet chooses them; the first that matches. */
const WIDEST = { narrow: '(max-width: 600px)', middle: '(max-width: 1020px)' }

function useShownFrame(): string | null {
  return useSyncExternalStore(
    watchWidth,
    () => Object.entries(WIDEST).find(([, query]) => matchMedia(query).matches)?.[0] ?? 'wide',
    () => null,
  )
}

function watchWidth(changed: () => void): () => void {
  const lists = Object.values(WIDEST).map((query) => matchMedia(query))
  for (const list of lists) list.addEventListener('change', changed)
  return () => {
    for (const list of lists) list.removeEventListener('change', changed)
  }
}
