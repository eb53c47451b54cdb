/**
 * Times every entry of every `test/bench/*.bench.ts`, which exports `benches`: functions by what they do. The files are
 * bundled first, as for production: a loader that changes TypeScript on the fly slows small functions down.
 */
import { mkdtempSync, readdirSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { pathToFileURL } from 'node:url'
import { build } from 'rolldown'
import { Bench } from 'tinybench'
import { ROOT } from '../setup/project.mjs'

const FOLDER = join(ROOT, 'test', 'bench')

/** Milliseconds for each function, after as long a warm-up. */
const TIME = 1000

export async function benchCalculations() {
  const files = readdirSync(FOLDER).filter((name) => name.endsWith('.bench.ts'))
  for (const file of files.sort()) await benchFile(file)
}

/** @param {string} file */
async function benchFile(file) {
  const bench = new Bench({ time: TIME, warmupTime: TIME })
  for (const [name, run] of Object.entries(await load(file))) bench.add(name, run)
  await bench.run()
  console.log(`\n${file}, microseconds${' '.repeat(Math.max(1, 53 - file.length))}median       p99`)
  for (const { name, result } of bench.tasks) {
    if (!('latency' in result)) throw 'error' in result ? result.error : new Error(`${name} did not run.`)
    console.log(`  ${name.padEnd(60)}${microseconds(result.latency.p50)}${microseconds(result.latency.p99)}`)
  }
}

/**
 * @param {string} file
 * @returns {Promise<Record<string, () => unknown>>}
 */
async function load(file) {
  const folder = mkdtempSync(join(tmpdir(), 'longhence-bench-'))
  try {
    const output = join(folder, 'bench.mjs')
    await build({ input: join(FOLDER, file), platform: 'node', output: { file: output }, logLevel: 'warn' })
    return (await import(pathToFileURL(output).href)).benches
  } finally {
    rmSync(folder, { recursive: true })
  }
}

/** @param {number} milliseconds */
function microseconds(milliseconds) {
  return (milliseconds * 1000).toFixed(1).padStart(10)
}
