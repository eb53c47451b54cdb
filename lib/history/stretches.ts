/** Which zones an arm is made of. */
import { logarithmicIn, type Model } from '../model'
import { listOf } from '../numerics/list'
import { edgeTurningZone, edgeZone, staticZone } from './approach-zones'
import { narrowZone } from './narrow-zone'
import { plainZone } from './plain-zone'
import { type Direction, FARTHEST, type Search } from './turning'
import { turningZone } from './turning-zone'
import type { Zone } from './zone'

/** Width in ln a of the zone around a turning point, a static state or an edge. */
const NEAR = 0.7
/** A turning point this near in ln a to the edge of a law is measured from the edge. */
const AT_EDGE = 1e-3

export interface Stretch {
  readonly zone: Zone
  /**
   * `inner`: it must be followed to its end. `last`: a history can run out within it, since the law does not break farther out and
   * no turning point waits there. `edge`: dark energy is used up at its end, and the rest goes on. `final`: the law ends at its end.
   */
  readonly kind: 'inner' | 'last' | 'edge' | 'final'
}

/** From where on, outwards, which kind of zone. */
interface Beginning {
  readonly from: number
  readonly zone: (from: number, to: number) => Zone
  /** What leads up to an edge, where the law ends or goes on. */
  readonly edge: 'edge' | 'final' | null
}

/** How far the panels may go; one e-fold before a turning point that the doubles do not hold. */
function reachOf(end: Search): number {
  if (end.kind !== 'none') return Math.min(FARTHEST, Math.abs(end.N))
  return end.farRoot === null
    ? FARTHEST
    : Math.min(FARTHEST, Math.max(0.5 * Math.abs(end.farRoot), Math.abs(end.farRoot) - 1))
}

/** The zones of an arm, outwards from today, cut where the law breaks. */
export function stretchesOf(model: Model, direction: Direction, end: Search): readonly Stretch[] {
  const reach = reachOf(end)
  const beginnings = beginningsOf(model, direction, end, reach)
  const breaks = listOf(model.law.breaks, (N) => direction * N).filter((m) => m > 0 && m < reach)
  const cuts = [...new Set([...breaks, ...listOf(beginnings, (one) => one.from), reach])].sort((a, b) => a - b)
  const runsOut = end.kind === 'none' || end.kind === 'singular'
  const edge = beginnings.find((one) => one.edge === 'edge')
  const lastBreak = Math.max(0, ...(edge ? [] : breaks))
  return listOf(cuts.slice(1), (to, i) => {
    const from = cuts[i]
    const begun = beginnings.reduce((last, one) => (one.from <= from ? one : last))
    return { zone: begun.zone(from, to), kind: begun.edge ?? (runsOut && from >= lastBreak ? 'last' : 'inner') }
  })
}

/** In ascending order; the first begins today. */
function beginningsOf(model: Model, direction: Direction, end: Search, reach: number): readonly Beginning[] {
  const law = logarithmicIn(model, direction)
  const edge = law?.edge ? Math.abs(law.edge.N) : Number.POSITIVE_INFINITY
  const plain = (from: number): Beginning => ({
    from,
    zone: (one, other) => plainZone(model, direction, one, other),
    edge: null,
  })
  const list = [plain(0)]
  let passed = 0
  for (const narrow of end.narrows) {
    const centre = Math.abs(narrow.N)
    const half = Math.min(NEAR, centre - passed, Math.min(edge, reach) - centre) / 2
    const zone = (from: number, to: number) => narrowZone(model, direction, narrow, from, to)
    passed = centre + half
    list.push({ from: centre - half, zone, edge: null }, plain(passed))
  }
  if (law && edge < reach) {
    const zone = (from: number, to: number) => edgeZone(model, direction, law, edge, from, to)
    list.push({ from: Math.max(passed, nearEdge(edge)), zone, edge: 'edge' }, plain(edge))
  }
  const least = edge < reach ? edge : 0
  if (end.kind === 'none' || reach < Math.abs(end.N)) return list
  if (law && end.kind === 'singular') {
    const zone = (from: number, to: number) => edgeZone(model, direction, law, edge, from, to)
    return [...list, { from: Math.max(passed, nearEdge(reach)), zone, edge: 'final' }]
  }
  if (law && end.kind === 'root' && edge >= reach && edge - reach < AT_EDGE) {
    const zone = (from: number) => edgeTurningZone(model, direction, law, edge, from)
    return [...list, { from: Math.max(passed, nearEdge(reach)), zone, edge: null }]
  }
  const zone = (from: number, to: number) =>
    end.kind === 'root'
      ? turningZone(model, direction, end.N, end.slope, from, to)
      : staticZone(model, direction, end.N, from, to)
  return [...list, { from: Math.max(least, passed, reach - NEAR), zone, edge: null }]
}

/** Not farther from an edge than halfway, so that what is left of dark energy tells from its density today. */
const nearEdge = (edge: number): number => Math.max(edge - NEAR, edge / 2)
