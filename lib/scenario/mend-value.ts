/** The nearest good text of one value, or null where there is no telling what was meant. */
import type { Limits, ListParameter, Parameter } from '../parameter'
import { FORBIDDEN } from './name'
import type { OwnParameter } from './own-parameter'
import { AS } from './parameters'
import { plainDecimal } from './values'

export function nearestText(parameter: Parameter | OwnParameter, text: string): string | null {
  switch (parameter.kind) {
    case 'number':
      return nearestNumber(parameter, text)
    case 'list':
      return nearestList(parameter, text)
    case 'choice':
      return parameter.choices.find((one) => one.value === text.trim().toLowerCase())?.value ?? null
    case 'text':
      return nearestName(text)
  }
}

/** Out of limits: the limit, where the limit itself is allowed. Blanks inside come from plus signs. */
function nearestNumber(limits: Limits, text: string): string | null {
  const plain = text.replace(/\s/g, '').replace(/[−–]/g, '-')
  const value = plainDecimal(plain)
  if (value === null) return null
  if (value > limits.max) return String(limits.max)
  const below = limits.above ? value <= limits.min : value < limits.min
  if (below) return limits.above ? null : String(limits.min)
  return plain
}

function nearestList(parameter: ListParameter, text: string): string | null {
  const items = text.split('_').map((item) => nearestNumber(parameter, item))
  const good = items.filter((item) => item !== null).slice(0, parameter.most)
  return good.length < parameter.least ? null : good.join('_')
}

function nearestName(text: string): string | null {
  const composed = [...text.normalize('NFC')].filter((character) => !FORBIDDEN.test(character))
  return composed.length < AS.least ? null : composed.slice(0, AS.most).join('')
}
