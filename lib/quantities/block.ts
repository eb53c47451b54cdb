/**
 * A block of instants: one phase, one arm, and an array for each thing that is known of them. Columns are functions of blocks, so that
 * a table is made column by column; a single instant is a block of one.
 */
import type { Event, Phase, Position, Span } from '../history/event'
import { spanSinceNow, spanSinceOrigin } from '../history/event'
import { expansionsAt, type Places, spanInto, startsOf, type Within, withinInto } from '../history/places'
import type { Clock } from '../history/tail'
import { hubbleTimeGyr } from '../units'
import type { ColumnSubject, Instant } from './instant'

export interface Block extends Places, Position {
  readonly subject: ColumnSubject
  readonly phase: Phase
  /** 1 while expanding, −1 while contracting. */
  readonly sign: 1 | -1
  readonly scale: Float64Array
  readonly redshift: Float64Array
  /** In Gyr, where that is what was asked for. */
  readonly given: { readonly time?: Float64Array; readonly age?: Float64Array }
  /** Which of them was asked for, so that the place is the result of a search; null where it follows from a. */
  readonly asked: 'time' | 'age' | null
  /** What several columns share, by what makes it. */
  readonly kept: Map<unknown, unknown>
  /** An array that is nobody else's, with a place for each instant. */
  take(): Float64Array
}

/** What several columns share: made once for each block. */
export function shared<T>(make: (block: Block) => T): (block: Block) => T {
  return (block) => {
    const known = block.kept.get(make) as T | undefined
    if (known !== undefined) return known
    const made = make(block)
    block.kept.set(make, made)
    return made
  }
}

type Arrays = Pick<Block, 'N' | 'inverseScale' | 'panel' | 's' | 'scale' | 'redshift'>

/** Every block has one shape, since loops read it in every turn. */
export const blockFrom = (arrays: Arrays, known: Omit<Block, keyof Arrays | 'starts' | 'kept'>): Block => ({
  subject: known.subject,
  phase: known.phase,
  arm: known.arm,
  sign: known.sign,
  swings: known.swings,
  count: known.count,
  N: arrays.N,
  inverseScale: arrays.inverseScale,
  panel: arrays.panel,
  s: arrays.s,
  starts: startsOf(arrays.panel, known.count),
  scale: arrays.scale,
  redshift: arrays.redshift,
  given: known.given,
  asked: known.asked,
  take: known.take,
  kept: new Map(),
})

const blocks = new WeakMap<Instant, Block>()

/** The block of one instant. */
export function blockOf(subject: ColumnSubject, instant: Instant): Block {
  let block = blocks.get(instant)
  if (!block) {
    const { phase, place, sign, swings, scale, redshift, time, age } = instant
    const arrays = {
      N: Float64Array.of(place.N),
      inverseScale: Float64Array.of(1 / scale),
      panel: Float64Array.of(place.panel),
      s: Float64Array.of(place.s),
      scale: Float64Array.of(scale),
      redshift: Float64Array.of(redshift),
    }
    const given = { time: Float64Array.of(time), age: Float64Array.of(age) }
    const { arm } = place
    const { asked } = instant
    const take = () => new Float64Array(1)
    block = blockFrom(arrays, { subject, phase, arm, sign, swings, count: 1, given, asked, take })
    blocks.set(instant, block)
  }
  return block
}

/** The event at place i. */
export const eventIn = ({ phase, arm, sign, swings, N, panel, s }: Block, i: number): Event => ({
  phase,
  sign,
  swings,
  place: { arm, N: N[i], panel: panel[i], s: s[i] },
})

/** Integrals from the inner edges of the panels. */
const within = shared<Within>((block) => {
  const out = { time: block.take(), conformal: block.take() }
  withinInto(out, block)
  return out
})

/** A time or conformal time of every instant, in 1/H₀. */
export function spanIn(block: Block, span: Span, clock: Clock): Float64Array {
  const out = block.take()
  spanInto(out, span, block, within(block), clock)
  return out
}

/** Every number times a factor. */
export function times(block: Block, values: Float64Array, factor: number): Float64Array {
  const out = block.take()
  for (let i = 0; i < block.count; i++) out[i] = values[i] * factor
  return out
}

/** No value at any instant. */
export const nothing = (block: Block): Float64Array => block.take().fill(Number.NaN)

const inGyr = (block: Block, span: Span): Float64Array =>
  times(block, spanIn(block, span, 'time'), hubbleTimeGyr(block.subject.scenario.h0))

/** Gyr from now. */
export const timeIn = shared(
  (block) => block.given.time ?? inGyr(block, spanSinceNow(block.subject.history, block, 'time')),
)

/** Gyr since the origin. */
export const ageIn = shared(
  (block) => block.given.age ?? inGyr(block, spanSinceOrigin(block.subject.history, block, 'time')),
)

/** E² = H²/H₀². */
export const expansionIn = shared((block) => {
  const out = block.take()
  expansionsAt(out, block)
  return out
})

/**
 * Divides by E², in place; no value where the expansion stands still. Two stores, since a choice between a number and NaN within
 * one expression makes an object for every row.
 */
export function overExpansion(block: Block, values: Float64Array): Float64Array {
  const squared = expansionIn(block)
  for (let i = 0; i < block.count; i++) {
    if (squared[i] > 0) values[i] /= squared[i]
    else values[i] = Number.NaN
  }
  return values
}

/** dE²/dN and d²E²/dN². */
export const slopesIn = shared((block) => {
  const [first, second] = [block.take(), block.take()]
  block.arm.model.slopesInto(first, second, block.N, block.inverseScale, block.count)
  return { first, second }
})

/** χ to what is seen at each instant, in c/H₀; no number where no line of sight leads there. */
export const sightIn = shared((block) =>
  block.phase === 'past'
    ? times(block, spanIn(block, spanSinceNow(block.subject.history, block, 'conformal'), 'conformal'), -1)
    : nothing(block),
)
