/** Starting further servers of our own, beside the one that the browser tests use. */
import { type ChildProcess, spawn } from 'node:child_process'
import { once } from 'node:events'
import { setTimeout as wait } from 'node:timers/promises'
import { probePort } from '../scripts/setup/port.mjs'
import { ROOT } from '../scripts/setup/project.mjs'

export interface Running {
  readonly child: ChildProcess
  readonly url: string
  /** Milliseconds from the command to the first answer. */
  readonly startedIn: number
}

/** As a user would: `npm start` with a port. Settles at the first answer. */
export async function npmStart(wanted?: number): Promise<Running> {
  const port = wanted ?? (await probePort(0))
  const url = `http://localhost:${port}`
  const begin = performance.now()
  const child = spawn('npm', ['start'], { cwd: ROOT, env: { ...process.env, PORT: String(port) }, stdio: 'ignore' })
  while (!(await answers(url))) {
    if (child.exitCode !== null) throw new Error(`npm start ended with ${child.exitCode}`)
    await wait(20)
  }
  return { child, url, startedIn: performance.now() - begin }
}

/** The exit code, and the milliseconds until it came. */
export async function stop({ child }: Running, signal: NodeJS.Signals) {
  const begin = performance.now()
  const exit = once(child, 'exit')
  child.kill(signal)
  const [code] = await exit
  return { code, stoppedIn: performance.now() - begin }
}

/** Runs the start script to its end. */
export async function startScript(args: readonly string[], env: Readonly<Record<string, string>> = {}) {
  const child = spawn(process.execPath, ['scripts/start.mjs', ...args], { cwd: ROOT, env: { ...process.env, ...env } })
  let said = ''
  child.stdout.on('data', (chunk) => {
    said += chunk
  })
  child.stderr.on('data', (chunk) => {
    said += chunk
  })
  const [code] = await once(child, 'close')
  return { code, said }
}

async function answers(url: string) {
  const response = await fetch(`${url}/healthz`).catch(() => undefined)
  return response?.ok ?? false
}
