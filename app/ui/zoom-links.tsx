import type { Zoom } from '../../lib/answers/panel'

interface Props {
  readonly zoom: Zoom
  /** What is zoomed, to tell several on one page apart. */
  readonly of: string
  readonly earlier: string
  readonly later: string
}

/** Steps along the horizontal axis, for those who have no brush and no keys. */
export function ZoomLinks({ zoom, of, earlier, later }: Props) {
  const steps = { Closer: zoom.closer, Wider: zoom.wider, [earlier]: zoom.earlier, [later]: zoom.later }
  return (
    <nav className="choice" aria-label={`Range of ${of}`}>
      <span className="choice-name">Range</span>
      {Object.entries(steps).map(([word, link]) => (
        <a key={word} href={link} rel="nofollow">
          {word}
        </a>
      ))}
      {zoom.reset && (
        <a href={zoom.reset} rel="nofollow">
          Whole range
        </a>
      )}
    </nav>
  )
}
