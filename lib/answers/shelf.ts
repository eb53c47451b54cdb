/** What of the page is the same for every address: what the ruler can read, and published parameter sets. */
import { EPOCH_VARIABLES } from '../ruler/epochs'
import { READING_GROUPS } from '../ruler/groups'
import { readingNamed } from '../ruler/readings'
import { PUBLISHED_SETS, type PublishedSet, type PublishedValue } from '../scenario/presets'

export interface Shelf {
  readonly epochs: readonly { readonly key: string; readonly label: string; readonly unit: string }[]
  readonly readings: readonly {
    readonly title: string
    readonly choices: readonly { readonly key: string; readonly label: string }[]
  }[]
  readonly sets: readonly ShelvedSet[]
}

export interface ShelvedSet {
  readonly key: string
  readonly title: string
  /** The code without a name, by which a scenario is known to be as published; null for a single parameter. */
  readonly plain: string | null
  /** In the markup of labels. */
  readonly values: string
  readonly cited: string
  /** Whether H₀ can be retuned to what it says of the acoustic angle and the age. */
  readonly retunes: boolean
}

/** Of the sets with an acoustic angle and an age, those that most comparisons take. */
const RETUNED_TO: readonly string[] = ['planck2018_TTTEEE_lowE_lensing', 'planck2018_TTTEEE_lowE_lensing_BAO']

export const SHELF: Shelf = {
  epochs: EPOCH_VARIABLES.map(({ key, label, unit }) => ({ key, label, unit })),
  readings: READING_GROUPS.map(({ title, keys }) => ({
    title,
    choices: keys.map((key) => ({ key, label: readingNamed(key)?.label ?? key })),
  })),
  sets: PUBLISHED_SETS.map(shelved),
}

/** `w_a −0.62 (+0.22 −0.19)`. */
function valueText({ symbol, value, error }: PublishedValue): string {
  return `${symbol} ${value} ${error.startsWith('+') ? `(${error})` : error}`.trim()
}

function shelved({ key, title, code, values, citation, confidence, note, kept }: PublishedSet): ShelvedSet {
  const hasErrors = values.some(({ error }) => error !== '')
  const what = confidence === 'best fit' ? '; best fit' : hasErrors ? `; errors ${confidence}` : ''
  return {
    key,
    title,
    plain: code?.replace(/,as:.*$/, '') ?? null,
    values: values.map(valueText).join(', '),
    cited: `${citation}${what}. ${note}`,
    retunes: kept !== null && RETUNED_TO.includes(key),
  }
}
