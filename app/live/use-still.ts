import { useState } from 'react'

/** In the middle of a gesture what it was before it. */
export function useStill<T>(value: T, moving: boolean): T {
  const [last, keep] = useState(value)
  if (!moving && last !== value) keep(value)
  return moving ? last : value
}
