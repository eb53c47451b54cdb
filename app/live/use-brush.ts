/** A drag across a plot that selects a part of it. A finger does not: it reads. */
import { type MouseEvent, type PointerEvent, useRef, useState } from 'react'

/** Shorter drags are clicks. Pixels. */
const LEAST = 8

interface Area {
  readonly left: number
  readonly width: number
}

export interface Brush {
  /** What is selected so far, in pixels of the plot. */
  readonly span: { readonly left: number; readonly width: number } | null
  /** True in the middle of a drag, in which the pointer belongs to the plot wherever it is. */
  readonly isDragging: () => boolean
  readonly handlers: {
    onPointerDown(event: PointerEvent<HTMLElement>): void
    onPointerMove(event: PointerEvent<HTMLElement>): void
    onPointerUp(event: PointerEvent<HTMLElement>): void
    onPointerCancel(): void
    onClickCapture(event: MouseEvent): void
  }
}

/** `select` is told the two parts of the plot between which the drag went. */
export function useBrush(area: Area | null, select: (one: number, other: number) => void): Brush {
  const start = useRef<number | null>(null)
  const dragged = useRef(false)
  const [span, setSpan] = useState<Brush['span']>(null)
  const across = (event: PointerEvent<HTMLElement>) => {
    const left = event.currentTarget.getBoundingClientRect().left + (area?.left ?? 0)
    return Math.max(0, Math.min(area?.width ?? 0, event.clientX - left))
  }
  const stop = () => {
    start.current = null
    setSpan(null)
  }
  return {
    span,
    isDragging: () => start.current !== null && dragged.current,
    handlers: {
      onPointerDown: (event) => {
        dragged.current = false
        if (area && event.button === 0 && event.pointerType !== 'touch') start.current = across(event)
      },
      onPointerMove: (event) => {
        if (start.current === null) return
        const to = across(event)
        if (!dragged.current && Math.abs(to - start.current) < LEAST) return
        if (!dragged.current) {
          dragged.current = true
          event.currentTarget.setPointerCapture(event.pointerId)
        }
        setSpan({ left: Math.min(start.current, to), width: Math.abs(to - start.current) })
      },
      onPointerUp: (event) => {
        const [from, to] = [start.current, across(event)]
        stop()
        if (from !== null && area && dragged.current && Math.abs(to - from) >= LEAST) {
          select(from / area.width, to / area.width)
        }
      },
      onPointerCancel: stop,
      // The click at the end of a drag is none.
      onClickCapture: (event) => {
        if (dragged.current) event.stopPropagation()
        dragged.current = false
      },
    },
  }
}
