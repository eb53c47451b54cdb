/** The rows of the measures: value and unit, or the reason why there is none. */
import { MEASURES } from '../quantities/measures'
import type { Solution } from '../solve'
import { rounded } from './number'

export interface MeasureWords {
  readonly key: string
  readonly symbol: string
  readonly label: string
  readonly meaning: string
  /** Null where there is no value. */
  readonly value: string | null
  readonly unit: string
  readonly because: string | null
}

export function measureWords(measures: Solution['measures']): readonly MeasureWords[] {
  return MEASURES.map(({ key, symbol, label, meaning, digits }) => {
    const { value, unit, because } = measures[key]
    return { key, symbol, label, meaning, unit, because, value: value === null ? null : rounded(value, digits) }
  })
}
