/** What other sites show of a pasted link. */
import { expect, test, vi } from 'vitest'
import { explorer } from '../../lib/answers/explorer'

vi.stubEnv('PUBLIC_URL', 'https://a.example/')
const { linkCard } = await import('../../app/link-card')

const ONE = 'h0:70,as:First'
const OTHER = 'h0:60,matter:0.4,dark:0.85,eos:cpl,w0:-0.6,wa:-1.6,as:Second'
const cardOf = (codes: readonly string[], keys: readonly [string, string][] = []) =>
  linkCard(explorer({ codes, keys: new Map(keys) }))

test('a scenario alone is told of without its name, which is the title', () => {
  const { openGraph, twitter } = cardOf([ONE])
  expect(openGraph?.title).toBe('First')
  expect(openGraph?.description).toMatch(/^Begins in a Big Bang/)
  expect(twitter?.description).toBe(openGraph?.description)
})

test('of several the one in focus is named, and the picture tells of the same', () => {
  const { openGraph } = cardOf([ONE, OTHER], [['focus', '2']])
  expect(openGraph?.title).toBe('First and Second')
  expect(openGraph?.description).toMatch(/^Second: begins in a Big Bang .* ends in a Big Crunch/)
  expect(JSON.stringify(openGraph?.images)).toMatch(
    /"https:\/\/a\.example\/api\/figure\?s=[^"]*&size=card&format=png&focus=2"/,
  )
})
