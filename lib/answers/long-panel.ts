/** The long view with its links: how time runs along it, and which range of it is shown. */
import type { Chart } from '../figures/chart'
import { contentsAt } from '../figures/contents'
import { longView } from '../figures/long-view'
import { type Shown, shownOf } from '../figures/picture'
import { LONG_FRAMES } from '../figures/plot'
import { remembered } from '../figures/remembered'
import type { Entry } from '../figures/window'
import { type Solution, scalesAt } from '../solve'
import { lately } from './lately'
import { framesOf, linker, type Option, type Subject, type Zoom, zoomOf } from './panel'

export interface LongPanel {
  readonly clocks: readonly Option[]
  readonly zoom: Zoom
  readonly figure: Shown
}

export function longChart({ solutions, place }: Pick<Subject, 'solutions' | 'place'>): Chart {
  return longView(solutions.map(drawable), place.focus, place)
}

export function longPanel(subject: Subject): LongPanel {
  const { place, frame } = subject
  const chart = longChart(subject)
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

const drawable = (solution: Solution): Entry<Solution> => ({ solution, ...seen(solution) })

/** A figure asks for the same times again while it is dragged about. */
const seen = lately(
  ({ code }: Solution) => code,
  (solution) => {
    const scaleAt = remembered((time) => scalesAt(solution, [time])[0] ?? null)
    return {
      scales: (times: readonly number[]) => times.map(scaleAt),
      contents: remembered((time) => contentsAt(solution, time)),
    }
  },
)
