import { describe, expect, it } from 'vitest'
import { type Desk, readDesk } from '../../lib/words/desk'
import { dragged, edited } from '../../lib/words/edit'

const desk = (...codes: string[]) => readDesk(new URLSearchParams(codes.map((code) => ['s', code]))) as Desk

/** The code of the scenario in focus after a change of one field. */
function after(code: string, name: string, text: string): string {
  const result = edited(desk(code), name, text)
  return result.ok ? (new URL(result.link, 'http://localhost').searchParams.get('s') ?? '') : result.complaint
}

describe('a change at the desk', () => {
  it.each([
    ['h0:70,matter:0.3', 'matter', '0,25', 'h0:70,matter:0.25'],
    ['h0:70,matter:0.3', 'matter', '', 'h0:70,matter:0.3111'],
    ['h0:70,matter:0.3', 'eos', 'cpl', 'h0:70,matter:0.3,eos:cpl'],
    ['h0:70,matter:0.3,eos:cpl,w0:-0.9', 'eos', 'jbp', 'h0:70,matter:0.3,eos:jbp,w0:-0.9'],
    ['h0:70,matter:0.3,curvature:-0.1,cmb:0', 'closes', 'curvature', 'h0:70,matter:0.3,dark:0.8,cmb:0'],
    ['h0:70,matter:0.3', 'masses', '0,05; 0,1', 'h0:70,matter:0.3,masses:0.05_0.1'],
    ['h0:70,matter:0.3', 'as', ' A, b: c ', 'h0:70,matter:0.3,as:A, b: c'],
  ])('%s with %s set to "%s"', (code, name, text, expected) => {
    expect(after(code, name, text)).toBe(expected)
  })

  it('leaves the name of a published set to its very numbers', () => {
    const published = 'h0:67.36,matter:0.3153,baryons:0.02237,nu:3.046,as:Planck 2018'
    expect(after(published, 'h0', '69')).toBe('h0:69,matter:0.3153,baryons:0.02237,nu:3.046')
    expect(after(published, 'h0', '67.360')).toBe(published)
    expect(after(published, 'as', 'Mine')).toBe(published.replace('Planck 2018', 'Mine'))
    expect(after('h0:69,matter:0.3,as:Planck 2018', 'h0', '70')).toBe('h0:70,matter:0.3,as:Planck 2018')
  })

  it('stops a drag at the last step that the other fields allow', () => {
    // A state of 0.06 eV weighs Ω h² = Σm/93.14 eV (Particle Data Group): 0.0013 of the whole at h0:70.
    const result = dragged(desk('h0:70,matter:0.3'), 'matter', '0')
    const stop = result.ok ? Number(/matter:([\d.]+)/.exec(result.link)?.[1]) : Number.NaN
    expect(stop).toBeGreaterThan(0)
    expect(stop).toBeLessThan(0.0025)
    expect(edited(desk('h0:70,matter:0.3'), 'matter', '0').ok).toBe(false)
    expect(dragged(desk('h0:70,matter:0.3'), 'matter', '0.25')).toEqual(
      edited(desk('h0:70,matter:0.3'), 'matter', '0.25'),
    )
  })

  it('keeps the other scenarios, the focus and the theme', () => {
    const query = new URLSearchParams('s=h0:70&s=h0:71&focus=2&theme=night')
    const result = edited(readDesk(query) as Desk, 'h0', '72')
    expect(result).toEqual({ ok: true, link: '/?s=h0:70,matter:0.3111&s=h0:72,matter:0.3111&focus=2&theme=night' })
  })

  it.each([
    ['h0', '7o', 'Hubble constant is not a plain decimal number. Allowed: a number from 1 to 1000 km/s/Mpc.'],
    ['matter', '-1', 'Matter is outside its limits. Allowed: a number from 0 to 10000.'],
    ['masses', '1;2;3;4', 'Neutrino masses has 4 numbers. Allowed: 1 to 3 numbers, each a number from 0 to 10 eV.'],
  ])('complains in the words of the form: %s set to "%s"', (name, text, complaint) => {
    expect(edited(desk('h0:70'), name, text)).toEqual({ ok: false, complaint })
  })
})

describe('the desk', () => {
  it('is that of the demo where an address names no scenario', () => {
    expect(readDesk(new URLSearchParams())?.scenarios).toHaveLength(3)
  })

  it('does not open what cannot be read as written', () => {
    expect(readDesk(new URLSearchParams({ s: 'h0:7o' }))).toBeNull()
  })

  it('leads to itself', () => {
    const { links } = desk('h0:70,as:One', 'h0:71,eos:cpl,wa:-0.3')
    const again = readDesk(new URL(links.here, 'http://localhost').searchParams)
    expect(again?.links.here).toBe(links.here)
  })

  it('has units as the measures have them', () => {
    const fields = desk('h0:70').form.groups.flatMap((group) => group.fields)
    expect(fields.find(({ name }) => name === 'h0')).toMatchObject({ unit: 'km/s/Mpc', slider: { min: 50, max: 100 } })
  })
})
