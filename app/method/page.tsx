import type { Metadata } from 'next'
import { method } from '../../lib/answers/method'
import { THEMES, themed } from '../../lib/words/place'
import { EDITION } from '../edition'
import { Footer } from '../ui/footer'
import { EntryOfMethod } from './entry'

export const metadata: Metadata = {
  title: 'Methods',
  description: 'Every quantity, law and parameter with symbol, formula, unit, meaning, accuracy and source.',
}

interface Props {
  readonly searchParams: Promise<Readonly<Record<string, string | string[] | undefined>>>
}

export default async function Method({ searchParams }: Props) {
  const asked = (await searchParams).theme
  const theme = THEMES.find((one) => one === asked)
  const sections = method()
  return (
    <div className="page" data-theme={theme}>
      <header className="masthead">
        <a className="brand" href={themed('/', theme)}>
          Longhence
        </a>
      </header>
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
