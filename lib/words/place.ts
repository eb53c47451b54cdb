/** What an address says beside the scenarios: every key once. It is read leniently, and defaults are not written. */

import { plainDecimal } from '../scenario/values'

export const THEMES = ['paper', 'night'] as const
export type Theme = (typeof THEMES)[number]

/** Null wherever what would hold anyway holds. */
export interface Place {
  /** Which scenario is in focus, from 0. */
  readonly focus: number
  /** Null: as the reader's system has it. */
  readonly theme: Theme | null
  /** The view below the long one, what it shows, against what, and whether compared with the scenario in focus. */
  readonly view: string | null
  readonly show: string | null
  readonly by: string | null
  readonly compare: string | null
  /** Redshift of the galaxy that the view of horizons follows. */
  readonly galaxy: number | null
  /** Time of the long view: linear where null. */
  readonly time: 'log' | null
  /** Range of the long view, Gyr from now. */
  readonly from: number | null
  readonly to: number | null
  /** Range of the view below it, in the unit of its horizontal axis. */
  readonly left: number | null
  readonly right: number | null
  /** The ruler, as typed: its variable, its one or two epochs, what is read, a length, a line, an area, units with h. */
  readonly epoch: string | null
  readonly at: string | null
  readonly until: string | null
  readonly read: string | null
  readonly length: string | null
  readonly line: string | null
  readonly sky: string | null
  readonly units: 'h' | null
}

interface Key<K extends keyof Place = keyof Place> {
  readonly key: K
  /** `count` is that of the scenarios. */
  read(text: string, count: number): Place[K]
  /** Null where the default holds. */
  write(value: Place[K]): string | null
}

/** Farther away no galaxy is followed. */
export const FARTHEST_GALAXY = 1e4
/** The ends of ranges lie within this of zero. */
export const FARTHEST_END = 1e6

const KEYS = [
  key('focus', focused, (focus) => (focus > 0 ? String(focus + 1) : null)),
  key('theme', (text) => THEMES.find((one) => one === text) ?? null),
  key('view', token),
  key('show', token),
  key('by', token),
  key('compare', token),
  key('galaxy', (text) => within(text, 0, FARTHEST_GALAXY) || null),
  key('time', (text) => (text === 'log' ? text : null)),
  key('from', end),
  key('to', end),
  key('left', end),
  key('right', end),
  key('epoch', token),
  key('at', typed),
  key('until', typed),
  key('read', (text) => (/^[a-zA-Z,]{1,600}$/.test(text) ? text : null)),
  key('length', typed),
  key('line', typed),
  key('sky', typed),
  key('units', (text) => (text === 'h' ? text : null)),
] as const

/** In the order in which they are written. */
export const PLACE_KEYS: readonly (keyof Place)[] = KEYS.map(({ key }) => key)

/** What only the ruler hangs on. */
export const RULER_KEYS = ['epoch', 'at', 'until', 'read', 'length', 'line', 'sky', 'units'] as const
export type RulerPlace = Pick<Place, (typeof RULER_KEYS)[number]>

/** A page without other keys, in a theme that was chosen. */
export const themed = (path: string, theme: Theme | null | undefined): string =>
  theme ? `${path}?theme=${theme}` : path

/** Reads a place leniently: whatever is not understood is what would hold anyway. `focus` counts from 1 in addresses. */
export function readPlace(textOf: (key: string) => string | null | undefined, count: number): Place {
  const entries = (KEYS as readonly Key[]).map(({ key, read }) => [key, read(textOf(key) ?? '', count)])
  return ascending(Object.fromEntries(entries) as unknown as Place)
}

/** A range may be given from either end. */
function ascending(place: Place): Place {
  const [from, to] = inOrder(place.from, place.to)
  const [left, right] = inOrder(place.left, place.right)
  return { ...place, from, to, left, right }
}

function inOrder(one: number | null, other: number | null): readonly [number | null, number | null] {
  return one !== null && other !== null && one > other ? [other, one] : [one, other]
}

/** Where nothing but the scenarios is said. */
export const PLAIN_PLACE: Place = readPlace(() => null, 1)

/** The keys of a place with their values, without those that say what would hold anyway. */
export function placePairs(place: Place): (readonly [key: string, value: string])[] {
  return (KEYS as readonly Key[]).flatMap(({ key, write }) => {
    const text = write(place[key])
    return text === null ? [] : [[key, text] as const]
  })
}

/** The same, ready for an address. */
export function placeKeys(place: Place): string[] {
  return placePairs(place).map(([key, value]) => `${key}=${encodeURIComponent(value).replaceAll('%2C', ',')}`)
}

function key<K extends keyof Place>(key: K, read: Key<K>['read'], write: Key<K>['write'] = plain): Key<K> {
  return { key, read, write }
}

function plain(value: string | number | null): string | null {
  return value === null ? null : String(value)
}

function focused(text: string, count: number): number {
  const focus = /^[1-6]$/.test(text) ? Number(text) - 1 : 0
  return focus < count ? focus : 0
}

/** A word whose meaning is that of the figures. */
function token(text: string): string | null {
  return /^[a-z]{1,20}$/.test(text) ? text : null
}

/** Whatever a person typed: it is judged where it is used. */
function typed(text: string): string | null {
  const kept = text.replace(/[\p{C}\p{Zl}\p{Zp}]/gu, '').trim()
  return kept === '' ? null : [...kept].slice(0, 40).join('')
}

function end(text: string): number | null {
  return within(text, -FARTHEST_END, FARTHEST_END)
}

function within(text: string, least: number, most: number): number | null {
  const value = plainDecimal(text)
  return value !== null && value >= least && value <= most ? value : null
}
