/** The ruler of an address: the last one stays until the next is there. */
import { useQuery } from '@tanstack/react-query'
import type { RulerView } from '../../lib/answers/ruler-view'
import { RULER_KEYS } from '../../lib/words/place'
import type { Address } from './address'
import { answerTo } from './either'

function askedOf(search: string): string {
  const query = new URLSearchParams(search)
  const keys: readonly string[] = ['s', ...RULER_KEYS]
  return new URLSearchParams([...query].filter(([key]) => keys.includes(key))).toString()
}

export interface LiveReadings {
  readonly view: RulerView
  readonly waiting: boolean
  readonly failed: boolean
}

export function useRuler(address: Address, initial: RulerView): LiveReadings {
  const asked = askedOf(address.search)
  const { data, isFetching, isError } = useQuery<RulerView>({
    queryKey: ['ruler', asked],
    queryFn: ({ signal }) => answerTo({ route: '/api/ruler', asked }, signal),
    // The address may have moved on since the server drew the page.
    placeholderData: (previous) => previous ?? initial,
    staleTime: Number.POSITIVE_INFINITY,
    gcTime: 60_000,
    networkMode: 'always',
    refetchOnWindowFocus: false,
  })
  return { view: data ?? initial, waiting: isFetching, failed: isError }
}
