/**
 * The address of the page, from which everything else follows. One entry in the browser's history for each change; what
 * one gesture does, as a drag or a held key, is one change.
 */
import { useSyncExternalStore } from 'react'

export interface Address {
  /** The query with its question mark. */
  readonly search: string
  /** True in the middle of a gesture: more is likely to come. */
  readonly moving: boolean
  /** How many changes Back can undo. */
  readonly depth: number
}

/** Milliseconds: a hand that rests for so long is followed by the bar of the browser, which is slow to be told. */
const REST = 350

const listeners = new Set<() => void>()
let current: Address | null = null
/** The gesture that made the present entry. */
let gesture: string | null = null
let timer: ReturnType<typeof setTimeout> | undefined

/** Null on the server, and until the page is alive. */
export function useAddress(): Address | null {
  return useSyncExternalStore(subscribe, addressNow, () => null)
}

/** Tells now and at every change. Returns how to stop it. */
export function watchAddress(listener: (address: Address) => void): () => void {
  const told = () => listener(addressNow())
  told()
  return subscribe(told)
}

/** Opens a link of the page. Calls with the same `by` in a row count as one change. */
export function go(link: string, by: string | null = null): void {
  const { search, depth } = addressNow()
  const next = new URL(link, location.href).search
  if (next === search) return
  const continued = by !== null && by === gesture
  gesture = by
  if (continued) {
    set({ search: next, moving: true, depth })
    clearTimeout(timer)
    timer = setTimeout(flush, REST)
    return
  }
  flush()
  set({ search: next, moving: by !== null, depth: depth + 1 })
  write('pushState')
}

/** The gesture is over. */
export function settle(): void {
  flush()
  if (addressNow().moving) set({ ...addressNow(), moving: false })
}

export function undo(): void {
  history.back()
}

export function addressNow(): Address {
  current ??= { search: location.search, moving: false, depth: Number(history.state?.depth ?? 0) }
  return current
}

function set(address: Address): void {
  current = address
  for (const listener of listeners) listener()
}

function flush(): void {
  if (timer === undefined) return
  clearTimeout(timer)
  timer = undefined
  write('replaceState')
}

function write(how: 'pushState' | 'replaceState'): void {
  const { search, depth } = addressNow()
  try {
    history[how]({ depth }, '', search || location.pathname)
  } catch {
    // Too many for this browser: the next one will take the address along.
  }
}

function subscribe(listener: () => void): () => void {
  if (listeners.size === 0) window.addEventListener('popstate', moved)
  listeners.add(listener)
  return () => {
    listeners.delete(listener)
    if (listeners.size === 0) window.removeEventListener('popstate', moved)
  }
}

/** Back and Forward. */
function moved(): void {
  clearTimeout(timer)
  timer = undefined
  gesture = null
  current = null
  set(addressNow())
}
