/** What the views draw, against closed forms: matter alone in flat space, a = (3 H₀ t/2)^(2/3) (any textbook). */
import { describe, expect, it } from 'vitest'
import { explorer } from '../../lib/answers/explorer'
import { opened } from '../../lib/answers/opened'
import { panelOf, settled, viewChart } from '../../lib/answers/panel'
import type { Chart } from '../../lib/figures/chart'
import { VIEWS } from '../../lib/figures/views'
import { hubbleLengthGly, hubbleLengthMpc } from '../../lib/units'
import { PLAIN_PLACE, type Place, placeKeys } from '../../lib/words/place'

const H0 = 70
const MATTER = `h0:${H0},matter:1,cmb:0,as:Matter`
const DEMO = opened([]).solutions
const GLY = hubbleLengthGly(H0)

const chartOf = (codes: readonly string[], place: Partial<Place>): Chart =>
  viewChart({ solutions: opened(codes).solutions, place: { ...PLAIN_PLACE, ...place } })

/** Every reading of a curve beside its closed form; five digits are kept. */
function compare(chart: Chart, curve: number, form: (x: number) => number): void {
  const { places, values } = chart.readings
  let compared = 0
  values[curve]?.forEach((value, i) => {
    const exact = form(places[i] as number)
    if (value === null || !Number.isFinite(exact)) return
    compared++
    expect(Math.abs(value - exact)).toBeLessThan(6e-5 * Math.abs(exact) + 1e-9)
  })
  expect(compared).toBeGreaterThan(50)
}

describe('horizons of matter alone', () => {
  it('in comoving coordinates against the scale factor', () => {
    const chart = chartOf([MATTER], { show: 'comoving', by: 'scale' })
    // χ = 2 (1 − √a) back, χ_ph = 2 √a, comoving Hubble radius √a, light sent today 2 (√a − 1), all in c/H₀.
    compare(chart, 0, (a) => (a <= 1 ? 2 * GLY * (1 - Math.sqrt(a)) : Number.NaN))
    compare(chart, 2, (a) => 2 * GLY * Math.sqrt(a))
    compare(chart, 3, (a) => GLY * Math.sqrt(a))
    compare(chart, 4, (a) => (a >= 1 ? 2 * GLY * (Math.sqrt(a) - 1) : Number.NaN))
    // There is no event horizon.
    expect(chart.readings.values[1]?.every((value) => value === null)).toBe(true)
  })

  it('nothing but a constant: the galaxy at z = 1 is lost this very moment', () => {
    // D_C = c z/H₀ with a constant alone, and the event horizon c/H₀.
    const { spots } = chartOf([`h0:${H0},matter:0,cmb:0`], { show: 'comoving' })
    expect(spots.map(({ label }) => label)).toEqual(['seen today', 'last light, now'])
  })
  it('in conformal coordinates light goes straight', () => {
    const chart = chartOf([MATTER], { show: 'conformal' })
    compare(chart, 0, (eta) => (eta <= 0 ? -eta : Number.NaN))
    compare(chart, 4, (eta) => (eta >= 0 ? eta : Number.NaN))
    expect(chart.curves[0]?.segments.flat()).toHaveLength(2)
  })
})

describe('rates and distances of matter alone', () => {
  it('H/(1 + z) = H₀ √(1 + z), q = ½', () => {
    compare(chartOf([MATTER], { view: 'rate' }), 0, (z) => H0 * Math.sqrt(1 + z))
    compare(chartOf([MATTER], { view: 'rate', show: 'q' }), 0, () => 0.5)
  })

  it('D_L = 2 (c/H₀) (1 + z − √(1 + z))', () => {
    const chart = chartOf([MATTER], { view: 'distances', show: 'luminosity', by: 'logredshift' })
    compare(chart, 0, (z) => 2 * hubbleLengthMpc(H0) * (1 + z - Math.sqrt(1 + z)))
  })

  it('as a ratio to another Hubble constant: the inverse of that of both', () => {
    const chart = chartOf([MATTER, 'h0:35,matter:1,cmb:0'], { view: 'distances', compare: 'ratio' })
    compare(chart, 0, () => 1)
    compare(chart, 1, () => 2)
    expect(chart.references).toMatchObject([{ at: 1 }])
  })

  it('contents: nothing but matter', () => {
    const chart = chartOf([MATTER], { view: 'contents' })
    expect(chart.curves.map(({ name }) => name)).toEqual(['cold matter'])
    compare(chart, 0, () => 1)
  })
})

describe('a logarithmic axis of scale factors', () => {
  const axisOf = (...codes: readonly string[]) => chartOf(codes, { view: 'rate', show: 'q', by: 'logscale' }).x
  // E² = Ω_m a⁻³ + (1 − Ω_m) a⁻² of matter alone vanishes at a = Ω_m / (Ω_m − 1).
  const turning = 'h0:70,matter:1.25,dark:0,cmb:0'
  const bouncing = 'h0:70,matter:0,dark:2,cmb:0'
  it('ends a little beyond the largest there is', () => {
    expect(axisOf(turning)).toMatchObject({ from: 1e-5, to: expect.closeTo(5 * 1.25, 9) })
    expect(axisOf(turning, MATTER).to).toBe(100)
  })
  it('begins a little before the least', () => {
    // E² = 2 − a⁻² vanishes at a = √½.
    expect(axisOf(bouncing)).toMatchObject({ from: expect.closeTo(Math.SQRT1_2 / 1.25, 9), to: 100 })
    expect(axisOf(bouncing, MATTER).from).toBe(1e-5)
  })
  it('shows a decade of the past at least', () => {
    expect(chartOf([bouncing], { view: 'distances', by: 'logscale' }).x).toMatchObject({ from: 0.1, to: 1 })
  })
})

describe('the choices of a view', () => {
  const scenarios = DEMO.map(({ scenario }) => scenario)
  const places = VIEWS.flatMap(({ key: view, shows }) =>
    shows.flatMap(({ key: show, by }) => by.map((axis) => ({ ...PLAIN_PLACE, view, show, by: axis }))),
  )

  it.each(places)('$view $show $by: each link opens what it says', (place) => {
    const panel = panelOf({ solutions: DEMO, scenarios, place, frame: 'wide' })
    for (const options of [panel.tabs, ...panel.choices.map((one) => one.options)]) {
      expect(options.filter(({ chosen }) => chosen)).toHaveLength(1)
    }
    expect(panel.figure.x.to).toBeGreaterThan(panel.figure.x.from)
    expect(panel.figure.caption).toMatch(/^\p{Lu}.*\.$/u)
    expect(panel.figure.alternative).toMatch(/^Line chart of /)
  })

  it('lead to themselves, and say no more than they must', () => {
    const start = explorer({ codes: [], keys: new Map() }).panel
    for (const { word, link } of [...start.tabs, ...start.choices.flatMap(({ options }) => options)]) {
      const query = new URL(link, 'http://localhost').searchParams
      const keys = new Map([...query].filter(([key]) => key !== 's'))
      const there = explorer({ codes: query.getAll('s'), keys }).panel
      const all = [...there.tabs, ...there.choices.flatMap(({ options }) => options)]
      expect(all.find((one) => one.word === word && one.chosen)?.link).toBe(link)
    }
    expect(placeKeys(settled({ ...PLAIN_PLACE, view: 'reach', show: 'proper', by: 'time', galaxy: 1 }, DEMO))).toEqual(
      [],
    )
    expect(placeKeys(settled({ ...PLAIN_PLACE, view: 'nowhere', show: 'x', by: 'y' }, DEMO))).toEqual([])
  })

  it('a range that is none is that of the axis', () => {
    for (const [left, right] of [
      [5, 5],
      [9, 1],
      [-3, -1],
    ] as const) {
      const chart = viewChart({ solutions: DEMO, place: { ...PLAIN_PLACE, view: 'rate', left, right } })
      expect([chart.x.from, chart.x.to]).toEqual([0, 6])
    }
    const chart = viewChart({ solutions: DEMO, place: { ...PLAIN_PLACE, view: 'rate', left: -1, right: 2 } })
    expect([chart.x.from, chart.x.to]).toEqual([0, 2])
  })
})
