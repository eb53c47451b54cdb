/** Formulas of the lists as trees: the readings are those of the textbooks named beside each formula. */
import { describe, expect, it } from 'vitest'
import { FAMILIES } from '../../lib/dark-energy'
import { COLUMNS } from '../../lib/quantities/columns'
import { MEASURES } from '../../lib/quantities/measures'
import { MOMENT_KINDS } from '../../lib/quantities/moment-kinds'
import { BETWEEN } from '../../lib/ruler/between'
import { READINGS } from '../../lib/ruler/readings'
import { formulaText, formulaTree, type MathNode } from '../../lib/words/formula'

/** Braces: `{above|below}`, `√{under}`. */
const read = (text: string) => formulaText(formulaTree(text)).replaceAll('\u00a0', ' ').replace(/ +/g, ' ').trim()

it.each([
  ['a = 1/(1 + z)', 'a={1|1+z}'],
  ['q = −(ä a)/ȧ²', 'q=−{äa|ȧ^2}'],
  ['j = a² (d³a/dt³)/ȧ³', 'j=a^2{{d^3a|dt^3}|ȧ^3}'],
  ['H_0', 'H_0'],
  ['t_0 = ∫ da/(a H), from the origin to today', 't_0=∫{da|aH}, from the origin to today'],
  ['R_k = (c/H_0)/√|Ω_k|', 'R_k={{c|H_0}|√{|Ω_k|}}'],
  ['c_s = c/√(3 (1 + 3ρ_b/4ρ_γ))', 'c_s={c|√{3(1+{3ρ_b|4ρ_γ})}}'],
  ['ρ/ρ_0 = [B + (1 − B) a^(−3(1+α))]^(1/(1+α))', '{ρ|ρ_0}=[B+(1−B)a^−3(1+α)]^{1|1+α}'],
  ['f = (d ln D)/(d ln a)', 'f={dlnD|dlna}'],
  ['ρ_c = 3H²/(8πG)', 'ρ_c={3H^2|8πG}'],
  ['D_M = |R sin(D_C/R)|, D_C', 'D_M=|Rsin({D_C|R})|,D_C'],
  ['w = (½ φ̇² − V)/(½ φ̇² + V)', 'w={½φ̇^2−V|½φ̇^2+V}'],
  ['w = w_0 + w_a z(1 + z)/(1 + z²)', 'w=w_0+w_a{z(1+z)|1+z^2}'],
  ['μ = 5 log_10(D_L/Mpc) + 25', 'μ=5log_10({D_L|Mpc})+25'],
  [
    'χ = ∫ c dt/a, from the beginning; after a bounce the contraction counts',
    'χ=∫c{dt|a}, from the beginning; after a bounce the contraction counts',
  ],
  ['Σ_cr = (c²/4πG) D_{A,2}/(D_{A,1} D_{A,12})', 'Σ_cr=({c^2|4πG}){D_A,2|D_A,1D_A,12}'],
])('%s', (text, expected) => expect(read(text)).toBe(expected))

const ALL = [
  ...[...COLUMNS, ...MEASURES, ...READINGS, ...BETWEEN].map((one) => one.formula),
  ...Object.values(MOMENT_KINDS).map((one) => one.formula),
  ...FAMILIES.map((one) => one.formula),
]
describe.each([...new Set(ALL)])('%s', (text) => {
  it('loses no letter, digit or sign', () => {
    const kept = (one: string) =>
      [
        ...one
          .normalize('NFC')
          .replace(/[\s\u00a0_^{}()|/√]/gu, '')
          .replaceAll('²', '2')
          .replaceAll('³', '3'),
      ]
        .toSorted()
        .join('')
    expect(kept(read(text))).toBe(kept(text))
  })
  it('has an operand above and below each line, and scripts on something', () => {
    const visit = ({ tag, children }: MathNode): void => {
      if (tag === 'mfrac') expect(children).toHaveLength(2)
      for (const child of children) {
        if (typeof child === 'string') expect(child.trim()).not.toBe('')
        else {
          if (tag === 'mfrac' || tag === 'msqrt') expect(formulaText(child)).not.toBe('')
          visit(child)
        }
      }
    }
    visit(formulaTree(text))
  })
})

it('stretches only brackets about what is tall', () => {
  const stretched = (text: string) => fencesOf(formulaTree(text)).map(({ attributes }) => attributes?.stretchy)
  expect(stretched('χ(z)')).toEqual(['false', 'false'])
  expect(stretched('sin(D_C/R)')).toEqual([undefined, undefined])
})

function fencesOf(node: MathNode): readonly MathNode[] {
  const within = node.children.flatMap((one) => (typeof one === 'string' ? [] : fencesOf(one)))
  return node.attributes?.fence ? [node, ...within] : within
}
