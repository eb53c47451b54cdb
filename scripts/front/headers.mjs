/** Headers that every answer carries, whoever makes it. */

/** Figures made to stand in other people's pages. */
const FRAMED_ANYWHERE = /^\/embed(?=[/?]|$)/

/**
 * @param {import('node:http').ServerResponse} response
 * @param {string} target
 */
export function setSecurityHeaders(response, target) {
  // A download is what its Content-Type says, not what a browser guesses from its bytes.
  response.setHeader('X-Content-Type-Options', 'nosniff')
  // The address holds someone's scenarios: sites that we link to learn nothing of it.
  response.setHeader('Referrer-Policy', 'same-origin')
  // Pages opened from elsewhere get no handle on ours.
  response.setHeader('Cross-Origin-Opener-Policy', 'same-origin')
  if (!FRAMED_ANYWHERE.test(target)) response.setHeader('X-Frame-Options', 'SAMEORIGIN')
}
