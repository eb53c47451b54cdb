import { useEffect } from 'react'

/** Asks the service worker whether the page that it gave was one that it had kept, because the server was gone. */
const WHENCE = 'whence'

/** Keeps the page for use without a network, and tells where that is how it was opened. */
export function useOffline(opened: () => void): void {
  useEffect(() => {
    const { serviceWorker } = navigator
    if (!serviceWorker) return
    const heard = ({ data }: MessageEvent<unknown>) => data === 'kept' && opened()
    serviceWorker.addEventListener('message', heard)
    serviceWorker.startMessages()
    serviceWorker.controller?.postMessage(WHENCE)
    const stop = onceLoaded(register)
    return () => {
      stop()
      serviceWorker.removeEventListener('message', heard)
    }
  }, [opened])
}

/** Its address changes with each build, so that every build has a worker of its own. */
function register(): void {
  // Refused by some browsers in private windows: then there is nothing to keep.
  navigator.serviceWorker.register(`/sw.js?build=${process.env.NEXT_PUBLIC_BUILD ?? ''}`).catch(() => undefined)
}

/** What the visitor came for has precedence. */
function onceLoaded(act: () => void): () => void {
  if (document.readyState === 'complete') {
    act()
    return () => {}
  }
  window.addEventListener('load', act, { once: true })
  return () => window.removeEventListener('load', act)
}
