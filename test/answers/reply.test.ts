/** How routes answer, without a server: tags, problems, memory. */
import { expect, test, vi } from 'vitest'
import { remembered } from '../../app/api/remembered'
import { pairsOf, reply } from '../../app/api/reply'
import type { Question } from '../../lib/answers/question'
import type { Problem } from '../../lib/scenario/scenario'

const problem: Problem = { parameter: 's', scenario: 0, value: 'h0:70', allowed: 'others', message: 'No.' }
const asked = (headers: Record<string, string> = {}, method = 'GET') =>
  new Request('http://x/api/thing?s=h0:70', { headers, method })
const question = (canonical: string, answer: Question<unknown>['answer']) => ({
  ok: true as const,
  value: { canonical, answer },
})

test('an answer is made once for a place', async () => {
  const answer = vi.fn(() => ({ ok: true as const, value: { a: [1] } }))
  for (let i = 0; i < 3; i++) {
    const response = reply(asked(), '/api/thing', question('once', answer), remembered)
    expect(response.status).toBe(200)
    expect(await response.json()).toEqual({ a: [1] })
  }
  expect(answer).toHaveBeenCalledTimes(1)
  reply(asked(), '/api/other', question('once', answer), remembered)
  expect(answer).toHaveBeenCalledTimes(2)
})
test('nothing is made for those who know the tag', () => {
  const answer = vi.fn(() => ({ ok: true as const, value: 1 }))
  const tag = reply(asked(), '/api/thing', question('known', answer), remembered).headers.get('etag') ?? ''
  const response = reply(asked({ 'If-None-Match': `"a", ${tag}` }), '/api/thing', question('known', answer), remembered)
  expect(response.status).toBe(304)
  expect(answer).toHaveBeenCalledTimes(1)
})
test('a legal scenario without an answer is a problem with status 422, is not kept, and has no tag', async () => {
  const answer = vi.fn(() => ({ ok: false as const, problems: [problem] }))
  const both: Record<string, string>[] = [{}, { 'If-None-Match': '*' }]
  for (const headers of both) {
    const response = reply(asked(headers), '/api/thing', question('unsolved', answer), remembered)
    expect(response.status).toBe(422)
    expect(response.headers.get('etag')).toBe(null)
    expect(response.headers.get('cache-control')).toBe('no-store')
    expect(await response.json()).toMatchObject({ status: 422, title: 'Unprocessable Entity', errors: [problem] })
  }
  expect(answer).toHaveBeenCalledTimes(2)
})
test('a refused parameter is a problem with status 400 that says how many there are', async () => {
  const response = reply(asked(), '/api/thing', { ok: false, problems: [problem, problem] }, remembered)
  expect(response.status).toBe(400)
  expect((await response.json()).detail).toBe('s (scenario 1): No. This is the first of 2 problems in errors.')
})
test('HEAD has the headers and no body', async () => {
  const answer = () => ({ ok: true as const, value: 1 })
  const response = reply(asked({}, 'HEAD'), '/api/thing', question('head', answer), remembered)
  expect(response.status).toBe(200)
  expect(response.headers.get('content-type')).toBe('application/json')
  expect(response.body).toBe(null)
})
test('a query is decoded once, whatever the host', () => {
  expect([...pairsOf({ url: 'http://[bad/api?s=a%2525&s=b+c&' } as Request)]).toEqual([
    ['s', 'a%25'],
    ['s', 'b c'],
  ])
})
