import { type RefObject, useLayoutEffect, useRef } from 'react'

/**
 * Text that changes with every turn of a slider must not move what stands below it: the element keeps the greatest height
 * it has had, until its width or `kind` changes. Measured when `content` is another.
 */
export function useSteadyHeight(kind: string, content: unknown): RefObject<HTMLElement | null> {
  const ref = useRef<HTMLElement>(null)
  const most = useRef({ kind: '', width: 0, height: 0 })
  // biome-ignore lint/correctness/useExhaustiveDependencies: to measure is to force a layout, so only where there is reason
  useLayoutEffect(() => {
    const element = ref.current
    if (!element) return
    const width = element.offsetWidth
    if (most.current.kind !== kind || most.current.width !== width) {
      most.current = { kind, width, height: 0 }
      element.style.minHeight = ''
    }
    most.current.height = Math.max(most.current.height, element.offsetHeight)
    element.style.minHeight = `${most.current.height}px`
  }, [kind, content])
  return ref
}
