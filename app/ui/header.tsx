import { memo } from 'react'
import type { Desk } from '../../lib/words/desk'
import { type Address, undo } from '../live/address'
import { CopyLink } from './copy-link'
import { Brand } from './masthead'
import { Tables } from './tables'

const NAMES = { paper: 'Paper', night: 'Night' } as const

interface Props {
  readonly desk: Desk
  /** How many changes can be undone. Undefined until the page is alive: what needs that keeps its room. */
  readonly depth: Address['depth'] | undefined
}

export const Header = memo(function Header({ desk, depth }: Props) {
  const { place, links } = desk
  return (
    <header className="masthead">
      <a className="skip" href="#scenarios">
        Skip to the scenarios
      </a>
      <Brand home="/" />
      <div className="acts-of-page">
        <button type="button" className={depth ? 'act' : 'act absent'} onClick={undo}>
          Undo
        </button>
        <CopyLink link={links.here} live={depth !== undefined} />
        <Tables links={links.tables} />
      </div>
      <nav className="themes" aria-label="Theme">
        {links.themes.map(({ theme, link }) => (
          <a key={theme} href={link} rel="nofollow" aria-current={theme === place.theme ? 'true' : undefined}>
            {theme === null ? 'System' : NAMES[theme]}
          </a>
        ))}
      </nav>
    </header>
  )
})
