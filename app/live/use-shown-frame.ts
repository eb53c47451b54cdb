/** Which of the drawings of a figure the page shows, as the style sheet chooses them; null until the page is alive. */
import { useSyncExternalStore } from 'react'

/** The first that matches. */
const WIDEST = { narrow: '(max-width: 600px)', middle: '(max-width: 1020px)' }

export function useShownFrame(): string | null {
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
