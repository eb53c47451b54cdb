/** QR codes, read by a decoder that is not ours: jsQR always, ZBar where it is installed. */
import { Resvg } from '@resvg/resvg-js'
import jsQR from 'jsqr'
import { describe, expect, test } from 'vitest'
import { askQr } from '../../lib/answers/qr'
import { serialize } from '../../lib/figures/svg'
import { MOST_BYTES } from '../../lib/print/qr'
import { DEMO } from '../../lib/scenario/demo'
import { needs, run } from '../tools'
import { answerOf, problemsOf } from './ask'

const ask = (base: string) => (pairs: URLSearchParams) => askQr(pairs, { version: '9.8.7', base })
const here = ask('https://a.example')
const LONG_NAME = '%E5%AE%87%E5%AE%99'.repeat(30)
const LONG = Array.from({ length: 6 }, () => `s=h0:70,as:${LONG_NAME}`).join('&')

const picture = (query: string) => {
  const { node, size } = answerOf(here, query).code
  return new Resvg(serialize(node), {
    fitTo: { mode: 'width', value: 8 * size },
    font: { loadSystemFonts: false },
  }).render()
}

const link = (query: string) => `https://a.example/?${query}&engine=`

describe.each([
  ['s=h0:70,matter:0.3', 'h0:70,matter:0.3'],
  [DEMO.codes.map((code) => `s=${encodeURIComponent(code)}`).join('&'), 'as:Gathering%20light'],
  [Array.from({ length: 3 }, () => `s=h0:70,as:${LONG_NAME}`).join('&'), LONG_NAME],
])('%s', (query, part) => {
  test('is read by jsQR', () => {
    const { pixels, width, height } = picture(query)
    const read = jsQR(new Uint8ClampedArray(pixels), width, height)
    expect(read?.data).toContain(part)
    expect(read?.data).toMatch(/^https:\/\/a\.example\/\?s=.*&engine=\d+$/)
  })
  test('is read by ZBar', (context) => {
    needs(context, 'zbarimg')
    const { said } = run('zbarimg', ['-q', '--raw', 'a.png'], { 'a.png': picture(query).asPng() })
    expect(said).toContain(part)
  })
})

test('the link opens the same scenario', () => {
  const { pixels, width, height } = picture('s=matter:0.30,h0:7e1')
  expect(jsQR(new Uint8ClampedArray(pixels), width, height)?.data).toContain(link('s=h0:70,matter:0.3'))
})

test('a link that is too long is refused with its length', () => {
  const [problem, ...others] = problemsOf(here, LONG)
  expect(others).toEqual([])
  expect(problem).toMatchObject({ parameter: 's', scenario: null })
  expect(problem.message).toMatch(/The link has \d{4} characters/)
  expect(problem.allowed).toContain(String(MOST_BYTES))
})

describe('where it leads', () => {
  test('a server that does not know its own address has to be told', () => {
    expect(problemsOf(ask(''), 's=h0:70')).toMatchObject([{ parameter: 'base', value: '' }])
    expect(answerOf(ask(''), 's=h0:70&base=http://localhost:3000').code.size).toBeGreaterThan(20)
  })
  test.each([
    'javascript:alert(1)',
    'https://a.example/path',
    'ftp://a.example',
    '//a.example',
    'https://',
    'x'.repeat(300),
  ])('%s is no site', (base) =>
    expect(problemsOf(here, `s=h0:70&base=${encodeURIComponent(base)}`)).toMatchObject([{ parameter: 'base' }]),
  )
})

test('files', () => {
  expect(answerOf(here, 's=h0:70,as:Steady%20light').fileName).toBe('longhence-steady-light-qr.svg')
  expect(answerOf(here, 's=h0:70&format=png')).toMatchObject({ mediaType: 'image/png', fileName: 'longhence-qr.png' })
})
