import type { Explorer } from '../../lib/answers/explorer'
import type { Theme } from '../../lib/words/link'

const NAMES = { paper: 'Paper', night: 'Night' } as const

interface Props {
  readonly themes: Explorer['links']['themes']
  readonly theme: Theme | null
}

export function Header({ themes, theme }: Props) {
  return (
    <header className="masthead">
      <a className="brand" href="/">
        Longhence
      </a>
      <nav className="themes" aria-label="Theme">
        {themes.map((one) => (
          <a key={one.theme} href={one.link} rel="nofollow" aria-current={one.theme === theme ? 'true' : undefined}>
            {one.theme === null ? 'System' : NAMES[one.theme]}
          </a>
        ))}
      </nav>
    </header>
  )
}
