/** In a thread of its own: computes what the server would answer, by the same code. */
import { askExplorer } from '../../lib/answers/ask-explorer'
import { askRuler } from '../../lib/answers/ask-ruler'
import { askHistory } from '../../lib/answers/history'
import type { Pairs, Question as Read } from '../../lib/answers/question'
import type { Home } from '../../lib/answers/table'
import { askWords } from '../../lib/answers/words'
import type { Reading } from '../../lib/scenario/scenario'
import { type Practice, practise } from './practice'

/** What pages ask for, and whole histories, by which a test compares all digits with the server's. */
const ROUTES = {
  '/api/explorer': askExplorer,
  '/api/history': askHistory,
  '/api/ruler': askRuler,
  '/api/words': askWords,
}

export interface Question {
  readonly route: keyof typeof ROUTES
  /** The query. */
  readonly asked: string
  /** What links begin with, for answers that have some. */
  readonly home?: Home
}

/** What the page shows, before it has a question. */
export interface Outlook {
  readonly outlook: string
}

export interface Computed extends Pick<Question, 'route' | 'asked'> {
  /** JSON; null where there is no answer. */
  readonly text: string | null
}

let practice: Practice | null = null

addEventListener('message', ({ data }: MessageEvent<Question | Outlook>) => {
  if ('outlook' in data) {
    practice ??= practise(data.outlook, (question) => void answer(askExplorer, question))
    return
  }
  practice?.yield()
  const { route, asked, home } = data
  postMessage({ route, asked, text: answer(ROUTES[route], asked, home) } satisfies Computed)
})

type Route = (pairs: Pairs, home: Home) => Reading<Read<unknown>>

function answer(route: Route, asked: string, home: Home = { version: '', base: '' }): string | null {
  try {
    const reading = route(new URLSearchParams(asked), home)
    const view = reading.ok ? reading.value.answer() : reading
    return view.ok ? JSON.stringify(view.value) : null
  } catch {
    return null
  }
}

postMessage(null)
