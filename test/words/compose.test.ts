import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { FAMILIES } from '../../lib/dark-energy'
import { budgetOf } from '../../lib/scenario/budget'
import { readScenario } from '../../lib/scenario/read'
import type { Scenario } from '../../lib/scenario/scenario'
import { writeScenario } from '../../lib/scenario/write'
import { codeOf, composedLink } from '../../lib/words/compose'
import { CLOSES, formOf, LIGHT } from '../../lib/words/fields'
import { pageLink } from '../../lib/words/link'
import { PLAIN_PLACE, placeKeys, readPlace } from '../../lib/words/place'

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

const placeOf = (keys: Readonly<Record<string, string>>) => readPlace((key) => keys[key], 3)
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
  const place = { ...PLAIN_PLACE, focus: 1, theme: 'night' as const }
  const base = { codes: ['h0:70,as:a,b', 'matter:0.2'], place, fields: sent('h0:71') }

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
    expect(placeOf({ focus: '9', theme: 'pink', from: '1e7', left: 'x', view: 'R/' })).toEqual(PLAIN_PLACE)
    expect(placeOf({ focus: '3', theme: 'night' })).toEqual({ ...PLAIN_PLACE, focus: 2, theme: 'night' })
  })

  it('does not say what would hold anyway, and says everything else', () => {
    expect(pageLink([scenarioOf('h0:70')], PLAIN_PLACE)).toBe('/?s=h0:70,matter:0.3111')
    const query =
      'focus=2&theme=night&view=rate&show=q&by=time&compare=ratio&galaxy=1.9&time=log&from=-13.8&to=40&left=0.1&right=6'
    const place = placeOf(Object.fromEntries(new URLSearchParams(query)))
    expect(placeKeys(place).join('&')).toBe(query)
  })
})
