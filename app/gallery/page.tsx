import type { Metadata } from 'next'
import { COLLECTIONS, type Exhibit, exhibitsOf } from '../../lib/answers/gallery'
import { drawChart } from '../../lib/figures/draw-chart'
import { type Frame, LONG_FRAMES, VIEW_FRAMES } from '../../lib/figures/plot'
import { serialize } from '../../lib/figures/svg'
import { placeKeys, THEMES } from '../../lib/words/place'
import type { PageProps } from '../keys'
import { Masthead } from '../ui/masthead'
import { Sentence } from '../ui/symbol'

export const metadata: Metadata = { title: 'Gallery', robots: { index: false, follow: false } }

/** Every figure in both themes, for a set of scenarios and a width at a time. */
export default async function Gallery({ searchParams }: PageProps) {
  const { set, width } = await searchParams
  const collection = COLLECTIONS.find(({ key }) => key === set) ?? COLLECTIONS[0]
  const id = VIEW_FRAMES.find((one) => one.id === width)?.id ?? 'middle'
  if (!collection) return null
  return (
    <div className="page gallery">
      <Masthead />
      <main>
        <h1>Gallery: {collection.title}</h1>
        <nav className="choices" aria-label="Sets">
          {COLLECTIONS.flatMap(({ key, title }) =>
            VIEW_FRAMES.map((frame) => (
              <a key={`${key}${frame.id}`} href={`/gallery?set=${key}&width=${frame.id}`} rel="nofollow">
                {title}, {frame.id}
              </a>
            )),
          )}
        </nav>
        {exhibitsOf(collection).map((exhibit, i) => (
          <Plates key={placeKeys(exhibit.place).join()} exhibit={exhibit} id={id} number={i} />
        ))}
      </main>
    </div>
  )
}

interface PlatesProps {
  readonly exhibit: Exhibit
  readonly id: string
  readonly number: number
}

function Plates({ exhibit: { place, chart }, id, number }: PlatesProps) {
  const frames: readonly Frame[] = place.view === null ? LONG_FRAMES : VIEW_FRAMES
  const frame = frames.find((one) => one.id === id)
  if (!frame) return null
  return (
    <section className="exhibit">
      <h2 className="heading">
        {chart.title} <small>{placeKeys(place).join(' ')}</small>
      </h2>
      <div className="plates">
        {THEMES.map((theme) => {
          const drawing = serialize(drawChart(chart, { ...frame, id: `g${number}-${theme}` }))
          // biome-ignore lint/security/noDangerouslySetInnerHtml: our own drawing, in which every text is escaped
          return <div key={theme} className={`plate ${theme}`} dangerouslySetInnerHTML={{ __html: drawing }} />
        })}
      </div>
      <p>
        <Sentence text={chart.caption} />
      </p>
    </section>
  )
}
