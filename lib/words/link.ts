/** Addresses of the page: the scenarios, which of them is in focus, and the theme. */
import type { Scenario } from '../scenario/scenario'
import { linkQuery } from '../scenario/write'

export const THEMES = ['paper', 'night'] as const
export type Theme = (typeof THEMES)[number]

/** What an address says beside the scenarios. */
export interface Place {
  readonly focus: number
  /** Null: as the reader's system has it. */
  readonly theme: Theme | null
}

export function pageLink(scenarios: readonly Scenario[], { focus, theme }: Place): string {
  return `/?${[linkQuery(scenarios), ...placeKeys({ focus, theme })].filter((part) => part !== '').join('&')}`
}

/** The keys of a place, without those that say what would hold anyway. */
export function placeKeys({ focus, theme }: Place): string[] {
  return [...(focus > 0 ? [`focus=${focus + 1}`] : []), ...(theme === null ? [] : [`theme=${theme}`])]
}

/** Reads a place leniently: whatever is not understood is what would hold anyway. `focus` counts from 1 in addresses. */
export function readPlace(focus: string | undefined, theme: string | undefined, count: number): Place {
  const place = /^[1-6]$/.test(focus ?? '') ? Number(focus) - 1 : 0
  return { focus: place < count ? place : 0, theme: THEMES.find((one) => one === theme) ?? null }
}
