/** The declarations for programs that ask us are what the document gives today; `npm run client-types` writes them anew. */
import { expect, test } from 'vitest'
import { openApi } from '../../lib/interface/openapi'
import { clientTypes } from './client-types'

test('public/longhence.d.ts is made from the document', async () => {
  const types = await clientTypes(openApi({ version: '1.0.0', base: '' }))
  await expect(types).toMatchFileSnapshot('../../public/longhence.d.ts')
})

test('every answer of it has its type', async () => {
  const types = await clientTypes(openApi({ version: '1.0.0', base: '' }))
  for (const name of ['Histories', 'Epochs', 'Ruler', 'RulerTable', 'Problem']) {
    expect(types).toContain(`export interface ${name} {`)
  }
  expect(types).not.toMatch(/\[k: string\]/)
})
