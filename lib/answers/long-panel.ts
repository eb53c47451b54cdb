/** The long view with its links: how time runs along it, and which range of it is shown. */
import type { Chart } from '../figures/chart'
import { entryOf } from '../figures/entry'
import { longView } from '../figures/long-view'
import { type Shown, shownOf } from '../figures/picture'
import { LONG_FRAMES } from '../figures/plot'
import type { Entry } from '../figures/window'
import type { Solution } from '../solve'
import { lately } from './lately'
import { framesOf, linker, type Option, type Subject, type Zoom, zoomOf } from './panel'

export interface LongPanel {
  readonly clocks: readonly Option[]
  readonly zoom: Zoom
  readonly figure: Shown
}

export function longChart({ solutions, place }: Pick<Subject, 'solutions' | 'place'>, read = true): Chart {
  return longView(solutions.map(drawable), place.focus, place, read)
}

/** `read` is a figure with what a cursor reads. */
export function longPanel(subject: Subject, read = true): LongPanel {
  const { place, frame } = subject
  const chart = longChart(subject, read)
  const link = linker(subject)
  const clocks = [
    { word: 'linear', time: null },
    { word: 'logarithmic', time: 'log' as const },
  ]
  return {
    clocks: clocks.map(({ word, time }) => ({
      word,
      link: link({ time, from: null, to: null }),
      chosen: time === place.time,
    })),
    zoom: zoomOf(chart.x, place, link, 'from', 'to'),
    figure: shownOf(chart, framesOf(LONG_FRAMES, frame), 'long', 'chart'),
  }
}

const drawable = (solution: Solution): Entry<Solution> => ({ ...seen(solution), solution })

const seen = lately(({ code }: Solution) => code, entryOf)
