/** The view of an address: the last one stays until the next is there, one request at a time, the newest wins. */
import { keepPreviousData, useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import type { Explorer } from '../../lib/answers/explorer'
import { type Desk, readDesk } from '../../lib/words/desk'
import type { Address } from './address'
import { askedOf, fetchView } from './fetch-view'

/** Milliseconds: between two tries of one request, and until a failed one is made again unasked. */
const RETRY = 500
const RECOVER = 5000

export interface Live {
  readonly view: Explorer
  /** Of the address, at once: the view may still be on its way. */
  readonly desk: Desk
  readonly waiting: boolean
  readonly trouble: Trouble | null
}

export interface Trouble {
  readonly message: string
  /** Null where asking again would change nothing. */
  readonly again: (() => void) | null
}

export function useExplorer(address: Address | null, initial: Explorer): Live {
  const wanted = address === null ? null : askedOf(address.search)
  const { first, asked, ask } = useAsked(wanted)
  const { data, error, isFetching, isPlaceholderData, refetch } = useQuery({
    queryKey: ['explorer', asked],
    queryFn: ({ signal }) => fetchView(asked ?? '', signal),
    enabled: asked !== null,
    initialData: asked === first ? initial : undefined,
    placeholderData: keepPreviousData,
    staleTime: Number.POSITIVE_INFINITY,
    gcTime: 60_000,
    networkMode: 'always',
    retry: 2,
    retryDelay: RETRY,
    refetchOnWindowFocus: false,
    refetchInterval: ({ state }) => (state.status === 'error' ? RECOVER : false),
  })
  // In the middle of a gesture the request under way is let finish: something is then always drawn.
  const late = wanted !== null && wanted !== asked
  if (late && !(address?.moving && isFetching)) ask(wanted)

  const own = address === null ? null : readDesk(new URLSearchParams(address.search))
  // A code that is well written and has no solution: the last picture stays, with the reason.
  const refused = data !== initial && own !== null ? (data?.refusal ?? null) : null
  const view = useLast(data && !refused && !isPlaceholderData ? data : null, initial)
  return {
    view,
    desk: own !== null && !(view === initial && wanted === first && initial.refusal) ? own : view,
    waiting: late || isFetching,
    trouble: troubleOf(error, refused, () => void refetch()),
  }
}

/** What is asked of the server; the view that came with the page answers the first question. */
function useAsked(wanted: string | null) {
  const [first, setFirst] = useState<string | null>(null)
  const [asked, ask] = useState<string | null>(null)
  if (first === null && wanted !== null) {
    setFirst(wanted)
    ask(wanted)
  }
  return { first, asked, ask }
}

function useLast<T>(value: T | null, initial: T): T {
  const [last, keep] = useState(initial)
  if (value !== null && value !== last) keep(value)
  return value ?? last
}

function troubleOf(error: Error | null, refused: Explorer['refusal'], again: () => void): Trouble | null {
  if (error) return { message: `${error.message} Shown is the last picture.`, again }
  const [problem] = refused?.problems ?? []
  return problem ? { message: `${problem.message} Shown is the last picture.`, again: null } : null
}
