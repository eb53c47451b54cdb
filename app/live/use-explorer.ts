/** The view of an address: the last one stays until the next is there. */
import { useEffect, useMemo, useState, useSyncExternalStore } from 'react'
import type { Brief, Explorer, Part } from '../../lib/answers/explorer'
import { type Desk, readDesk } from '../../lib/words/desk'
import { type Address, addressNow, watchAddress } from './address'
import { type Answers, createAnswers } from './answers'
import { askedOf } from './fetch-view'
import { compute, isAwake, onComputed } from './here'
import { useOffline } from './use-offline'
import { PAUSE } from './use-unhurried'

export interface Live {
  readonly view: Explorer
  /** Of the address, at once: the view may still be on its way. */
  readonly desk: Desk
  /** True until the view is that of the address. */
  readonly waiting: boolean
  /** True until the server has answered as well. */
  readonly busy: boolean
  readonly trouble: Trouble | null
}

export interface Trouble {
  readonly message: string
  /** True where what is shown is not what the address says. */
  readonly grave: boolean
  /** Null where asking again would change nothing. */
  readonly again: (() => void) | null
}

/** `asked` is the question that `initial` answers: a page that was kept for use without a network may answer another. */
export function useExplorer(address: Address | null, initial: Explorer, asked: string, frame: string | null): Live {
  const answers = useAnswers(initial, asked, frame)
  const { answer, wanted, fetching, computing, error } = useSyncExternalStore(
    answers.subscribe,
    answers.read,
    answers.read,
  )
  const own = useDesk(address)
  // A code that is well written and has no solution: the last picture stays, with the reason.
  const refused = answer.view !== initial && own !== null ? answer.view.refusal : null
  const view = useLast(refused ? null : answer.view, initial)
  const waiting = answer.asked !== wanted
  const showsFirst = view === initial && wanted === asked
  return {
    view,
    desk: own !== null && !(showsFirst && initial.refusal) ? own : view,
    waiting,
    busy: waiting || fetching,
    trouble: troubleOf(computing ? null : error, waiting, answers.again) ?? refusalOf(refused),
  }
}

/** Whether the view below the long one is in sight. */
let viewsSeen = true

export function tellViewsSeen(seen: boolean): void {
  viewsSeen = seen
}

/** What came with the page is drawn for every frame; later answers for the one that is seen. */
function useAnswers(initial: Explorer, asked: string, frame: string | null) {
  const [answers] = useState(() => createAnswers({ asked, view: initial, here: false }, MEANS))
  useEffect(() => {
    /** When there were words last. */
    let said = 0
    let rest: ReturnType<typeof setTimeout> | undefined
    const partsOf = (search: string): readonly Part[] => {
      const isOther = answers.read().answer.view.scenarios.length !== new URLSearchParams(search).getAll('s').length
      const words = isOther || performance.now() - said > PAUSE
      return [...(viewsSeen ? (['view'] as const) : []), ...(words ? (['words'] as const) : [])]
    }
    const want = () => {
      clearTimeout(rest)
      const { search, moving } = addressNow()
      const isFirst = askedOf(search, null) === asked
      answers.want(isFirst ? asked : askedOf(search, frame, moving ? partsOf(search) : null), moving)
      // A hand that rests before it lets go sees the words of what it sees.
      if (moving) rest = setTimeout(want, 2 * PAUSE)
    }
    const computed = (question: string, view: Brief | null) => {
      if (view?.moments) said = performance.now()
      answers.computed(question, view)
    }
    onComputed(computed, () => askedOf(location.search, frame, viewsSeen ? ['view', 'words'] : ['words']))
    const stop = watchAddress(want)
    return () => {
      clearTimeout(rest)
      stop()
    }
  }, [answers, asked, frame])
  useOffline(answers.again)
  return answers
}

const MEANS = {
  isAwake,
  compute,
  load: async (told: Parameters<Parameters<typeof createAnswers>[1]['load']>[0]) =>
    (await import('./asking')).startAsking(told),
}

function useDesk(address: Address | null): Desk | null {
  const search = address?.search
  return useMemo(() => (search === undefined ? null : readDesk(new URLSearchParams(search))), [search])
}

function useLast<T>(value: T | null, initial: T): T {
  const [last, keep] = useState(initial)
  if (value !== null && value !== last) keep(value)
  return value ?? last
}

function troubleOf(error: Answers['error'], waiting: boolean, again: () => void): Trouble | null {
  if (!error) return null
  const shown = waiting ? 'Shown is the last picture.' : 'This page computes in your browser.'
  return { message: `${error.message} ${shown}`, grave: waiting, again }
}

function refusalOf(refused: Explorer['refusal']): Trouble | null {
  const [problem] = refused?.problems ?? []
  return problem ? { message: `${problem.message} Shown is the last picture.`, grave: true, again: null } : null
}
