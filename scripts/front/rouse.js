// In the page: fetches its scripts when it has loaded, and has them run at the first sign of a hand, or when nobody has come for a
// while, so that they are ready.
{
  const { nonce, dataset } = document.currentScript
  const sources = dataset.scripts.split(' ')
  const signs = ['pointermove', 'pointerdown', 'touchstart', 'keydown', 'focusin', 'wheel', 'scroll']
  const patience = 3000
  let roused = false
  const scriptOf = (properties) => Object.assign(document.createElement('script'), properties)
  /** One in each turn of the loop, so that none of them is long. */
  const fetchAhead = (hrefs) => {
    const [href, ...others] = hrefs
    if (roused || href === undefined) return
    const link = document.createElement('link')
    document.head.append(Object.assign(link, { rel: 'preload', as: 'script', fetchPriority: 'low', nonce, href }))
    setTimeout(fetchAhead, 0, others)
  }
  const tell = () => {
    for (const told of document.querySelectorAll('[data-rest]'))
      told.replaceWith(scriptOf({ nonce: told.nonce, text: told.text }))
  }
  const rouse = () => {
    if (roused) return
    roused = true
    for (const sign of signs) removeEventListener(sign, rouse, true)
    tell()
    // The rest of it, before those who are told take it for complete.
    if (document.readyState === 'loading') document.addEventListener('DOMContentLoaded', tell)
    for (const src of sources) document.head.append(scriptOf({ src }))
  }
  for (const sign of signs) addEventListener(sign, rouse, { capture: true, passive: true })
  addEventListener('load', () => {
    setTimeout(fetchAhead, 0, sources)
    setTimeout(rouse, patience)
  })
  // A page that was kept for use without a network may have to compute what its address says.
  if (navigator.serviceWorker?.controller) rouse()
}
