import { type KeyboardEvent, useLayoutEffect, useRef } from 'react'
import { roundStep } from '../../lib/figures/scale'
import type { Field } from '../../lib/words/fields'
import { settle } from '../live/address'
import { wake } from '../live/here'
import type { Hand } from '../live/use-editing'

/** Steps of a key that still belong to one change, in milliseconds. */
const PAUSE = 1000
/** So many presses of an arrow key lead about from one end to the other. */
const PRESSES = 250

const ARROWS: Readonly<Record<string, number>> = { ArrowRight: 1, ArrowUp: 1, ArrowLeft: -1, ArrowDown: -1 }

interface Props {
  readonly field: Extract<Field, { kind: 'number' }>
  readonly drag: Hand['drag']
}

/** Arrow keys go in steps that can be seen, with Shift in the smallest ones. */
export function Slider({ field, drag }: Props) {
  const { name, label, unit, slider, value } = field
  const { min, max, step } = slider
  const gesture = useGesture(name)
  const move = (to: number) => drag(name, String(onStep(to, slider)), gesture.now())
  const press = (event: KeyboardEvent) => {
    const way = ARROWS[event.key]
    if (way === undefined) return
    event.preventDefault()
    const size = event.shiftKey ? step : stride(slider)
    move(Math.max(min, Math.min(max, Number(value) + way * size)))
  }
  const ref = useFilled((Number(value) - min) / (max - min))
  return (
    <input
      ref={ref}
      type="range"
      className="slider"
      aria-label={label}
      aria-valuetext={unit ? `${value} ${unit}` : value}
      min={min}
      max={max}
      step={step}
      value={value}
      onChange={({ target }) => move(Number(target.value))}
      onPointerEnter={wake}
      onFocus={wake}
      onPointerDown={() => {
        // A finger may come without having been near.
        wake()
        gesture.begin(true)
      }}
      onKeyDown={press}
      onPointerUp={gesture.end}
      onPointerCancel={gesture.end}
      onKeyUp={gesture.end}
      onBlur={gesture.end}
    />
  )
}

/** How much of its line is coloured: told to the style here, since the policy of the page lets no style come with its text. */
function useFilled(part: number) {
  const ref = useRef<HTMLInputElement>(null)
  useLayoutEffect(() => {
    ref.current?.style.setProperty('--part', `${100 * Math.max(0, Math.min(1, part))}%`)
  }, [part])
  return ref
}

let gestures = 0

/** A drag from pressing to letting go is one gesture, and so are steps of keys that follow each other quickly. */
function useGesture(name: string) {
  const state = useRef({ number: 0, last: 0, held: false })
  const begin = (held: boolean) => {
    gestures += 1
    state.current = { number: gestures, last: performance.now(), held }
  }
  const now = () => {
    if (!state.current.held && performance.now() - state.current.last > PAUSE) begin(false)
    state.current.last = performance.now()
    return `${name} ${state.current.number}`
  }
  const end = () => {
    if (state.current.held) state.current = { ...state.current, held: false, last: 0 }
    settle()
  }
  return { begin, now, end }
}

type Range = Props['field']['slider']

/** Without the noise of binary fractions. */
function onStep(value: number, { step }: Range): number {
  const decimals = Math.max(0, Math.ceil(-Math.log10(step)))
  return Number(value.toFixed(decimals))
}

/** A round number of steps. */
function stride({ min, max, step }: Range): number {
  return Math.max(step, roundStep((0.99 * (max - min)) / PRESSES))
}
