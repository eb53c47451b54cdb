import { describe, expect, it } from 'vitest'
import { explorer } from '../../lib/answers/explorer'
import { DEMO } from '../../lib/scenario/demo'

const open = (...codes: string[]) => explorer({ codes, keys: new Map() })

/** The codes that a link of the page opens. */
function opens(link: string | null): string[] {
  return new URL(link ?? 'about:blank', 'http://localhost').searchParams.getAll('s')
}

describe('the explorer', () => {
  it('opens with the demo where no scenario is named', () => {
    const view = open()
    expect(view).toMatchObject({ title: DEMO.title, refusal: null, place: { focus: 0, theme: null } })
    expect(view.scenarios).toHaveLength(DEMO.codes.length)
    expect(view.long.figure.curves).toHaveLength(DEMO.codes.length)
    expect(view.long.figure.pictures).toHaveLength(3)
  })

  it('tells ages to two decimals', () => {
    // Flat, matter alone: the age is 2/(3 H₀), 9.31 Gyr at 70 km/s/Mpc.
    const view = open('matter:1,cmb:0,h0:70')
    expect(view.scenarios[0]?.verdict.sentences[0]).toBe(
      'Begins in a Big Bang 9.31\u00a0Gyr ago and expands for ever at a falling pace.',
    )
    expect(view.measures.find(({ key }) => key === 'age')).toMatchObject({ value: '9.31', unit: 'Gyr', because: null })
    expect(view.measures.find(({ key }) => key === 'eventHorizon')).toMatchObject({
      value: null,
      because: expect.stringMatching(/\w/),
    })
  })

  it('says what the ending owes to the law beyond today', () => {
    const code = 'matter:0.4,dark:0.85,eos:cpl,w0:-0.6,wa:-1.6'
    expect(open(code).scenarios[0]?.verdict.aside).toMatch(/^Holding w at today’s value it would expand for ever/)
    expect(open(`${code},beyond:hold`).scenarios[0]?.verdict.aside).toMatch(/^Following its law .* Big Crunch/)
    expect(open('h0:70').scenarios[0]?.verdict.aside).toBeNull()
  })

  it('names what is wrong and offers the nearest good reading', () => {
    const { refusal, scenarios } = open('h0:70,matter:0.3x')
    expect(refusal?.problems).toMatchObject([{ parameter: 'matter', scenario: 0, value: '0.3x' }])
    expect(opens(refusal?.link ?? null)).toHaveLength(scenarios.length)
  })

  it('is never blank: where nothing can be saved the demo stands in', () => {
    const { refusal, scenarios } = open('')
    expect(refusal?.link).toBeNull()
    expect(scenarios.length).toBeGreaterThan(0)
  })

  it('survives any text', () => {
    for (const code of ['%', '::::', 'a'.repeat(5000), '__proto__:1', '<script>', 'h0:1e999', 'as:\u202e']) {
      expect(open(code).scenarios.length).toBeGreaterThan(0)
    }
  })
})

it('a legal scenario that the engine cannot solve is named, and the others are shown', () => {
  const hard = 'matter:0,eos:cpl,w0:0,wa:-5e-324,masses:0'
  const { refusal, scenarios } = open('h0:70,as:Good', hard)
  // Where the engine learns to solve it, there is nothing left to name.
  if (refusal === null) return expect(scenarios).toHaveLength(2)
  expect(refusal.problems).toMatchObject([{ scenario: 1, message: expect.stringContaining('no solution') }])
  expect(scenarios.map(({ name }) => name)).toEqual(['Good'])
})

describe('links of the page', () => {
  const three = ['h0:70,as:One', 'h0:71,as:Two', 'h0:72,as:Three 2']
  const view = explorer({ codes: three, keys: new Map(Object.entries({ focus: '3', theme: 'night' })) })

  it('choose the focus and the theme', () => {
    expect(view.scenarios.map(({ link }) => link.replace(/^.*as:Three%202/, ''))).toEqual([
      '&theme=night',
      '&focus=2&theme=night',
      '&focus=3&theme=night',
    ])
    expect(view.links.themes.map(({ link }) => /theme=(\w+)/.exec(link)?.[1] ?? null)).toEqual([null, 'paper', 'night'])
  })

  it('add, copy and remove', () => {
    expect(opens(view.links.add)).toHaveLength(4)
    expect(opens(view.links.copy).map((code) => code.replace(/.*as:/, ''))).toEqual([
      'One',
      'Two',
      'Three 2',
      'Three 3',
    ])
    expect(opens(view.links.remove).map((code) => code.replace(/.*as:/, ''))).toEqual(['One', 'Two'])
  })

  it('stop at six and at one', () => {
    expect(open(...Array(6).fill('h0:70')).links).toMatchObject({ add: null, copy: null })
    expect(open('h0:70').links.remove).toBeNull()
  })
})
