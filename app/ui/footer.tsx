import { ENGINE } from '../../lib/solve'
import { version } from '../../package.json'

export function Footer({ data }: { readonly data: string | null }) {
  return (
    <footer className="colophon">
      <p>
        Homogeneous and isotropic universes of general relativity, with smooth dark energy. What a law says beyond the
        measurements it describes is an assumption, not a forecast.
      </p>
      <p>
        Longhence {version}, engine {ENGINE}. MIT licence.
        {data && (
          <>
            {' '}
            <a href={data} rel="nofollow">
              These numbers as JSON
            </a>
          </>
        )}
      </p>
    </footer>
  )
}
