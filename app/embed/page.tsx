import '../styles/embed.css'
import type { Metadata } from 'next'
import { opened } from '../../lib/answers/opened'
import { figureOf } from '../../lib/answers/words'
import { drawChart } from '../../lib/figures/draw-chart'
import { LONG_FRAMES } from '../../lib/figures/plot'
import { linkQuery } from '../../lib/scenario/write'
import { ENGINE } from '../../lib/solve'
import { nameOf } from '../../lib/words/desk'
import { THEMES } from '../../lib/words/place'
import { all, type PageProps } from '../keys'
import { DataTable, tableOf } from '../ui/data-table'
import { Drawing } from '../ui/drawing'

export const metadata: Metadata = { title: 'Figure', robots: { index: false } }

/** The figure alone, for a frame in somebody else's page. */
export default async function Embed({ searchParams }: PageProps) {
  const { s, theme } = await searchParams
  const { solutions, problems } = opened(all(s))
  const figure = figureOf(solutions.map((one, slot) => ({ ...one, label: nameOf(one.scenario, slot) })))
  const home = `/?${linkQuery(solutions.map(({ scenario }) => scenario))}&engine=${ENGINE}`
  return (
    <main className="embed" data-theme={THEMES.find((one) => one === theme)}>
      <h1 className="spoken">Scale factor against time</h1>
      {LONG_FRAMES.map((frame) => (
        <div key={frame.id} className={`frame ${frame.id}`}>
          <Drawing node={drawChart(figure, frame, 'chart')} />
        </div>
      ))}
      <div className="foot">
        <DataTable {...tableOf(figure)} />
        <p className="origin">
          {problems.length > 0 && 'The link could not be read as written. '}
          <a href={home} target="_blank" rel="noopener">
            Longhence
          </a>
        </p>
      </div>
    </main>
  )
}
