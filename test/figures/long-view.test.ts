import { describe, expect, it } from 'vitest'
import { drawChart } from '../../lib/figures/draw-chart'
import { plainEntry } from '../../lib/figures/entry'
import { type Label, labelHeight, labelWidth } from '../../lib/figures/label'
import { placeLabels } from '../../lib/figures/labels'
import { longView } from '../../lib/figures/long-view'
import { LONG_FRAMES as FRAMES, type Frame, plotOf } from '../../lib/figures/plot'
import { linearRange } from '../../lib/figures/scale'
import { serialize } from '../../lib/figures/svg'
import { type Entry, outwards, type Window, windowOf } from '../../lib/figures/window'
import * as universes from './universes'

const { bounce, deSitter, einsteinDeSitter, flatLambda, milne, phantom, sinking } = universes
const SIX = [flatLambda(), sinking(), phantom(), bounce(), milne(), einsteinDeSitter()]
const SETS = {
  demo: [flatLambda(), sinking(0.12), phantom(-1.25)],
  six: SIX,
  alike: [0.2, 0.25, 0.3, 0.35, 0.4, 0.45].map((matter) => flatLambda(matter, `Matter ${matter}`)),
  crunches: [0.1, 0.12, 0.5, 0.7, 1, 2].map((sink) => sinking(sink, `Sink ${sink}`)),
  'one of a thousand Gyr beside one of one': [flatLambda(0.3, 'slow', 1000), flatLambda(0.3, 'fast', 1)],
  'without a beginning': [deSitter()],
}

/** The visible parts of a curve. */
function partsOf(entry: Entry, { top, ...x }: Window) {
  return entry.lines({ x, y: linearRange(0, top) })
}

describe('the shared window', () => {
  it.each(Object.entries(SETS))('holds now, every origin and every ending within reason: %s', (_, set) => {
    const { from, to } = windowOf(set)
    expect(from).toBeLessThan(0)
    for (const { solution } of set) {
      expect(solution.origin.time ?? 0).toBeGreaterThan(from)
      const end = solution.end.time
      if (end !== null && end < -5 * from) expect(end).toBeLessThan(to)
    }
  })

  it('does not stretch to an ending that is too far', () => {
    const far = sinking(0.0001)
    expect(far.solution.end.time ?? 0).toBeGreaterThan(windowOf([far]).to)
    // A turn that is not shown does not make the window high: the curve fills at least half of it.
    expect(windowOf([far]).top).toBeLessThan(2 * (far.scales([windowOf([far]).to])[0] ?? 0))
    expect(longView([far]).curves[0]).toMatchObject({ note: expect.stringContaining('later: Big Crunch') })
  })

  it('stands still while one scenario changes a little', () => {
    const windows = Array.from({ length: 51 }, (_, i) => windowOf([sinking(), flatLambda(0.25 + 0.001 * i)]))
    const different = new Set(windows.map(({ from, to, top }) => `${from} ${to} ${top}`))
    // The age changes by a sixth, which is three to eight steps; the rest follows from it.
    expect(different.size).toBeGreaterThan(1)
    expect(different.size).toBeLessThan(10)
  })

  it.each([1e-7, 0.0123, 0.02, 1, 1.24999, 4.9, 5, 13.8, 14.51, 99.9, 113, 2.5e9])(
    'goes out to round numbers: %f',
    (size) => {
      const out = outwards(size)
      expect(out).toBeGreaterThanOrEqual(size)
      expect(out).toBeLessThanOrEqual(1.05 * size)
      // So that it does not go on growing.
      expect(outwards(out)).toBe(out)
      expect(String(Number(out.toPrecision(3)))).toBe(String(out))
    },
  )

  it('holds the turn of a crunch', () => {
    const { turnaround } = sinking().solution.end
    expect(windowOf([sinking()]).top).toBeGreaterThan(turnaround?.scale ?? Number.NaN)
  })

  it.each([0.5, 0.2, 0.05, 0.03, 0.02, 0.0145, 0.01, 0.005, 0.002])(
    'holds an ending within ten pasts and a turn within sixteen, and goes far towards a later one: 1 + %f',
    (sink) => {
      const entry = sinking(sink)
      const { origin, end } = entry.solution
      const [past, turn] = [-(origin.time ?? 0), end.turnaround ?? { time: Number.NaN, scale: Number.NaN }]
      const { to, top } = windowOf([entry])
      if ((end.time ?? 0) <= 10 * past) expect(to).toBeGreaterThan(end.time ?? Number.NaN)
      if (turn.time <= 16 * past) {
        expect(to).toBeGreaterThan(1.04 * turn.time)
        expect(top).toBeGreaterThan(turn.scale)
      } else expect(to).toBeGreaterThan(10 * past)
      expect(to).toBeLessThan(20.1 * past)
    },
  )

  it('turns at 112 Gyr and is seen to', () => {
    // In sin^(2/3) the turn comes after (π/2)/(1.5 √0.0145/14 Gyr) − 9.3 Gyr.
    const entry = sinking(0.0145)
    expect(entry.solution.end.turnaround?.time).toBeCloseTo(112.45, 1)
    expect(windowOf([entry]).to).toBeGreaterThan(130)
  })

  it.each([flatLambda(), deSitter(), bounce(), bounce(40), flatLambda(0.01)].map((entry) => [entry] as const))(
    'has no empty future: its curve leaves through the top in the last third, or the future is the shortest',
    (entry) => {
      const { from, to } = windowOf([entry])
      const leaves = Array.from({ length: 1001 }, (_, i) => (to * i) / 1000).find(
        (t) => (entry.scales([t])[0] ?? 9) > 5,
      )
      if (to > -0.5 * from) expect(leaves ?? to).toBeGreaterThan(to * 0.66)
    },
  )

  it('is high enough for an ending at a size, and marks it there', () => {
    const [time, scale] = [18, 9]
    const history = (t: number) => (t > time ? null : scale - (scale - 1) * Math.sqrt(1 - t / time))
    const solution = { ...flatLambda().solution, origin: { ...flatLambda().solution.origin, time: -14 } }
    const end = { ...solution.end, kind: 'singular' as const, time, scale }
    const chart = longView([plainEntry({ ...solution, end }, (times) => times.map(history))])
    expect(chart.y.to).toBeGreaterThan(scale)
    expect(chart.curves[0]?.marks).toContainEqual({ kind: 'cross', at: [time, scale] })
  })
})

describe('a sampled curve', () => {
  it.each(SIX.map((entry) => [entry.solution.label, entry] as const))('%s lies on its closed form', (_, entry) => {
    const window = windowOf(SIX)
    const points = partsOf(entry, window).flat()
    const exact = entry.scales(points.map(([time]) => time))
    points.forEach(([time, scale], i) => {
      const limit = [entry.solution.origin.time, entry.solution.end.time].includes(time)
      // A point on the upper edge is interpolated between samples: a part in a thousand of the window.
      if (!limit) expect(Math.abs(scale - (exact[i] ?? Number.NaN))).toBeLessThan(1e-3 * window.top)
    })
  })

  it.each(SIX.map((entry) => [entry.solution.label, entry] as const))(
    '%s follows it between points too',
    (_, entry) => {
      const window = windowOf(SIX)
      for (const segment of partsOf(entry, window)) {
        segment.slice(1).forEach(([to, high], i) => {
          const [from, low] = segment[i] ?? [to, high]
          const time = (from + to) / 2
          const exact = entry.scales([time])[0] ?? Number.NaN
          // Distance from the chord, each axis in parts of the window; the root at an origin is steep, so height alone
          // would say little. 1e-3 of the window is half a pixel of the wide figure.
          const steep = Math.abs(high - low) / window.top / ((to - from) / (window.to - window.from))
          expect(Math.abs(exact - (low + high) / 2) / window.top / Math.hypot(1, steep)).toBeLessThan(1e-3)
        })
      }
    },
  )

  it('comes in parts where it leaves through the top and returns', () => {
    const parts = partsOf(sinking(), { ...linearRange(-10, 60), top: 1.3 })
    expect(parts).toHaveLength(2)
    expect(parts.map((part) => part.at(0)?.[1])).toEqual([0, 1.3])
    expect(parts.map((part) => part.at(-1)?.[1])).toEqual([1.3, 0])
  })

  it('draws the contraction before a bounce', () => {
    const [first] = partsOf(bounce(), windowOf([bounce()]))[0] ?? []
    expect(first?.[0]).toBeLessThan(-10)
    expect(first?.[1]).toBeGreaterThan(bounce().solution.origin.scale)
  })
})

describe('a range of one’s own', () => {
  const three = [flatLambda(), sinking(), phantom()]

  it('shows what lies in it, with marks of that alone', () => {
    const view = longView(three, 0, { time: null, from: -5, to: 8 })
    expect([view.x.from, view.x.to]).toEqual([-5, 8])
    for (const { segments, marks } of view.curves) {
      for (const [time] of segments.flat()) expect(time >= -5 && time <= 8).toBe(true)
      expect(marks.map(({ kind }) => kind)).toEqual(['arrow', 'arrow'])
    }
    expect(view.y.to).toBeLessThan(5)
  })

  it('may lie where nothing is left', () => {
    const text = serialize(drawChart(longView([sinking()], 0, { time: null, from: 900, to: 1000 }), FRAMES[0] as Frame))
    expect(text).not.toMatch(/NaN|Infinity|undefined/)
  })

  it('has time run logarithmically both ways, with now and every ending in it', () => {
    const { x, ribbons, curves } = longView(three, 0, { time: 'log', from: null, to: null })
    expect(x.scaling).toBe('signed-log')
    expect(x.from).toBeLessThan(flatLambda().solution.origin.time ?? 0)
    for (const { solution } of [sinking(), phantom()]) expect(x.to).toBeGreaterThan(solution.end.time ?? 0)
    expect(curves.map(({ strong }) => strong)).toEqual([true, false, false])
    expect(ribbons).toEqual([])
  })
})

describe('marks', () => {
  const kinds = (entry: (typeof SIX)[number]) => longView([entry]).curves[0]?.marks.map(({ kind }) => kind)

  it('ring an origin, cross an ending, point on where there is none', () => {
    expect(kinds(flatLambda())).toEqual(['ring', 'arrow'])
    expect(kinds(sinking())).toEqual(['ring', 'cross'])
    expect(kinds(deSitter())).toEqual(['arrow', 'arrow'])
    expect(kinds(bounce())).toEqual(['ring', 'arrow', 'arrow'])
    expect(kinds(phantom())).toEqual(['arrow', 'arrow', 'cross'])
  })
})

describe('labels', () => {
  const cases = Object.entries(SETS).flatMap(([name, set]) =>
    FRAMES.map((frame) => [name, frame.id, set, frame] as const),
  )

  it.each(cases)('do not collide and stay on the sheet: %s, %s', (_, __, set, frame) => {
    const view = longView(set)
    const plot = plotOf(frame, { left: 36, right: frame.compact ? 8 : 140, top: 55, bottom: 42 }, view)
    const boxes = placeLabels(view, plot, frame, plot.left + 100).map((label) => boxOf(label, frame))
    boxes.forEach((one, i) => {
      expect(one.left).toBeGreaterThanOrEqual(0)
      expect(one.right).toBeLessThanOrEqual(frame.width + 1)
      for (const other of boxes.slice(i + 1)) {
        expect(
          one.left < other.right && other.left < one.right && one.top < other.bottom && other.top < one.bottom,
        ).toBe(false)
      }
    })
  })

  function boxOf(label: Label, { type }: Frame) {
    const width = labelWidth(label, type)
    const left = label.x - { start: 0, middle: width / 2, end: width }[label.anchor]
    return { left, right: left + width, top: label.y, bottom: label.y + labelHeight(label, type) }
  }
})

describe('the drawing', () => {
  it('has no inline styles, no NaN, and says what it shows', () => {
    for (const frame of FRAMES) {
      const view = longView(SETS.demo)
      const text = serialize(drawChart(view, frame))
      expect(text).not.toMatch(/style=|NaN|Infinity|undefined/)
      expect(text).toContain('role="img"')
      expect(view.alternative).toContain('Steady light: begins in a Big Bang')
    }
  })

  it('escapes what a person typed', () => {
    const text = serialize(drawChart(longView([flatLambda(0.3, '<b>"&')]), FRAMES[2] as Frame))
    expect(text).not.toContain('<b>')
    expect(text).toContain('&lt;b&gt;')
  })

  it('hatches only what extrapolates a law', () => {
    const followed = sinking(0.2, 'one', { eos: 'cpl', law: { w0: -0.6, wa: -1.6 } })
    const held = sinking(0.2, 'one', { eos: 'cpl', law: { w0: -0.6, wa: -1.6 }, beyond: 'hold' })
    expect(longView([followed])).toMatchObject({
      future: 'hatched',
      caption: expect.stringContaining('Hatched: one follows'),
    })
    expect([longView([held]).future, longView([flatLambda()]).future]).toEqual(['tint', 'tint'])
  })
})
