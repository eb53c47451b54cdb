import dynamic from 'next/dynamic'
import { type KeyboardEvent, type RefObject, useLayoutEffect, useRef, useState } from 'react'
import type { LongView } from '../../lib/figures/long-view'
import type { Plot } from '../../lib/figures/plot'
import { go } from '../live/address'
import { readingText, timeText } from './reading-text'
import { Readout } from './readout'

/** The chart library comes with the first pointer or focus. */
const CursorChart = dynamic(() => import('./cursor-chart').then((one) => one.CursorChart), { ssr: false })

interface Size {
  readonly width: number
  readonly height: number
}

interface Props {
  readonly view: LongView
  readonly plot: Plot
  /** Of the drawing, in its own units. */
  readonly size: Size
  readonly links: readonly string[]
  /** The curve that stands out. */
  readonly lit: number | null
  readonly light: (slot: number | null) => void
}

/** Lies over the plot and its ribbons; reads all curves at one time, by mouse, finger or keys. */
export function Cursor({ view, plot, size, links, lit, light }: Props) {
  const { readings, curves } = view
  const ref = useRef<HTMLDivElement>(null)
  const scale = useScale(ref, size)
  const [woken, wake] = useState(false)
  const [index, setIndex] = useState<number | null>(null)
  const [byKeys, setByKeys] = useState(false)
  const now = readings.times.indexOf(0)
  const last = readings.times.length - 1
  const at = index === null ? null : Math.min(index, last)
  const choose = (slot: number) => go(links[slot] ?? '')
  const leave = () => {
    setIndex(null)
    setByKeys(false)
    light(null)
    // A chart that nobody looks at would be drawn again with every turn of a slider.
    wake(false)
  }
  const press = (event: KeyboardEvent) => {
    const moved = keyed(event.key, at ?? now, last)
    const next = litBy(event.key, lit, curves.length)
    if (event.key === 'Escape') leave()
    else if (event.key === 'Enter' && lit !== null) choose(lit)
    else if (moved !== null) setIndex(moved)
    else if (next !== undefined) light(next)
    else return
    event.preventDefault()
    wake(event.key !== 'Escape')
    setByKeys(event.key !== 'Escape')
  }
  const area = scale && areaOf(plot, size, scale)
  return (
    <div
      ref={ref}
      className="cursor"
      role="slider"
      tabIndex={0}
      aria-label="Time at the cursor"
      aria-valuemin={0}
      aria-valuemax={last}
      aria-valuenow={at ?? now}
      aria-valuetext={timeText(readings.times[at ?? now] ?? 0)}
      onKeyDown={press}
      onFocus={() => wake(true)}
      onBlur={leave}
      onPointerEnter={() => wake(true)}
      onPointerDown={() => wake(true)}
    >
      {woken && area && (
        <div className="cursor-area" style={area}>
          <CursorChart
            view={view}
            width={area.width}
            height={area.height}
            plotHeight={scale.by * (plot.bottom - plot.top)}
            index={at}
            move={(to) => {
              setIndex(to)
              setByKeys(false)
            }}
            leave={leave}
            light={light}
            choose={choose}
          />
          {at !== null && <Readout view={view} index={at} lit={lit} width={area.width} />}
        </div>
      )}
      <p className="spoken" role="status">
        {byKeys && readingText(view, at ?? now, lit)}
      </p>
    </div>
  )
}

const LEAPS: Readonly<Record<string, number>> = { ArrowLeft: -1, ArrowRight: 1, PageDown: -20, PageUp: 20 }

function keyed(key: string, from: number, last: number): number | null {
  if (key === 'Home') return 0
  if (key === 'End') return last
  const leap = LEAPS[key]
  return leap === undefined ? null : Math.max(0, Math.min(last, from + leap))
}

/** Up and down go from curve to curve; undefined for other keys. */
function litBy(key: string, lit: number | null, count: number): number | undefined {
  if (key === 'ArrowDown') return lit === null ? 0 : (lit + 1) % count
  if (key === 'ArrowUp') return lit === null ? count - 1 : (lit + count - 1) % count
  return undefined
}

interface Scale {
  /** Pixels of the screen for one of the drawing. */
  readonly by: number
  readonly left: number
  readonly top: number
}

/** How the drawing lies in its box: as large as fits, in the middle. */
function useScale(ref: RefObject<HTMLDivElement | null>, { width, height }: Size): Scale | null {
  const [scale, setScale] = useState<Scale | null>(null)
  useLayoutEffect(() => {
    const element = ref.current
    if (!element) return
    const measure = () => {
      const box = element.getBoundingClientRect()
      const by = Math.min(box.width / width, box.height / height)
      setScale({ by, left: (box.width - by * width) / 2, top: (box.height - by * height) / 2 })
    }
    const observer = new ResizeObserver(measure)
    observer.observe(element)
    return () => observer.disconnect()
  }, [ref, width, height])
  return scale
}

function areaOf(plot: Plot, size: Size, { by, left, top }: Scale) {
  return {
    left: left + by * plot.left,
    top: top + by * plot.top,
    width: by * (plot.right - plot.left),
    height: by * (size.height - plot.top),
  }
}
