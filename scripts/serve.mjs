/** Serves a built application until SIGTERM or SIGINT. */
import { once } from 'node:events'
import { createServer } from 'node:http'
import next from 'next'
import { drainer } from './front/drain.mjs'
import { createFront } from './front/server.mjs'
import { ROOT } from './setup/project.mjs'

/** How long answers under way may take to finish once the server was told to stop, in milliseconds. */
const DEADLINE = 10_000

/**
 * The library that draws pixels keeps its memory for the next picture: what is given back and asked for anew costs more
 * than the drawing. It reads this when it is loaded.
 */
process.env.MIMALLOC_PURGE_DELAY ??= '-1'

/**
 * Settles when the server listens; throws where it cannot.
 * @param {number} port 0 takes any free one
 */
export async function serve(port) {
  // Routes find the files that they read, such as fonts, from here.
  process.chdir(ROOT)
  // Next would take over upgrades on the server it is given; there are none, so it is given one that never listens.
  const app = next({ dev: false, dir: ROOT, httpServer: createServer() })
  await app.prepare()
  const server = createFront(app.getRequestHandler())
  const stop = drainer(server, DEADLINE)
  for (const signal of ['SIGTERM', 'SIGINT']) process.on(signal, () => stop().then(() => process.exit(0)))
  await once(server.listen(port), 'listening')
  const address = server.address()
  const shown = address !== null && typeof address === 'object' ? address.port : port
  console.log(`Longhence answers at http://localhost:${shown}`)
}
