/** What the schemas of answers are put together from. */

export type Schema = Readonly<Record<string, unknown>>

export const number: Schema = { type: 'number' }
export const text: Schema = { type: 'string' }
export const maybeNumber: Schema = { type: ['number', 'null'] }
export const listOf = (items: Schema): Schema => ({ type: 'array', items })
export const refTo = (name: string): Schema => ({ $ref: `#/components/schemas/${name}` })

/** All properties are always there, and no others. */
export const closed = (properties: Readonly<Record<string, Schema>>, description?: string): Schema => ({
  type: 'object',
  ...(description ? { description } : {}),
  properties,
  required: Object.keys(properties),
  additionalProperties: false,
})

export const scenarios = (scenario: Schema): Schema => closed({ engine: text, scenarios: listOf(scenario) })
export const column = closed({ name: text, unit: text, label: text })
export const rows = listOf(listOf(maybeNumber))
