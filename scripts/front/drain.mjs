/** Stopping without cutting anyone off: answers under way are finished, up to a deadline. */

/**
 * Returns a function that stops the server and settles when the last connection is gone. Called again, it stops waiting.
 * @param {import('node:http').Server} server
 * @param {number} deadline milliseconds
 * @returns {() => Promise<void>}
 */
export function drainer(server, deadline) {
  let draining = false
  server.prependListener('request', (_request, response) => {
    if (draining) response.shouldKeepAlive = false
    // Kept-alive connections would otherwise hold the server until they time out.
    response.once('close', () => draining && server.closeIdleConnections())
  })
  return () => {
    if (draining) server.closeAllConnections()
    draining = true
    const timer = setTimeout(() => server.closeAllConnections(), deadline)
    return new Promise((resolve) => {
      server.close(() => {
        clearTimeout(timer)
        resolve()
      })
    })
  }
}
