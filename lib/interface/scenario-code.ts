/** The scenario code, told from the lists of its keys. */
import { FAMILIES } from '../dark-energy'
import type { Parameter } from '../parameter'
import { OWN_PARAMETERS } from '../scenario/parameters'
import { allowedChoice, allowedList, allowedNumber } from '../scenario/values'

type Told = Parameter | (typeof OWN_PARAMETERS)[number]

export interface KeyTold {
  readonly key: string
  readonly label: string
  readonly meaning: string
  readonly allowed: string
  /** Text of the default; empty where there is none. */
  readonly fallback: string
}

export const CODE_KEYS: readonly KeyTold[] = toldOf(OWN_PARAMETERS)

export const FAMILY_KEYS = FAMILIES.map(({ key, label, formula, source, parameters }) => ({
  key,
  label,
  formula,
  source,
  keys: toldOf(parameters),
}))

/** Each key once, though a family may have it with other limits for other values of another key. */
function toldOf(parameters: readonly Told[]): readonly KeyTold[] {
  const keys = [...new Set(parameters.map(({ key }) => key))]
  return keys.map((key) => {
    const same = parameters.filter((one) => one.key === key)
    const { label, meaning } = same[0] as Told
    const allowed = same.map((one) => `${allowedOf(one)}${whereOf(one)}`).join('; ')
    return { key, label, meaning, allowed, fallback: fallbackOf(same[0] as Told) }
  })
}

function whereOf(one: Told): string {
  return 'only' in one && one.only ? `, where ${one.only.key} is ${one.only.values.join(' or ')}` : ''
}

function allowedOf(one: Told): string {
  if (one.kind === 'number') return allowedNumber(one)
  if (one.kind === 'list') return allowedList(one)
  return one.kind === 'choice' ? allowedChoice(one) : `${one.least} to ${one.most} characters`
}

function fallbackOf(one: Told): string {
  if (one.kind === 'text' || one.fallback === null) return ''
  return Array.isArray(one.fallback) ? one.fallback.join('_') : String(one.fallback)
}

/** In CommonMark, as documents of interfaces take it. */
export function codeDescription(): string {
  const line = ({ key, meaning, allowed, fallback }: KeyTold) =>
    `- \`${key}\`: ${meaning} Allowed: ${allowed}.${fallback === '' ? '' : ` Default: ${fallback}.`}`
  return [
    'A scenario code: `key:value` pairs joined by commas, in any order; `as` comes last and takes the whole rest.',
    ...CODE_KEYS.map(line),
    'Laws of dark energy (`eos`) and their keys:',
    ...FAMILY_KEYS.map(
      ({ key, formula, keys }) => `- \`${key}\`: ${formula}${keys.map((one) => `\n  ${line(one)}`).join('')}`,
    ),
  ].join('\n')
}
