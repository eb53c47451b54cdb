/** Labels within the plot: where each hides least, and a line to what it names where that is not beside it. */
import { evenParts } from '../numerics/list'
import type { Chart, Curve } from './chart'
import { boxOf, type Label, type Leader, labelHeight, labelWidth, type Texts, textsOf, toneOf } from './label'
import {
  alongLine,
  type Box,
  type Candidate,
  type Cover,
  clearest,
  costOf,
  coverOf,
  obstaclesOf,
  type Spot,
  spotsOf,
  type Way,
} from './obstacles'
import type { Frame, Plot } from './plot'
import type { Point } from './sample'

type Drawn = Pick<Chart, 'curves' | 'spots' | 'now' | 'x' | 'references'>

interface Wish extends Texts {
  readonly tone: string
  /** Where the label may be, the best places first; at least one. */
  readonly places: (width: number, height: number) => Iterable<Place>
}

interface Place extends Candidate {
  /** Where the thing is that it names. */
  readonly of: number
}

/** The labels of the curves that are `below` the row of names, of those that end within the plot, of spots and of lines. */
export function insideLabels(
  chart: Drawn,
  plot: Plot,
  frame: Frame,
  { placed, below }: { readonly placed: readonly Label[]; readonly below: readonly Curve[] },
): readonly Label[] {
  const wishes = [
    ...levelWishes(chart, plot, frame),
    ...spotWishes(chart, plot, frame),
    ...chart.curves.flatMap((curve) => curveWishes(curve, plot, frame, below.includes(curve))),
  ]
  if (wishes.length === 0) return []
  const covered = coverOf(obstaclesOf(chart, plot))
  const labels: Label[] = []
  const way = (i: number) => wayAround([...placed, ...labels.filter((_, k) => k !== i)], frame, plot, covered)
  for (const [i, wish] of wishes.entries()) labels[i] = labelOf(wish, frame, way(i))
  // The first ones did not know of the last ones.
  for (const [i, wish] of wishes.entries()) {
    if (hides(labels[i] as Label, frame, { ...way(i), covered: () => 0 })) labels[i] = labelOf(wish, frame, way(i))
  }
  return labels
}

function wayAround(others: readonly Label[], frame: Frame, plot: Plot, covered: Cover): Way {
  return {
    covered,
    lines: others.flatMap(({ leader }) => (leader ? spotsOf(leader) : [])),
    taken: others.map((label) => boxOf(label, frame.type)),
    edges: { ...plot, right: frame.width },
  }
}

const hides = (label: Label, { type }: Frame, way: Way): boolean => costOf(boxOf(label, type), way) > 0

function labelOf(wish: Wish, { type }: Frame, way: Way): Label {
  const { tone, name, note } = wish
  const best = clearest(wish.places(labelWidth(wish, type), labelHeight(wish, type)), way) as Place
  const anchor = best.x + best.width / 2 < best.of ? 'end' : 'start'
  return {
    tone,
    name,
    note,
    anchor,
    x: anchor === 'end' ? best.x + best.width : best.x,
    y: best.y,
    leader: best.leader,
  }
}

/**
 * Ends within the plot, the line of a rip, and what is named along its way.
 * `below`: it leaves at the top, where the title of the axis stands.
 */
function curveWishes(curve: Curve, plot: Plot, frame: Frame, below: boolean): Wish[] {
  const { finish, asymptote } = curve
  const named = { tone: toneOf(curve), ...textsOf(curve, frame) }
  const wishes: Wish[] = []
  if (finish?.edge === 'along') wishes.push({ ...named, places: alongCurve(curve, plot, frame) })
  else if (finish && (below || finish.edge === 'inside'))
    wishes.push({ ...named, places: besidePoint(finish.at, plot, frame, below) })
  if (asymptote !== null) {
    const places = besidePoint([asymptote.at, Number.POSITIVE_INFINITY], plot, frame, false)
    wishes.push({ ...named, name: '', note: asymptote.label, places })
  }
  return wishes
}

function spotWishes({ spots }: Drawn, plot: Plot, frame: Frame): Wish[] {
  const named = spots.filter(({ label }) => label !== '')
  return named.map(({ tone, at, label }) => ({
    tone,
    name: '',
    note: label,
    places: besidePoint(at, plot, frame, true),
  }))
}

/** So many places along a line across the figure are tried. */
const LEVEL_STEPS = 24
/** What it costs to be one more pixel away from the best place. Tuned by eye. */
const AWAY = 0.2

/** Words at a line across the figure, above or below it, from the right. */
function levelWishes({ references }: Drawn, plot: Plot, { type, compact }: Frame): Wish[] {
  const named = references.filter(({ axis, label }) => axis === 'y' && label !== '')
  return named.map(({ at, label, short = label }) => {
    const places = (width: number, height: number) => {
      const room = plot.right - plot.left - width - 0.8 * type
      const rows = [plot.y(at) - height - 0.15 * type, plot.y(at) + 0.15 * type]
      const steps = evenParts(LEVEL_STEPS).map((part) => room * part)
      return steps.flatMap((step) => {
        const x = plot.right - 0.4 * type - width - step
        return rows.map((y) => ({ x, y, width, height, start: AWAY * step, of: x, leader: null }))
      })
    }
    return { tone: 'part-level', name: '', note: compact ? short : label, places }
  })
}

/** Farther away than this many units of type nobody would know what a label is of. */
const APART = 1

function leaderTo([x, y]: Spot, box: Box, type: number): Leader | null {
  const nearX = Math.max(box.x, Math.min(box.x + box.width, x))
  const nearY = Math.max(box.y, Math.min(box.y + box.height, y))
  return Math.hypot(nearX - x, nearY - y) > APART * type ? [nearX, nearY, x, y] : null
}

/** A label may be so many steps from its end. */
const FARTHEST_STEP = 14

/** To the right and to the left of the end, at ever larger distances up or down. */
function besidePoint(at: Point, plot: Plot, { type }: Frame, led: boolean): Wish['places'] {
  const steps = Array.from({ length: 2 * FARTHEST_STEP + 1 }, (_, i) => (i % 2 === 0 ? i / 2 : -(i + 1) / 2))
  const of = plot.x(at[0])
  return (width, height) => {
    const y = at[1] === Number.POSITIVE_INFINITY ? plot.top + 0.4 * type : plot.y(at[1]) - height - 0.3 * type
    const first = of + 0.7 * type
    const places = steps.flatMap((step) =>
      [first, of - 0.7 * type - width, of - width / 2].map((x) => {
        const box = { x, y: y - step * 0.8 * type, width, height }
        const start = AWAY * Math.hypot(x - first, box.y - y)
        const leader = led ? leaderTo([of, plot.y(at[1])], box, type) : null
        return { x, y: box.y, width, height, start, of, leader }
      }),
    )
    return places.sort((one, other) => one.start - other.start)
  }
}

/** Parts of the visible curve at which it may be named, the best first. */
const PARTS = [0.6, 0.65, 0.55, 0.7, 0.5, 0.75, 0.45, 0.8, 0.4, 0.35, 0.85, 0.3, 0.25, 0.9, 0.2, 0.15, 0.95, 0.1, 0.05]
/** What the next best of them costs, and the next row away from the curve: beyond the first a line has to lead there. Tuned by eye. */
const COST = { part: 0.5, row: 25 }
const ROWS = 4

/** Close above or below the curve, or farther away with a line to it. */
function alongCurve({ segments }: Curve, plot: Plot, { type }: Frame): Wish['places'] {
  const way = alongLine(segments.flat().map(([x, y]) => [plot.x(x), plot.y(y)] as const))
  const gap = 0.35 * type
  return function* (width, height) {
    for (let row = 0; row < ROWS; row++) {
      for (const [rank, part] of PARTS.entries()) {
        const spot = way[Math.floor(part * (way.length - 1))] ?? [0, 0]
        const start = COST.part * rank + COST.row * row
        for (const y of [spot[1] - height * (1 + row) - gap, spot[1] + height * row + gap]) {
          for (const x of [spot[0] - width / 2, spot[0] + gap, spot[0] - width - gap]) {
            const leader = row === 0 ? null : leaderTo(spot, { x, y, width, height }, type)
            yield { x, y, width, height, start, of: x + width / 2, leader }
          }
        }
      }
    }
  }
}
