/**
 * A browser compiles what runs often, and takes a second or more over it. So the engine computes neighbours of what the page
 * shows before a hand drags it: each question is new, so that nothing is taken from what was kept, and they lead as far about as a hand
 * does, since what was compiled for one kind of history is compiled anew for another.
 */
import { DEMO } from '../../lib/scenario/demo'
import { readQuery } from '../../lib/scenario/query'
import { linkQuery } from '../../lib/scenario/write'

/** So many questions, after which it gets no faster. */
const ROUNDS = 300
/** Golden section: its multiples, less whole numbers, never come close to each other. */
const GOLDEN = 0.618034
/** Nobody has asked anything for so long: a hand that drags asks more often. Milliseconds. */
const QUIET = 300

export interface Practice {
  /** There is a question of the page: it counts like one of these, and for a while there is none of these. */
  yield(): void
}

/** Puts them one by one, so that a question of the page waits for one of them at most. */
export function practise(asked: string, put: (question: string) => void): Practice {
  let round = 0
  const go = () => {
    const question = round < ROUNDS ? nearby(asked, round) : null
    if (question === null) return
    round += 1
    put(question)
    next = setTimeout(go)
  }
  let next = setTimeout(go)
  return {
    yield() {
      round += 1
      clearTimeout(next)
      next = setTimeout(go, QUIET)
    },
  }
}

/** As far as a hand goes along a slider: parts of what a scenario has. */
const [LEAST, MOST] = [0.2, 2.2]

/** What is asked about scenarios, of which one has less or more matter; null where they cannot be read. */
export function nearby(asked: string, round: number): string | null {
  const pairs = new URLSearchParams(asked)
  const codes = pairs.getAll('s')
  const reading = readQuery(codes.length > 0 ? codes : DEMO.codes)
  if (!reading.ok) return null
  const changed = round % reading.value.length
  const factor = LEAST + (MOST - LEAST) * (((round + 1) * GOLDEN) % 1)
  const scenarios = reading.value.map((one, i) => (i === changed ? { ...one, matter: one.matter * factor } : one))
  pairs.delete('s')
  return [linkQuery(scenarios), ...(pairs.size > 0 ? [pairs.toString()] : [])].join('&')
}
