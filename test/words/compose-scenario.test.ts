/** Published sets, defaults and a retuned H₀ in the address of the page. */
import { describe, expect, it } from 'vitest'
import { PUBLISHED_SETS } from '../../lib/scenario/presets'
import { presetLink, retuned } from '../../lib/words/compose-scenario'

const PAGE = 's=h0:70,matter:0.3,as:One&s=h0:67.66,matter:0.3,eos:constant,w:-0.9,as:Two&focus=2&theme=night&at=1.9'
const query = (more: string) => new URLSearchParams(`${PAGE}&${more}`)

describe('a published set', () => {
  it('takes the place of the scenario in focus and leaves the rest of the address', () => {
    expect(presetLink(query('set=desi_dr2_LCDM_DESI_CMB'))).toBe(
      '/?s=h0:70,matter:0.3,as:One&s=h0:68.17,matter:0.3027,as:DESI%20DR2%20with%20CMB&focus=2&theme=night&at=1.9',
    )
  })
  it('of one parameter changes that one', () => {
    expect(presetLink(query('set=sh0es_2022'))).toContain('s=h0:73.04,matter:0.3,eos:constant,w:-0.9,as:Two&')
  })
  it('may be the defaults, under the old name', () => {
    expect(presetLink(query('set=defaults'))).toContain('&s=h0:67.66,matter:0.3111,as:Two&')
  })
  it.each(PUBLISHED_SETS.map(({ key }) => key))('%s opens', (key) =>
    expect(presetLink(query(`set=${key}`))).not.toBeNull(),
  )
  it('that does not exist, or an address that cannot be read, gives nothing', () => {
    expect(presetLink(query('set=constructor'))).toBeNull()
    expect(presetLink(new URLSearchParams('s=h0:x&set=defaults'))).toBeNull()
  })
})

describe('retuning', () => {
  it('changes H₀ of the scenario in focus alone', () => {
    const result = retuned(query('keep=age&of=1'))
    expect(result).toMatchObject({ wish: 'the age of One', because: null })
    expect(result?.link).toMatch(
      /^\/\?s=h0:70,matter:0\.3,as:One&s=h0:6\d\.\d+,matter:0\.3,eos:constant,w:-0\.9,as:Two&/,
    )
  })
  it('keeps what a published set says', () => {
    const result = retuned(query('keep=acousticAngle&of=planck2018_TTTEEE_lowE_lensing'))
    expect(result).toMatchObject({ because: null, wish: expect.stringContaining('Planck 2018') })
  })
  it('says why not', () => {
    expect(retuned(query('keep=acousticAngle&of=desi_dr2_LCDM_DESI_CMB'))?.because).toMatch(/not published/)
    const empty = new URLSearchParams('s=h0:70,matter:0.3,cmb:0&s=h0:70&keep=acousticAngle&of=2')
    expect(retuned(empty)?.because).toMatch(/no recombination/)
  })
  it('of nothing is nothing', () => {
    for (const more of ['keep=age', 'keep=age&of=7', 'keep=mass&of=1']) expect(retuned(query(more))).toBeNull()
  })
})
