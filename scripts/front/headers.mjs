/** Headers that every answer carries, whoever makes it. */
import { randomBytes } from 'node:crypto'
import { isApi, split } from './target.mjs'

/** Figures made to stand in other people's pages. */
const FRAMED_ANYWHERE = /^\/embed(?=[/?]|$)/

/** What is no page: files that run nothing by themselves, and answers of the interface, which may bring their own policy. */
const NO_PAGE = /^\/(api\/|_next\/|healthz(?=[/?]|$))/

/**
 * @param {import('node:http').IncomingMessage} request
 * @param {import('node:http').ServerResponse} response
 */
export function setHeaders(request, response) {
  const target = request.url ?? ''
  const framedAnywhere = FRAMED_ANYWHERE.test(target)
  // A download is what its Content-Type says, not what a browser guesses from its bytes.
  response.setHeader('X-Content-Type-Options', 'nosniff')
  // The address holds someone's scenarios: sites that we link to learn nothing of it.
  response.setHeader('Referrer-Policy', 'same-origin')
  // Pages opened from elsewhere get no handle on ours.
  response.setHeader('Cross-Origin-Opener-Policy', 'same-origin')
  if (!framedAnywhere) response.setHeader('X-Frame-Options', 'SAMEORIGIN')
  if (isApi(split(target).path)) {
    // Pages of any site may read what the interface answers: it holds nothing but what its address asks for.
    response.setHeader('Access-Control-Allow-Origin', '*')
    response.setHeader('Access-Control-Expose-Headers', 'ETag, Content-Disposition')
  }
  if (!NO_PAGE.test(target)) setContentPolicy(request, response, framedAnywhere ? '*' : "'self'")
}

/**
 * Next finds the nonce in the request's own header and writes it into the scripts of the page, as long as the page is
 * drawn for the request. What a visitor sends under that name is overwritten.
 * @param {import('node:http').IncomingMessage} request
 * @param {import('node:http').ServerResponse} response
 * @param {string} ancestors who may frame the page
 */
function setContentPolicy(request, response, ancestors) {
  const policy = contentPolicy(randomBytes(16).toString('base64'), ancestors)
  request.headers['content-security-policy'] = policy
  response.setHeader('Content-Security-Policy', policy)
}

/**
 * Only our own, and no script or style written into the page by a name that someone put in a link.
 * @param {string} nonce
 * @param {string} ancestors
 */
export function contentPolicy(nonce, ancestors) {
  return [
    "default-src 'none'",
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic'`,
    `style-src 'self' 'nonce-${nonce}'`,
    ...['connect', 'font', 'frame', 'img', 'manifest', 'worker'].map((kind) => `${kind}-src 'self'`),
    "form-action 'self'",
    "base-uri 'none'",
    `frame-ancestors ${ancestors}`,
  ].join('; ')
}
