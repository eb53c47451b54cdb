/** Labels of scenarios that try them hard: none lies on another, none leaves the sheet, few lie on curves. */
import { describe, expect, it } from 'vitest'
import { exhibitsOf } from '../../lib/answers/gallery'
import type { Chart } from '../../lib/figures/chart'
import { plotOfChart } from '../../lib/figures/draw-chart'
import { titleWidth } from '../../lib/figures/draw-text'
import { boxOf, type Label } from '../../lib/figures/label'
import { placeLabels } from '../../lib/figures/labels'
import { alongLine, type Box, coverOf, type Spot } from '../../lib/figures/obstacles'
import { type Frame, type Plot, VIEW_FRAMES } from '../../lib/figures/plot'
import { placeKeys } from '../../lib/words/place'

const SETS: Readonly<Record<string, readonly string[]>> = {
  loitering: ['h0:65,matter:0.1,dark:1.4,as:Loitering', 'h0:70,matter:0.3'],
  'longer loitering': ['h0:70,matter:0.3,dark:1.7134,as:Loitering'],
  collapsing: ['h0:70,matter:1.4,dark:0,as:Closed and heavy', 'h0:60,matter:2.5,dark:0.1'],
  'with long names': [
    'h0:70,matter:0.3,as:A universe of matter and a constant',
    'h0:70,matter:0.25,eos:cpl,w0:-0.9,wa:0.2,as:Dark energy that thaws as far as seen',
    'h0:73.04,matter:0.3,eos:constant,w:-1.1,as:A high Hubble constant with phantom energy',
    'h0:70,matter:1.2,dark:0,as:Closed without any dark energy at all',
  ],
  ripping: ['h0:72,matter:0.28,eos:constant,w:-1.25', 'h0:70,matter:0.3,eos:constant,w:-3'],
}
const NARROW = VIEW_FRAMES[0] as Frame
const SLIDE: Frame = { id: 'slide', width: 585, height: 295, type: 15, compact: false }

function labelsOf(chart: Chart, frame: Frame): readonly Label[] {
  const plot = plotOfChart(chart, frame)
  const free = (frame.compact ? 0 : plot.left) + titleWidth(chart.y, 0.9 * frame.type) + frame.type
  return placeLabels(chart, plot, frame, free)
}

const overlap = (one: Box, other: Box): boolean =>
  one.x < other.x + other.width &&
  other.x < one.x + one.width &&
  one.y < other.y + other.height &&
  other.y < one.y + one.height

/** Spots of curves, five pixels apart, under a label. */
function hidden({ curves }: Chart, plot: Plot, boxes: readonly Box[]): number {
  const spots = curves.flatMap(({ segments }) =>
    segments.flatMap((segment) => alongLine(segment.map(([x, y]): Spot => [plot.x(x), plot.y(y)]))),
  )
  const within = ({ x, y, width, height }: Box) =>
    spots.filter(([a, b]) => a > x && a < x + width && b > y + 2 && b < y + height - 2).length
  return boxes.reduce((sum, box) => sum + within(box), 0)
}

describe.each(Object.entries(SETS))('labels: %s', (title, codes) => {
  const exhibits = exhibitsOf({ key: 'awkward', title, codes })
  it.each([NARROW, SLIDE].map((frame) => [frame.id, frame] as const))('on a sheet that is %s', (_, frame) => {
    let covered = 0
    for (const { chart, place } of exhibits) {
      const where = placeKeys(place).join('&')
      const labels = labelsOf(chart, frame)
      const boxes = labels.map((label) => boxOf(label, frame.type))
      // Ribbons are a key to hue and dash; where there are none every curve that is seen bears its name.
      const seen = chart.curves.filter(({ finish }) => finish !== null)
      if (chart.ribbons.length === 0)
        expect(
          labels.filter(({ name }) => name !== ''),
          where,
        ).toHaveLength(seen.length)
      boxes.forEach((one, i) => {
        expect(one.x, where).toBeGreaterThanOrEqual(-1)
        expect(one.x + one.width, where).toBeLessThanOrEqual(frame.width + 1)
        for (const other of boxes.slice(i + 1)) expect(overlap(one, other), where).toBe(false)
      })
      covered += hidden(chart, plotOfChart(chart, frame), boxes)
    }
    // Labels lie beside curves, not on them. The bounds are the worst of these with room to spare; long names are half a phone wide.
    expect(covered / exhibits.length).toBeLessThan(title === 'with long names' ? 5 : 2)
  })
})

it('counts the spots that a box covers', () => {
  const covered = coverOf([
    [1, 1],
    [10, 10],
    [41, 3],
    [200, 90],
  ])
  const box = (x: number, y: number, width: number, height: number) => covered({ x, y, width, height })
  expect(box(0, 0, 12, 12)).toBe(2)
  expect(box(38, 0, 8, 8)).toBe(1)
  expect(box(-50, -50, 500, 500)).toBe(4)
  expect(box(60, 20, 80, 40)).toBe(0)
  expect(box(198, 88, 400, 400)).toBe(1)
  expect(box(-40, -40, 20, 20)).toBe(0)
  expect(box(300, 300, 20, 20)).toBe(0)
})

describe('a name within a narrow figure that is nearer to another curve than to its own', () => {
  const distances = (codes: readonly string[]) => {
    const { chart } =
      exhibitsOf({ key: 'narrow', title: '', codes }).find(({ place }) => place.view === 'distances') ?? {}
    if (!chart) throw new Error('no view of distances')
    return { chart, labels: labelsOf(chart, NARROW).filter(({ name }) => name !== '') }
  }
  it('bears the stroke of its own, as do those beside it', () => {
    const matters = [0.1, 0.12, 0.14, 0.16, 0.18, 0.2]
    const { chart, labels } = distances(matters.map((one) => `h0:70,matter:${one},as:Matter ${one}`))
    expect(labels.map(({ swatch, name }) => [name, swatch?.dash]).toSorted()).toEqual(
      chart.curves.map(({ dash, name }) => [name, dash]),
    )
  })
  it('and none where each is next to its own', () => {
    const { labels } = distances(['h0:70,matter:0.1', 'h0:70,matter:2'])
    expect(labels.map(({ swatch }) => swatch)).toEqual([undefined, undefined])
  })
})
