/** What of the page is the same for every address: what the ruler can read. */
import { EPOCH_VARIABLES } from '../ruler/epochs'
import { READING_GROUPS } from '../ruler/groups'
import { readingNamed } from '../ruler/readings'

export interface Shelf {
  readonly epochs: readonly { readonly key: string; readonly label: string; readonly unit: string }[]
  readonly readings: readonly {
    readonly title: string
    readonly choices: readonly { readonly key: string; readonly label: string }[]
  }[]
}

export const SHELF: Shelf = {
  epochs: EPOCH_VARIABLES.map(({ key, label, unit }) => ({ key, label, unit })),
  readings: READING_GROUPS.map(({ title, keys }) => ({
    title,
    choices: keys.map((key) => ({ key, label: readingNamed(key)?.label ?? key })),
  })),
}
