/** `/api/openapi.json` takes no parameters at all. */
import { readKeys, SCENARIO } from '../answers/keys'
import type { Pairs, Question } from '../answers/question'
import { fault, problemsOf } from '../scenario/problems'
import type { Reading } from '../scenario/scenario'
import { openApi, type Place } from './openapi'
import type { Schema } from './shapes'

export function askDocument(pairs: Pairs, place: Place): Reading<Question<Schema>> {
  const { codes, faults } = readKeys(pairs, [])
  const strange = codes.map((code) => fault(SCENARIO, code, 'none', 'The document holds no scenario.'))
  const all = [...strange, ...faults]
  if (all.length > 0) return { ok: false, problems: problemsOf(all, null) }
  return { ok: true, value: { canonical: '', answer: () => ({ ok: true, value: openApi(place) }) } }
}
