/** The interface as an OpenAPI 3.1 document. */
import { ENGINE } from '../solve'
import type { Route, RouteParameter } from './route'
import { ROUTES } from './routes'
import { SCHEMAS } from './schemas'
import { refTo, type Schema } from './shapes'

export interface Place {
  readonly version: string
  /** What stands before the paths; empty where that is not known. */
  readonly base: string
}

const PROBLEM = 'application/problem+json'

export function openApi({ version, base }: Place): Schema {
  return {
    openapi: '3.1.0',
    info: {
      title: 'Longhence',
      version,
      summary: 'Histories of expanding universes as numbers, tables and figures',
      description: `Engine ${ENGINE}: the same scenario code gives the same digits until this number changes. All numbers are full doubles; units stand beside them. No key is needed, and pages of any site may ask.`,
      license: { name: 'MIT', identifier: 'MIT' },
    },
    servers: [{ url: base === '' ? '/' : base }],
    paths: Object.fromEntries(ROUTES.map((route) => [route.path, { [route.method]: operationOf(route) }])),
    components: { schemas: SCHEMAS },
  }
}

function operationOf({ path, summary, parameters, body, answer, refusals }: Route): Schema {
  return {
    operationId: path.replace(/^\/api\//, '').replace(/[^a-z]+/g, '_'),
    summary,
    ...(parameters.length > 0 ? { parameters: parameters.map(parameterOf) } : {}),
    ...(body ? { requestBody: { required: true, content: contentOf(body) } } : {}),
    responses: {
      200: { description: 'The answer', content: contentOf(answer) },
      ...Object.fromEntries([400, ...refusals].map((status) => [status, refusal(status)])),
    },
  }
}

function parameterOf({ name, description, schema, required, example }: RouteParameter): Schema {
  const shape = schema.type === 'array' ? { style: 'form', explode: true } : {}
  const shown = example === undefined ? {} : { example: schema.type === 'array' ? [example] : example }
  return { name, in: 'query', description, required: required ?? false, schema, ...shape, ...shown }
}

const contentOf = (types: Route['answer']): Schema =>
  Object.fromEntries(Object.entries(types).map(([type, schema]) => [type, { schema }]))

const MEANINGS: Readonly<Record<number, string>> = {
  400: 'A parameter is refused; errors name each, what was given and what is allowed',
  413: 'The body is too large',
  415: 'The body is of another type',
  422: 'A legal request without an answer',
}

const refusal = (status: number): Schema => ({
  description: MEANINGS[status] ?? 'Refused',
  content: { [PROBLEM]: { schema: refTo('Problem') } },
})
