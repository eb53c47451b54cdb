/** Branches that are left out of the coverage say why. */
import { readdirSync, readFileSync } from 'node:fs'
import { expect, it } from 'vitest'

const LIB = new URL('../lib/', import.meta.url)
const hints = readdirSync(LIB, { recursive: true, encoding: 'utf8' })
  .filter((name) => name.endsWith('.ts'))
  .flatMap((name) => {
    const found = readFileSync(new URL(name, LIB), 'utf8').matchAll(/\/[/*].*?ignore.*/g)
    return [...found]
      .filter(([text]) => /\b(?:[cv]8|istanbul|node:coverage)\s+ignore\b/.test(text))
      .map(([text]) => ({ name, text }))
  })

it('there are some', () => {
  expect(hints.length).toBeGreaterThan(0)
})

it.each(hints)('$name: $text', ({ text }) => {
  expect(text).toMatch(/\/\* v8 ignore (?:if|else|next) -- \S+ \S+.*\*\//)
})
