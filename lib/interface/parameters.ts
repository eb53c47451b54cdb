/** Query keys of the routes, described by the very schemas that read them. */
import { RULER_FORMAT } from '../answers/ask-ruler'
import { AT_FIELDS } from '../answers/epochs'
import { FIGURE_FIELDS, FIGURE_FORMATS, LEAST_DPI, MOST_DPI, VIEW_KEYS } from '../answers/figure'
import type { PLACE_FIELDS } from '../answers/figure-place'
import { TABLE_FIELDS } from '../answers/layout'
import { OEMBED_FIELDS } from '../answers/oembed'
import { QR_FIELDS, QR_FORMATS } from '../answers/qr'
import { FORMATS } from '../formats'
import { SIZES } from '../print/sizes'
import { THEME_KEYS } from '../print/theme'
import { COLUMNS } from '../quantities/columns'
import { MOST_SCENARIOS } from '../scenario/query'
import { SPACINGS } from '../tables/spacing'
import { FARTHEST_END, FARTHEST_GALAXY } from '../words/place'
import type { RouteParameter } from './route'
import { codeDescription } from './scenario-code'
import type { Schema } from './shapes'

export const SCENARIOS: RouteParameter = {
  name: 's',
  description: `${codeDescription()}\n\nUp to ${MOST_SCENARIOS} times. Where there is none, the scenarios of the demo.`,
  schema: { type: 'array', items: { type: 'string' }, minItems: 1, maxItems: MOST_SCENARIOS },
  example: 'h0:70,matter:0.3',
}

const numbers: Schema = { type: 'string', description: 'Plain decimal numbers joined by commas' }
const columns: Schema = {
  type: 'string',
  description: `Some of ${COLUMNS.map(({ key }) => key).join(', ')}, joined by commas`,
}
const bounds: Schema = { enum: ['0', '1'], default: '0' }
const keysOf = (list: readonly { readonly key: string }[]): Schema => ({ enum: list.map(({ key }) => key) })

const AT_SHAPES: Readonly<Record<keyof typeof AT_FIELDS, Schema>> = {
  z: numbers,
  scale: numbers,
  time: numbers,
  age: numbers,
  branch: { enum: ['expanding', 'contracting'], default: 'expanding' },
  columns,
  bounds,
}

const TABLE_SHAPES: Readonly<Record<keyof typeof TABLE_FIELDS, Schema>> = {
  format: { ...keysOf(FORMATS), default: FORMATS[0].key },
  by: { ...keysOf(SPACINGS), default: SPACINGS[0].key },
  from: { type: 'number' },
  to: { type: 'number' },
  rows: { type: 'integer', minimum: 2, maximum: Math.max(...FORMATS.map(({ mostRows }) => mostRows)), default: 200 },
  columns,
  bounds,
}

const end: Schema = { type: 'number', minimum: -FARTHEST_END, maximum: FARTHEST_END }
const PLACE_SHAPES: Readonly<Record<keyof typeof PLACE_FIELDS, Schema>> = {
  focus: { type: 'integer', minimum: 1, maximum: MOST_SCENARIOS, default: 1 },
  time: { enum: ['log'] },
  from: end,
  to: end,
  show: { type: 'string' },
  by: { type: 'string' },
  compare: { enum: ['ratio', 'difference'] },
  galaxy: { type: 'number', exclusiveMinimum: 0, maximum: FARTHEST_GALAXY },
  left: end,
  right: end,
}

const FIGURE_SHAPES: Readonly<Record<keyof typeof FIGURE_FIELDS, Schema>> = {
  view: { ...keysOf(VIEW_KEYS), default: VIEW_KEYS[0].key },
  ...PLACE_SHAPES,
  format: { ...keysOf(FIGURE_FORMATS), default: FIGURE_FORMATS[0].key },
  size: { ...keysOf(SIZES), default: SIZES[0].key },
  theme: { enum: THEME_KEYS, default: THEME_KEYS[0] },
  dpi: { type: 'integer', minimum: LEAST_DPI, maximum: MOST_DPI },
}

const QR_SHAPES: Readonly<Record<keyof typeof QR_FIELDS, Schema>> = {
  format: { ...keysOf(QR_FORMATS), default: QR_FORMATS[0].key },
  base: { type: 'string', format: 'uri' },
}

const pixels: Schema = { type: 'integer', minimum: 1 }
const OEMBED_SHAPES: Readonly<Record<keyof typeof OEMBED_FIELDS, Schema>> = {
  url: { type: 'string', format: 'uri' },
  maxwidth: pixels,
  maxheight: pixels,
  format: { enum: ['json'], default: 'json' },
}

interface Described {
  meta(): { readonly description?: string } | undefined
}

/** The fields of a route with their shapes. */
export function parametersOf(
  fields: Readonly<Record<string, Described>>,
  shapes: Readonly<Record<string, Schema>>,
): RouteParameter[] {
  return Object.entries(fields).map(([name, field]) => ({
    name,
    description: field.meta()?.description ?? '',
    schema: shapes[name] ?? {},
  }))
}

export const AT_PARAMETERS = parametersOf(AT_FIELDS, AT_SHAPES)
export const TABLE_PARAMETERS = parametersOf(TABLE_FIELDS, TABLE_SHAPES)
export const FIGURE_PARAMETERS = parametersOf(FIGURE_FIELDS, FIGURE_SHAPES)
export const QR_PARAMETERS = parametersOf(QR_FIELDS, QR_SHAPES)
export const OEMBED_PARAMETERS = parametersOf(OEMBED_FIELDS, OEMBED_SHAPES)
export const RULER_FORMATS = parametersOf(
  { format: RULER_FORMAT.field },
  { format: { ...keysOf(RULER_FORMAT.formats), default: RULER_FORMAT.formats[0].key } },
)
