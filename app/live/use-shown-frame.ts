/** Which of the drawings of a figure the page shows, as the style sheet chooses them; null until the page is alive. */
import { useSyncExternalStore } from 'react'

/** The first that matches. */
const WIDEST = { narrow: '(max-width: 600px)', middle: '(max-width: 1020px)' }

export function useShownFrame(): string | null {
  return useSyncExternalStore(watchWidth, shownFrame, () => null)
}

let lists: readonly (readonly [string, MediaQueryList])[] | null = null

/** Asked for with every drawing of the page, and slow to be made. */
function widths() {
  lists ??= Object.entries(WIDEST).map(([frame, query]) => [frame, matchMedia(query)] as const)
  return lists
}

const shownFrame = () => widths().find(([, list]) => list.matches)?.[0] ?? 'wide'

function watchWidth(changed: () => void): () => void {
  for (const [, list] of widths()) list.addEventListener('change', changed)
  return () => {
    for (const [, list] of widths()) list.removeEventListener('change', changed)
  }
}
