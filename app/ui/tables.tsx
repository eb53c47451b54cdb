import type { Desk } from '../../lib/words/desk'

/** Rows of every scenario of the page, for a notebook. */
export function Tables({ links }: { readonly links: Desk['links']['tables'] }) {
  return (
    <span className="downloads">
      Table{' '}
      {links.map(({ format, link }) => (
        <a key={format} href={link} rel="nofollow" download aria-label={`Table as ${format}`}>
          {format}
        </a>
      ))}
    </span>
  )
}
