import dynamic from 'next/dynamic'
import { type KeyboardEvent, type RefObject, useId, useLayoutEffect, useRef, useState } from 'react'
import type { Picture, Shown } from '../../lib/figures/picture'
import { fractionOf } from '../../lib/figures/scale'
import { aside, between, closer, type Ends, ranged, wider } from '../../lib/figures/zoom'
import { go } from '../live/address'
import { useBrush } from '../live/use-brush'
import { placeText, rangeText, readingText } from './reading-text'
import { Readout } from './readout'

/** The chart library comes with the first pointer or focus. */
const CursorChart = dynamic(() => import('./cursor-chart').then((one) => one.CursorChart), { ssr: false })

interface Props {
  readonly figure: Shown
  readonly picture: Picture
  readonly label: string
  /** A link in which the ends of a range are missing, and one that leads back to the whole. */
  readonly template: string
  readonly reset: string | null
  /** For each curve where a click leads; null where it leads nowhere. */
  readonly links: readonly string[] | null
  /** The curve that stands out. */
  readonly lit: number | null
  readonly light: (curve: number | null) => void
}

/** Lies over the plot and what hangs below it; reads all curves at one place, by mouse, finger or keys, and zooms. */
export function Cursor({ figure, picture, label, template, reset, links, lit, light }: Props) {
  const { x, now, readings, curves } = figure
  const ref = useRef<HTMLDivElement>(null)
  const keys = useId()
  const scale = useScale(ref, picture)
  const [woken, wake] = useState(false)
  const [index, setIndex] = useState<number | null>(null)
  const [speaks, speak] = useState(false)
  const last = readings.places.length - 1
  const home = homeOf(figure)
  const at = index === null ? null : Math.min(index, last)
  const part = fractionOf(x, readings.places[at ?? home] ?? now ?? x.from)
  const area = scale && areaOf(picture, scale)
  const zoom = (ends: Ends) => go(ranged(template, ends))
  const brush = useBrush(area, (one, other) => zoom(between(x, one, other)))
  const choose = links && ((curve: number) => go(links[curve] ?? ''))
  const leave = () => {
    setIndex(null)
    speak(false)
    light(null)
    // A chart that nobody looks at would be drawn again with every turn of a slider.
    wake(false)
  }
  const press = (event: KeyboardEvent) => {
    const steps = zoomed(event, part, figure, reset)
    const moved = event.shiftKey ? null : keyed(event.key, at ?? home, last)
    const next = litBy(event.key, lit, curves.length)
    if (event.key === 'Escape') leave()
    else if (event.key === 'Enter' && lit !== null && choose) choose(lit)
    else if (steps !== null) typeof steps === 'string' ? go(steps) : zoom(steps)
    else if (moved !== null) setIndex(moved)
    else if (next !== undefined) light(next)
    else return
    event.preventDefault()
    wake(event.key !== 'Escape')
    speak(event.key !== 'Escape' && steps === null)
  }
  return (
    <>
      <div
        ref={ref}
        className="cursor"
        role="slider"
        tabIndex={0}
        aria-label={label}
        aria-valuemin={0}
        aria-valuemax={last}
        aria-valuenow={at ?? home}
        aria-valuetext={placeText(x, readings.places[at ?? home] ?? 0)}
        aria-describedby={keys}
        aria-keyshortcuts="ArrowLeft ArrowRight ArrowUp ArrowDown Home End PageUp PageDown Enter Escape + - 0 Shift+ArrowLeft Shift+ArrowRight"
        onKeyDown={press}
        onFocus={() => wake(true)}
        onBlur={leave}
        onPointerEnter={() => wake(true)}
        {...brush.handlers}
        onPointerMove={(event) => {
          // It may have left the plot for what stands beside it, and be back.
          wake(true)
          brush.handlers.onPointerMove(event)
        }}
        onPointerDown={(event) => {
          wake(true)
          brush.handlers.onPointerDown(event)
        }}
      >
        {woken && area && (
          <div className="cursor-area" style={area}>
            <CursorChart
              figure={figure}
              width={area.width}
              height={area.height}
              plotHeight={scale.by * (picture.plot.bottom - picture.plot.top)}
              index={at}
              move={(to) => {
                setIndex(to)
                speak(false)
              }}
              leave={() => brush.isDragging() || leave()}
              light={light}
              choose={choose}
            />
            {brush.span && <div className="brush" style={brush.span} />}
            {at !== null && !brush.span && <Readout figure={figure} index={at} lit={lit} width={area.width} />}
          </div>
        )}
      </div>
      <p className="spoken" role="status">
        {speaks && readingText(figure, at ?? home, lit)}
      </p>
      <p className="spoken" role="status">
        {reset && rangeText(x)}
      </p>
      <p className="keys" id={keys}>
        ← → read; ↑ ↓ choose a curve; + − 0 zoom
      </p>
    </>
  )
}

/** Where the cursor begins: today, or the middle. */
function homeOf({ now, readings: { places } }: Shown): number {
  const today = now === null ? -1 : places.indexOf(now)
  return today >= 0 ? today : places.length >> 1
}

const LEAPS: Readonly<Record<string, number>> = { ArrowLeft: -1, ArrowRight: 1, PageDown: -20, PageUp: 20 }

function keyed(key: string, from: number, last: number): number | null {
  if (key === 'Home') return 0
  if (key === 'End') return last
  const leap = LEAPS[key]
  return leap === undefined ? null : Math.max(0, Math.min(last, from + leap))
}

/** The range that a key leads to, or the link of the whole; null for other keys. */
function zoomed({ key, shiftKey }: KeyboardEvent, part: number, { x }: Shown, reset: string | null) {
  if (key === '+' || key === '=') return closer(x, part)
  if (key === '-' || key === '_') return wider(x, part)
  if (key === '0') return reset
  if (shiftKey && key === 'ArrowLeft') return aside(x, -1)
  return shiftKey && key === 'ArrowRight' ? aside(x, 1) : null
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
function useScale(ref: RefObject<HTMLDivElement | null>, { width, height }: Picture): Scale | null {
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

function areaOf({ plot, height }: Picture, { by, left, top }: Scale) {
  return {
    left: left + by * plot.left,
    top: top + by * plot.top,
    width: by * (plot.right - plot.left),
    height: by * (height - plot.top),
  }
}
