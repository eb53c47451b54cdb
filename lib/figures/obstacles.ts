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
/** Worth of a covered spot of a curve, of a line through another label, of another label, and of the edge. Tuned by eye. */
const COST = { curve: 10, crossing: 60, label: 400, edge: 800 }

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

/** Where something may be, and what it costs to be there at all. */
export interface Candidate extends Box {
  readonly start: number
  /** A line that goes with it. */
  readonly leader: readonly [x1: number, y1: number, x2: number, y2: number] | null
}

/** What is in the way: spots of curves and of lines, other labels, and the edges. */
export interface Way {
  readonly covered: Cover
  readonly lines: readonly Spot[]
  readonly taken: readonly Box[]
  readonly edges: Edges
}

/** The candidate that hides least; of equals the first. Those that cost less come first, and no more are made than are needed. */
export function clearest<C extends Candidate>(candidates: Iterable<C>, way: Way): C | null {
  let [best, least]: [C | null, number] = [null, Number.POSITIVE_INFINITY]
  for (const one of candidates) {
    if (one.start >= least) break
    let cost = one.start + costOf(one, way)
    if (cost < least && one.leader) cost += crossed(spotsOf(one.leader), way.taken)
    if (cost < least) [best, least] = [one, cost]
  }
  return best
}

export const spotsOf = ([x1, y1, x2, y2]: NonNullable<Candidate['leader']>): readonly Spot[] =>
  alongLine([
    [x1, y1],
    [x2, y2],
  ])

/** What a line costs that strikes through others' words. */
function crossed(line: readonly Spot[], taken: readonly Box[]): number {
  return COST.crossing * taken.filter((box) => line.some(([x, y]) => holds(box, x, y))).length
}

/** What a box hides. */
export function costOf(box: Box, { covered, lines, taken, edges }: Way): number {
  const struck = lines.filter(([x, y]) => holds(box, x, y)).length
  const overlaps = taken.filter((other) => overlap(box, other)).length
  return COST.curve * (covered(box) + struck) + COST.label * overlaps + (outside(box, edges) ? COST.edge : 0)
}

/** How many spots a box covers. */
export type Cover = (box: Box) => number

/** In pixels; a box covers the cells that it touches. */
const CELL = 4

/** Asked for hundreds of boxes: from sums over all cells left of and above each. */
export function coverOf(spots: readonly Spot[]): Cover {
  const cell = (at: number, most: number) => Math.max(0, Math.min(most, Math.floor(at / CELL) + 1))
  const columns = 2 + Math.max(0, ...spots.map(([x]) => Math.floor(x / CELL)))
  const rows = 2 + Math.max(0, ...spots.map(([, y]) => Math.floor(y / CELL)))
  const sums = new Int32Array(columns * rows)
  for (const [x, y] of spots) {
    const at = cell(y, rows - 1) * columns + cell(x, columns - 1)
    sums[at] = (sums[at] as number) + 1
  }
  for (let at = 1; at < sums.length; at++) {
    if (at % columns > 0) sums[at] = (sums[at] as number) + (sums[at - 1] as number)
  }
  for (let at = columns; at < sums.length; at++) sums[at] = (sums[at] as number) + (sums[at - columns] as number)
  return ({ x, y, width, height }) => {
    const [left, right] = [cell(x, columns) - 1, cell(x + width, columns - 1)]
    const [above, below] = [cell(y, rows) - 1, cell(y + height, rows - 1)]
    const upTo = (column: number, row: number) =>
      column < 0 || row < 0 ? 0 : (sums[Math.min(row, rows - 1) * columns + Math.min(column, columns - 1)] as number)
    return upTo(right, below) - upTo(left, below) - upTo(right, above) + upTo(left, above)
  }
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
