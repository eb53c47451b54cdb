import { useEffect, useRef, useState } from 'react'

/** As often as words and numbers that change can be read, in milliseconds. */
export const PAUSE = 200

/** In the middle of a gesture the newest value a few times a second; else the value at once. */
export function useUnhurried<T>(value: T, moving: boolean): T {
  const [shown, show] = useState(value)
  const newest = useRef(value)
  useEffect(() => {
    newest.current = value
  }, [value])
  useEffect(() => {
    if (!moving) return
    const timer = setInterval(() => show(newest.current), PAUSE)
    return () => clearInterval(timer)
  }, [moving])
  if (!moving && shown !== value) show(value)
  return moving ? shown : value
}
