import { type ReactNode, useEffect, useRef, useState } from 'react'

interface Props<T> {
  readonly of: T
  /** In the middle of a gesture. */
  readonly moving: boolean
  readonly className?: string
  /** Told whether it is in sight. */
  readonly told?: (seen: boolean) => void
  readonly children: (shown: T) => ReactNode
}

/** In the middle of a gesture only what is in sight follows; the rest is drawn when the gesture is over, or scrolled to. */
export function InSight<T>({ of, moving, className, told, children }: Props<T>) {
  const ref = useRef<HTMLDivElement>(null)
  const [seen, see] = useState(true)
  const [last, keep] = useState(of)
  useEffect(() => {
    if (!ref.current) return
    const observer = new IntersectionObserver((entries) => {
      const isSeen = entries.at(-1)?.isIntersecting ?? true
      see(isSeen)
      told?.(isSeen)
    })
    observer.observe(ref.current)
    return () => observer.disconnect()
  }, [told])
  const follows = seen || !moving
  if (follows && last !== of) keep(of)
  return (
    <div ref={ref} className={className}>
      {children(follows ? of : last)}
    </div>
  )
}
