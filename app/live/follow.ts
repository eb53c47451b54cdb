/** Plain clicks on links of this page change it where it stands. */
import type { MouseEvent } from 'react'
import { addressNow, go } from './address'

/** Links whose address the server has to work out first. */
const COMPOSED = '/compose/'

export function follow(event: MouseEvent): void {
  const link = event.target instanceof Element ? event.target.closest('a') : null
  const plain = event.button === 0 && !(event.metaKey || event.ctrlKey || event.shiftKey || event.altKey)
  if (!link || !plain || event.defaultPrevented || link.origin !== location.origin) return
  if (link.getAttribute('href')?.startsWith('#')) return
  if (link.pathname === '/') go(link.href)
  else if (link.pathname.startsWith(COMPOSED)) void compose(link)
  else return
  event.preventDefault()
}

/** Seen to be under way; whatever goes wrong, the browser follows the link as it would have without us. */
async function compose(link: HTMLAnchorElement): Promise<void> {
  const before = addressNow().search
  link.setAttribute('aria-busy', 'true')
  try {
    const response = await fetch(link.href, { headers: { accept: 'application/json' } })
    if (!response.ok) throw new Error(String(response.status))
    const target = new URL((await response.json()).location, location.origin)
    // What was changed meanwhile is newer than what was asked for.
    if (addressNow().search !== before) return
    if (target.pathname === '/') go(target.href)
    else location.assign(target)
  } catch {
    location.assign(link.href)
  } finally {
    link.removeAttribute('aria-busy')
  }
}
