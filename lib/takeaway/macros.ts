/** A LaTeX macro for every measure: `\lhAge`, or `\lhAgeB` for the second of several scenarios. */

import { tex } from '../formats/tex'
import { MEASURES } from '../quantities/measures'
import { capital } from '../words/sentence'
import { isPlain, type Rounded } from './rounded'
import type { Edition } from './sources'
import { type Known, rounded } from './told'

const DASH = '--'

export function macrosOf(scenarios: readonly Known[], { version, engine, link }: Edition): string {
  const head = [`% Longhence ${version}, engine ${engine}`, `% ${link}`]
  const blocks = scenarios.map((known, slot) => {
    const suffix = scenarios.length > 1 ? String.fromCharCode(65 + slot) : ''
    return [`% ${known.solution.code}`, ...MEASURES.map((measure) => macro(measure, known, suffix))].join('\n')
  })
  return `${[...head, ...blocks].join('\n')}\n`
}

function macro({ key, label, unit }: (typeof MEASURES)[number], known: Known, suffix: string): string {
  const found = rounded(known, key)
  const { because } = known.solution.measures[key]
  const remark = `${label}${unit && `, ${unit}`}${because === null ? '' : `: ${because}`}`
  return `\\newcommand{\\lh${capital(key)}${suffix}}{${found === null ? DASH : numberTex(found)}} % ${ascii(remark)}`
}

/** Signs and powers in mathematics, in text as well. */
export function numberTex({ value, decimals, digits }: Rounded): string {
  if (!isPlain(value)) {
    const [mantissa, power] = value.toExponential(digits - 1).split('e')
    return `\\ensuremath{${mantissa}\\times10^{${Number(power)}}}`
  }
  const text = value.toFixed(decimals)
  return value < 0 ? `\\ensuremath{${text}}` : text
}

const ascii = (text: string): string => tex(text).replace(/[^\x20-\x7e]/g, '?')
