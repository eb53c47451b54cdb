/** The HTTP server in front of the application: refuses what is malformed, compresses, adds headers, keeps time. */
import { createServer } from 'node:http'
import { compress } from './compress.mjs'
import { setHeaders } from './headers.mjs'
import { sendProblem, writeProblem } from './problem.mjs'
import { rest } from './rest.mjs'
import { LONGEST_STATE, routerStateProblem } from './router-state.mjs'
import { LONGEST_TARGET, methodProblem, optionsHeaders, targetProblem, unencodedProblem } from './target.mjs'

/** @typedef {(request: import('node:http').IncomingMessage, response: import('node:http').ServerResponse) => unknown} Handler */

/** Milliseconds, and bytes. A visitor on a slow line gets through; one who only holds a connection does not. */
const LIMITS = {
  headersTimeout: 15_000,
  requestTimeout: 30_000,
  keepAliveTimeout: 15_000,
  connectionsCheckingInterval: 5_000,
  // Refused below, with a body that says why.
  requireHostHeader: false,
  // The two that may be long, and Node's default for all the others.
  maxHeaderSize: LONGEST_TARGET + LONGEST_STATE + 16 * 1024,
}
/** A connection on which nothing has moved for this long is dropped; no answer takes as long to begin. */
const SILENCE = 120_000

/**
 * @param {Handler} handler answers what is let through
 * @param {Partial<typeof LIMITS>} [limits]
 */
export function createFront(handler, limits = {}) {
  const server = createServer({ ...LIMITS, ...limits }, (request, response) => {
    const target = request.url ?? ''
    setHeaders(request, response)
    const problem =
      methodProblem(request.method, target) ??
      hostProblem(request) ??
      targetProblem(target) ??
      routerStateProblem(request.headers)
    if (problem) sendProblem(response, problem, target.split('?')[0].slice(0, 200))
    else if (request.method === 'OPTIONS') response.writeHead(204, optionsHeaders(target)).end()
    else compress(request, response, () => answer(handler, request, rest(response)))
  })
  server.setTimeout(SILENCE)
  server.on('connect', (_request, socket) => writeProblem(socket, /** @type {any} */ (methodProblem('CONNECT'))))
  server.on('checkExpectation', (_request, response) => {
    sendProblem(response, { status: 417, detail: 'This server meets no expectation but 100-continue.' }, '')
  })
  server.on('clientError', (error, socket) => {
    if (socket.writable && !('code' in error && error.code === 'ECONNRESET')) writeProblem(socket, parserProblem(error))
    else socket.destroy()
  })
  return server
}

/**
 * The application answers its own errors; this is for those that it did not foresee.
 * @type {(handler: Handler, ...exchange: Parameters<Handler>) => Promise<void>}
 */
async function answer(handler, request, response) {
  try {
    await handler(request, response)
  } catch (error) {
    console.error(error)
    if (response.headersSent) response.destroy()
    else sendProblem(response, { status: 500, detail: 'The server failed to answer.' }, request.url ?? '')
  }
}

/**
 * @param {import('node:http').IncomingMessage} request
 * @returns {import('./problem.mjs').Problem | null}
 */
function hostProblem({ httpVersion, headers }) {
  if (httpVersion !== '1.1' || headers.host !== undefined) return null
  return { status: 400, detail: 'A request in HTTP/1.1 must have a Host header.' }
}

/**
 * @param {Error & {code?: string, rawPacket?: Buffer}} error of Node's parser
 * @returns {import('./problem.mjs').Problem}
 */
function parserProblem({ code, rawPacket }) {
  if (code === 'HPE_INVALID_METHOD') return /** @type {any} */ (methodProblem(''))
  if (code === 'HPE_HEADER_OVERFLOW') return { status: 431, detail: 'The address and headers are too long together.' }
  if (code === 'ERR_HTTP_REQUEST_TIMEOUT') return { status: 408, detail: 'The request did not arrive in time.' }
  if (code === 'HPE_INVALID_URL') return unencodedProblem(String(rawPacket).split(' ', 2)[1] ?? '')
  return { status: 400, detail: 'This is not a request in HTTP/1.1.' }
}
