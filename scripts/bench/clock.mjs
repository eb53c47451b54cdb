/**
 * Processor time per run, of all threads: what waits for other processes does not count, what collects garbage does. Whatever is
 * compared is timed in turns of a few milliseconds, so that a machine that grows slower or faster meanwhile does so for all of it.
 */

/** Seconds. */
const [WARM_UP, TURN] = [1, 0.01]
const [LEAST_ROUNDS, MOST_ROUNDS] = [3, 100]
/** Seconds for the turns of one function. */
const BUDGET = 1

/** @typedef {() => unknown} Run */

/** @param {Run} run @param {number} count */
export function secondsOf(run, count) {
  const start = process.cpuUsage()
  for (let i = 0; i < count; i++) run()
  const { user, system } = process.cpuUsage(start)
  return (user + system) / 1e6
}

/**
 * Warms a function up, and returns how many runs make a turn.
 * @param {Run} run
 */
export function warmUp(run, turn = TURN) {
  let [runs, spent, last] = [1, 0, 0]
  while (spent < WARM_UP) {
    last = secondsOf(run, runs)
    spent += last
    if (last < turn) runs *= 2
  }
  return Math.max(1, Math.round((runs * turn) / Math.max(last, turn)))
}

/**
 * Seconds per run of each function, in turns.
 * @param {readonly Run[]} runs
 */
export function timesOf(runs) {
  const counts = runs.map((run) => warmUp(run))
  const times = runs.map(() => /** @type {number[]} */ ([]))
  let spent = 0
  for (let round = 0; round < MOST_ROUNDS && (round < LEAST_ROUNDS || spent < BUDGET * runs.length); round++) {
    runs.forEach((run, i) => {
      const seconds = secondsOf(run, counts[i])
      spent += seconds
      times[i].push(seconds / counts[i])
    })
  }
  return times
}

/** @param {readonly number[]} values */
export function median(values) {
  const sorted = values.toSorted((one, other) => one - other)
  const middle = sorted.length >> 1
  return sorted.length % 2 === 1 ? sorted[middle] : (sorted[middle - 1] + sorted[middle]) / 2
}

/** A time in the unit that suits it. @param {number} seconds */
export function shown(seconds) {
  const [unit, size] = seconds < 1e-3 ? ['µs', 1e-6] : seconds < 1 ? ['ms', 1e-3] : ['s ', 1]
  return `${(seconds / size).toPrecision(3)} ${unit}`.padStart(11)
}
