/** Problem details for HTTP, RFC 9457. */
import { STATUS_CODES } from 'node:http'

export const PROBLEM_TYPE = 'application/problem+json'

/**
 * @typedef {object} RefusedParameter
 * @property {string} parameter the bare key
 * @property {number | null} scenario index of the scenario it belongs to, null where it belongs to none
 * @property {string | null} value as it was sent
 * @property {string} allowed
 * @property {string} message
 *
 * @typedef {object} Problem
 * @property {number} status
 * @property {string} detail one or two sentences for a person
 * @property {readonly RefusedParameter[]} [errors]
 * @property {Readonly<Record<string, string>>} [headers] sent along, e.g. Allow
 */

/**
 * `about:blank` says that the title is that of the status and means nothing more (section 4.2.1).
 * @param {Problem} problem
 * @param {string} instance path of the request
 */
export function problemDocument({ status, detail, errors = [] }, instance) {
  const title = STATUS_CODES[status] ?? 'Error'
  return { type: 'about:blank', title, status, detail, instance, errors }
}

/**
 * The body.
 * @param {Problem} problem
 * @param {string} instance
 */
export const problemBody = (problem, instance) => JSON.stringify(problemDocument(problem, instance))

/**
 * @param {import('node:http').ServerResponse} response
 * @param {Problem} problem
 * @param {string} instance
 */
export function sendProblem(response, problem, instance) {
  const body = problemBody(problem, instance)
  response.writeHead(problem.status, {
    ...problem.headers,
    'Content-Type': PROBLEM_TYPE,
    'Content-Length': Buffer.byteLength(body),
    'Cache-Control': 'no-store',
  })
  response.end(body)
}

/**
 * The same where there is no request yet to respond to, only a socket; it is closed afterwards.
 * @param {import('node:stream').Duplex} socket
 * @param {Problem} problem
 */
export function writeProblem(socket, problem) {
  const body = problemBody(problem, '')
  const head = {
    ...problem.headers,
    'Content-Type': PROBLEM_TYPE,
    'Content-Length': Buffer.byteLength(body),
    Connection: 'close',
  }
  const lines = Object.entries(head).map(([name, value]) => `${name}: ${value}\r\n`)
  socket.end(`HTTP/1.1 ${problem.status} ${STATUS_CODES[problem.status]}\r\n${lines.join('')}\r\n${body}`)
}
