/** Which port to serve on, and whether it is to be had. */
import { once } from 'node:events'
import { createServer } from 'node:net'
import { parseArgs } from 'node:util'
import { Refusal } from './project.mjs'

/**
 * `-p` or `--port`, else PORT, else 3000. 0 takes any free port.
 * @param {string[]} args
 * @param {import('./project.mjs').Environment} env
 */
export function choosePort(args, env) {
  const text = portArgument(args) ?? (env.PORT || '3000')
  if (!/^\d{1,5}$/.test(text) || Number(text) > 65535) {
    throw new Refusal(`A port is a number from 0 to 65535, not "${text}".`)
  }
  return Number(text)
}

/** @param {string[]} args */
function portArgument(args) {
  try {
    return parseArgs({ args, options: { port: { type: 'string', short: 'p' } } }).values.port
  } catch (error) {
    throw new Refusal(`${error instanceof Error ? error.message.split('. ')[0] : error}. The only option is -p PORT.`)
  }
}

/**
 * Listens for a moment, and returns the port it had. Throws what listening throws.
 * @param {number} port
 * @returns {Promise<number>}
 */
export async function probePort(port) {
  const server = createServer().listen(port)
  await once(server, 'listening')
  const address = server.address()
  server.close()
  await once(server, 'close')
  return address !== null && typeof address === 'object' ? address.port : port
}

/**
 * What an error of listening means, in one line; other errors come back as they are.
 * @param {unknown} error
 * @param {number} port
 */
export function explainListenError(error, port) {
  const code = error instanceof Error && 'code' in error ? error.code : undefined
  if (code === 'EADDRINUSE') return new Refusal(`Port ${port} is in use. Choose another one with PORT or -p.`)
  if (code === 'EACCES') return new Refusal(`Port ${port} needs more rights. Choose another one with PORT or -p.`)
  return error
}
