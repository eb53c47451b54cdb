/** `/api/explorer`: what the page shows, as data. Like the page it reads leniently what stands behind `s`. */

import { LONG_FRAMES } from '../figures/plot'
import { problemsOf } from '../scenario/problems'
import { readQuery } from '../scenario/query'
import type { Reading } from '../scenario/scenario'
import { linkQuery } from '../scenario/write'
import { PLACE_KEYS, placeKeys, readPlace } from '../words/place'
import { type Asked, type Brief, brief, explorer, type Part } from './explorer'
import { readKeys, SCENARIO } from './keys'
import type { Pairs, Question } from './question'

/** The live page asks for the drawings that it shows. */
const FRAME = 'frame'
/** And in the middle of a gesture for the long view, with what else is in sight. */
const PARTS = 'parts'
const LONG = 'long'
const MORE: readonly Part[] = ['view', 'words']

export function askExplorer(pairs: Pairs): Reading<Question<Brief>> {
  const { codes, values, faults } = readKeys(pairs, [...PLACE_KEYS, FRAME, PARTS])
  if (faults.length > 0) return { ok: false, problems: problemsOf(faults, null) }
  const asked = { codes, keys: values, frame: values.get(FRAME) }
  const named = values.get(PARTS)?.split(' ') ?? []
  if (!named.includes(LONG))
    return { ok: true, value: { canonical: canonicalOf(asked), answer: () => ({ ok: true, value: explorer(asked) }) } }
  const parts = new Set(MORE.filter((one) => named.includes(one)))
  const canonical = `${canonicalOf(asked)}&${PARTS}=${[LONG, ...parts].join('+')}`
  return { ok: true, value: { canonical, answer: () => ({ ok: true, value: brief(asked, parts) }) } }
}

/** No scenario at all stays apart from the scenarios of the demo: it has a title. */
function canonicalOf({ codes, keys, frame }: Asked): string {
  const reading = readQuery(codes)
  const count = reading.ok ? reading.value.length : codes.length
  const queries =
    reading.ok && codes.length > 0
      ? [linkQuery(reading.value)]
      : codes.map((code) => `${SCENARIO}=${encodeURIComponent(code)}`)
  const drawn = LONG_FRAMES.some(({ id }) => id === frame) ? [`${FRAME}=${frame}`] : []
  return [...queries, ...placeKeys(readPlace((key) => keys.get(key), count)), ...drawn].join('&')
}
