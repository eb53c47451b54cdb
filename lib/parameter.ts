/** What a parameter of a scenario is: one record serves the URL's reader and writer, the form, the method page and the tests. */

interface Described {
  /** Its key in the scenario code. */
  readonly key: string
  /** Symbol in the markup of labels: `_` starts a subscript, e.g. `Ω_m`, `w_0`. */
  readonly symbol: string
  /** In plain trade words, lower case. */
  readonly label: string
  /** Empty for a pure number. */
  readonly unit: string
  /** One sentence. */
  readonly meaning: string
  /** Read only when another key of the same family has one of these values. */
  readonly only?: { readonly key: string; readonly values: readonly string[] }
}

export interface Limits {
  readonly min: number
  readonly max: number
  /** True where the lower limit itself is refused. */
  readonly above?: boolean
}

/** A plain decimal number. `fallback` is what an absent key means. */
export interface NumberParameter extends Described, Limits {
  readonly kind: 'number'
  readonly fallback: number
  /** What a slider offers; typed numbers may go to the limits. */
  readonly slider: { readonly min: number; readonly max: number; readonly step: number }
}

/** Numbers joined by `_`, each within the limits. `fallback` null: the key is required. */
export interface ListParameter extends Described, Limits {
  readonly kind: 'list'
  readonly fallback: readonly number[] | null
  readonly least: number
  readonly most: number
  readonly ascending: boolean
}

/** One word of a few. */
export interface ChoiceParameter extends Described {
  readonly kind: 'choice'
  readonly fallback: string
  readonly choices: readonly { readonly value: string; readonly label: string }[]
}

export type Parameter = NumberParameter | ListParameter | ChoiceParameter
export type ParameterValue = number | readonly number[] | string
export type ParameterValues = Readonly<Record<string, ParameterValue>>
