/** The shapes of all answers as JSON Schema (draft 2020-12), filled from the lists of measures, columns and kinds. */
import type { EndKind, OriginKind } from '../history/outcome'
import { COLUMNS } from '../quantities/columns'
import { MEASURES } from '../quantities/measures'
import type { MomentKind } from '../quantities/moments'
import { END_NAMES } from '../words/ending'
import { RULER_SCHEMAS } from './ruler'
import { closed, column, listOf, maybeNumber, number, refTo, rows, type Schema, scenarios, text } from './shapes'

const ORIGINS: Readonly<Record<OriginKind, string>> = {
  'big-bang': 'a = 0 at a finite time',
  bounce: 'contraction before expansion',
  eternal: 'a → 0 only as t → −∞',
  static: 'emerges from a static state',
  oscillating: 'the last of many bounces',
  singular: 'the density diverges at a finite a',
}
const MOMENTS: Readonly<Record<MomentKind, true>> = {
  origin: true,
  'matter-radiation-equality': true,
  recombination: true,
  drag: true,
  'acceleration-start': true,
  'acceleration-end': true,
  'matter-dark-equality': true,
  now: true,
  turnaround: true,
  'unbinding-cluster': true,
  'unbinding-galaxy': true,
  'unbinding-planet': true,
  'unbinding-earth': true,
  'unbinding-atom': true,
  end: true,
}
const ENDS: readonly EndKind[] = Object.keys(END_NAMES) as EndKind[]

const densities = ['photons', 'masslessNeutrinos', 'massiveNeutrinos', 'coldMatter', 'curvature', 'dark']

const measure = (unit: string, description: string): Schema => ({
  description,
  oneOf: [
    closed({ value: number, unit: { const: unit }, error: number, because: { type: 'null' } }),
    closed({ value: { type: 'null' }, unit: { const: unit }, error: { type: 'null' }, because: text }),
  ],
})

const end = closed({
  kind: { enum: ENDS },
  time: { ...maybeNumber, description: 'Gyr from now; null when infinite' },
  scale: { ...maybeNumber, description: 'Limit of a; null when infinite' },
  turnaround: { oneOf: [closed({ time: number, scale: number }), { type: 'null' }] },
  proven: { type: 'boolean' },
  because: text,
})

const history: Readonly<Record<string, Schema>> = {
  code: { ...text, description: 'The canonical scenario code, ready to stand in an address' },
  label: text,
  densities: closed(Object.fromEntries(densities.map((key) => [key, number])), 'Ω today; the sum is 1'),
  origin: closed({
    kind: { enum: Object.keys(ORIGINS), description: list(ORIGINS) },
    time: { ...maybeNumber, description: 'Gyr from now; null when infinite' },
    scale: number,
  }),
  end,
  measures: closed(
    Object.fromEntries(MEASURES.map(({ key, unit, label, meaning }) => [key, measure(unit, `${label}: ${meaning}`)])),
  ),
  moments: listOf(
    closed({
      kind: { enum: Object.keys(MOMENTS) },
      label: text,
      time: maybeNumber,
      scale: maybeNumber,
      redshift: maybeNumber,
      age: { ...maybeNumber, description: 'Gyr since the origin; null when infinite' },
      remaining: { ...maybeNumber, description: 'Gyr left to the end; null when infinite' },
    }),
  ),
  series: closed({ columns: listOf(column), rows: listOf(listOf(number)) }, 'Rounded points for drawing'),
}

function list(kinds: Readonly<Record<string, string>>): string {
  return Object.entries(kinds)
    .map(([kind, meaning]) => `${kind}: ${meaning}`)
    .join('; ')
}

const changeBetween = (kinds: readonly string[]): Schema => ({
  oneOf: [closed({ from: { enum: kinds }, to: { enum: kinds } }), { type: 'null' }],
})

const index: Schema = { type: 'integer', minimum: 0, description: 'The line of the request, counted from 0' }

const direction: Schema = { enum: ['up', 'down'] }
const accuracy: Schema = {
  ...number,
  description: 'The boundary lies no farther from the value; about 2e-10 of it where no integration is needed',
}

/** Of the columns, and of those of their error bounds. */
const COLUMN_NAMES = COLUMNS.flatMap(({ key }) => [key, `${key}Error`])

const problemProperties: Readonly<Record<string, Schema>> = {
  type: text,
  title: text,
  status: { type: 'integer', minimum: 400, maximum: 599 },
  detail: text,
  instance: text,
  errors: listOf(refTo('RefusedParameter')),
}

export const SCHEMAS: Readonly<Record<string, Schema>> = {
  History: closed(history),
  Histories: scenarios(refTo('History')),
  Neighbourhoods: scenarios(
    closed({
      code: text,
      closes: { enum: ['curvature', 'dark'], description: 'The density that closes the budget' },
      origin: { enum: Object.keys(ORIGINS) },
      end: { enum: ENDS },
      neighbours: {
        ...listOf(refTo('Neighbour')),
        description:
          'The nearest that growing steps find from the value given; two boundaries between the same two steps are missed',
      },
      edges: { ...listOf(refTo('Edge')), description: 'Of a scalar field: beyond these there is no solution' },
      leftOut: listOf(closed({ parameter: text, because: text })),
    }),
  ),
  Neighbour: closed({
    parameter: { ...text, description: 'Key of the scenario code' },
    index: { type: ['integer', 'null'], description: 'Place in a list of numbers, counted from 0' },
    symbol: text,
    value: { ...number, description: 'Where the kind changes' },
    accuracy,
    change: {
      ...number,
      description: 'The same less the value given; 0 where any change will do, within the accuracy',
    },
    direction,
    end: changeBetween(ENDS),
    origin: changeBetween(Object.keys(ORIGINS)),
    certain: { type: 'boolean', description: 'False where a kind on either side is seen by integration, not proven' },
    because: { ...text, description: 'Why it begins or ends so beyond the boundary' },
  }),
  Edge: closed({
    parameter: { ...text, description: 'Key of the scenario code' },
    index: { type: ['integer', 'null'], description: 'Place in a list of numbers, counted from 0' },
    symbol: text,
    value: { ...number, description: 'Up to where there are solutions' },
    accuracy,
    change: { ...number, description: 'The same less the value given' },
    direction,
    because: { ...text, description: 'Why there is none beyond, such as the largest density that the field can reach' },
  }),
  Note: closed({ row: { type: 'integer' }, column: { type: ['string', 'null'] }, because: text }),
  Epochs: scenarios(closed({ code: text, columns: listOf(refTo('Column')), rows, notes: listOf(refTo('Note')) })),
  Table: scenarios(closed({ code: text, columns: listOf(refTo('Column')), rows })),
  Column: closed({ name: { enum: COLUMN_NAMES }, unit: text, label: text }),
  BatchLine: {
    oneOf: [text, closed({ s: text })],
    description: 'A scenario code as plain text, nothing percent-encoded',
  },
  BatchResult: { oneOf: [closed({ index, ...history }), closed({ index, problem: refTo('Problem') })] },
  Words: closed({
    engine: text,
    figure: closed({ caption: text, alternative: text }),
    scenarios: listOf(
      closed({
        code: text,
        label: text,
        caption: text,
        alternative: text,
        summary: text,
        methods: text,
        press: closed({ facts: listOf(closed({ title: text, text })) }),
      }),
    ),
    macros: { ...text, description: 'LaTeX' },
    bibtex: text,
  }),
  OEmbed: closed({
    version: { const: '1.0' },
    type: { const: 'rich' },
    provider_name: text,
    provider_url: text,
    title: text,
    html: text,
    width: number,
    height: number,
    thumbnail_url: text,
    thumbnail_width: number,
    thumbnail_height: number,
  }),
  RefusedParameter: closed({
    parameter: text,
    scenario: { type: ['integer', 'null'], description: 'The place of its s, counted from 0' },
    value: { type: ['string', 'null'] },
    allowed: text,
    message: text,
  }),
  ...RULER_SCHEMAS,
  Problem: closed(problemProperties, 'Problem details, RFC 9457'),
}
