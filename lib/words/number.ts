/** Numbers as people read them: rounded, with a true minus sign and thin spaces between thousands. */
import type { Quantity } from '../quantities/quantity'

export const MINUS = '−'
/** Narrow no-break space. */
export const THIN = '\u202f'
const SUPERSCRIPTS: Readonly<Record<string, string>> = Object.fromEntries(
  [...'0123456789-'].map((sign, index) => [sign, [...'⁰¹²³⁴⁵⁶⁷⁸⁹⁻'][index]]),
)

/** From here on digits before the point stop helping the eye. */
const LARGE = 1e6
const SMALL = 1e-3

/** `decimals` digits after the point; powers of ten from a million on. */
export function fixed(value: number, decimals: number): string {
  if (Math.abs(value) >= LARGE) return scientific(value, 3)
  return dressed(value.toFixed(decimals))
}

/** `digits` significant digits; powers of ten from a million on and below a thousandth. */
export function significant(value: number, digits: number): string {
  if (value === 0) return '0'
  const rounded = Number(value.toPrecision(digits))
  const size = Math.abs(rounded)
  if (size >= LARGE || size < SMALL) return scientific(value, digits)
  const decimals = digits - 1 - Math.floor(Math.log10(size))
  return dressed(rounded.toFixed(Math.max(0, decimals)))
}

/** A number and its unit, never parted at the end of a line. */
export function withUnit(text: string, unit: string): string {
  return unit === '' ? text : `${text}\u00a0${unit}`
}

/** With a sign even where positive: a time from now. */
export function signed(text: string): string {
  return text.startsWith(MINUS) || /^[0.]+$/.test(text) ? text : `+${text}`
}

/** Numbers as they are typed, within words: with a true minus sign. */
export function typeset(words: string): string {
  return words.replace(/(?<![\p{L}\d])-(?=[\d.])/gu, MINUS)
}

/** A power of ten, or a few of them, to one digit. */
export function powerOfTen(value: number): string {
  return scientific(value, 1).replace(`1${THIN}×${THIN}`, '')
}

function scientific(value: number, digits: number): string {
  const [mantissa, exponent] = value.toExponential(digits - 1).split('e') as [string, string]
  const power = [...exponent.replace('+', '')].map((sign) => SUPERSCRIPTS[sign]).join('')
  return `${dressed(mantissa)}${THIN}×${THIN}10${power}`
}

/** Minus sign and thousands of the text of a number; −0.00 loses its sign. */
function dressed(text: string): string {
  const negative = text.startsWith('-') && /[1-9]/.test(text)
  const [whole, fraction] = text.replace('-', '').split('.') as [string, string?]
  const grouped = whole.length > 4 ? whole.replace(/\B(?=(\d{3})+$)/g, THIN) : whole
  return (negative ? MINUS : '') + grouped + (fraction === undefined ? '' : `.${fraction}`)
}

/** To the digits that a quantity is told with. */
export function rounded(value: number, { kind, count }: Quantity['digits']): string {
  return kind === 'fixed' ? fixed(value, count) : significant(value, count)
}
