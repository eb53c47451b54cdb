/**
 * Times every entry of every `test/bench/*.bench.ts`. Each file has a process of its own: what one warms up, another does not find, and
 * what one keeps, another's garbage collector need not look at.
 */
import { spawnSync } from 'node:child_process'
import { readdirSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { Refusal } from '../setup/project.mjs'
import { FOLDER } from './bundle.mjs'

const ONE = fileURLToPath(new URL('./one-file.mjs', import.meta.url))

export function benchCalculations() {
  const files = readdirSync(FOLDER).filter((name) => name.endsWith('.bench.ts'))
  for (const file of files.sort()) {
    const { status } = spawnSync(process.execPath, [ONE, file], { stdio: 'inherit' })
    if (status !== 0) throw new Refusal(`test/bench/${file} failed.`)
  }
}
