/** What a label within the plot must keep clear of. */
import type { LongView } from './long-view'
import type { Plot } from './plot'

export interface Box {
  readonly x: number
  readonly y: number
  readonly width: number
  readonly height: number
}

type Spot = readonly [x: number, y: number]
type Edges = Pick<Plot, 'left' | 'right' | 'top' | 'bottom'>

/** Every so many pixels a curve counts as an obstacle. */
const STEP = 5
/** Worth of a covered spot of a curve, of another label, of the edge, and of one more pixel away. Tuned by eye. */
const COST = { curve: 10, label: 400, edge: 800, away: 0.2 }

export function obstaclesOf(view: LongView, plot: Plot): readonly Spot[] {
  return view.curves.flatMap(({ segments, asymptote }) => [
    ...segments.flatMap((segment) => along(segment.map(([time, scale]) => [plot.x(time), plot.y(scale)] as const))),
    ...(asymptote === null ? [] : along([[plot.x(asymptote), plot.top] as const, [plot.x(asymptote), plot.bottom]])),
  ])
}

function along(line: readonly Spot[]): Spot[] {
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
export function clearest(boxes: readonly Box[], spots: readonly Spot[], taken: readonly Box[], edges: Edges): Box {
  const first = boxes[0] as Box
  const costs = boxes.map((box) => {
    const covered = spots.filter(([x, y]) => within(box, x, y)).length
    const away = Math.hypot(box.x - first.x, box.y - first.y)
    const overlaps = taken.filter((other) => overlap(box, other)).length
    return COST.curve * covered + COST.label * overlaps + (outside(box, edges) ? COST.edge : 0) + COST.away * away
  })
  return boxes[costs.indexOf(Math.min(...costs))] ?? first
}

function within({ x, y, width, height }: Box, px: number, py: number): boolean {
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
