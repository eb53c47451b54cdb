/** What a label within the plot must keep clear of. */
import type { Chart } from './chart'
import { within } from './draw-axes'
import type { Edges, Plot } from './plot'

export interface Box {
  readonly x: number
  readonly y: number
  readonly width: number
  readonly height: number
}

export type Spot = readonly [x: number, y: number]

/** Every so many pixels a curve counts as an obstacle. */
const STEP = 5
/** Worth of a covered spot of a curve, of another label, of the edge, and of one more pixel away. Tuned by eye. */
const COST = { curve: 10, label: 400, edge: 800, away: 0.2 }

export function obstaclesOf(
  { curves, spots, now, x }: Pick<Chart, 'curves' | 'spots' | 'now' | 'x'>,
  plot: Plot,
): readonly Spot[] {
  const uprights = curves.flatMap(({ asymptote }) => (asymptote === null ? [] : [asymptote.at]))
  if (now !== null && within(x, now)) uprights.push(now)
  return [
    ...curves.flatMap(({ segments }) =>
      segments.flatMap((segment) => alongLine(segment.map(([one, other]) => [plot.x(one), plot.y(other)] as const))),
    ),
    ...uprights.flatMap((at) => alongLine([[plot.x(at), plot.top] as const, [plot.x(at), plot.bottom]])),
    ...spots.map(({ at }) => [plot.x(at[0]), plot.y(at[1])] as const),
  ]
}

/** Points every few pixels. */
export function alongLine(line: readonly Spot[]): Spot[] {
  return line.flatMap(([x, y], i) => {
    const [nextX, nextY] = line[i + 1] ?? [x, y]
    const steps = Math.max(1, Math.ceil(Math.hypot(nextX - x, nextY - y) / STEP))
    return Array.from(
      { length: steps },
      (_, k) => [x + ((nextX - x) * k) / steps, y + ((nextY - y) * k) / steps] as const,
    )
  })
}

/** The candidate that hides least; of equals the first. */
export function clearest<B extends Box>(
  boxes: readonly B[],
  spots: readonly Spot[],
  taken: readonly Box[],
  edges: Edges,
): B {
  const first = boxes[0] as B
  let [best, least] = [first, Number.POSITIVE_INFINITY]
  for (const box of boxes) {
    const away = Math.hypot(box.x - first.x, box.y - first.y)
    const cost = costOf(box, spots, taken, edges, COST.away * away, least)
    if (cost < least) [best, least] = [box, cost]
  }
  return best
}

/** What a box hides, added to `start`, until that is more than `least` anyway. */
export function costOf(
  box: Box,
  spots: readonly Spot[],
  taken: readonly Box[],
  edges: Edges,
  start = 0,
  least = Number.POSITIVE_INFINITY,
): number {
  const overlaps = taken.filter((other) => overlap(box, other)).length
  return withCovered(box, spots, start + COST.label * overlaps + (outside(box, edges) ? COST.edge : 0), least)
}

/** Adds what a box covers, until that is more than `least` anyway. */
function withCovered(box: Box, spots: readonly Spot[], start: number, least: number): number {
  let cost = start
  for (const [x, y] of spots) {
    if (cost >= least) return cost
    if (holds(box, x, y)) cost += COST.curve
  }
  return cost
}

function holds({ x, y, width, height }: Box, px: number, py: number): boolean {
  return px >= x - 2 && px <= x + width + 2 && py >= y - 2 && py <= y + height + 2
}

function overlap(one: Box, other: Box): boolean {
  return (
    one.x < other.x + other.width &&
    other.x < one.x + one.width &&
    one.y < other.y + other.height &&
    other.y < one.y + one.height
  )
}

function outside({ x, y, width, height }: Box, { left, right, top, bottom }: Edges): boolean {
  return x < left || x + width > right || y < top || y + height > bottom
}
