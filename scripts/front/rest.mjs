/**
 * Pages rest: their scripts arrive with them, and run when a hand comes near or nobody has come for a while (`rouse.js`).
 * What the server drew is there to be read, and its links and forms work, without the second of a slow phone that scripts take.
 */
import { readFileSync } from 'node:fs'

const ROUSE = readFileSync(new URL('./rouse.js', import.meta.url), 'utf8')

/** The scripts in the head. */
const SCRIPT = /<script src="([^"]+)" async="" nonce="([^"]*)"><\/script>/g
/** What the head announces of the one that begins everything; it stands at the end of the body. */
const ANNOUNCED = /<link rel="preload" as="script" [^>]*href="([^"]+)"\/>/g
const BEGINNER = /<script src="[^"]+" nonce="([^"]*)" async="">/g
/** What they are told at the end of the body. As plain text nobody compiles it. */
const TOLD = /<script nonce="([^"]*)">(?=\(?self\.__next_f)/g
/** No such beginning is longer. */
const BEGINNING = 120
const HEAD_END = '</head>'

/**
 * Changes a page on its way out; all else is passed on as it comes.
 * @template {import('node:http').ServerResponse} Response
 * @param {Response} response
 * @returns {Response} the same
 */
export function rest(response) {
  const { write, end } = response
  const page = restingPage()
  const restore = () => Object.assign(response, { write, end })
  response.write = (/** @type {any} */ chunk, /** @type {any[]} */ ...others) => {
    if (isPage(response)) return pass(page.add(bytesOf(chunk, others[0])))
    restore()
    return response.write(chunk, ...others)
  }
  const pass = (/** @type {string} */ text) =>
    text === '' || Reflect.apply(write, response, [Buffer.from(text, 'latin1')])
  response.end = (/** @type {any[]} */ ...last) => {
    restore()
    if (!isPage(response)) return response.end(...last)
    const [chunk, encoding] = last
    const text = typeof chunk === 'string' || chunk instanceof Uint8Array ? page.add(bytesOf(chunk, encoding)) : ''
    pass(text + page.end())
    return response.end(last.find((one) => typeof one === 'function'))
  }
  return response
}

/** @param {import('node:http').ServerResponse} response */
const isPage = (response) =>
  String(response.getHeader('content-type')).startsWith('text/html') && !response.hasHeader('content-length')

/** One character for each byte, since a letter may be spread over two chunks. @param {any} chunk @param {any} encoding */
const bytesOf = (chunk, encoding) =>
  (typeof chunk === 'string' ? Buffer.from(chunk, encoding) : Buffer.from(chunk)).toString('latin1')

/** A page that comes in pieces: each gives back what can go on by now. The head waits until it is complete. */
export function restingPage() {
  let held = ''
  let inHead = true
  const released = (/** @type {number} */ length) => {
    const ready = held.slice(0, length)
    held = held.slice(length)
    return ready
      .replace(TOLD, '<script type="text/plain" data-rest nonce="$1">')
      .replace(BEGINNER, '<script type="text/plain" nonce="$1">')
  }
  const leaveHead = () => {
    if (inHead) held = withRestingHead(held)
    inHead = false
  }
  return {
    /** @param {string} text */
    add(text) {
      held += text
      if (inHead && !held.includes(HEAD_END)) return ''
      leaveHead()
      const tag = held.lastIndexOf('<')
      return released(tag > held.length - BEGINNING ? tag : held.length)
    },
    end() {
      leaveHead()
      return released(held.length)
    },
  }
}

/** What wakes the page fetches them when it has loaded, so that they take no part of the line from what is to be read. @param {string} head */
function withRestingHead(head) {
  const [first] = head.matchAll(SCRIPT)
  if (!first) return head
  const sources = [ANNOUNCED, SCRIPT].flatMap((tag) => [...head.matchAll(tag)].map(([, source]) => source))
  const rouse = `<script nonce="${first[2]}" data-scripts="${sources.join(' ')}">${ROUSE}</script>`
  return head
    .replace(ANNOUNCED, '')
    .replace(SCRIPT, '')
    .replace(HEAD_END, rouse + HEAD_END)
}
