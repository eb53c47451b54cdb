/** The ruler's keys and answers. Its keys are read as people type them, so the shapes here are those that are always understood. */

import { epochVariable } from '../ruler/epochs'
import { LINE_UNITS } from '../ruler/given'
import { EPOCH_KEYS } from '../ruler/keys'
import { READINGS } from '../ruler/readings'
import { PLAIN_PLACE, type RULER_KEYS } from '../words/place'
import { rulerAskOf } from '../words/ruler-ask'
import type { RouteParameter } from './route'
import { closed, column, listOf, refTo, rows, type Schema, scenarios, text } from './shapes'

const USUAL = rulerAskOf(PLAIN_PLACE)
const variables = EPOCH_KEYS.map((key) => `${key} ${epochVariable(key).unit}`.trim()).join(', ')
const typed = (value: string): Schema => ({ type: 'string', maxLength: 40, default: value })

const KEYS: Readonly<Record<(typeof RULER_KEYS)[number], Omit<RouteParameter, 'name'>>> = {
  epoch: {
    description: `What epochs are given by: ${variables}.`,
    schema: { enum: EPOCH_KEYS, default: USUAL.variable },
  },
  at: { description: 'The epoch.', schema: typed(USUAL.at) },
  until: { description: 'Another epoch, for what lies between the two.', schema: { type: 'string', maxLength: 40 } },
  read: {
    description: `What is read: some of ${READINGS.map(({ key }) => key).join(', ')}, joined by commas.`,
    schema: { type: 'string', default: USUAL.read.join(',') },
  },
  length: {
    description: 'A length in Mpc, of which angle and comovingAngle tell the angle.',
    schema: typed(USUAL.length),
  },
  line: {
    description: `Where observedLine is emitted: a wavelength or frequency with one of ${LINE_UNITS.join(', ')}.`,
    schema: typed(USUAL.line),
  },
  sky: { description: 'Square degrees of the sky, for skyVolume.', schema: typed(USUAL.sky) },
  units: { description: 'With h, lengths are in units with h⁻¹.', schema: { enum: ['h'] } },
}

export const RULER_PARAMETERS: readonly RouteParameter[] = Object.entries(KEYS).map(([name, one]) => ({ name, ...one }))

const complaints = ['at', 'until', 'length', 'line', 'sky'] as const

export const RULER_SCHEMAS: Readonly<Record<string, Schema>> = {
  Ruler: closed({
    scenarios: listOf(closed({ slot: { type: 'integer' }, name: text })),
    at: listOf(refTo('RulerRow')),
    between: { ...listOf(refTo('RulerRow')), description: 'Empty where there is but one epoch' },
    notes: { ...listOf(text), description: 'Why cells are empty, or what has to be said beside them' },
    complaints: {
      type: 'object',
      description: 'By key, what cannot be read as it was typed',
      properties: Object.fromEntries(complaints.map((key) => [key, text])),
      additionalProperties: false,
    },
    downloads: listOf(closed({ format: text, link: text })),
  }),
  RulerRow: closed({
    key: text,
    symbol: text,
    label: text,
    unit: text,
    cells: {
      ...listOf({ type: ['string', 'null'] }),
      description: 'One for each scenario, rounded as the page shows it; null where there is none',
    },
  }),
  RulerTable: scenarios(closed({ code: text, columns: listOf(column), rows })),
}
