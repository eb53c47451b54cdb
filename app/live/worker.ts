/** In a thread of its own: computes what the server would answer, by the same code. Questions are queries, answers JSON. */
import { askExplorer } from '../../lib/answers/ask-explorer'

export interface Computed {
  readonly asked: string
  /** Null where there is no answer. */
  readonly text: string | null
}

addEventListener('message', ({ data }: MessageEvent<string>) => {
  postMessage({ asked: data, text: answer(data) } satisfies Computed)
})

function answer(asked: string): string | null {
  try {
    const reading = askExplorer(new URLSearchParams(asked))
    const view = reading.ok ? reading.value.answer() : reading
    return view.ok ? JSON.stringify(view.value) : null
  } catch {
    return null
  }
}

postMessage(null)
