import { memo } from 'react'
import { type Theme, themed } from '../../lib/words/place'

export interface Edition {
  readonly version: string
  readonly engine: number | string
}

interface Props {
  readonly data: string | null
  readonly theme?: Theme | undefined
  readonly edition: Edition
}

export const Footer = memo(function Footer({ data, edition, theme }: Props) {
  return (
    <footer className="colophon">
      <p>
        Homogeneous and isotropic universes of general relativity, with smooth dark energy. What a law says beyond the
        measurements it describes is an assumption, not a forecast.
      </p>
      <p>
        Longhence {edition.version}, engine {edition.engine}. MIT licence.{' '}
        <a href={themed('/method', theme)}>Methods and sources</a>
        {data && (
          <>
            {' '}
            <a href={data} rel="nofollow">
              These numbers as JSON
            </a>
          </>
        )}
      </p>
      {data && <p className="codes">Scenarios: {codesIn(data).join('; ')}</p>}
    </footer>
  )
})

/** On paper alone, which has no address. */
const codesIn = (data: string): readonly string[] => new URLSearchParams(data.split('?')[1]).getAll('s')
