/** What the values of query keys may be, as zod schemas; their leaves are the readers of the scenario code. */
import { z } from 'zod'
import type { Limits } from '../parameter'
import { COLUMN_KEYS, type Column } from '../quantities/column'
import { columnNamed } from '../quantities/columns'
import { type Fault, fault } from '../scenario/problems'
import { plainDecimal, readNumber } from '../scenario/values'

/** What a reader makes of a text: the value, or all that is wrong with it. */
type Read<T> = (text: string) => { readonly value: T } | { readonly faults: readonly Fault[] }

/** A schema around a reader. zod's own coercion is not used: it takes '' for 0 and 0x1 for 1. */
function field<T>(meaning: string, read: Read<T>) {
  return z
    .string()
    .transform((text, context) => {
      const result = read(text)
      if ('value' in result) return result.value
      for (const one of result.faults) context.addIssue({ code: 'custom', message: one.message, params: one })
      return z.NEVER
    })
    .meta({ description: meaning })
}

export interface Above {
  readonly key: string
  /** A finite bound, or −Infinity. */
  readonly above: number
  readonly unit: string
}

export const allowedNumber = ({ above, unit }: Omit<Above, 'key'>): string =>
  `a plain decimal number${above === Number.NEGATIVE_INFINITY ? '' : ` above ${above}`}${unit && `, in ${unit}`}`

function numberFault(one: Above, text: string, allowed: string): Fault | null {
  const value = plainDecimal(text)
  const complaint =
    text === ''
      ? 'has no value'
      : value === null
        ? 'is not a plain decimal number'
        : !Number.isFinite(value)
          ? 'is larger than any double'
          : value <= one.above
            ? `is not above ${one.above}`
            : null
  const hint = /^\s\d|[eE]\s\d/.test(text) ? ' In an address a plus sign is written %2B, or left out.' : ''
  return complaint === null ? null : fault(one.key, text, allowed, `${one.key} ${complaint}.${hint}`)
}

export const number = (one: Above, meaning: string) =>
  field<number>(meaning, (text) => {
    const found = numberFault(one, text, allowedNumber(one))
    return found ? { faults: [found] } : { value: plainDecimal(text) as number }
  })

/** A number within limits, as those of the scenario code. */
export const limited = (one: Limits & Pick<Above, 'key' | 'unit'>, meaning: string) =>
  field<number>(meaning, (text) => {
    const read = readNumber(one, text)
    return 'fault' in read ? { faults: [read.fault] } : read
  })

const MOST_VALUES = 1000

export const numberList = (one: Above, meaning: string) =>
  field<readonly number[]>(meaning, (text) => {
    const items = text.split(',')
    const allowed = `1 to ${MOST_VALUES} values joined by commas, each ${allowedNumber(one)}`
    if (items.length > MOST_VALUES) {
      return { faults: [fault(one.key, text, allowed, `${one.key} has ${items.length} values.`)] }
    }
    const faults = items.flatMap((item) => numberFault(one, item, allowed) ?? [])
    return faults.length > 0 ? { faults } : { value: items.map((item) => plainDecimal(item) as number) }
  })

export const count = (key: string, least: number, most: number, meaning: string) =>
  field<number>(meaning, (text) => {
    const value = plainDecimal(text)
    if (value !== null && Number.isInteger(value) && value >= least && value <= most) return { value }
    const message =
      text === ''
        ? `${key} has no value.`
        : value === null || !Number.isInteger(value)
          ? `${key} is not a whole number.`
          : `${key} is outside its limits.`
    return { faults: [fault(key, text, `a whole number from ${least} to ${most}`, message)] }
  })

/** One of several records, by its key. */
export const oneOf = <T extends { readonly key: string }>(key: string, choices: readonly T[], meaning: string) =>
  field<T>(meaning, (text) => {
    const value = choices.find((one) => one.key === text)
    if (value) return { value }
    const message = text === '' ? `${key} has no value.` : `${key} does not know this word.`
    return { faults: [fault(key, text, `one of ${choices.map((one) => one.key).join(', ')}`, message)] }
  })

/** Names of columns, each once, joined by commas. */
export const columnList = field<readonly Column[]>(
  'The columns, in the order asked; all where none are asked.',
  (text) => {
    const names = text.split(',')
    const allowed = `some of ${COLUMN_KEYS.join(', ')}, each once, joined by commas`
    const faults = names.flatMap((name, i) => {
      if (!columnNamed(name)) return [fault('columns', name, allowed, 'There is no such column.')]
      return names.indexOf(name) < i ? [fault('columns', name, allowed, `${name} stands more than once.`)] : []
    })
    return faults.length > 0 ? { faults } : { value: names.flatMap((name) => columnNamed(name) ?? []) }
  },
)

/** 1 where every column is to be followed by that of its error bounds. */
export const boundsFlag = oneOf(
  'bounds',
  [{ key: '0' }, { key: '1' }],
  'With 1, each column is followed by one of the absolute bounds on its numerical errors, named with Error at its end.',
)

/** The value of a key by its schema; undefined where the key is absent or at fault. Adds to `faults`. */
export function take<T>(
  values: ReadonlyMap<string, string>,
  key: string,
  schema: z.ZodType<T, string>,
  faults: Fault[],
): T | undefined {
  const text = values.get(key)
  if (text === undefined) return undefined
  const parsed = schema.safeParse(text)
  if (parsed.success) return parsed.data
  for (const issue of parsed.error.issues) if (issue.code === 'custom') faults.push(issue.params as Fault)
  return undefined
}

const LONGEST_SITE = 200

/** The address of a site, without a path or a slash at its end. */
export const site = (key: string, meaning: string) =>
  field<string>(meaning, (text) => {
    if (text.length <= LONGEST_SITE && /^https?:\/\/[a-z0-9.-]+(:\d{1,5})?$/i.test(text)) return { value: text }
    const message = `${key} is not the address of a site.`
    return { faults: [fault(key, text, 'http:// or https://, a host, and perhaps a port', message)] }
  })

/** Any text. */
export const text = (key: string, meaning: string) =>
  field<string>(meaning, (value) =>
    value === '' ? { faults: [fault(key, value, 'a text', `${key} has no value.`)] } : { value },
  )
