import type { Metadata } from 'next'
import { retuned } from '../../lib/words/compose-scenario'
import { EDITION } from '../edition'
import { Footer } from '../ui/footer'
import { Sentence } from '../ui/symbol'

export const metadata: Metadata = { title: 'H₀ not retuned', robots: { index: false } }

interface Props {
  readonly searchParams: Promise<Readonly<Record<string, string | string[] | undefined>>>
}

/** Why no Hubble constant keeps what was to be kept, and the way back. */
export default async function NotRetuned({ searchParams }: Props) {
  const pairs = Object.entries(await searchParams).flatMap(([key, value]) =>
    [value ?? []].flat().map((one) => [key, one]),
  )
  const result = retuned(new URLSearchParams(pairs))
  const because = result?.because
  return (
    <div className="page">
      <header className="masthead">
        <a className="brand" href="/">
          Longhence
        </a>
      </header>
      <main className="lone">
        <h1>The Hubble constant stays</h1>
        {because ? (
          <p>
            Nothing keeps {result.wish} here: <Sentence text={because} />.
          </p>
        ) : (
          <p>This address names nothing to keep.</p>
        )}
        <p>
          <a href={result?.link ?? '/'}>Back to the scenarios</a>
        </p>
      </main>
      <Footer data={null} edition={EDITION} />
    </div>
  )
}
