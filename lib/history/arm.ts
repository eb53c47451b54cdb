/**
 * One direction from today, into the past or into the future of the expansion: all times and distances along it,
 * measured from today and from its far end, so that each keeps its own relative accuracy.
 */
import type { Model } from '../model'
import { type Panel, panelsOf } from './panels'
import { explodes, remainingIn, type Tail, tailAt } from './tail'
import { type Direction, type Search, searchTurning } from './turning'
import { plainZone, staticZone, turningZone, type Zone } from './zone'

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
/** Width in ln a of the zone around a turning point. */
const TURNING_WIDTH = 0.7
/** Nearest approach in ln a to a static state that is followed; nearer, a is that of the static state to all its digits. */
const STATIC_NEAREST = 1e-16

export function armOf(model: Model, direction: Direction): Arm {
  const end = searchTurning(model, direction)
  const panels: Panel[] = []
  for (const zone of zonesOf(model, direction, end)) panels.push(...panelsOf(zone, stopOf(model, direction, panels)))
  const edges = Float64Array.from([...panels.map((one) => one.zone.distanceAt(one.from)), lastEdge(panels)])
  const tail = end.kind === 'none' ? tailAt(model, direction, direction * lastEdge(panels), true) : null
  const beyond = endless(model, direction, end, tail)
  return {
    model,
    direction,
    end,
    panels,
    edges,
    tail,
    time: sumsOf(panels, 'time', beyond.time),
    conformal: sumsOf(panels, 'conformal', beyond.conformal),
  }
}

const lastEdge = (panels: readonly Panel[]): number => {
  const last = panels[panels.length - 1]
  return last.zone.distanceAt(last.to)
}

function zonesOf(model: Model, direction: Direction, end: Search): readonly Zone[] {
  const breaks = model.law.breaks
    .map((N) => direction * N)
    .filter((m) => m > 0)
    .sort((one, other) => one - other)
  const reach = end.kind === 'none' ? FARTHEST : Math.abs(end.N)
  const near = end.kind === 'none' ? reach : Math.max(0, reach - TURNING_WIDTH)
  const zones: Zone[] = []
  const edges = [0, ...breaks.filter((m) => m < near), near]
  for (let i = 0; i + 1 < edges.length; i++) {
    if (edges[i + 1] > edges[i]) zones.push(plainZone(model, direction, edges[i], edges[i + 1]))
  }
  if (end.kind === 'root') zones.push(turningZone(model, direction, end.N, near))
  if (end.kind === 'double') zones.push(staticZone(model, direction, end.N, near, STATIC_NEAREST))
  return zones
}

/** Stop marching where the closed form takes over, or where nothing that a double can hold is left to add. */
function stopOf(model: Model, direction: Direction, before: readonly Panel[]): (panel: Panel, edge: number) => boolean {
  let time = before.reduce((sum, one) => sum + one.time.total, 0)
  let conformal = before.reduce((sum, one) => sum + one.conformal.total, 0)
  return (panel, edge) => {
    time += panel.time.total
    conformal += panel.conformal.total
    const spent = panel.time.total < NEGLIGIBLE * time && panel.conformal.total < NEGLIGIBLE * conformal
    return spent || (panel.zone.to === FARTHEST && tailAt(model, direction, direction * edge) !== null)
  }
}

/** What lies beyond the last panel: value and error of both integrals. */
function endless(
  model: Model,
  direction: Direction,
  end: Search,
  tail: Tail | null,
): Record<Clock, readonly [number, number]> {
  const none = [0, 0] as const
  const infinite = [Number.POSITIVE_INFINITY, 0] as const
  if (end.kind === 'root') return { time: none, conformal: none }
  if (end.kind === 'double') return { time: infinite, conformal: infinite }
  if (explodes(model, direction)) return { time: none, conformal: none }
  if (tail === null) return { time: infinite, conformal: infinite }
  const doubt = tail.time.corrections.reduce((sum, one) => sum + one.size ** 2, 4 * Number.EPSILON)
  const of = (clock: Clock) => {
    const value = remainingIn(tail[clock], 0)
    return [value, Number.isFinite(value) ? doubt * value : 0] as const
  }
  return { time: of('time'), conformal: of('conformal') }
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
