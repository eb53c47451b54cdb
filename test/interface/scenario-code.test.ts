import { describe, expect, it } from 'vitest'
import { CODE_KEYS, codeDescription, FAMILY_KEYS } from '../../lib/interface/scenario-code'
import { typeset } from '../../lib/words/number'

describe('the scenario code, told', () => {
  it('names each key once', () => {
    for (const keys of [CODE_KEYS, ...FAMILY_KEYS.map((one) => one.keys)]) {
      expect(new Set(keys.map(({ key }) => key)).size).toBe(keys.length)
    }
  })

  it('says where a key is read, and what is allowed there', () => {
    const field = FAMILY_KEYS.find(({ key }) => key === 'field')
    expect(field?.keys.find(({ key }) => key === 'slope')?.allowed).toBe(
      'a number from -20 to 20, where v is exponential or linear; a number above 0 and up to 20, where v is inverse',
    )
    expect(codeDescription()).toContain('- `slope`: ')
  })

  it('has true minus signs where it is read and none where it is typed', () => {
    expect(typeset('a number from -0.99 to 20')).toBe('a number from −0.99 to 20')
    expect(typeset('eos:constant,w:-1 or w-a, 2-3')).toBe('eos:constant,w:−1 or w-a, 2-3')
  })
})
