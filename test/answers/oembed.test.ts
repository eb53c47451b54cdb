/** oEmbed 1.0 (oembed.com, section 2.3.4): the fields of the type rich, and sizes within those asked for. */
import { describe, expect, test } from 'vitest'
import { askOEmbed } from '../../lib/answers/oembed'
import { DEMO } from '../../lib/scenario/demo'
import { answerOf, problemsOf } from './ask'

const ask = (base: string) => (pairs: URLSearchParams) => askOEmbed(pairs, { version: '1', base })
const here = ask('https://a.example')
const query = (url: string, more = '') => `url=${encodeURIComponent(url)}${more}`

test('a link of ours', () => {
  const answer = answerOf(here, query('https://a.example/?s=h0:70,as:%3Cb%3E%22x%22&focus=1'))
  expect(answer).toMatchObject({
    version: '1.0',
    type: 'rich',
    provider_name: 'Longhence',
    title: '<b>"x"',
    width: 800,
    height: 480,
    thumbnail_url: 'https://a.example/api/figure?s=h0:70,matter:0.3111,as:%3Cb%3E%22x%22&format=png&size=card',
  })
  expect(answer.html).toMatch(/^<iframe src="https:\/\/a\.example\/embed\?s=h0:70,matter:0\.3111,as:%3Cb%3E%22x%22" /)
  expect(answer.html).toContain('title="&lt;b&gt;&quot;x&quot;"')
})

test('a link without scenarios is that of the demo, under its title', () => {
  const answer = answerOf(here, query('https://a.example/'))
  expect(answer.title).toBe(DEMO.title)
  expect(new URL(answer.thumbnail_url).searchParams.getAll('s')).toHaveLength(DEMO.codes.length)
})

test('no wider and no higher than asked', () => {
  const { width, height, html } = answerOf(
    here,
    query('https://a.example/embed?s=h0:70', '&maxwidth=300&maxheight=9999'),
  )
  expect([width, height]).toEqual([300, 480])
  expect(html).toContain('width="300" height="480"')
})

describe('refused', () => {
  test.each([
    ['no link', '', 'url'],
    ['another site', query('https://b.example/?s=h0:70'), 'url'],
    ['a site whose name begins alike', query('https://a.example.b.example/?s=h0:70'), 'url'],
    ['another page', query('https://a.example/api/history?s=h0:70'), 'url'],
    ['a scenario that cannot be read', query('https://a.example/?s=h0:0'), 'url'],
    ['another format', query('https://a.example/?s=h0:70', '&format=xml'), 'format'],
    ['a size of nothing', query('https://a.example/?s=h0:70', '&maxwidth=0'), 'maxwidth'],
    ['scenarios of its own', query('https://a.example/?s=h0:70', '&s=h0:70'), 's'],
  ])('%s', (_, asked, parameter) => {
    expect(problemsOf(here, asked)).toMatchObject([{ parameter }])
  })
  test('everything, where the server does not know its own address', () => {
    expect(problemsOf(ask(''), query('https://a.example/?s=h0:70'))).toMatchObject([{ parameter: 'url' }])
  })
})
