/** `/api/ruler`: what the page's ruler shows, as data; `/api/ruler/table`: its readings in full, as a download. */
import { FORMATS } from '../formats'
import { fileName } from '../formats/file-name'
import type { Column } from '../quantities/column'
import { columnNamed } from '../quantities/columns'
import type { EpochKey } from '../ruler/keys'
import { type Fault, fault, problemsOf } from '../scenario/problems'
import type { Reading, Scenario } from '../scenario/scenario'
import { linkQuery } from '../scenario/write'
import { ENGINE, type Solution } from '../solve'
import { PLAIN_PLACE, type Place, placeKeys, RULER_KEYS, readPlace } from '../words/place'
import { type RulerAsk, rulerAskOf, rulerPlaceOf } from '../words/ruler-ask'
import { rulerTyped } from '../words/ruler-typed'
import { oneOf, take } from './fields'
import { readKeys } from './keys'
import { opened } from './opened'
import { mapped, type Pairs, type Question, scenariosOf, solved } from './question'
import { type RulerLine, rulerLines } from './ruler'
import { type RulerView, rulerView } from './ruler-view'
import type { Download, Home } from './table'

const TABLE_FORMATS = FORMATS.filter(({ key }) => key === 'csv' || key === 'json')
/** Of the table, and what reads it. */
export const RULER_FORMAT = {
  formats: TABLE_FORMATS,
  field: oneOf('format', TABLE_FORMATS, 'The format of the download.'),
}

/** Like the page it reads leniently what stands behind `s`, and answers with complaints where a field cannot be read. */
export function askRuler(pairs: Pairs): Reading<Question<RulerView>> {
  const { codes, values, faults } = readKeys(pairs, RULER_KEYS)
  if (faults.length > 0) return { ok: false, problems: problemsOf(faults, null) }
  const place = placeOf(values)
  const queries = codes.map((code) => `s=${encodeURIComponent(code)}`)
  return {
    ok: true,
    value: {
      canonical: [...queries, ...placeKeys(place)].join('&'),
      answer: () => ({ ok: true, value: rulerView(opened(codes).solutions, place) }),
    },
  }
}

export function askRulerTable(pairs: Pairs, home: Home): Reading<Question<Download>> {
  const { codes, values, faults: unknown } = readKeys(pairs, [...RULER_KEYS, 'format'])
  const faults: Fault[] = [...unknown]
  const format = take(values, 'format', RULER_FORMAT.field, faults) ?? TABLE_FORMATS[0]
  const place = placeOf(values)
  const ask = rulerAskOf(place)
  for (const [key, message] of Object.entries(rulerTyped(ask).complaints)) {
    faults.push(fault(key, ask[key as 'at'], message.replace(/^.*Allowed: (.*)\.$/, '$1'), message))
  }
  const shown = placeKeys(place)
  const keys = [...shown, `format=${format?.key}`].join('&')
  return mapped(scenariosOf(codes, faults), (scenarios) => ({
    canonical: `${linkQuery(scenarios)}&${keys}`,
    answer: () =>
      mapped(
        solved(scenarios, (one) => one),
        (solutions) => download(scenarios, solutions, ask, format ?? TABLE_FORMATS[0], shown, home),
      ),
  }))
}

function placeOf(values: ReadonlyMap<string, string>): Place {
  const read = readPlace((key) => values.get(key), 1)
  return { ...PLAIN_PLACE, ...rulerPlaceOf(rulerAskOf(read)) }
}

function download(
  scenarios: readonly Scenario[],
  solutions: readonly Solution[],
  asked: RulerAsk,
  format: (typeof FORMATS)[number],
  shown: readonly string[],
  home: Home,
): Download {
  const ask = withEpoch(asked)
  const { at, between } = rulerLines(solutions, ask)
  const lines = [...at, ...between]
  const names = scenarios.flatMap(({ name }) => name ?? [])
  const query = linkQuery(scenarios)
  const provenance = {
    version: home.version,
    engine: ENGINE,
    page: `${home.base}/?${[query, ...shown, `engine=${ENGINE}`].join('&')}`,
    data: `${home.base}/api/ruler/table?${[query, ...shown, `format=${format.key}`].join('&')}`,
  }
  const columns = lines.map(({ quantity: { key, label }, unit }) => ({ key, label, unit }))
  const tables = solutions.map(({ code }, slot) => ({ code, rows: () => [cellsOf(lines, slot)] }))
  return {
    mediaType: format.mediaType,
    fileName: fileName([...names, 'ruler'], format.extension),
    pieces: () => format.pieces({ provenance, columns, tables }),
  }
}

const cellsOf = (lines: readonly RulerLine[], slot: number) => lines.map(({ cells }) => cells[slot]?.value ?? null)

/** The file says where it was read, whether or not that was among the readings. */
function withEpoch(ask: RulerAsk): RulerAsk {
  const key = columnOf(ask.variable)
  return ask.read.includes(key) ? ask : { ...ask, read: [key, ...ask.read] }
}

function columnOf(variable: EpochKey): Column['key'] {
  return columnNamed(variable)?.key ?? 'redshift'
}
