/** Answers of the interface: tags and 304, problems, and the headers that all of them carry. */
import { createHash } from 'node:crypto'
import type { Question } from '../../lib/answers/question'
import type { Problem, Reading } from '../../lib/scenario/scenario'
import { PROBLEM_TYPE, problemBody } from '../../scripts/front/problem.mjs'
import { EDITION } from './home'

/** The same address gives the same answer until a new version is served. */
const KEEP = 'public, max-age=3600'

export interface Body {
  readonly content: Uint8Array<ArrayBuffer> | ReadableStream<Uint8Array>
  readonly headers: Readonly<Record<string, string>>
}

/** The query of a request, decoded once. */
export function pairsOf({ url }: Request): URLSearchParams {
  const at = url.indexOf('?')
  return new URLSearchParams(at < 0 ? '' : url.slice(at + 1))
}

/** `body` makes the answer, told its place among all answers. */
export function reply<T>(
  request: Request,
  path: string,
  reading: Reading<Question<T>>,
  body: (question: Question<T>, place: string) => Reading<Body>,
): Response {
  if (!reading.ok) return refused(400, path, reading.problems)
  const place = `${path}?${reading.value.canonical}`
  const tag = `W/"${createHash('sha256').update(`${EDITION} ${place}`).digest('base64url').slice(0, 22)}"`
  const known = request.headers.get('if-none-match')?.trim()
  const headers = { ETag: tag, 'Cache-Control': KEEP }
  if (known !== undefined && names(known, tag)) return new Response(null, { status: 304, headers })
  const made = body(reading.value, place)
  if (!made.ok) return refused(422, path, made.problems)
  if (known === '*') return new Response(null, { status: 304, headers })
  const content = request.method === 'HEAD' ? null : made.value.content
  return new Response(content, { headers: { ...headers, ...made.value.headers } })
}

/** Whether a list of tags holds one, by weak comparison (RFC 9110, section 8.8.3.2). */
const names = (list: string, tag: string): boolean =>
  list.split(',').some((one) => one.trim().replace(/^W\//, '') === tag.slice(2))

/** The first of several problems stands for all. */
export function detailOf(errors: readonly Problem[]): string {
  const [first] = errors
  const where = first.scenario === null ? '' : ` (scenario ${first.scenario + 1})`
  const more = errors.length > 1 ? ` This is the first of ${errors.length} problems in errors.` : ''
  return `${first.parameter}${where}: ${first.message}${more}`
}

export function refused(status: 400 | 422, path: string, errors: readonly Problem[]): Response {
  return problem({ status, detail: detailOf(errors), errors }, path)
}

export function problem(one: Parameters<typeof problemBody>[0], path: string): Response {
  return new Response(problemBody(one, path), {
    status: one.status,
    headers: { ...one.headers, 'Content-Type': PROBLEM_TYPE, 'Cache-Control': 'no-store' },
  })
}
