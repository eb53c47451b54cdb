/** What a request may ask for: refusals of methods and targets that no page or route should have to think about. */

/** Nothing is changed by a request, so these are all; what is too long for an address is posted. */
const ALLOW = 'GET, HEAD, OPTIONS'
const POSTED = '/api/batch'
const ALLOW_POSTED = 'POST, OPTIONS'

/**
 * Room for six scenarios and a thousand full doubles, all percent-encoded (about 40 kB), and some more.
 */
export const LONGEST_TARGET = 48 * 1024

/** @typedef {import('./problem.mjs').Problem} Problem */

/** @param {string} target */
const allowedAt = (target) => (split(target).path === POSTED ? ALLOW_POSTED : ALLOW)

/**
 * @param {string | undefined} method
 * @param {string} [target]
 * @returns {Problem | null}
 */
export function methodProblem(method = '', target = '/') {
  const allow = allowedAt(target)
  if (allow.split(', ').includes(method)) return null
  return {
    status: 405,
    detail: `This server answers ${allow}${allow === ALLOW ? '' : ` at ${POSTED}`}, not ${method || 'this method'}.`,
    headers: { Allow: allow },
  }
}

/**
 * @param {string} target as in the request line
 * @returns {Problem | null}
 */
export function targetProblem(target) {
  if (target.length > LONGEST_TARGET) {
    return { status: 414, detail: `The address has ${target.length} characters; ${LONGEST_TARGET} are the most.` }
  }
  // Also keeps a path from being taken for a host: `http://other/`, `//other/`, `/\other/`.
  if (!target.startsWith('/') || target.startsWith('//') || target.includes('\\')) {
    return bad('The request must name a path that starts with one slash, and no host.')
  }
  const { path, query } = split(target)
  const decoded = decode(path)
  if (decoded === null) return bad('The path holds a percent sign that encodes no character.')
  if (hasControl(decoded)) return bad('The path holds a control character.')
  return isApi(path) ? queryProblem(query) : null
}

/**
 * What Node's parser refuses: characters of a target that are no part of an address.
 * @param {string} target as far as it was read
 * @returns {Problem}
 */
export function unencodedProblem(target) {
  const pairs = pairsOf(split(target).query)
  const at = pairs.findIndex((pair) => pair.some((part) => /[^!-~]/.test(part)))
  const message = 'The address holds characters that have to be percent-encoded.'
  return at < 0 ? bad(message) : refusedPair(pairs, at, message)
}

/**
 * The answer to OPTIONS.
 * @param {string} target
 */
export function optionsHeaders(target) {
  const allow = allowedAt(target)
  const plain = { Allow: allow, 'Content-Length': '0' }
  if (!isApi(split(target).path)) return plain
  return {
    ...plain,
    'Access-Control-Allow-Methods': allow,
    'Access-Control-Allow-Headers': 'Content-Type, If-None-Match',
    'Access-Control-Max-Age': '86400',
  }
}

/**
 * Pages read a damaged query as well as they can and say so; the interface refuses it.
 * @param {string} query
 * @returns {Problem | null}
 */
function queryProblem(query) {
  const pairs = pairsOf(query)
  const at = pairs.findIndex((pair) => pair.some((part) => decode(part) === null))
  if (at < 0) return hiddenKeyProblem(pairs)
  const [key] = pairs[at]
  const message = `The value of ${key} holds a percent sign that encodes no character; a percent sign itself is %25.`
  return refusedPair(pairs, at, message)
}

/** @param {string} query */
const pairsOf = (query) => query.split('&').map((pair) => pair.split(/=(.*)/s))

/**
 * @param {string[][]} pairs
 * @param {number} at
 * @param {string} message
 * @returns {Problem}
 */
function refusedPair(pairs, at, message) {
  const [key, value = ''] = pairs[at]
  const scenario = key === 's' ? pairs.slice(0, at).filter(([earlier]) => earlier === 's').length : null
  return { ...bad(message), errors: [{ parameter: key, scenario, value, allowed: 'percent-encoded UTF-8', message }] }
}

/**
 * Next takes these keys out of the query before a route sees them, so a route could not refuse them as unknown.
 * @param {string[][]} pairs
 * @returns {Problem | null}
 */
function hiddenKeyProblem(pairs) {
  const hidden = pairs.map(([key]) => decode(key) ?? key).find((key) => key === '__proto__' || /^nxt[IP]/.test(key))
  if (hidden === undefined) return null
  const message = `The interface has no parameter ${hidden}.`
  return { ...bad(message), errors: [{ parameter: hidden, scenario: null, value: '', allowed: 'none', message }] }
}

/** @param {string} target */
export function split(target) {
  const at = target.indexOf('?')
  return at < 0 ? { path: target, query: '' } : { path: target.slice(0, at), query: target.slice(at + 1) }
}

/** @param {string} text */
function decode(text) {
  try {
    return decodeURIComponent(text)
  } catch {
    return null
  }
}

/** @param {string} text */
function hasControl(text) {
  for (const character of text) if (character < ' ' || character === '\x7f') return true
  return false
}

/** @param {string} path */
export function isApi(path) {
  return path === '/api' || path.startsWith('/api/')
}

/** @param {string} detail @returns {Problem} */
function bad(detail) {
  return { status: 400, detail }
}
