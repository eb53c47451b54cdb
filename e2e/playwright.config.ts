import { defineConfig } from '@playwright/test'
import { CHROMIUM, find } from '../scripts/setup/browsers.mjs'
import { ROOT } from '../scripts/setup/project.mjs'

const port = process.env.PORT || '3000'
const baseURL = `http://localhost:${port}`

export default defineConfig({
  testDir: '.',
  outputDir: '../test-results',
  // One at a time: some tests measure time, and small machines have two cores.
  workers: 1,
  // A machine that is busy with something else is no failure. What passes only at the second try is named at the end of `npm test`.
  timeout: 60_000,
  expect: { timeout: 15_000 },
  retries: 1,
  forbidOnly: Boolean(process.env.CI),
  reporter: process.env.PLAYWRIGHT_JSON_OUTPUT_FILE ? [['list'], ['json']] : [['list']],
  use: {
    baseURL,
    // What is kept for use without a network would answer in place of what a test says; offline.spec.ts is about it.
    serviceWorkers: 'block',
    trace: 'retain-on-failure',
    launchOptions: {
      executablePath: find(CHROMIUM, process.env),
      args: [
        '--no-sandbox',
        '--disable-gpu',
        '--disable-quic',
        '--no-first-run',
        '--disable-background-networking',
        '--disable-component-update',
        '--disable-sync',
      ],
    },
  },
  projects: [{ name: 'desktop', use: { browserName: 'chromium', viewport: { width: 1280, height: 800 } } }],
  webServer: {
    command: 'exec node scripts/start.mjs',
    cwd: ROOT,
    env: { PORT: port },
    url: `${baseURL}/healthz`,
    timeout: 300_000,
    reuseExistingServer: !process.env.CI,
    gracefulShutdown: { signal: 'SIGTERM', timeout: 15_000 },
  },
})
