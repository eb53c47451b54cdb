import { useEffect, useState } from 'react'

/** True once something has been going on for so many milliseconds. */
export function useLate(going: boolean, after: number): boolean {
  const [late, setLate] = useState(false)
  useEffect(() => {
    if (!going) return
    const timer = setTimeout(() => setLate(true), after)
    return () => {
      clearTimeout(timer)
      setLate(false)
    }
  }, [going, after])
  return going && late
}
