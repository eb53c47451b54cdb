/** What the document of the interface says about a route. */
import type { Schema } from './shapes'

export interface RouteParameter {
  readonly name: string
  readonly description: string
  readonly schema: Schema
  readonly required?: boolean
  readonly example?: string
}

export interface Example {
  /** One line: what it shows. */
  readonly title: string
  /** Behind the question mark; absent where there is none. */
  readonly query?: string
  /** Of a POST. */
  readonly body?: string
}

export interface Route {
  readonly path: string
  readonly method: 'get' | 'post'
  readonly summary: string
  readonly parameters: readonly RouteParameter[]
  /** Media types of the body, with the schema of each line or document. */
  readonly body?: Readonly<Record<string, Schema>>
  /** Media types of the answer, each with its schema. */
  readonly answer: Readonly<Record<string, Schema>>
  /** Statuses of problems beside 400. */
  readonly refusals: readonly number[]
  readonly examples: readonly Example[]
}

export const BYTES: Schema = { type: 'string' }
