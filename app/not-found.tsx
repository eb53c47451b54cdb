import { EDITION } from './edition'
import { Footer } from './ui/footer'
import { Masthead } from './ui/masthead'

export const metadata = { title: 'No such page' }

export default function NotFound() {
  return (
    <div className="page">
      <Masthead />
      <main className="lone">
        <h1>There is no such page</h1>
        <p>
          Scenarios live in the address of the <a href="/">explorer</a>, behind <code className="unbroken">?s=</code>.
          Perhaps a part of the link was lost on the way.
        </p>
      </main>
      <Footer data={null} edition={EDITION} />
    </div>
  )
}
