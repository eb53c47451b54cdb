/** `/api/figure`: a view of scenarios as a file for a place. */
import type { Chart } from '../figures/chart'
import { drawChart, heightOfChart } from '../figures/draw-chart'
import { VIEWS } from '../figures/views'
import { askedOf, drawnOf, type View } from '../figures/views/view'
import { fileName } from '../formats/file-name'
import { type Picture, type Sheet, sheetOf } from '../print/sheet'
import { SIZES, type Size } from '../print/sizes'
import { paletteOf, THEME_KEYS, type ThemeKey } from '../print/theme'
import type { About } from '../print/to-svg'
import { DEMO } from '../scenario/demo'
import { type Fault, fault } from '../scenario/problems'
import type { Reading, Scenario } from '../scenario/scenario'
import { linkQuery } from '../scenario/write'
import { ENGINE, type Solution } from '../solve'
import { nameOf } from '../words/desk'
import { pageLink } from '../words/link'
import { type Place, placeKeys } from '../words/place'
import { joined, lowered } from '../words/sentence'
import { verdictOf } from '../words/verdict'
import { count, oneOf, take } from './fields'
import { PLACE_FIELDS, readFigurePlace } from './figure-place'
import { readKeys } from './keys'
import { longChart } from './long-panel'
import { viewChart, viewOf } from './panel'
import { mapped, type Pairs, type Question, scenariosOf, solved } from './question'
import type { Home } from './table'

const LONG = 'long'

/** All views that can be had as files, the default first. */
export const VIEW_KEYS = [{ key: LONG }, ...VIEWS.map(({ key }) => ({ key }))]

/** A chart, and the same without what hangs below it. */
function pictureOf(chart: Chart): Picture {
  const of = (one: Chart): Picture => ({
    draw: (frame) => drawChart(one, frame),
    heightOf: (frame) => heightOfChart(one, frame),
  })
  return chart.ribbons.length === 0 ? of(chart) : { ...of(chart), lean: of({ ...chart, ribbons: [] }) }
}

export const FIGURE_FORMATS = [
  { key: 'svg', mediaType: 'image/svg+xml' },
  { key: 'png', mediaType: 'image/png' },
  { key: 'pdf', mediaType: 'application/pdf' },
] as const
export type FigureFormat = (typeof FIGURE_FORMATS)[number]

const THEMES = THEME_KEYS.map((key) => ({ key }))
export const LEAST_DPI = 96
export const MOST_DPI = 600
export const MOST_PIXELS = 40e6

function told({ key, title, shows }: View): string {
  return `${key}: ${title}, with show one of ${shows.map((show) => show.key).join(', ')}.`
}

export const FIGURE_FIELDS = {
  view: oneOf('view', VIEW_KEYS, `What is drawn. long: scale factor against time. ${VIEWS.map(told).join(' ')}`),
  format: oneOf('format', FIGURE_FORMATS, 'The format of the file.'),
  size: oneOf('size', SIZES, SIZES.map(({ key, label, source }) => `${key}: ${label} (${source}).`).join(' ')),
  theme: oneOf('theme', THEMES, 'Dark on light, or light on dark.'),
  ...PLACE_FIELDS,
  dpi: count('dpi', LEAST_DPI, MOST_DPI, `Dots an inch of a PNG of at most ${MOST_PIXELS / 1e6} megapixels.`),
}

export interface FigureFile {
  readonly format: FigureFormat
  readonly fileName: string
  readonly sheet: Sheet
  readonly about: About
  /** Of a PNG. */
  readonly dpi: number
}

interface Order {
  readonly view: string
  readonly place: Place
  readonly format: FigureFormat
  readonly size: Size
  readonly theme: ThemeKey
  readonly dpi: number
}

export function askFigure(pairs: Pairs, home: Home): Reading<Question<FigureFile>> {
  const keys = readKeys(pairs, Object.keys(FIGURE_FIELDS))
  const faults: Fault[] = [...keys.faults]
  const order = readOrder(keys.values, faults, keys.codes.length || DEMO.codes.length)
  return mapped(scenariosOf(keys.codes, faults), (scenarios) => ({
    canonical: `${linkQuery(scenarios)}&${orderText(order)}`,
    answer: () =>
      mapped(
        solved(scenarios, (one) => one),
        (solutions) => figureFile(scenarios, solutions, order, home),
      ),
  }))
}

function readOrder(values: ReadonlyMap<string, string>, faults: Fault[], scenarios: number): Order {
  const view = take(values, 'view', FIGURE_FIELDS.view, faults)?.key ?? LONG
  const place = readFigurePlace(view, values, scenarios, faults)
  const format = take(values, 'format', FIGURE_FIELDS.format, faults) ?? FIGURE_FORMATS[0]
  const size = take(values, 'size', FIGURE_FIELDS.size, faults) ?? SIZES[0]
  const theme = take(values, 'theme', FIGURE_FIELDS.theme, faults)?.key ?? THEME_KEYS[0]
  const asked = take(values, 'dpi', FIGURE_FIELDS.dpi, faults)
  if (asked !== undefined && format.key !== 'png') {
    faults.push(fault('dpi', String(asked), 'only with format=png', `A file of format ${format.key} has no dots.`))
  }
  const dpi = asked ?? size.dpi
  const most = mostDpi(size, scenarios)
  if (format.key === 'png' && dpi > most) {
    const message = `The picture would have ${(pixelsOf(size, scenarios, dpi) / 1e6).toFixed(0)} megapixels.`
    faults.push(fault('dpi', String(dpi), `up to ${most} with size=${size.key}`, message))
  }
  return { view, place, format, size, theme, dpi }
}

/** At most: each scenario has a ribbon below the plot, and the foot eight lines. In units of the type. */
const RIBBON = 2
const FRAME = 12.5

function pixelsOf({ width, height, fixed, type }: Size, scenarios: number, dpi: number): number {
  const highest = fixed ? height : height + (scenarios * RIBBON + FRAME) * type
  return (width / 72) * dpi * (highest / 72) * dpi
}

const mostDpi = (size: Size, scenarios: number): number =>
  Math.min(MOST_DPI, Math.floor(Math.sqrt(MOST_PIXELS / pixelsOf(size, scenarios, 1))))

function orderText({ view, place, format, size, theme, dpi }: Order): string {
  const dots = format.key === 'png' ? `&dpi=${dpi}` : ''
  const shown = placeKeys({ ...place, view: null, theme: null }).map((pair) => `&${pair}`)
  return `view=${view}${shown.join('')}&format=${format.key}&size=${size.key}&theme=${theme}${dots}`
}

function figureFile(
  scenarios: readonly Scenario[],
  solutions: readonly Solution[],
  { view, place, format, size, theme, dpi }: Order,
  home: Home,
): FigureFile {
  const named = solutions.map((one, slot) => ({ ...one, label: nameOf(one.scenario, slot) }))
  const subject = { solutions: named, place }
  const chart = view === LONG ? longChart(subject) : viewChart(subject)
  const shown = view === LONG ? named : drawnOf(askedOf(viewOf(place), place, named).show, named, place.focus)
  const title = joined(shown.map(({ label }) => label))
  const edition = `Longhence ${home.version}, engine ${ENGINE}`
  const codes = shown.map(({ code }) => decodeURIComponent(code))
  const link = `${home.base}${pageLink(scenarios, place)}&engine=${ENGINE}`
  const names = shown.flatMap(({ scenario }) => scenario.name ?? [])
  return {
    format,
    dpi,
    fileName: fileName([...(names.length > 0 ? names : ['figure']), view, size.key], format.key),
    sheet: sheetOf(pictureOf(chart), size, paletteOf(theme), {
      heading: [title, headline(named[place.focus] as Solution, shown.length)],
      foot: `${edition}: ${codes.join('; ')}`,
    }),
    about: {
      title,
      description: `${chart.caption} ${chart.alternative} Scenarios: ${codes.join('; ')}. ${edition}. ${link}`,
    },
  }
}

/** The verdict on the scenario in focus, which has to be named where it is one of several. */
function headline(solution: Solution, count: number): string {
  const verdict = verdictOf(solution, null).sentences[0] ?? ''
  return count > 1 ? `${solution.label}: ${lowered(verdict)}` : verdict
}
