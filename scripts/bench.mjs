/** `npm run bench`: microseconds of the calculations, then the rate of uncached requests. */
import { ensureBuilt } from './setup/build.mjs'
import { ensureInstalled } from './setup/install.mjs'
import { fail } from './setup/project.mjs'

try {
  ensureInstalled()
  ensureBuilt()
  const { benchCalculations } = await import('./bench/calculations.mjs')
  await benchCalculations()
  const { benchRequests } = await import('./bench/requests.mjs')
  await benchRequests()
} catch (error) {
  fail(error)
}
