/** Times every entry of every `test/bench/*.bench.ts`. Each file is a bundle of its own: what one warms up, another does not find. */
import { readdirSync } from 'node:fs'
import { FOLDER, load } from './bundle.mjs'
import { median, shown, timesOf } from './clock.mjs'

export async function benchCalculations() {
  const files = readdirSync(FOLDER).filter((name) => name.endsWith('.bench.ts'))
  for (const file of files.sort()) await benchFile(file)
}

/** @param {string} file */
async function benchFile(file) {
  /** @type {{benches: import('../../test/bench/bench').Benches}} */
  const { benches } = await load(file)
  const times = timesOf(Object.values(benches).map(({ run }) => run))
  console.log(`\n${file.replace('.bench.ts', '').padEnd(62)}     median    minimum        aim`)
  Object.entries(benches).forEach(([name, { aim }], i) => {
    const least = Math.min(...times[i])
    console.log(`  ${name.padEnd(60)}${shown(median(times[i]))}${shown(least)}${aim === undefined ? '' : shown(aim)}`)
  })
}
