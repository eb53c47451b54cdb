/** What a parameter of the scenario itself may be, beside those of the families. */
import type { ChoiceParameter, ListParameter, NumberParameter } from '../parameter'

/** Where the form puts a parameter. */
export type Group = 'expansion rate' | 'densities' | 'radiation and neutrinos' | 'dark energy' | 'name'

/** `fallback` null: an absent key has no number of its own (what it then is follows from the others). */
interface OwnNumber extends Omit<NumberParameter, 'fallback'> {
  readonly fallback: number | null
}

/** Free text, counted in code points. */
interface TextParameter extends Omit<ChoiceParameter, 'kind' | 'fallback' | 'choices'> {
  readonly kind: 'text'
  readonly least: number
  readonly most: number
}

export type OwnParameter = (OwnNumber | ListParameter | ChoiceParameter | TextParameter) & { readonly group: Group }
