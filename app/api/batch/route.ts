import { answerLine, LARGEST_BATCH, type Line, linesOf, MOST_LINES } from '../../../lib/answers/batch'
import { problemDocument } from '../../../scripts/front/problem.mjs'
import { detailOf, problem } from '../reply'
import { streamOf } from '../stream'
import { readText } from './read-text'

export const dynamic = 'force-dynamic'

const PATH = '/api/batch'
const TYPE = 'application/x-ndjson'
const TYPES = [TYPE, 'application/ndjson', 'application/jsonl', 'application/x-jsonlines']

/** A history for each line, written while they are read: newline-delimited JSON in and out. */
export async function POST(request: Request): Promise<Response> {
  if (!TYPES.includes(typeOf(request)) || request.headers.has('content-encoding')) {
    const detail = `The body has to be newline-delimited JSON (${TYPE}), without a content encoding.`
    return problem({ status: 415, detail, headers: { 'Accept-Post': TYPES.join(', ') } }, PATH)
  }
  const text = await readText(request, LARGEST_BATCH)
  if (text === 'too large') return problem({ status: 413, detail: `The body may have ${LARGEST_BATCH} bytes.` }, PATH)
  if (text === 'no text') return problem({ status: 400, detail: 'The body is not UTF-8.' }, PATH)
  const lines = linesOf(text.text)
  if (lines.length === 0) return problem({ status: 400, detail: 'The body has no line with a scenario.' }, PATH)
  if (lines.length > MOST_LINES) {
    return problem({ status: 413, detail: `The body has ${lines.length} scenarios; ${MOST_LINES} are the most.` }, PATH)
  }
  const headers = { 'Content-Type': TYPE, 'Cache-Control': 'no-store' }
  return new Response(streamOf(answers(lines)), { headers })
}

const typeOf = ({ headers }: Request): string => (headers.get('content-type') ?? '').split(';')[0].trim().toLowerCase()

function* answers(lines: readonly Line[]): Generator<string> {
  for (const line of lines) yield `${JSON.stringify(resultOf(line))}\n`
}

function resultOf(line: Line): object {
  const { index } = line
  const answer = answerLine(line)
  if (answer.ok) return { index, ...answer.value }
  const errors = answer.problems
  return {
    index,
    problem: problemDocument({ status: answer.legal ? 422 : 400, detail: detailOf(errors), errors }, PATH),
  }
}
