/** What is pasted elsewhere: complete for every scenario, rounded, and taken by the programs that it is made for. */
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { askWords } from '../../lib/answers/words'
import { FAMILIES } from '../../lib/dark-energy'
import { COLUMNS } from '../../lib/quantities/columns'
import { MEASURES } from '../../lib/quantities/measures'
import { DEMO } from '../../lib/scenario/demo'
import { bibtexOf, keyOf, PUBLICATIONS, publicationsIn } from '../../lib/takeaway/bibliography'
import { answerOf } from '../answers/ask'
import { plainCode } from '../quantities/codes'
import { needs, run } from '../tools'

const words = (...codes: readonly string[]) =>
  answerOf(
    (pairs: URLSearchParams) => askWords(pairs, { version: '9.8.7', base: 'https://a.example' }),
    codes.map((code) => `s=${encodeURIComponent(code)}`).join('&'),
  )
const DEMO_WORDS = words(...DEMO.codes)

describe('each scenario', () => {
  test.each(DEMO_WORDS.scenarios.map((one) => [one.label, one] as const))('%s has all of them', (label, one) => {
    expect(one.caption).toContain(label)
    expect(one.caption).toContain('Longhence 9.8.7, engine')
    expect(one.alternative).toMatch(/^Line chart/)
    expect(one.methods).toContain('Friedmann 1922')
    expect(one.methods).toContain(one.code)
    expect(one.press.facts.map(({ title }) => title)).toEqual([
      'Travel time is not distance',
      'Faster than light',
      'What does not expand',
      'What is assumed',
    ])
  })
  test('the summary has two sentences, no symbol and no digit too many', () => {
    for (const { summary } of DEMO_WORDS.scenarios) {
      expect(summary.match(/\.(?= |$)/g)).toHaveLength(2)
      expect(summary).not.toMatch(/Ω|Gyr|Gly|Mpc/)
      for (const [number] of summary.matchAll(/\d[\d.]*\d/g))
        expect(number.replace('.', '').length).toBeLessThanOrEqual(3)
    }
    expect(DEMO_WORDS.scenarios[0].summary).toMatch(/began 13\.8 billion years ago.*16\.6 billion light years/)
    expect(DEMO_WORDS.scenarios[1].summary).toContain('Big Crunch')
    expect(DEMO_WORDS.scenarios[2].summary).toContain('Big Rip')
  })
  test('fewer digits in, fewer digits out', () => {
    const [fine] = words('h0:67.66,matter:0.3111').scenarios
    const [rough] = words('h0:70,matter:0.3').scenarios
    expect(fine.summary).toContain('6.14 billion years')
    expect(rough.summary).toContain('6.1 billion years')
  })
  test('beside a scenario whose numbers leave the doubles, one digit is left', () => {
    const code =
      'h0:182.314359145,matter:0.0003467368504525317,dark:-8.128305161640995e-7,eos:chaplygin,b:1,beyond:hold'
    expect(words(code).scenarios[0].summary).toMatch(/^This universe began 5 billion years ago in a Big Bang/)
  })
  test('no word of a number that is none, whatever the scenario', () => {
    fc.assert(
      fc.property(plainCode, (code) => {
        let text = ''
        try {
          text = JSON.stringify(words(code))
        } catch (error) {
          // Refused before any words are made.
          if (!`${error}`.includes('parameter')) throw error
        }
        expect(text).not.toMatch(/NaN|Infinity|undefined|null|\[object/)
      }),
      { numRuns: 60 },
    )
  })
})

describe('press card', () => {
  // Wright 2006, PASP 118, 1711, section 2, gives the relations; the numbers are those of our columns, which are tested
  // against tables elsewhere. Here: what is far away was nearer when its light left, and the light took a time in between.
  test.each(DEMO_WORDS.scenarios.map((one) => [one.label, one.press.facts[0].text] as const))('%s', (_, text) => {
    const [time, now, then] = [...text.matchAll(/([\d.]+) billion/g)].map(([, number]) => Number(number))
    expect(then).toBeLessThan(time)
    expect(time).toBeLessThan(now)
    expect(now / then).toBeCloseTo(2, 0)
  })
})

describe('macros', () => {
  test('one for each measure, of letters alone', () => {
    const [...names] = words('h0:70').macros.matchAll(/^\\newcommand\{\\(\w+)\}/gm)
    expect(names).toHaveLength(MEASURES.length)
    for (const [, name] of names) expect(name).toMatch(/^lh[A-Za-z]+$/)
    expect(DEMO_WORDS.macros.match(/\\lhAge[ABC]\}/g)).toHaveLength(3)
  })
  test('LaTeX takes them, and the dash of what there is not', (context) => {
    needs(context, 'latex')
    for (const { macros } of [DEMO_WORDS, words('matter:1,cmb:0,as:100 % & more'), words('h0:1,matter:0.3,cmb:0')]) {
      const uses = [...macros.matchAll(/\\newcommand\{(\\\w+)\}/g)].map(([, name]) => `${name}, $${name}$`)
      const text = `\\documentclass{article}\n${macros}\\begin{document}${uses.join(' ')}\\end{document}\n`
      const { status, said } = run('latex', ['-interaction=nonstopmode', '-halt-on-error', 'a.tex'], { 'a.tex': text })
      expect(status, said).toBe(0)
    }
  })
})

describe('references', () => {
  const sources = [...new Set([...FAMILIES, ...MEASURES].map(({ source }) => source))]
  test.each(sources)('%s is in the bibliography', (source) => {
    // One publication for each part between semicolons.
    expect(publicationsIn(source).length).toBe(source.split(';').length)
  })
  test('every entry has a key of its own and is named by a source', () => {
    expect(new Set(PUBLICATIONS.map(keyOf)).size).toBe(PUBLICATIONS.length)
    const named = [...FAMILIES, ...MEASURES, ...COLUMNS].map(({ source }) => source).join()
    for (const { cite } of PUBLICATIONS) expect(named).toContain(cite)
  })
  test('only the sources that were used', () => {
    const [steady] = [words('h0:70').bibtex]
    expect(steady).toContain('@software{longhence')
    expect(steady).toContain('@article{einstein1917')
    expect(steady).not.toContain('linder2003')
    expect(words('eos:cpl,w0:-0.9').bibtex).toContain('@article{linder2003')
  })
  test('BibTeX takes all of them without a complaint', (context) => {
    needs(context, 'bibtex')
    const aux = '\\relax\n\\citation{*}\n\\bibstyle{plain}\n\\bibdata{a}\n'
    const bib = `${PUBLICATIONS.map(bibtexOf).join('\n')}\n${DEMO_WORDS.bibtex.split('\n\n')[0]}\n`
    const { status, said } = run('bibtex', ['a'], { 'a.aux': aux, 'a.bib': bib })
    expect(said).not.toMatch(/error|I was expecting|Repeated entry/i)
    expect(status, said).toBe(0)
  })
})
