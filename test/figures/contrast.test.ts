/** Colours against the ground of each theme: WCAG 2.2, 1.4.3 (text, 4.5:1) and 1.4.11 (lines and edges, 3:1). */
import { readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { describe, expect, it } from 'vitest'

const css = readFileSync(fileURLToPath(new URL('../../app/styles/theme.css', import.meta.url)), 'utf8')
const colours = new Map(
  [...css.matchAll(/--([\w-]+): light-dark\((#\w{6}), (#\w{6})\)/g)].map(([, name, paper, night]) => [
    name,
    { paper, night },
  ]),
)

/** WCAG 2.2, definition of relative luminance. */
function luminance(hex: string): number {
  const [r, g, b] = [1, 3, 5]
    .map((at) => Number.parseInt(hex.slice(at, at + 2), 16) / 255)
    .map((c) => (c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4)) as [number, number, number]
  return 0.2126 * r + 0.7152 * g + 0.0722 * b
}

function contrast(one: string, other: string): number {
  const [high, low] = [luminance(one), luminance(other)].sort((x, y) => y - x) as [number, number]
  return (high + 0.05) / (low + 0.05)
}

describe.each(['paper', 'night'] as const)('%s', (theme) => {
  const colour = (name: string) => colours.get(name)?.[theme] ?? ''

  it.each(['ink', 'soft', 'hue-0', 'hue-1', 'hue-2', 'hue-3', 'hue-4', 'hue-5'])('%s can be read as text', (name) => {
    for (const ground of ['ground', 'tint', 'field']) {
      expect(contrast(colour(name), colour(ground)), ground).toBeGreaterThanOrEqual(4.5)
    }
  })

  it('edges of fields and axes can be seen', () => {
    expect(contrast(colour('edge'), colour('ground'))).toBeGreaterThanOrEqual(3)
    expect(contrast(colour('edge'), colour('field'))).toBeGreaterThanOrEqual(3)
  })

  it.each([
    ['on-ribbon', 'matter'],
    ['on-ribbon', 'curvature'],
    ['on-dark-energy', 'dark-energy'],
    ['ground', 'radiation'],
    ['ink', 'alarm'],
  ])('%s can be read on %s', (text, ground) => {
    expect(contrast(colour(text), colour(ground))).toBeGreaterThanOrEqual(4.5)
  })
})
