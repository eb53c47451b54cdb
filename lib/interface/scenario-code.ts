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

export const CODE_KEYS: readonly KeyTold[] = OWN_PARAMETERS.map(toldOf)

export const FAMILY_KEYS = FAMILIES.map(({ key, label, formula, source, parameters }) => ({
  key,
  label,
  formula,
  source,
  keys: parameters.map(toldOf),
}))

function toldOf(one: Told): KeyTold {
  const { key, label, meaning } = one
  return { key, label, meaning, allowed: allowedOf(one), fallback: fallbackOf(one) }
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
