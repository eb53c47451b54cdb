/** A page on its way out: the same in whatever pieces it comes. */
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { restingPage } from '../../scripts/front/rest.mjs'

const PAGE = [
  '<!DOCTYPE html><html><head><link rel="stylesheet" href="/a.css"/>',
  '<link rel="preload" as="script" fetchPriority="low" nonce="abc==" href="/zero.js"/>',
  '<script src="/one.js" async="" nonce="abc=="></script><script src="/two.js" async="" nonce="abc=="></script></head>',
  '<body><p>1 < 2</p><script nonce="abc==">(self.__next_f=self.__next_f||[]).push([0])</script>',
  '<script nonce="abc==">self.__next_f.push([1,"a \\u003cb"])</script><script nonce="abc==">other()</script>',
  '<script src="/zero.js" nonce="abc==" async=""></script></body></html>',
].join('')

function inPieces(text: string, cuts: readonly number[]): string {
  const page = restingPage()
  const ends = [...cuts, text.length].sort((one, other) => one - other)
  const pieces = ends.map((end, i) => page.add(text.slice(ends[i - 1] ?? 0, end)))
  return [...pieces, page.end()].join('')
}

describe('a page that rests', () => {
  const whole = inPieces(PAGE, [])

  test('runs no script but the one that wakes it, which knows the others', () => {
    for (const name of ['zero', 'one', 'two']) expect(whole).not.toContain(`="/${name}.js"`)
    expect(whole).not.toContain('<link rel="preload"')
    expect(whole).toContain('data-scripts="/zero.js /one.js /two.js"')
    expect(whole.indexOf('data-scripts')).toBeLessThan(whole.indexOf('</head>'))
  })

  test('holds as plain text what its scripts are told, and that alone', () => {
    expect(whole.match(/<script type="text\/plain" data-rest nonce="abc==">/g)).toHaveLength(2)
    expect(whole).toContain('<script nonce="abc==">other()</script>')
    expect(whole).toContain('<p>1 < 2</p>')
  })

  test('is the same in whatever pieces it comes', () => {
    const cuts = fc.array(fc.nat(PAGE.length), { maxLength: 12 })
    fc.assert(fc.property(cuts, (where) => void expect(inPieces(PAGE, where)).toBe(whole)))
  })

  test('without scripts passes as it is, also where its head never ends', () => {
    for (const text of ['<html><head><title>x</title></head><body></body></html>', '<html><head>']) {
      expect(inPieces(text, [7])).toBe(text)
    }
  })
})
