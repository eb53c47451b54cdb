/**
 * Pages rest: their scripts arrive with them, and run when a hand comes near or nobody has come for a while (`rouse.js`).
 * What the server drew is there to be read, and its links and forms work, without the second of a slow phone that scripts take.
 */
import { readFileSync } from 'node:fs'

const ROUSE = readFileSync(new URL('./rouse.js', import.meta.url), 'utf8')

/** The scripts in the head. */
const SCRIPT = /<script src="([^"]+)" async="" nonce="([^"]*)"><\/script>/g
const HEAD_END = '</head>'

/**
 * Holds back the head of a page until it is complete, and changes its scripts; all else is passed on as it comes.
 * @template {import('node:http').ServerResponse} Response
 * @param {Response} response
 * @returns {Response} the same
 */
export function rest(response) {
  const { write, end } = response
  let head = ''
  const restore = () => Object.assign(response, { write, end })
  response.write = (/** @type {any} */ chunk, /** @type {any[]} */ ...others) => {
    if (isPage(response)) {
      head += bytesOf(chunk, others[0])
      if (!head.includes(HEAD_END)) return true
    }
    restore()
    return response.write(head === '' ? chunk : resting(head), ...others)
  }
  response.end = (/** @type {any[]} */ ...last) => {
    restore()
    if (head !== '') response.write(resting(head))
    return response.end(...last)
  }
  return response
}

/** @param {import('node:http').ServerResponse} response */
const isPage = (response) =>
  String(response.getHeader('content-type')).startsWith('text/html') && !response.hasHeader('content-length')

/** One character for each byte, since a letter may be spread over two chunks. @param {any} chunk @param {any} encoding */
const bytesOf = (chunk, encoding) =>
  (typeof chunk === 'string' ? Buffer.from(chunk, encoding) : Buffer.from(chunk)).toString('latin1')

/** The scripts are fetched all the same, with what is left of the line. @param {string} head */
function resting(head) {
  const [first, ...others] = [...head.matchAll(SCRIPT)]
  if (!first) return Buffer.from(head, 'latin1')
  const sources = [first, ...others].map(([, source]) => source)
  const rouse = `<script nonce="${first[2]}" data-scripts="${sources.join(' ')}">${ROUSE}</script>`
  const links = sources.map(
    (source) => `<link rel="preload" as="script" fetchpriority="low" nonce="${first[2]}" href="${source}"/>`,
  )
  return Buffer.from(head.replace(SCRIPT, '').replace(HEAD_END, [...links, rouse, HEAD_END].join('')), 'latin1')
}
