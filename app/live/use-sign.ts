import { useEffect, useState } from 'react'

const SIGNS = [
  'pointermove',
  'pointerdown',
  'pointerup',
  'touchstart',
  'keydown',
  'keyup',
  'focusin',
  'wheel',
  'scroll',
]

/** True from the first sign of a hand on, or the next one where the first has woken the page. */
export function useSign(): boolean {
  const [given, give] = useState(false)
  useEffect(() => {
    if (given) return
    const listening = new AbortController()
    const how = { capture: true, passive: true, signal: listening.signal }
    for (const sign of SIGNS) addEventListener(sign, () => give(true), how)
    return () => listening.abort()
  }, [given])
  return given
}
