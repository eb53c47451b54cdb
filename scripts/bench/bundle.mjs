/** Modules of TypeScript, bundled as for production: a loader that changes them on the fly slows small functions down. */
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { pathToFileURL } from 'node:url'
import { build } from 'rolldown'
import { ROOT } from '../setup/project.mjs'

export const FOLDER = join(ROOT, 'test', 'bench')

/**
 * What a file of `test/bench/` exports.
 * @param {string} file
 */
export function load(file) {
  return inScratch(async (scratch) => {
    const output = join(scratch, 'bundle.mjs')
    await build({ input: join(FOLDER, file), platform: 'node', output: { file: output }, logLevel: 'warn' })
    return await import(pathToFileURL(output).href)
  })
}

/**
 * Runs with a folder that is gone afterwards.
 * @template T
 * @param {(scratch: string) => Promise<T>} run
 */
export async function inScratch(run) {
  const scratch = mkdtempSync(join(tmpdir(), 'longhence-bench-'))
  try {
    return await run(scratch)
  } finally {
    rmSync(scratch, { recursive: true })
  }
}
