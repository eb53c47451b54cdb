/**
 * The answers to an address that changes: which one is shown, who computed it, and what is still on its way. In the middle
 * of a gesture this browser computes, as soon as it can; when the gesture is over, the server's answer is the one that
 * stands. Where the server does not answer, this browser does. Nothing old is ever shown over something newer.
 */
import type { Brief, Explorer, ScenarioView } from '../../lib/answers/explorer'
import type { Ask, Progress } from './asking'

export interface Answer {
  readonly asked: string
  readonly view: Explorer
  /** True where it was computed in this browser. */
  readonly here: boolean
}

export interface Answers {
  readonly answer: Answer
  /** What should be shown. */
  readonly wanted: string
  /** True while the server works on it. */
  readonly fetching: boolean
  /** True while this browser works on it. */
  readonly computing: boolean
  /** Why the server did not answer; stays until it does. */
  readonly error: Error | null
}

/** Who can be asked. */
export interface Means {
  readonly isAwake: () => boolean
  /** In this browser; answers come back by `computed`. */
  readonly compute: (asked: string) => void
  /** Loads what it takes to ask the server. */
  readonly load: (told: (progress: Progress) => void) => Promise<Ask>
}

export function createAnswers(first: Answer, { isAwake, compute, load }: Means) {
  let state: Answers = { answer: first, wanted: first.asked, fetching: false, computing: false, error: null }
  const listeners = new Set<() => void>()
  /** Of each question when it was last put, and of the answer that is shown. */
  const turns = new Map([[first.asked, 0]])
  let [turn, shown, moving] = [0, 0, false]
  let asking: Promise<Ask> | null = null

  const set = (change: Partial<Answers>) => {
    state = { ...state, ...change }
    for (const listener of listeners) listener()
  }
  const ask = () => {
    set({ fetching: true })
    asking ??= load(told)
    asking.then(
      // Meanwhile it may be another question, or none.
      (put) => state.fetching && put(state.wanted),
      () => {
        asking = null
        set({ fetching: false, error: new Error('The server cannot be reached.') })
        computeHere()
      },
    )
  }
  const isOpen = () => state.answer.asked !== state.wanted || state.answer.here
  const computeHere = () => {
    if (state.answer.asked === state.wanted) return
    set({ computing: true })
    compute(state.wanted)
  }
  const show = ({ view, ...rest }: Omit<Answer, 'view'> & { readonly view: Brief }) => {
    const full = whole(view, state.answer.view)
    if (full === null) return
    const answer: Answer = { ...rest, view: full }
    const its = turns.get(answer.asked) ?? -1
    const stands = its === shown && answer.here && !state.answer.here
    if (its < shown || stands) return
    shown = its
    for (const [asked, at] of turns) if (at < its) turns.delete(asked)
    set({ answer: unlessSame(answer, state.answer) })
  }
  const told = ({ asked, view, fetching, failing, error }: Progress) => {
    if (view) show({ asked, view, here: false })
    const late = asked !== state.wanted
    set({ fetching: fetching && (state.fetching || !late), error: view ? null : (error ?? state.error) })
    if (failing && !view) computeHere()
    if (late && !fetching && isOpen() && !(moving && isAwake())) ask()
  }

  return {
    read: () => state,
    subscribe(listener: () => void) {
      listeners.add(listener)
      return () => void listeners.delete(listener)
    },
    /** The address is another, or the gesture is over. */
    want(asked: string, inGesture: boolean) {
      if (asked === state.wanted && inGesture === moving) return
      moving = inGesture
      turns.set(asked, ++turn)
      if (asked === state.answer.asked) shown = turn
      const computing = state.computing && asked === state.wanted
      set({ wanted: asked, computing, fetching: state.fetching && asked !== first.asked })
      if (asked === first.asked) return show(first)
      if (isAwake()) computeHere()
      if (isOpen() && (!moving || !(isAwake() || state.fetching))) ask()
    },
    computed(asked: string, view: Brief | null) {
      if (view) show({ asked, view, here: true })
      if (asked === state.wanted) set({ computing: false })
    },
    /** Asks the server for what is shown already, to know whether it is there. */
    again: ask,
  }
}

/** What was not asked for stays as it was; null where it is not known, of a scenario that came meanwhile. */
function whole(view: Explorer | Brief, before: Explorer): Explorer | null {
  if (isWhole(view)) return view
  const { readings } = before.long.figure
  const { moments, measures, panel } = before
  const scenarios: ScenarioView[] = []
  for (const [i, tab] of view.scenarios.entries()) {
    const known = before.scenarios[i]
    if (isTold(tab)) scenarios.push(tab)
    else if (known) scenarios.push({ ...known, ...tab })
    else return null
  }
  return {
    ...view,
    scenarios,
    long: { ...view.long, figure: { ...view.long.figure, readings } },
    moments: view.moments ?? moments,
    measures: view.measures ?? measures,
    panel: view.panel ?? panel,
  }
}

const isTold = (tab: Brief['scenarios'][number]): tab is ScenarioView => 'verdict' in tab

/** Only a whole answer has what a cursor reads. */
const isWhole = (view: Explorer | Brief): view is Explorer => view.long.figure.readings.places.length > 0

/** The same content as the same object has nothing drawn again. */
function unlessSame(answer: Answer, before: Answer): Answer {
  const same = answer.asked === before.asked && JSON.stringify(answer.view) === JSON.stringify(before.view)
  return same ? { ...answer, view: before.view } : answer
}
