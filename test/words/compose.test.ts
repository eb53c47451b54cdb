import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { FAMILIES } from '../../lib/dark-energy'
import { budgetOf } from '../../lib/scenario/budget'
import { readScenario } from '../../lib/scenario/read'
import type { Scenario } from '../../lib/scenario/scenario'
import { writeScenario } from '../../lib/scenario/write'
import { codeOf, composedLink } from '../../lib/words/compose'
import { CLOSES, formOf, LIGHT } from '../../lib/words/fields'
import { pageLink, readPlace } from '../../lib/words/link'

function scenarioOf(code: string): Scenario {
  const reading = readScenario(code, null)
  if (!reading.ok) throw new Error(JSON.stringify(reading.problems))
  return reading.value
}

/** What a browser would send for the form of a scenario, with some fields changed. */
function sent(code: string, changes: Readonly<Record<string, string>> = {}): Map<string, string> {
  const scenario = scenarioOf(code)
  const form = formOf(scenario, budgetOf(scenario))
  const fields = form.groups.flatMap((group) => group.fields).map(({ name, value }) => [name, value] as const)
  return new Map([
    ...form.hidden.map(({ name, value }) => [name, value] as const),
    ...fields,
    ...Object.entries(changes),
  ])
}

const canonical = (fields: Map<string, string>) => writeScenario(scenarioOf(codeOf(fields)))

describe('a form sent as it is', () => {
  it.each([
    'h0:67.66,matter:0.3111',
    'matter:0.4,dark:0.85,eos:cpl,w0:-0.6,wa:-1.6,as:Fading light, or so',
    'matter:1,cmb:0',
    'matter:0.3,radiation:0.01,beyond:hold,eos:constant,w:-1.2',
    'masses:0,nu:3',
    'masses:0.05_0.06,curvature:-0.01,baryons:0.02',
  ])('means what it meant: %s', (code) => {
    expect(canonical(sent(code))).toBe(writeScenario(scenarioOf(code)))
  })

  it('means what it meant for random scenarios', () => {
    const number = fc.double({ min: 0.5, max: 1, noNaN: true })
    const code = fc
      .tuple(number, number, fc.constantFrom('dark', 'curvature'), number)
      .map(([h, m, key, x]) => `h0:${100 * h},matter:${m},${key}:${x}`)
    fc.assert(
      fc.property(code, (text) => {
        expect(canonical(sent(text))).toBe(writeScenario(scenarioOf(text)))
      }),
    )
  })
})

describe('what a person types', () => {
  it.each([
    ['0,3', '0.3'],
    [' 0.3 ', '0.3'],
    ['3e-1', '0.3'],
  ])('matter %j is %s', (typed, value) =>
    expect(canonical(sent('h0:70', { matter: typed }))).toBe(`h0:70,matter:${value}`),
  )

  it('takes a true minus sign, a list with commas, and an empty field for its default', () => {
    expect(canonical(sent('eos:constant', { w: '−1,2' }))).toBe('h0:67.66,matter:0.3111,eos:constant,w:-1.2')
    expect(canonical(sent('h0:70', { masses: '0,06; 0,01' }))).toBe('h0:70,matter:0.3111,masses:0.01_0.06')
    expect(canonical(sent('h0:70', { h0: '' }))).toBe('h0:67.66,matter:0.3111')
  })

  it('arrives as typed where it cannot be read, and cannot smuggle in another key', () => {
    for (const typed of ['abc', '0.3,h0:70', '0.3,beyond:hold,cmb:0', '1,2,3', '0x1']) {
      expect(readScenario(codeOf(sent('h0:70', { matter: typed })), null)).toMatchObject({
        ok: false,
        problems: [{ parameter: 'matter' }],
      })
    }
  })
})

describe('choices of the form', () => {
  it('another law takes the keys that it shares and the defaults of the rest', () => {
    const fields = sent('eos:cpl,w0:-0.9,wa:0.4', { eos: 'constant' })
    expect(canonical(fields)).toBe('h0:67.66,matter:0.3111,eos:constant')
    expect(canonical(sent('eos:constant,w:-1.2', { eos: 'cpl' }))).toBe('h0:67.66,matter:0.3111,eos:cpl')
  })

  it.each(FAMILIES.flatMap(({ key }) => FAMILIES.map((other) => [other.key, key])))('%s can become %s', (from, to) => {
    const before = canonical(sent('h0:70', { eos: from }))
    expect(canonical(sent(before, { eos: to }))).toMatch(to === 'lambda' ? /^h0:70,matter:0\.3111$/ : `eos:${to}`)
  })

  it('another closing component leaves the universe as it is', () => {
    const before = budgetOf(scenarioOf('h0:70,curvature:0.02'))
    const after = budgetOf(scenarioOf(codeOf(sent('h0:70,curvature:0.02', { [CLOSES]: 'curvature' }))))
    // Both sums round once or twice: a few eps of 1.
    expect(Math.abs(after.curvature - before.curvature)).toBeLessThan(8 * Number.EPSILON)
    expect(after.dark).toBe(before.dark)
  })

  it('radiation can be given, or left out', () => {
    expect(canonical(sent('h0:70', { [LIGHT]: 'none' }))).toBe('h0:70,matter:0.3111,cmb:0')
    expect(canonical(sent('h0:70', { [LIGHT]: 'given' }))).toMatch(/^h0:70,matter:0\.3111,radiation:0\.0000\d+$|e-5$/)
  })
})

describe('the address', () => {
  const base = { codes: ['h0:70,as:a,b', 'matter:0.2'], focus: '2', theme: 'night', fields: sent('h0:71') }

  it('keeps the other scenarios, the focus and the theme', () => {
    expect(composedLink(base)).toBe('/?s=h0:70,matter:0.3111,as:a%2Cb&s=h0:71,matter:0.3111&focus=2&theme=night')
  })

  it('carries what cannot be read without breaking out of its place', () => {
    const link = composedLink({ ...base, fields: new Map([['h0', '7&s=x#%"<']]) })
    expect(new URL(link, 'http://localhost').searchParams.getAll('s')).toEqual([
      'h0:70,matter:0.3111,as:a,b',
      'h0:7&s=x#%"<,matter:'.replace(',matter:', ''),
    ])
    expect(link).not.toMatch(/["<\s]/)
  })

  it('is read leniently in what is not a scenario', () => {
    expect(readPlace('9', 'pink', 3)).toEqual({ focus: 0, theme: null })
    expect(readPlace('3', 'night', 3)).toEqual({ focus: 2, theme: 'night' })
    expect(pageLink([scenarioOf('h0:70')], { focus: 0, theme: null })).toBe('/?s=h0:70,matter:0.3111')
  })
})
