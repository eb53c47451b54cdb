import { useEffect, useState } from 'react'
import type { Home } from '../../lib/answers/table'
import type { Words } from '../../lib/answers/words'
import { answerTo } from '../live/either'
import { TakeAwayWords } from './take-away-words'

type State = { readonly words: Words } | { readonly trouble: string } | null

/** The words of what is shown, asked for when they are opened; the last ones stay until the next have come. */
export default function Fetched({ query, home }: { readonly query: string; readonly home: Home }) {
  const [state, setState] = useState<State>(null)
  useEffect(() => {
    const controller = new AbortController()
    answerTo({ route: '/api/words', asked: query, home }, controller.signal).then(
      (words) => setState({ words }),
      (error: Error) => controller.signal.aborted || setState({ trouble: error.message }),
    )
    return () => controller.abort()
  }, [query, home])
  if (state === null) return null
  return 'words' in state ? <TakeAwayWords words={state.words} level={3} /> : <p role="alert">{state.trouble}</p>
}
