/** The head of every page but the explorer: whose it is, and the way back to `home`. */
export function Masthead({ home = '/' }: { readonly home?: string }) {
  return (
    <header className="masthead">
      <Brand home={home} />
    </header>
  )
}

export function Brand({ home }: { readonly home: string }) {
  return (
    <a className="brand" href={home}>
      Longhence
    </a>
  )
}
