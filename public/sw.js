/**
 * Keeps the explorer for use without a network: the files of one build from the first visit on, and the latest pages.
 * Pages come from the server whenever it answers; without it from what was kept, at last the plain explorer, which computes
 * by itself whatever its address says.
 */
const PREFIX = 'longhence-'
const CACHE = PREFIX + new URL(location.href).searchParams.get('build')
/** So many pages beside the plain explorer. */
const MOST_PAGES = 30
/** A network that says nothing for so long is none. Milliseconds. */
const PATIENCE = 6000

/** What is opened in a window without being a page. */
const DATA = /^\/(api\/|longhence\.d\.ts$)/

/** The windows whose page was one that had been kept. */
const kept = new Set()

self.addEventListener('install', (event) => event.waitUntil(fill()))
self.addEventListener('activate', (event) => event.waitUntil(takeOver()))

self.addEventListener('fetch', (event) => {
  const { request } = event
  const { origin, pathname } = new URL(request.url)
  if (request.method !== 'GET' || origin !== location.origin) return
  if (pathname.startsWith('/_next/static/')) event.respondWith(fixed(request))
  else if (request.mode === 'navigate' && !DATA.test(pathname)) event.respondWith(page(event))
})

self.addEventListener('message', ({ source, data }) => {
  if (data === 'whence' && kept.delete(source.id)) source.postMessage('kept')
})

async function fill() {
  const cache = await caches.open(CACHE)
  const { files } = await (await fetch('/kept.json', { cache: 'no-store' })).json()
  await cache.addAll(files)
  await cache.add(new Request('/', { cache: 'no-store' }))
}

async function takeOver() {
  const names = (await caches.keys()).filter((name) => name.startsWith(PREFIX) && name !== CACHE)
  await Promise.all(names.map((name) => caches.delete(name)))
  await self.clients.claim()
}

/** Their names hold a hash of their content; what a query adds is for the file itself. */
async function fixed(request) {
  const cache = await caches.open(CACHE)
  const known = await cache.match(request, { ignoreSearch: true, ignoreVary: true })
  // A response without an address of its own leaves to a worker the fragment that it was called with.
  if (known) return new Response(known.body, known)
  const response = await fetch(request)
  if (response.ok) await cache.put(request, response.clone())
  return response
}

async function page(event) {
  const { request, resultingClientId } = event
  const fromServer = fetch(request)
  try {
    const response = await inTime(fromServer)
    if (response.ok) event.waitUntil(keep(request, response.clone()))
    return response
  } catch {
    const cache = await caches.open(CACHE)
    const known = (await cache.match(request, { ignoreVary: true })) ?? (await plain(cache, request))
    if (!known) return fromServer
    kept.add(resultingClientId)
    return known
  }
}

/** Only the explorer can show what it was not made for. */
function plain(cache, request) {
  return new URL(request.url).pathname === '/' ? cache.match('/', { ignoreVary: true }) : undefined
}

function inTime(promise) {
  return Promise.race([promise, new Promise((_, reject) => setTimeout(reject, PATIENCE))])
}

async function keep(request, response) {
  const cache = await caches.open(CACHE)
  await cache.put(request, response)
  const pages = (await cache.keys()).filter(({ url }) => isPage(new URL(url)))
  await Promise.all(pages.slice(0, -MOST_PAGES).map((old) => cache.delete(old)))
}

const isPage = ({ pathname, search }) => !pathname.startsWith('/_next/') && pathname + search !== '/'
