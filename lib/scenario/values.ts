/** Reads the value of one key by what its parameter allows. Strict: what is not plainly right is a fault. */
import type { ChoiceParameter, Limits, ListParameter } from '../parameter'
import { type Fault, fault } from './problems'

const PLAIN_DECIMAL = /^[+-]?(?:\d+(?:\.\d*)?|\.\d+)(?:[eE][+-]?\d+)?$/

export type Value<T> = { readonly value: T } | { readonly fault: Fault }

interface Named {
  readonly key: string
  readonly unit: string
}

/** The nearest double of a plain decimal, −0 as 0, ±Infinity beyond the doubles; null for any other text. */
export function plainDecimal(text: string): number | null {
  return PLAIN_DECIMAL.test(text) ? Number(text) + 0 : null
}

export function within(value: number, limits: Limits): boolean {
  return value <= limits.max && (limits.above ? value > limits.min : value >= limits.min)
}

/** What may stand after the key, in words. */
export function allowedNumber(parameter: Limits & Named): string {
  const unit = parameter.unit && ` ${parameter.unit}`
  const range = parameter.above
    ? `above ${parameter.min} and up to ${parameter.max}`
    : `from ${parameter.min} to ${parameter.max}`
  return `a number ${range}${unit}`
}

export function allowedList(parameter: ListParameter): string {
  const { least, most } = parameter
  const count = least === most ? `${most}` : `${least} to ${most}`
  const order = parameter.ascending ? ', ascending' : ''
  return `${count} numbers joined by _${order}, each ${allowedNumber(parameter)}`
}

export const allowedChoice = (parameter: ChoiceParameter): string =>
  `one of ${parameter.choices.map((one) => one.value).join(', ')}`

export function readNumber(parameter: Limits & Named, text: string): Value<number> {
  const message = numberComplaint(parameter, text)
  if (message !== null) return { fault: fault(parameter.key, text, allowedNumber(parameter), message) }
  return { value: plainDecimal(text) as number }
}

function numberComplaint(parameter: Limits & Named, text: string): string | null {
  const value = plainDecimal(text)
  if (text === '') return `${parameter.key} has no value.`
  if (value === null) return `${parameter.key} is not a plain decimal number.${plusHint(text)}`
  return within(value, parameter) ? null : `${parameter.key} is outside its limits.`
}

/** In an address a bare plus sign means a blank. */
const plusHint = (text: string): string =>
  /^\s\d|[eE]\s\d/.test(text) ? ' In an address a plus sign is written %2B, or left out.' : ''

export function readList(parameter: ListParameter, text: string): Value<readonly number[]> {
  const refuse = (message: string) => ({ fault: fault(parameter.key, text, allowedList(parameter), message) })
  const items = text.split('_')
  if (text === '') return refuse(`${parameter.key} has no value.`)
  if (items.length < parameter.least || items.length > parameter.most) {
    return refuse(`${parameter.key} has ${items.length === 1 ? 'one number' : `${items.length} numbers`}.`)
  }
  const message = items.map((item) => numberComplaint(parameter, item)).find((one) => one !== null)
  if (message !== undefined) return refuse(message)
  const values = items.map((item) => plainDecimal(item) as number)
  return parameter.ascending && !ascends(values) ? refuse(`${parameter.key} must ascend.`) : { value: values }
}

const ascends = (values: readonly number[]): boolean => values.every((x, i) => i === 0 || x > values[i - 1])

export function readChoice(parameter: ChoiceParameter, text: string): Value<string> {
  if (parameter.choices.some((one) => one.value === text)) return { value: text }
  const message = text === '' ? `${parameter.key} has no value.` : `${parameter.key} does not know this word.`
  return { fault: fault(parameter.key, text, allowedChoice(parameter), message) }
}
