import { drawLongView } from '../../lib/figures/draw-long-view'
import type { LongView } from '../../lib/figures/long-view'
import { FRAMES } from '../../lib/figures/plot'
import { Drawing } from './drawing'

/** The long view, drawn for three widths of which the page shows one. */
export function Figure({ view }: { readonly view: LongView }) {
  return (
    <figure className="long-view">
      {FRAMES.map((frame) => (
        <div key={frame.id} className={`frame ${frame.id}`}>
          <Drawing node={drawLongView(view, frame)} />
        </div>
      ))}
      <figcaption>{view.caption}</figcaption>
    </figure>
  )
}
