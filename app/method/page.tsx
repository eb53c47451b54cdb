import type { Metadata } from 'next'
import { method } from '../../lib/answers/method'
import { THEMES, themed } from '../../lib/words/place'
import { EDITION } from '../edition'
import type { PageProps } from '../keys'
import { Footer } from '../ui/footer'
import { Masthead } from '../ui/masthead'
import { EntryOfMethod } from './entry'

export const metadata: Metadata = {
  title: 'Methods',
  description: 'Every quantity, law and parameter with symbol, formula, unit, meaning, accuracy and source.',
}

export default async function Method({ searchParams }: PageProps) {
  const asked = (await searchParams).theme
  const theme = THEMES.find((one) => one === asked)
  const sections = method()
  return (
    <div className="page" data-theme={theme}>
      <Masthead home={themed('/', theme)} />
      <main className="methods">
        <h1>Methods</h1>
        <nav aria-label="Sections">
          {sections.map(({ anchor, title }) => (
            <a key={anchor} href={`#${anchor}`}>
              {title}
            </a>
          ))}
        </nav>
        {sections.map(({ anchor, title, entries }) => (
          <section key={anchor} aria-labelledby={anchor}>
            <h2 id={anchor}>{title}</h2>
            {entries.map((one) => (
              <EntryOfMethod key={one.anchor} entry={one} level={3} />
            ))}
          </section>
        ))}
      </main>
      <Footer data={null} edition={EDITION} theme={theme} />
    </div>
  )
}
