import { useEffect, useState } from 'react'
import type { Words } from '../../lib/answers/words'
import type { Routes } from '../../public/longhence'
import { TakeAwayWords } from './take-away-words'

type State = { readonly words: Words } | { readonly trouble: string } | null

/** The words of what is shown, asked for when they are opened; the last ones stay until the next have come. */
export default function Fetched({ query }: { readonly query: string }) {
  const [state, setState] = useState<State>(null)
  useEffect(() => {
    const controller = new AbortController()
    fetchWords(query, controller.signal).then(
      (words) => setState({ words }),
      (error: Error) => controller.signal.aborted || setState({ trouble: error.message }),
    )
    return () => controller.abort()
  }, [query])
  if (state === null) return null
  return 'words' in state ? <TakeAwayWords words={state.words} level={3} /> : <p role="alert">{state.trouble}</p>
}

type Answer = Routes['/api/words']['answers']['application/json']

async function fetchWords(query: string, signal: AbortSignal): Promise<Answer> {
  const response = await fetch(`/api/words?${query}`, { signal })
  if (!response.ok) throw new Error(`The server answered with ${response.status}.`)
  return response.json()
}
