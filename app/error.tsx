'use client'

import { Masthead } from './ui/masthead'

/** Where the page itself fails: what can be said, and the ways on. */
export default function Failure({ reset }: { readonly reset: () => void }) {
  return (
    <div className="page">
      <Masthead />
      <main className="lone">
        <h1>This page could not be drawn</h1>
        <p>The fault is ours, not that of the link: the scenario in it is kept in the address.</p>
        <p>
          <button type="button" onClick={reset}>
            Try again
          </button>{' '}
          <a href="/">Open the explorer</a>
        </p>
      </main>
    </div>
  )
}
