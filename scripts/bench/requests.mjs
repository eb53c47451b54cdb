/**
 * The rate of `/api/history`, a scenario never asked before in each request, as a ratio to `/healthz`, which computes
 * nothing. Both are measured in turns, so that a slower or busier machine changes the ratio little. Where the system tells it,
 * the server's processor time per request stands beside: other processes do not count in it.
 */
import { readFileSync } from 'node:fs'
import autocannon from 'autocannon'
import { Refusal } from '../setup/project.mjs'
import { median } from './clock.mjs'
import { withServer } from './server.mjs'

const CONNECTIONS = 16
const SECONDS = 2
const ROUNDS = 7
/** Requests of each kind before the clock runs. */
const WARM_UP = 1500
const AIM = 0.45

let asked = 0
/** Matter from 0.3 up, in steps that leave every request its own. */
const unseen = () => `/api/history?s=matter:${(0.3 + ++asked * 1e-8).toFixed(8)}`
const health = () => '/healthz'

/** @typedef {{readonly rate: number, readonly processor: number}} Turn rate in requests per second, processor in seconds per request */
/** @typedef {import('./server.mjs').Server} Server */

export const benchRequests = () => withServer(compare)

/** @param {Server} server */
async function compare(server) {
  for (const path of [health, unseen]) await turn(server, path, { amount: WARM_UP })
  /** @type {{health: Turn, history: Turn}[]} */
  const rounds = []
  for (let i = 0; i < ROUNDS; i++) {
    rounds.push({
      health: await turn(server, health, { duration: SECONDS }),
      history: await turn(server, unseen, { duration: SECONDS }),
    })
  }
  const middle = (/** @type {(round: typeof rounds[number]) => number} */ of) => median(rounds.map(of))
  const title = `requests, ${CONNECTIONS} connections`
  console.log(`\n${title.padEnd(36)}per second   server's processor, µs`)
  line(
    '/healthz',
    middle(({ health }) => health.rate),
    middle(({ health }) => health.processor * 1e6),
    0,
  )
  line(
    '/api/history, uncached',
    middle(({ history }) => history.rate),
    middle(({ history }) => history.processor * 1e6),
    0,
  )
  const [rate, processor] = [
    middle(({ health, history }) => history.rate / health.rate),
    middle(({ health, history }) => health.processor / history.processor),
  ]
  line(`ratio (aim ${AIM})`, rate, processor, 2)
}

/** @param {string} name @param {number} rate @param {number} processor @param {number} decimals */
function line(name, rate, processor, decimals) {
  const shown = [rate, processor].map((value) => (Number.isFinite(value) ? value.toFixed(decimals) : 'unknown'))
  console.log(`  ${name.padEnd(34)}${shown[0].padStart(10)}${shown[1].padStart(25)}`)
}

/**
 * Anything but 200 makes the number worthless, so it throws.
 * @param {Server} server
 * @param {() => string} path of each request
 * @param {{amount: number} | {duration: number}} length
 * @returns {Promise<Turn>}
 */
async function turn({ url, pid }, path, length) {
  const before = processorSeconds(pid)
  const result = await autocannon({
    url,
    connections: CONNECTIONS,
    ...length,
    requests: [{ method: 'GET', setupRequest: (request) => ({ ...request, path: path() }) }],
  })
  if (result.non2xx + result.errors > 0) {
    throw new Refusal(`${result.non2xx} answers were errors and ${result.errors} never came.`)
  }
  const answers = result['2xx']
  return { rate: answers / result.duration, processor: (processorSeconds(pid) - before) / answers }
}

/** Linux counts in hundredths of a second (proc(5), utime and stime); NaN on other systems. @param {number} pid */
function processorSeconds(pid) {
  try {
    const fields = readFileSync(`/proc/${pid}/stat`, 'utf8').split(') ')[1].split(' ')
    return (Number(fields[11]) + Number(fields[12])) / 100
  } catch {
    return Number.NaN
  }
}
