/** Values printed in the literature (published.json), and what it means to agree with one. */
import { expect } from 'vitest'
import file from './published.json'

export const { constants: CONSTANTS, entries: PUBLISHED } = file

/** A printed decimal and half a unit in its last place. */
export function printed(text: string): { readonly value: number; readonly half: number } {
  const [, mantissa, exponent = '0'] = /^(-?[\d.]+)(?:e([-+]?\d+))?$/.exec(text) ?? []
  if (mantissa === undefined) throw new Error(`${text} is not a decimal`)
  const decimals = (mantissa.split('.')[1] ?? '').length
  return { value: Number(text), half: 0.5 * 10 ** (Number(exponent) - decimals) }
}

/** Agreement to the printed digits, plus a margin where something else enters (a fit; say which). */
export function expectPrinted(actual: number, text: string, margin = 0): void {
  const { value, half } = printed(text)
  // A hair more, so that a tie in decimals passes in doubles.
  expect(Math.abs(actual - value), `${actual} against ${text}`).toBeLessThanOrEqual((half + margin) * (1 + 1e-9))
}

/** Agreement within a relative tolerance; the caller says why it is that large. */
export function expectRelative(actual: number, expected: number, tolerance: number): void {
  const scale = Math.abs(expected)
  expect(Math.abs(actual - expected), `${actual} against ${expected}`).toBeLessThanOrEqual(tolerance * scale)
}

/** Agreement within an absolute tolerance. */
export function expectNear(actual: number, expected: number, tolerance: number): void {
  expect(Math.abs(actual - expected), `${actual} against ${expected}`).toBeLessThanOrEqual(tolerance)
}
