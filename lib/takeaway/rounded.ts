/** Numbers rounded to what is known of them. */
import { fixed, significant } from '../words/number'

export interface Rounded {
  readonly value: number
  /** Digits after the point. */
  readonly decimals: number
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
  const decimals = Math.max(0, -place)
  const unit = 10 ** place
  return {
    value: place > 0 ? Math.round(value / unit) * unit : Number(value.toFixed(Math.min(100, decimals))),
    decimals,
  }
}

/** As people read it. */
export function textOf({ value, decimals }: Rounded): string {
  if (value !== 0 && (Math.abs(value) < 1e-3 || Math.abs(value) >= 1e6)) {
    return significant(value, Math.max(1, Math.floor(Math.log10(Math.abs(value))) + decimals + 1))
  }
  return fixed(value, decimals)
}
