/**
 * `npm start`: installs and builds what is missing or stale, then serves in this same process.
 * Everything but the version check is imported late, since an old Node could not even read it.
 */
import { nodeProblem } from './setup/node-version.mjs'

const problem = nodeProblem(process.version)
if (problem) {
  console.error(problem)
  process.exit(1)
}

const { fail } = await import('./setup/project.mjs')
const { choosePort, explainListenError, probePort } = await import('./setup/port.mjs')
const { ensureInstalled } = await import('./setup/install.mjs')
const { ensureBuilt } = await import('./setup/build.mjs')

Object.assign(process.env, { NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1' })

try {
  const port = choosePort(process.argv.slice(2), process.env)
  // Asked before the build, so that nobody waits a minute to hear it.
  if (port !== 0) await probePort(port).catch((error) => fail(explainListenError(error, port)))
  ensureInstalled()
  ensureBuilt()
  const { serve } = await import('./serve.mjs')
  await serve(port).catch((error) => fail(explainListenError(error, port)))
} catch (error) {
  fail(error)
}
