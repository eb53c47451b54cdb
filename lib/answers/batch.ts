/** `/api/batch`: many scenarios, one a line; a line at fault gives a problem and stops nothing. */
import { problemsOf } from '../scenario/problems'
import { readScenario } from '../scenario/read'
import type { Problem, Reading } from '../scenario/scenario'
import { historyOfScenario } from './history'
import { mapped, solved } from './question'

export const MOST_LINES = 10_000
/** Characters of a line; the longest codes have some hundreds. */
export const LONGEST_LINE = 16_384
/** Bytes of all lines together. */
export const LARGEST_BATCH = 8 * 2 ** 20

const FORMS = 'a JSON string that holds a scenario code, or an object {"s": "…"} with one'

export interface Line {
  /** Counts every line from 0, blank ones too. */
  readonly index: number
  readonly text: string
}

/** The lines that hold something. */
export function linesOf(body: string): readonly Line[] {
  return body.split('\n').flatMap((text, index) => (text.trim() === '' ? [] : [{ index, text }]))
}

/** The answer to a line; `legal` says whether its problems are those of a scenario that can be read. */
export type LineAnswer =
  | { readonly ok: true; readonly value: ReturnType<typeof historyOfScenario> }
  | { readonly ok: false; readonly legal: boolean; readonly problems: readonly Problem[] }

export function answerLine({ text }: Line): LineAnswer {
  const code = codeIn(text)
  if (!code.ok) return { ...code, legal: false }
  const scenario = readScenario(code.value, null)
  if (!scenario.ok) return { ...scenario, legal: false }
  const answer = mapped(solved([scenario.value], historyOfScenario), ([one]) => one)
  if (answer.ok) return answer
  return { ok: false, legal: true, problems: answer.problems.map((one) => ({ ...one, scenario: null })) }
}

function codeIn(text: string): Reading<string> {
  const refused = (message: string): Reading<string> => ({
    ok: false,
    problems: problemsOf([{ parameter: 's', value: text.slice(0, 200), allowed: FORMS, message }], null),
  })
  if (text.length > LONGEST_LINE) return refused(`The line has ${text.length} characters.`)
  let value: unknown
  try {
    value = JSON.parse(text)
  } catch {
    return refused('The line is no JSON.')
  }
  if (typeof value === 'string') return { ok: true, value }
  if (typeof value !== 'object' || value === null || !('s' in value) || typeof value.s !== 'string') {
    return refused('The line holds no scenario code.')
  }
  const stranger = Object.keys(value).find((key) => key !== 's')
  return stranger === undefined ? { ok: true, value: value.s } : refused(`There is no such parameter: ${stranger}.`)
}
