import { useQuery } from '@tanstack/react-query'
import type { Words } from '../../lib/answers/words'
import { TakeAwayWords } from './take-away-words'

/** The words of what is shown, asked for when they are opened; the last ones stay until the next have come. */
export default function Fetched({ query }: { readonly query: string }) {
  const { data, error } = useQuery({
    queryKey: ['words', query],
    queryFn: ({ signal }) => fetchWords(query, signal),
    placeholderData: (last) => last,
  })
  if (error) return <p role="alert">{error.message}</p>
  return data ? <TakeAwayWords words={data} /> : null
}

async function fetchWords(query: string, signal: AbortSignal): Promise<Words> {
  const response = await fetch(`/api/words?${query}`, { signal })
  if (!response.ok) throw new Error(`The server answered with ${response.status}.`)
  return response.json()
}
