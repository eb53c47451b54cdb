/** The ruler, once it is alive. */
import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { useState } from 'react'
import type { RulerView } from '../../lib/answers/ruler-view'
import type { Shelf } from '../../lib/answers/shelf'
import { rulerLink } from '../../lib/words/compose-ruler'
import type { Desk } from '../../lib/words/desk'
import { type RulerAsk, rulerAskOf } from '../../lib/words/ruler-ask'
import { type RulerField, rulerTyped } from '../../lib/words/ruler-typed'
import { Ruler, type RulerHand } from '../ui/ruler'
import { type Address, go, settle } from './address'
import { useLate } from './use-late'
import { useRuler } from './use-ruler'

/** Sooner nobody misses anything. Milliseconds. */
const PATIENCE = 300

export interface LiveRulerProps {
  readonly desk: Desk
  readonly address: Address
  readonly initial: RulerView
  readonly shelf: Shelf
}

export default function LiveRuler(props: LiveRulerProps) {
  const [client] = useState(() => new QueryClient())
  return (
    <QueryClientProvider client={client}>
      <RulerOf {...props} />
    </QueryClientProvider>
  )
}

function RulerOf({ desk, address, initial, shelf }: LiveRulerProps) {
  const { view, waiting, failed } = useRuler(address, initial)
  const late = useLate(waiting, PATIENCE)
  const state = failed ? 'The server cannot be reached. Shown is what was read last.' : late ? 'Calculating' : null
  return <Ruler desk={desk} view={view} shelf={shelf} state={state} hand={useHand(desk, view)} />
}

type Drafts = Readonly<Partial<Record<RulerField, string>>>

/** What is typed stays as typed until the field is left; what can be read of it is asked at once. */
function useHand(desk: Desk, view: RulerView): RulerHand {
  const [drafts, setDrafts] = useState<Drafts>({})
  const asked = rulerAskOf(desk.place)
  const put = (field: RulerField, text: string | undefined) => setDrafts((before) => ({ ...before, [field]: text }))
  const ask = (changed: Partial<RulerAsk>, by: string | null = null) =>
    go(rulerLink(desk.links.here, desk.place, { ...asked, ...changed }), by)
  const complaintAbout = (field: RulerField, text: string) =>
    text.trim() === '' ? undefined : rulerTyped({ ...asked, [field]: text }).complaints[field]
  const complaintOf = (field: RulerField) => {
    const draft = drafts[field]
    return draft === undefined ? view.complaints[field] : complaintAbout(field, draft)
  }
  return {
    textOf: (field) => drafts[field] ?? asked[field],
    complaintOf,
    type: (field, text) => {
      put(field, text)
      if (complaintAbout(field, text) === undefined) ask({ [field]: text.trim() }, `ruler ${field}`)
    },
    leave: (field) => {
      settle()
      if (complaintOf(field) === undefined) put(field, undefined)
    },
    drop: (field) => put(field, undefined),
    ask,
  }
}
