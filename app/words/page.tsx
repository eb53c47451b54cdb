import type { Metadata } from 'next'
import { opened } from '../../lib/answers/opened'
import { wordsOf } from '../../lib/answers/words'
import { linkQuery } from '../../lib/scenario/write'
import { ENGINE } from '../../lib/solve'
import { THEMES, themed } from '../../lib/words/place'
import { HOME } from '../api/home'
import { EDITION } from '../edition'
import { all, type PageProps } from '../keys'
import { Footer } from '../ui/footer'
import { Masthead } from '../ui/masthead'
import { TakeAwayWords } from '../ui/take-away-words'

export const metadata: Metadata = {
  title: 'Words to take away',
  description: 'Captions, methods, summaries, press cards, LaTeX macros and references of scenarios.',
  robots: { index: false },
}

/** The words of scenarios, complete without scripts. */
export default async function Page({ searchParams }: PageProps) {
  const { s, theme: asked } = await searchParams
  const theme = THEMES.find((one) => one === asked)
  const kept = theme ? [`theme=${theme}`] : []
  const { solutions, problems } = opened(all(s))
  const query = linkQuery(solutions.map(({ scenario }) => scenario))
  const edition = { version: HOME.version, engine: ENGINE, link: `${HOME.base}/?${query}&engine=${ENGINE}` }
  return (
    <div className="page" data-theme={theme}>
      <Masthead home={themed('/', theme)} />
      <main className="take-away alone">
        <h1>Words to take away</h1>
        {problems.length > 0 && (
          <p role="alert">The link could not be read as written; these are the words of what could.</p>
        )}
        <p>
          <a href={`/?${[query, ...kept].join('&')}`}>Open in the explorer</a>
        </p>
        <TakeAwayWords words={wordsOf(solutions, edition)} level={2} />
      </main>
      <Footer data={null} edition={EDITION} theme={theme} />
    </div>
  )
}
