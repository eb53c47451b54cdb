/**
 * Processor time per run, of all threads: what waits for other processes does not count, what collects garbage does. Whatever is
 * compared is timed in turns of a few milliseconds, so that a machine that grows slower or faster meanwhile does so for all of it.
 * A processor that is shared with others loses up to half of its speed for seconds: turns in which it was not at its best are left out.
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

/** Terms of the sum by which the speed of the processor is judged, half a millisecond of them. */
const TERMS = 30_000
/** Slower than at its best by more than this part, it was disturbed. */
const DISTURBED = 0.1

/** Seconds that one and the same work takes at this moment. */
function pace() {
  const start = performance.now()
  let sum = 0
  for (let i = 0; i < TERMS; i++) sum += Math.exp(-i / TERMS)
  // The sum is used, or nobody would add it up.
  return sum > 0 ? (performance.now() - start) / 1e3 : Number.NaN
}

/** @typedef {{readonly seconds: number, readonly pace: number}} Turn seconds per run, and the slower pace of before and after */

/** @param {Run} run @param {number} count @returns {Turn} */
export function turnOf(run, count) {
  const before = pace()
  const seconds = secondsOf(run, count) / count
  return { seconds, pace: Math.max(before, pace()) }
}

/**
 * Those in which the processor was at its best.
 * @template {{readonly pace: number}} T
 * @param {readonly T[]} turns
 */
export function undisturbed(turns) {
  const best = Math.min(...turns.map((one) => one.pace))
  return turns.filter((one) => one.pace <= (1 + DISTURBED) * best)
}

/**
 * Seconds per run of each function, in turns; the undisturbed ones.
 * @param {readonly Run[]} runs
 */
export function timesOf(runs) {
  const counts = runs.map((run) => warmUp(run))
  const turns = runs.map(() => /** @type {Turn[]} */ ([]))
  let spent = 0
  for (let round = 0; round < MOST_ROUNDS && (round < LEAST_ROUNDS || spent < BUDGET * runs.length); round++) {
    runs.forEach((run, i) => {
      const turn = turnOf(run, counts[i])
      spent += turn.seconds * counts[i]
      turns[i].push(turn)
    })
  }
  return turns.map((all) => undisturbed(all).map(({ seconds }) => seconds))
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
