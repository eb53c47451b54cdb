import { useEffect, useState } from 'react'

const SIGNS = ['pointermove', 'pointerdown', 'touchstart', 'keydown', 'focusin', 'wheel', 'scroll']

/** True from the first sign of a hand on. */
export function useSign(): boolean {
  const [given, give] = useState(false)
  useEffect(() => {
    if (given) return
    // What woke the page may have been one.
    if (navigator.userActivation?.hasBeenActive) return give(true)
    const listening = new AbortController()
    const how = { capture: true, passive: true, signal: listening.signal }
    for (const sign of SIGNS) addEventListener(sign, () => give(true), how)
    return () => listening.abort()
  }, [given])
  return given
}
