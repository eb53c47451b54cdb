import type { Metadata } from 'next'
import { retuned } from '../../lib/words/compose-scenario'
import { EDITION } from '../edition'
import { type PageProps, queryOf } from '../keys'
import { Footer } from '../ui/footer'
import { Masthead } from '../ui/masthead'
import { Sentence } from '../ui/symbol'

export const metadata: Metadata = { title: 'H₀ not retuned', robots: { index: false } }

/** Why no Hubble constant keeps what was to be kept, and the way back. */
export default async function NotRetuned(props: PageProps) {
  const result = retuned(await queryOf(props))
  const because = result?.because
  return (
    <div className="page">
      <Masthead />
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
