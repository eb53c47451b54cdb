/** The application as benchmarks need it: on a port of its own, answering, and gone afterwards. */
import { spawn } from 'node:child_process'
import { setTimeout as wait } from 'node:timers/promises'
import { probePort } from '../setup/port.mjs'
import { Refusal, ROOT } from '../setup/project.mjs'

/** @typedef {{readonly url: string, readonly pid: number}} Server */

/**
 * Runs with a server that has been built.
 * @template T
 * @param {(server: Server) => Promise<T>} run
 */
export async function withServer(run) {
  const port = await probePort(0)
  const url = `http://localhost:${port}`
  const server = spawn(process.execPath, ['scripts/start.mjs', '-p', String(port)], { cwd: ROOT, stdio: 'ignore' })
  try {
    await answering(url)
    return await run({ url, pid: server.pid ?? 0 })
  } finally {
    server.kill('SIGTERM')
  }
}

/** @param {string} url */
async function answering(url) {
  for (let i = 0; i < 400; i++) {
    if (await fetch(`${url}/healthz`).catch(() => false)) return
    await wait(50)
  }
  throw new Refusal('The server did not start.')
}
