/**
 * The engine in this browser: a worker, loaded when it is first needed. Of the explorer's questions it gets one at a time, the
 * newest next.
 */
import type { Brief } from '../../lib/answers/explorer'
import type { Computed, Outlook, Question } from './worker'

/** Told of every answer; null where there is none. */
type Listener = (asked: string, view: Brief | null) => void
/** What the explorer shows now, as a question. */
type Ahead = () => string

const EXPLORER = '/api/explorer'

let worker: Worker | null = null
let ready = false
let underWay: string | null = null
let next: string | null = null
let listener: Listener = () => {}
let ahead: Ahead = () => ''

/** True once it computes without delay. */
export const isAwake = (): boolean => ready

export function onComputed(told: Listener, now: Ahead): void {
  listener = told
  ahead = now
}

/** Loads it, unless that has been done. */
export function wake(): void {
  if (worker) return
  worker = new Worker(new URL('./worker.ts', import.meta.url))
  worker.addEventListener('message', heard)
  worker.addEventListener('error', lost)
}

/** Takes the place of a question that waits. */
export function compute(asked: string): void {
  wake()
  next = asked === underWay ? null : asked
  goOn()
}

function goOn(): void {
  if (!ready || underWay !== null || next === null) return
  underWay = next
  next = null
  put({ route: EXPLORER, asked: underWay })
}

const put = (question: Question | Outlook): void => worker?.postMessage(question)

/** The answer to a question that is put once, as JSON; null where there is none. */
export function answered(question: Question): Promise<string | null> {
  wake()
  const its = worker
  return new Promise((resolve) => {
    const heardIts = ({ data }: MessageEvent<Computed | null>) => {
      if (data?.route !== question.route || data.asked !== question.asked) return
      its?.removeEventListener('message', heardIts)
      resolve(data.text)
    }
    its?.addEventListener('message', heardIts)
    its?.addEventListener('error', () => resolve(null), { once: true })
    put(question)
  })
}

/** Null says that it is ready. */
function heard({ data }: MessageEvent<Computed | null>): void {
  if (data !== null && data.route !== EXPLORER) return
  ready = true
  underWay = null
  // First the next question: it is worked on while this answer is drawn.
  goOn()
  if (data === null && underWay === null) put({ outlook: ahead() })
  if (data !== null) listener(data.asked, data.text === null ? null : JSON.parse(data.text))
}

/** It could not be loaded, or broke down; the next question tries again. */
function lost(): void {
  const asked = next ?? underWay
  worker?.terminate()
  worker = underWay = next = null
  ready = false
  if (asked !== null) listener(asked, null)
}
