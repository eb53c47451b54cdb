/**
 * The hunt for missed turning points and for the costliest scenarios: `npm run hunt`, or `npm run hunt -- 100000` for another count.
 * Ends with 1 where something was missed.
 */
import { load } from './bench/bundle.mjs'
import { ensureInstalled } from './setup/install.mjs'
import { fail, Refusal } from './setup/project.mjs'

const DEFAULT = 1_000_000
/** Scenarios of one report. */
const PORTION = 20_000
/** One place to graze, with its thirteen offsets, for so many random scenarios. */
const PER_GRAZE = 100
/** Scenarios that are solved whole, for their cost. */
const PER_SOLUTION = 50

try {
  const [text = String(DEFAULT), first = '1'] = process.argv.slice(2)
  const [count, seed] = [Number(text), Number(first)]
  if (!(Number.isSafeInteger(count) && count > 0 && Number.isSafeInteger(seed)))
    throw new Refusal('npm run hunt -- COUNT SEED, both whole numbers')
  ensureInstalled()
  process.exitCode = (await run(count, seed)) > 0 ? 1 : 0
} catch (error) {
  fail(error)
}

/** @param {number} count @param {number} seed */
async function run(count, seed) {
  /** @type {typeof import('../test/hunt/hunt')} */
  const { hunt } = await load('../hunt/hunt.ts')
  /** @type {typeof import('../test/hunt/costs')} */
  const { costliest } = await load('../hunt/costs.ts')
  /** @type {Record<string, number>} */
  const counts = {}
  let [scenarios, unproven, misses] = [0, 0, 0]
  for (let done = 0; done < count; done += PORTION) {
    const portion = Math.min(PORTION, count - done)
    const tally = hunt(portion, Math.ceil(portion / PER_GRAZE), seed + done)
    scenarios += tally.scenarios
    unproven += tally.unproven
    misses += tally.misses.length
    for (const [name, number] of Object.entries(tally.counts)) counts[name] = (counts[name] ?? 0) + number
    for (const miss of tally.misses) console.log(`MISSED, seed ${miss.seed}: ${miss.code}\n  ${miss.because}`)
    console.log(`${scenarios} scenarios, ${misses} missed, ${unproven} unproven`)
  }
  for (const [name, number] of Object.entries(counts).sort()) console.log(`  ${name.padEnd(60)}${number}`)
  console.log(`share unproven: ${((100 * unproven) / scenarios).toPrecision(3)}%`)
  console.log('costliest whole solutions, in milliseconds of processor time:')
  for (const { code, milliseconds, outcome } of costliest(Math.max(100, Math.ceil(count / PER_SOLUTION)), seed))
    console.log(`  ${milliseconds.toFixed(1).padStart(7)}  ${outcome}  ${code}`)
  return misses
}
