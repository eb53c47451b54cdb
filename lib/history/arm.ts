/**
 * One direction from today, into the past or into the future of the expansion: all times and distances along it,
 * measured from today and from its far end, so that each keeps its own relative accuracy.
 */
import { logarithmicIn, logExpansion, type Model } from '../model'
import { integralOfExp } from './far'
import { type Panel, panelsOf } from './panels'
import { explodes, remainingIn, type Tail, tailAt } from './tail'
import { type Direction, type Search, searchTurning } from './turning'
import { edgeZone, plainZone, staticZone, turningZone, type Zone } from './zone'

export type Clock = 'time' | 'conformal'

/** Sums at the inner edge of each panel, from today, and at its outer edge, to the end. */
interface Sums {
  readonly fromToday: Float64Array
  readonly toEnd: Float64Array
  /** From today to the end; Infinity where it diverges. */
  readonly total: number
  readonly error: number
}

export interface Arm {
  readonly model: Model
  readonly direction: Direction
  readonly end: Search
  readonly panels: readonly Panel[]
  /** m = |ln a| at the inner edge of each panel, and at the outer edge of the last. */
  readonly edges: Float64Array
  readonly tail: Tail | null
  readonly time: Sums
  readonly conformal: Sums
}

/** Farthest |ln a| for which a and 1/a are doubles. */
export const FARTHEST = 700
const NEGLIGIBLE = 1e-18
/** In 1/H₀: beyond this nobody asks, and E² nears the end of the doubles. */
const FOR_EVER = 1e100
/** Width in ln a of the zone around a turning point, a static state or an edge. */
const NEAR = 0.7

export function armOf(model: Model, direction: Direction): Arm {
  const end = searchTurning(model, direction)
  const { panels, stopped } = march(model, direction, end)
  return armFrom(model, direction, end, panels, stopped)
}

/** The arm of panels that are there already. */
export function armFrom(
  model: Model,
  direction: Direction,
  end: Search,
  panels: readonly Panel[],
  stopped: Stopped,
): Arm {
  const edges = Float64Array.from([...panels.map((one) => one.zone.distanceAt(one.from)), lastEdge(panels)])
  const { tail, time, conformal } = beyond(model, direction, end, stopped, lastEdge(panels))
  return {
    model,
    direction,
    end,
    panels,
    edges,
    tail,
    time: sumsOf(panels, 'time', time),
    conformal: sumsOf(panels, 'conformal', conformal),
  }
}

const lastEdge = (panels: readonly Panel[]): number => {
  const last = panels[panels.length - 1]
  return last.zone.distanceAt(last.to)
}

/** A zone, and whether a history can run out within it: the law does not break farther out, and no turning point waits there. */
interface Stretch {
  readonly zone: Zone
  /** `edge`: dark energy is used up at its end, and the rest goes on. */
  readonly kind: 'inner' | 'last' | 'edge'
}

/** From where on, outwards, which kind of zone. */
interface Beginning {
  readonly from: number
  readonly zone: (from: number, to: number) => Zone
  readonly edge: boolean
}

function stretchesOf(model: Model, direction: Direction, end: Search): readonly Stretch[] {
  const reach = end.kind === 'none' ? FARTHEST : Math.min(FARTHEST, Math.abs(end.N))
  const beginnings = beginningsOf(model, direction, end, reach)
  const breaks = model.law.breaks.map((N) => direction * N).filter((m) => m > 0 && m < reach)
  const cuts = [...new Set([...breaks, ...beginnings.map((one) => one.from), reach])].sort((a, b) => a - b)
  const runsOut = end.kind === 'none' || end.kind === 'singular'
  const edge = beginnings.find((one) => one.edge)
  const lastBreak = Math.max(0, ...(edge ? [] : breaks))
  return cuts.slice(1).map((to, i) => {
    const from = cuts[i] ?? 0
    const begun = beginnings.findLast((one) => one.from <= from)
    const zone = (begun ?? beginnings[0]).zone(from, to)
    return { zone, kind: begun?.edge ? 'edge' : runsOut && from >= lastBreak ? 'last' : 'inner' }
  })
}

/** In ascending order; the first begins today. */
function beginningsOf(model: Model, direction: Direction, end: Search, reach: number): readonly Beginning[] {
  const law = logarithmicIn(model, direction)
  const edge = law?.edge ? Math.abs(law.edge.N) : Number.POSITIVE_INFINITY
  const plain = (from: number): Beginning => ({
    from,
    zone: (one, other) => plainZone(model, direction, one, other),
    edge: false,
  })
  const list = [plain(0)]
  if (law && edge < reach) {
    const zone = (from: number, to: number) => edgeZone(model, direction, law, from, to)
    list.push({ from: nearEdge(edge), zone, edge: true }, plain(edge))
  }
  const least = edge < reach ? edge : 0
  if (end.kind === 'none' || reach < Math.abs(end.N)) return list
  if (law && (end.kind === 'singular' || (end.kind === 'root' && edge === reach))) {
    const zone = (from: number, to: number) => edgeZone(model, direction, law, from, to)
    return [...list, { from: nearEdge(reach), zone, edge: false }]
  }
  const zoneTo = end.kind === 'root' ? turningZone : staticZone
  const zone = (from: number, to: number) => zoneTo(model, direction, end.N, from, to)
  return [...list, { from: Math.max(least, reach - NEAR), zone, edge: false }]
}

/** Not farther from an edge than halfway, so that what is left of dark energy tells from its density today. */
const nearEdge = (edge: number): number => Math.max(edge - NEAR, edge / 2)

/** Why the panels stop: at the end itself, where a closed form takes over, or where nothing that a double can hold is left to add. */
export type Stopped = 'end' | 'tail' | 'spent' | 'for ever' | 'far'

function march(model: Model, direction: Direction, end: Search): { panels: readonly Panel[]; stopped: Stopped } {
  const panels: Panel[] = []
  let [time, conformal] = [0, 0]
  let stopped: Stopped | null = null
  for (const { zone, kind } of stretchesOf(model, direction, end)) {
    const enough = (panel: Panel, edge: number): boolean => {
      time += panel.time.total
      conformal += panel.conformal.total
      const spent = panel.time.total < NEGLIGIBLE * time && panel.conformal.total < NEGLIGIBLE * conformal
      if (kind === 'edge') return spent && zone.distanceAt(edge + 1) === zone.distanceAt(zone.to)
      if (kind === 'last' && spent) stopped = 'spent'
      else if (end.kind !== 'root' && time > FOR_EVER) stopped = 'for ever'
      else if (zone.to === FARTHEST && tailAt(model, direction, direction * edge) !== null) stopped = 'tail'
      return stopped !== null
    }
    panels.push(...panelsOf(zone, enough))
    if (stopped !== null) return { panels, stopped }
  }
  return { panels, stopped: lastEdge(panels) === FARTHEST ? 'far' : 'end' }
}

interface Beyond extends Record<Clock, readonly [number, number]> {
  readonly tail: Tail | null
}

/** What lies beyond the last panel: the tail, and value and error of both integrals. */
function beyond(model: Model, direction: Direction, end: Search, stopped: Stopped, edge: number): Beyond {
  const infinite = [Number.POSITIVE_INFINITY, 0] as const
  const nothing = [0, 0] as const
  if (end.kind === 'double' || stopped === 'for ever') return { tail: null, time: infinite, conformal: infinite }
  const ends = end.kind === 'root' || (end.kind === 'singular' && Math.abs(end.N) <= FARTHEST)
  if (ends || stopped === 'end') return { tail: null, time: nothing, conformal: nothing }
  if (explodes(model, direction)) return exploding(model, direction, stopped, edge)
  const tail = tailAt(model, direction, direction * edge, true)
  if (tail === null) {
    const left = stopped === 'spent' ? nothing : infinite
    return { tail, time: left, conformal: left }
  }
  const doubt = tail.time.corrections.reduce((sum, one) => sum + one.size ** 2, 4 * Number.EPSILON)
  const of = (clock: Clock) => {
    const value = remainingIn(tail[clock], 0)
    return [value, Number.isFinite(value) ? doubt * value : 0] as const
  }
  return { tail, time: of('time'), conformal: of('conformal') }
}

/** Every integral is finite, but the doubles may end before it is complete. */
function exploding(model: Model, direction: Direction, stopped: Stopped, edge: number): Beyond {
  if (stopped === 'spent') return { tail: null, time: [0, 0], conformal: [0, 0] }
  const of = (weight: number): readonly [number, number] => {
    const value = integralOfExp((m) => -weight * direction * m - 0.5 * logExpansion(model, direction * m), edge)
    return [value, Number.isFinite(value) ? 1e-12 * value : 0]
  }
  return { tail: null, time: of(0), conformal: of(1) }
}

function sumsOf(panels: readonly Panel[], clock: Clock, [beyond, beyondError]: readonly [number, number]): Sums {
  const fromToday = new Float64Array(panels.length + 1)
  const toEnd = new Float64Array(panels.length)
  panels.forEach((one, i) => {
    fromToday[i + 1] = fromToday[i] + one[clock].total
  })
  let left = beyond
  let error = beyondError
  for (let i = panels.length - 1; i >= 0; i--) {
    toEnd[i] = left
    left += panels[i][clock].total
    error += panels[i][clock].error
  }
  return { fromToday, toEnd, total: left, error }
}
