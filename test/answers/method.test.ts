/** The page of methods is complete: every entry of every list stands on it, with all that an entry needs. */
import { describe, expect, it } from 'vitest'
import { explorer } from '../../lib/answers/explorer'
import { type MethodEntry, method } from '../../lib/answers/method'
import { rulerOf } from '../../lib/answers/ruler-view'
import { FAMILIES } from '../../lib/dark-energy'
import { UNBOUND_SYSTEMS } from '../../lib/measures/unbinding'
import { COLUMN_KEYS } from '../../lib/quantities/column'
import { MEASURE_KEYS } from '../../lib/quantities/measures'
import { OWN_KEYS } from '../../lib/scenario/parameters'

const sections = method()
const all = sections.flatMap(({ entries }) => entries.flatMap((one): MethodEntry[] => [one, ...one.parts]))
const anchors = new Set([...all.map(({ anchor }) => anchor), ...sections.map(({ anchor }) => anchor)])

it('has every anchor once, ready for an address', () => {
  expect(anchors.size).toBe(all.length + sections.length)
  for (const anchor of anchors) expect(anchor).toMatch(/^[A-Za-z][\w-]*$/)
})

it.each([
  ...MEASURE_KEYS.map((key) => `measure-${key}`),
  ...COLUMN_KEYS.map((key) => `reading-${key}`),
  ...FAMILIES.flatMap(({ key, parameters }) => [`law-${key}`, ...parameters.map((one) => `law-${key}-${one.key}`)]),
  ...[...OWN_KEYS].map((key) => `parameter-${key}`),
  'caution-unbinding',
])('%s is explained', (anchor) => expect(anchors).toContain(anchor))

const NEEDED: Readonly<Record<string, readonly string[]>> = {
  measure: ['Accuracy', 'Source'],
  moment: ['Accuracy', 'Source'],
  reading: ['Accuracy', 'Source'],
  between: ['Accuracy', 'Source'],
  parameter: ['Key', 'Allowed', 'Default'],
}

describe.each(all.map((one) => [one.anchor, one] as const))('%s', (anchor, one) => {
  const [kind = '', , part] = anchor.split('-')
  const needed = kind === 'law' ? (part ? NEEDED.parameter : ['Caution', 'Key', 'Source']) : (NEEDED[kind] ?? [])
  it('has all that it needs', () => {
    expect(one.title).toMatch(/\S/)
    expect(one.meaning).toMatch(/^[\p{L}−].*\.$/su)
    expect(one.facts.map(({ term }) => term)).toEqual(needed)
    for (const { text } of one.facts) expect(text).toMatch(/\S/)
    if (kind in NEEDED && kind !== 'parameter') expect(one.symbol).toMatch(/\S/)
    if (['measure', 'moment', 'reading', 'between'].includes(kind) || (kind === 'law' && !part)) {
      expect(one.formula).toMatch(/\S/)
    }
  })
  it('has sentences that end', () => {
    for (const { term, text } of one.facts) if (term === 'Accuracy' || term === 'Caution') expect(text).toMatch(/\.$/)
  })
})

describe('what the explorer points at', () => {
  const codes = [
    'h0:70,matter:0.3,eos:constant,w:-1.5',
    'matter:0.4,dark:0.85,eos:cpl,w0:-0.6,wa:-1.6',
    'matter:0.3,eos:field,v:cosine',
    'matter:0.3,eos:nodes,at:0.5_1,w:-1_-0.9,radiation:0.0001',
  ]
  it.each(codes)('%s: every moment, measure, reading and field resolves', (code) => {
    const view = explorer({ codes: [code], keys: new Map() })
    const keys: Readonly<Record<string, string>> = { at: '1', until: '2', read: COLUMN_KEYS.join(',') }
    const ruler = rulerOf([code], (key) => keys[key])
    const pointed = [
      ...view.moments.map(({ kind }) => `moment-${kind}`),
      ...view.measures.map(({ key }) => `measure-${key}`),
      ...ruler.at.map(({ key }) => `reading-${key}`),
      ...ruler.between.map(({ key }) => `between-${key}`),
      ...view.form.groups.flatMap(({ fields, family }) => [
        ...fields.flatMap(({ means }) => means ?? []),
        ...(family ? [`law-${family.key}`] : []),
      ]),
    ]
    expect(pointed.filter((anchor) => !anchors.has(anchor))).toEqual([])
    expect(pointed.length).toBeGreaterThan(50)
  })
})

it('says once that unbinding is an order of magnitude, with the lost bound state of a circular orbit', () => {
  // (27/256)(2π/P)²: where the effective potential of a circular orbit under a growing outward force loses its minimum.
  // d/dr of l²/(2r²) − GM/r − ä/a r²/2 and its slope vanish together at r⁴ = l²… : ä/a = (27/256) GM/r₀³.
  const effective = (r: number, push: number) => 1 / r ** 3 - 1 / r ** 2 + push * r
  const bound = (push: number) =>
    Array.from({ length: 4000 }, (_, i) => 1 + i / 1000).some((r) => effective(r, push) < 0)
  expect(bound(27 / 256 - 1e-4)).toBe(true)
  expect(bound(27 / 256 + 1e-4)).toBe(false)
  const caution = all.find(({ anchor }) => anchor === 'caution-unbinding')
  expect(caution?.meaning).toContain('(27/256)(2π/P)²')
  for (const { kind } of UNBOUND_SYSTEMS) {
    const [accuracy] = all.find(({ anchor }) => anchor === `moment-${kind}`)?.facts ?? []
    expect(accuracy?.text).toContain('order of magnitude')
  }
})
