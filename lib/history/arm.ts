/**
 * One direction from today, into the past or into the future of the expansion: all times and distances along it,
 * measured from today and from its far end, so that each keeps its own relative accuracy.
 */
import type { Model } from '../model'
import { listOf } from '../numerics/list'
import { beyondPanels, type Stopped } from './beyond'
import { type Panel, panelsOf, type Stretch } from './panels'
import { stretchesOf } from './stretches'
import { explodes, type Tail, tailsOf } from './tail'
import { type Direction, FARTHEST, type Search, searchTurning } from './turning'
import type { Zone } from './zone'

/** Sums at the inner edge of each panel, from today, and at its outer edge, to the end. */
interface Sums {
  readonly fromToday: readonly number[]
  readonly toEnd: readonly number[]
  /** From today to the end; Infinity where it diverges. */
  readonly total: number
  readonly error: number
  /** Error bounds of the integral from today to the outer edge of each panel, and from its inner edge to the end. */
  readonly errorFromToday: readonly number[]
  readonly errorToEnd: readonly number[]
}

export interface Arm {
  readonly model: Model
  readonly direction: Direction
  readonly end: Search
  readonly panels: readonly Panel[]
  /** m = |ln a| at the inner edge of each panel, and at the outer edge of the last. */
  readonly edges: readonly number[]
  readonly tail: Tail | null
  readonly time: Sums
  readonly conformal: Sums
}

const NEGLIGIBLE = 1e-18
/** In 1/H₀: beyond this nobody asks, and E² nears the end of the doubles. */
const FOR_EVER = 1e100
const LARGEST = 1e250
/** An integrand this far down comes from densities that are about to leave the doubles. */
const NOTHING = 1e-200

export function armOf(model: Model, direction: Direction): Arm {
  const end = searchTurning(model, direction)
  const { panels, stopped, tail } = march(model, direction, end)
  return armFrom(model, direction, end, panels, stopped, tail)
}

/** The arm of panels that are there already. */
export function armFrom(
  model: Model,
  direction: Direction,
  end: Search,
  panels: readonly Panel[],
  stopped: Stopped,
  begun: Tail | null = null,
): Arm {
  const edges = [...listOf(panels, (one) => one.zone.distanceAt(one.from)), lastEdge(panels)]
  const { tail, time, conformal } = beyondPanels(model, direction, end, stopped, lastEdge(panels), begun)
  return {
    model,
    direction,
    end,
    panels,
    edges,
    tail,
    time: sumsOf(
      listOf(panels, (one) => one.time),
      time,
    ),
    conformal: sumsOf(
      listOf(panels, (one) => one.conformal),
      conformal,
    ),
  }
}

const lastEdge = (panels: readonly Panel[]): number => {
  const last = panels[panels.length - 1]
  return last.zone.distanceAt(last.to)
}

interface March {
  readonly panels: readonly Panel[]
  readonly stopped: Stopped
  readonly tail: Tail | null
}

function march(model: Model, direction: Direction, end: Search): March {
  const panels: Panel[] = []
  let [time, conformal] = [0, 0]
  let stopped: Stopped | null = null
  let tail: Tail | null = null
  const tailAt = tailsOf(model, direction)
  // Ages near a beginning whose density outgrows every power add nothing to the whole, but they are asked for themselves.
  const bursts = direction < 0 && explodes(model, direction)
  for (const { zone, kind } of stretchesOf(model, direction, end)) {
    const enough = (panel: Panel, edge: number): boolean => {
      time += panel.time.total
      conformal += panel.conformal.total
      const adds = Math.max(panel.time.total / time, panel.conformal.total / conformal)
      const gone = adds < NEGLIGIBLE
      if (end.kind !== 'root' && (time > FOR_EVER || conformal > LARGEST)) stopped = 'for ever'
      else if (kind === 'edge') return gone && zone.distanceAt(edge + 1) === zone.distanceAt(zone.to)
      else if (kind === 'final' && gone && atEdge(zone, edge)) stopped = 'spent'
      else if (kind === 'last' && gone && (adds < NOTHING || (!bursts && lasts(model, direction, edge))))
        stopped = 'spent'
      else if (zone.to === FARTHEST) tail = tailAt(direction * edge)
      if (tail !== null) stopped = 'tail'
      return stopped !== null
    }
    panels.push(...panelsOf(zone, enough))
    if (stopped !== null) return { panels, stopped, tail }
  }
  return { panels, stopped: lastEdge(panels) === FARTHEST ? 'far' : 'end', tail }
}

/** In the variable of an edge: this much farther than where ln a no longer tells it from the edge. */
const BEHIND = 25

/** Is this so near to an edge that whatever is left beyond adds nothing to what is left at any double ln a? */
const atEdge = (zone: Zone, s: number): boolean => zone.distanceAt(s - BEHIND) === zone.distanceAt(zone.to)

/** Is E² here made of what never thins out again farther on? Then what adds nothing now adds nothing later. */
function lasts(model: Model, direction: Direction, edge: number): boolean {
  const N = direction * edge
  const lasting = model.acting.reduce((sum, one) => {
    const range =
      direction > 0 ? one.exponentRange(N, Number.POSITIVE_INFINITY) : one.exponentRange(Number.NEGATIVE_INFINITY, N)
    return (direction > 0 ? range[1] <= 0 : range[0] >= 0) ? sum + one.density(N) : sum
  }, 0)
  return !(lasting < 0.5 * model.expansion(N, Math.exp(-N)))
}

/** Running sums outwards and inwards. Plain arrays: typed ones of this length take longer to make than to fill. */
function sumsOf(stretches: readonly Stretch[], [beyond, beyondError]: readonly [number, number]): Sums {
  const fromToday = [0]
  const errorFromToday: number[] = []
  let sum = 0
  let errorBefore = 0
  for (const one of stretches) {
    sum += one.total
    fromToday.push(sum)
    errorBefore += one.error
    errorFromToday.push(errorBefore)
  }
  errorFromToday.push(errorBefore + beyondError)
  let left = beyond
  let error = beyondError
  const toEnd: number[] = []
  const errorToEnd = [beyondError]
  for (let i = stretches.length - 1; i >= 0; i--) {
    toEnd.push(left)
    left += stretches[i].total
    error += stretches[i].error
    errorToEnd.push(error)
  }
  return {
    fromToday,
    toEnd: toEnd.reverse(),
    total: left,
    error,
    errorFromToday,
    errorToEnd: errorToEnd.reverse(),
  }
}
