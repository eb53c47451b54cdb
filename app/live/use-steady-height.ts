import { type RefObject, useLayoutEffect, useRef } from 'react'

/**
 * Text that changes with every turn of a slider must not move what stands below it: the element keeps the greatest height
 * it has had, until its width or `kind` changes. Heard from the browser once it has laid out the page, since asking would
 * have it do so for every turn.
 */
export function useSteadyHeight(kind: string): RefObject<HTMLElement | null> {
  const ref = useRef<HTMLElement>(null)
  // biome-ignore lint/correctness/useExhaustiveDependencies: another kind begins anew
  useLayoutEffect(() => {
    const element = ref.current
    if (!element) return
    const most = { width: 0, height: 0 }
    const hold = (width: number, height: number) => {
      if (width !== most.width) {
        Object.assign(most, { width, height: 0 })
        // Its own height, which comes as another report, or is this one.
        if (element.style.minHeight !== '') {
          element.style.minHeight = ''
          return
        }
      }
      if (height <= most.height) return
      most.height = height
      element.style.minHeight = `${height}px`
    }
    element.style.minHeight = ''
    const observer = new ResizeObserver(([entry]) => {
      const [size] = entry?.borderBoxSize ?? []
      if (size) hold(size.inlineSize, size.blockSize)
    })
    observer.observe(element)
    return () => observer.disconnect()
  }, [kind])
  return ref
}
