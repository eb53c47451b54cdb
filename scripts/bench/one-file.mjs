/** Times every entry of one file of `test/bench/`, which is the argument. */
import { load } from './bundle.mjs'
import { median, shown, timesOf } from './clock.mjs'

const [, , file] = process.argv
/** @type {{benches: import('../../test/bench/bench').Benches}} */
const { benches } = await load(file)
const times = timesOf(Object.values(benches).map(({ run }) => run))
console.log(`\n${file.replace('.bench.ts', '').padEnd(62)}     median    minimum        aim`)
Object.entries(benches).forEach(([name, { aim }], i) => {
  const least = Math.min(...times[i])
  console.log(`  ${name.padEnd(60)}${shown(median(times[i]))}${shown(least)}${aim === undefined ? '' : shown(aim)}`)
})
