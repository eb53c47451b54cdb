import { readFileSync } from 'node:fs'
import { expect, it } from 'vitest'
import { neutrinoTable } from '../../scripts/neutrino-table.mjs'

it('is what its script writes', () => {
  const table = readFileSync(new URL('../../lib/neutrinos/table.ts', import.meta.url), 'utf8')
  expect(neutrinoTable()).toBe(table)
})
