/** TypeScript declarations of every route and answer, made from the document of the interface. */
import { compile, type JSONSchema } from 'json-schema-to-typescript'
import type { Schema } from '../../lib/interface/shapes'

const BANNER = `/**
 * The interface of Longhence in types, as /api/openapi.json has it: \`Routes['/api/at']['answers']['application/json']\`.
 * Made by \`npm run client-types\`.
 */`

/** What the compiler says about where a type comes from. */
const REFERRED =
  /\/\*\*\n \* This interface was referenced by [^/]*?\*\/\n|\n \*\n \* This interface was referenced by [^/]*?(?=\n \*\/)/g

interface Parameter {
  readonly name: string
  readonly description: string
  readonly required: boolean
  readonly schema: Schema
}

interface Content {
  readonly content: Readonly<Record<string, { readonly schema: Schema }>>
}

interface Operation {
  readonly summary: string
  readonly parameters?: readonly Parameter[]
  readonly requestBody?: Content
  readonly responses: Readonly<Record<string, Content>>
}

export async function clientTypes(document: Schema): Promise<string> {
  const { paths, components } = JSON.parse(
    JSON.stringify(document).replaceAll('#/components/schemas/', '#/definitions/'),
  )
  const routes = Object.entries<Record<string, Operation>>(paths).map(([path, methods]) => [
    path,
    routeOf(Object.values(methods)[0]),
  ])
  const root = { ...closed(Object.fromEntries(routes)), definitions: components.schemas }
  const types = await compile(root as JSONSchema, 'Routes', {
    bannerComment: BANNER,
    unreachableDefinitions: true,
    ignoreMinAndMaxItems: true,
    style: { semi: false, singleQuote: true, printWidth: 120 },
  })
  return types.replace(REFERRED, '')
}

function routeOf({ summary, parameters = [], requestBody, responses }: Operation): Schema {
  const query = parameters.map(({ name, description, schema }) => [
    name,
    { ...schema, description: firstLine(description) },
  ])
  const required = parameters.filter((one) => one.required).map(({ name }) => name)
  return {
    ...closed({
      query: { ...closed(Object.fromEntries(query)), required },
      ...(requestBody ? { body: byType(requestBody) } : {}),
      answers: byType(responses[200]),
    }),
    description: summary,
  }
}

const byType = ({ content }: Content): Schema =>
  closed(Object.fromEntries(Object.entries(content).map(([type, { schema }]) => [type, schema])))

const closed = (properties: Readonly<Record<string, Schema>>): Schema => ({
  type: 'object',
  properties,
  required: Object.keys(properties),
  additionalProperties: false,
})

const firstLine = (text: string): string => text.split('\n')[0]
