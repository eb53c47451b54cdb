/**
 * `npm run bench`: times of the calculations, the same rows by other methods, then the rate of uncached requests.
 * `npm run bench -- calculations` runs one of the parts alone.
 */
import { ensureBuilt } from './setup/build.mjs'
import { ensureInstalled } from './setup/install.mjs'
import { fail, Refusal } from './setup/project.mjs'

const PARTS = {
  calculations: async () => (await import('./bench/calculations.mjs')).benchCalculations(),
  beside: async () => (await import('./bench/beside.mjs')).benchBeside(),
  requests: async () => {
    ensureBuilt()
    await (await import('./bench/requests.mjs')).benchRequests()
  },
}

try {
  const asked = process.argv.slice(2)
  const unknown = asked.find((name) => !Object.hasOwn(PARTS, name))
  if (unknown !== undefined)
    throw new Refusal(`No part is called ${unknown}; there are ${Object.keys(PARTS).join(', ')}.`)
  ensureInstalled()
  for (const [name, run] of Object.entries(PARTS)) {
    if (asked.length === 0 || asked.includes(name)) await run()
  }
} catch (error) {
  fail(error)
}
