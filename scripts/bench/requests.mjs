/**
 * The rate of `/api/history`, a scenario never asked before in each request, as a ratio to `/healthz`, which computes
 * nothing. Both are measured in turns, so that a slower or busier machine changes the ratio little.
 */
import { spawn } from 'node:child_process'
import { setTimeout as wait } from 'node:timers/promises'
import autocannon from 'autocannon'
import { probePort } from '../setup/port.mjs'
import { Refusal, ROOT } from '../setup/project.mjs'

const CONNECTIONS = 16
const SECONDS = 4
const ROUNDS = 3

let asked = 0
/** Matter from 0.3 up, in steps that leave every request its own. */
const unseen = () => `/api/history?s=matter:${(0.3 + ++asked * 1e-8).toFixed(8)}`
const health = () => '/healthz'

export async function benchRequests() {
  const port = await probePort(0)
  const url = `http://localhost:${port}`
  const server = spawn(process.execPath, ['scripts/start.mjs', '-p', String(port)], { cwd: ROOT, stdio: 'ignore' })
  try {
    await answering(url)
    console.log(`\nrequests per second, ${CONNECTIONS} connections`)
    const { status } = await fetch(`${url}${unseen()}`)
    if (status === 200) await compare(url)
    else console.log(`  /api/history answers ${status}, so there is no rate to measure.`)
  } finally {
    server.kill('SIGTERM')
  }
}

/** @param {string} url */
async function compare(url) {
  await rate(url, health, 1)
  await rate(url, unseen, 2)
  /** @type {{health: number, history: number}[]} */
  const rounds = []
  for (let i = 0; i < ROUNDS; i++) {
    rounds.push({ health: await rate(url, health), history: await rate(url, unseen) })
  }
  const of = (/** @type {'health' | 'history'} */ key) => median(rounds.map((round) => round[key]))
  console.log(`  /healthz                ${of('health').toFixed(0).padStart(6)}`)
  console.log(`  /api/history, uncached  ${of('history').toFixed(0).padStart(6)}`)
  console.log(
    `  ratio                   ${median(rounds.map((r) => r.history / r.health))
      .toFixed(2)
      .padStart(6)}`,
  )
}

/**
 * Answers per second. Anything but 200 makes the number worthless, so it throws.
 * @param {string} url
 * @param {() => string} path of each request
 */
async function rate(url, path, seconds = SECONDS) {
  const result = await autocannon({
    url,
    connections: CONNECTIONS,
    duration: seconds,
    requests: [{ method: 'GET', setupRequest: (request) => ({ ...request, path: path() }) }],
  })
  if (result.non2xx + result.errors > 0) {
    throw new Refusal(`${result.non2xx} answers were errors and ${result.errors} never came.`)
  }
  return result['2xx'] / result.duration
}

/** @param {readonly number[]} values an odd number of them */
function median(values) {
  return [...values].sort((one, other) => one - other)[(values.length - 1) / 2]
}

/** @param {string} url */
async function answering(url) {
  for (let i = 0; i < 200; i++) {
    if (await fetch(`${url}/healthz`).catch(() => false)) return
    await wait(50)
  }
  throw new Refusal('The server did not start.')
}
