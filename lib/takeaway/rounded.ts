/** Numbers rounded to what is known of them. */
import { fixed, significant } from '../words/number'

export interface Rounded {
  readonly value: number
  /** Digits after the point. */
  readonly decimals: number
  /** Significant digits. */
  readonly digits: number
}

/** Digits of a sentence, which nobody wants to be long. */
const MOST_DIGITS = 5

/**
 * The last digit that is kept is worth more than the doubt, and at least one digit is kept. `finest` is the least that the
 * last digit may be worth.
 */
export function roundedBy(value: number, doubt: number, finest: number, most = MOST_DIGITS): Rounded {
  const size = value === 0 ? 0 : Math.floor(Math.log10(Math.abs(value)))
  const wanted = Math.max(Math.ceil(Math.log10(Math.max(doubt, finest)) - 1e-9), size - most + 1)
  const place = value === 0 ? Math.ceil(Math.log10(finest)) : Math.min(size, wanted)
  const decimals = Math.min(100, Math.max(0, -place))
  const kept = Number(value.toPrecision(Math.max(1, size - place + 1)))
  const grown = kept === 0 ? size : Math.floor(Math.log10(Math.abs(kept)))
  return { value: kept, decimals, digits: Math.max(1, grown - place + 1) }
}

/** As people read it. */
export function textOf({ value, decimals, digits }: Rounded): string {
  return isPlain(value) ? fixed(value, decimals) : significant(value, digits)
}

/** Without a power of ten. */
export const isPlain = (value: number): boolean => value === 0 || (Math.abs(value) >= 1e-3 && Math.abs(value) < 1e6)
