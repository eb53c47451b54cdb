/**
 * `npm run coverage`: every branch of the engine is taken by a test or carries a `v8 ignore` comment that says why none takes it.
 * Ends with 1 where one is left; `coverage/coverage-final.json` lists them all.
 */
import { defineConfig } from 'vitest/config'
import plain from './vitest.config'

const TESTS = 'golden,numerics,neutrinos,dark-energy,history,measures,world,quantities,answers,neighbours,hunt'

export default defineConfig({
  test: {
    ...plain.test,
    include: [`test/{${TESTS}}/**/*.test.ts`],
    // The measured code is slower, and so are several workers that share two cores.
    testTimeout: 600_000,
    coverage: {
      enabled: true,
      provider: 'v8',
      include: ['lib/{numerics,dark-energy,history,measures}/**/*.ts'],
      reporter: [['text', { skipFull: true }], 'json'],
      reportsDirectory: 'coverage',
      reportOnFailure: true,
      thresholds: { branches: 100 },
    },
  },
})
