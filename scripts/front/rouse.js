// In the page: has its scripts run at the first sign of a hand, or when nobody has come for a while, so that they are ready.
{
  const sources = document.currentScript.dataset.scripts.split(' ')
  const signs = ['pointermove', 'pointerdown', 'touchstart', 'keydown', 'focusin', 'wheel', 'scroll']
  const patience = 3000
  let roused = false
  const scriptOf = (properties) => Object.assign(document.createElement('script'), properties)
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
  addEventListener('load', () => setTimeout(rouse, patience))
  // A page that was kept for use without a network may have to compute what its address says.
  if (navigator.serviceWorker?.controller) rouse()
}
