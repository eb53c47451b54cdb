import type { ReactNode } from 'react'

interface Props {
  /** The entry's anchor on the page of methods. */
  readonly of: string
  readonly children: ReactNode
}

/** A name or symbol that leads to what it means. */
export function Means({ of, children }: Props) {
  return (
    <a className="means" href={`/method#${of}`}>
      {children}
    </a>
  )
}
