/** Questions to the server, with its answers kept. Loaded with the first question: the page comes with an answer. */
import { QueryClient, QueryObserver } from '@tanstack/react-query'
import type { Brief } from '../../lib/answers/explorer'
import { fetchView } from './fetch-view'

/** Milliseconds: between two tries of one request, and until a failed one is made again unasked. */
const RETRY = 500
const RECOVER = 5000

export interface Progress {
  readonly asked: string
  readonly view: Brief | null
  readonly fetching: boolean
  /** True from the first try that failed. */
  readonly failing: boolean
  /** Once it has been tried often enough. */
  readonly error: Error | null
}

/** Asks a question, in place of the one before; the same one again is tried once more. */
export type Ask = (asked: string) => void

export function startAsking(told: (progress: Progress) => void): Ask {
  const client = new QueryClient()
  let current: string | null = null
  let observer: QueryObserver<Brief> | null = null
  const tell = () => {
    const result = observer?.getCurrentResult()
    if (!result || current === null) return
    const { data = null, isFetching, failureCount, error } = result
    told({ asked: current, view: data, fetching: isFetching, failing: failureCount > 0, error })
  }
  return (asked) => {
    const again = asked === current
    current = asked
    if (observer && again) void observer.refetch({ cancelRefetch: false })
    else if (observer) observer.setOptions(optionsOf(asked))
    else {
      observer = new QueryObserver<Brief>(client, optionsOf(asked))
      observer.subscribe(tell)
    }
    tell()
  }
}

function optionsOf(asked: string) {
  return {
    queryKey: ['explorer', asked] as readonly unknown[],
    queryFn: ({ signal }: { readonly signal: AbortSignal }) => fetchView(asked, signal),
    staleTime: Number.POSITIVE_INFINITY,
    gcTime: 60_000,
    networkMode: 'always' as const,
    retry: 2,
    retryDelay: RETRY,
    refetchOnWindowFocus: false,
    refetchInterval: ({ state }: { readonly state: { readonly status: string } }) =>
      state.status === 'error' ? RECOVER : false,
  }
}
