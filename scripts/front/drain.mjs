/** Stopping without cutting anyone off: answers under way are finished, up to a deadline. */

/**
 * Returns a function that stops the server and settles when the last connection is gone. Called again, it stops waiting.
 * @param {import('node:http').Server} server
 * @param {number} deadline milliseconds
 * @returns {() => Promise<void>}
 */
export function drainer(server, deadline) {
  let draining = false
  const busy = countAnswers(server, (socket) => draining && socket.destroy())
  return () => {
    if (draining) server.closeAllConnections()
    draining = true
    const timer = setTimeout(() => server.closeAllConnections(), deadline)
    // Node itself would wait for connections that browsers open in advance and do not use.
    for (const [socket, answers] of busy) if (answers === 0) socket.destroy()
    return new Promise((resolve) => {
      server.close(() => {
        clearTimeout(timer)
        resolve()
      })
    })
  }
}

/**
 * How many answers are under way on each connection.
 * @param {import('node:http').Server} server
 * @param {(socket: import('node:net').Socket) => void} idle called when the last one has ended
 */
function countAnswers(server, idle) {
  /** @type {Map<import('node:net').Socket, number>} */
  const busy = new Map()
  /** @param {import('node:net').Socket} socket @param {number} change */
  const add = (socket, change) => {
    const answers = (busy.get(socket) ?? 0) + change
    if (!socket.destroyed) busy.set(socket, answers)
    if (answers === 0) idle(socket)
  }
  server.on('connection', (socket) => {
    busy.set(socket, 0)
    socket.once('close', () => busy.delete(socket))
  })
  server.prependListener('request', ({ socket }, response) => {
    add(socket, 1)
    response.once('close', () => add(socket, -1))
  })
  return busy
}
