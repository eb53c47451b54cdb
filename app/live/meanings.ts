/**
 * Beside a name or number that the pointer rests on, or that the keyboard has reached: its entry, taken from the page of
 * methods, which the link itself opens. Loaded after the rest of the page.
 */

/** Milliseconds until a pointer that rests is meant, and until one that left is gone. */
const REST = 350
const GONE = 250
const GAP = 8

let page: Promise<Document> | undefined
let timer: ReturnType<typeof setTimeout> | undefined
let shown: Element | null = null
let box: HTMLElement | null = null

const nameAt = (target: EventTarget | null): Element | null =>
  target instanceof Element ? target.closest('a.means, [data-means]') : null

const anchorOf = (name: Element): string =>
  name instanceof HTMLAnchorElement ? name.hash.slice(1) : (name.getAttribute('data-means') ?? '')

function methods(): Promise<Document> {
  page ??= fetch('/method')
    .then((response) => (response.ok ? response.text() : Promise.reject(new Error(String(response.status)))))
    .then((text) => new DOMParser().parseFromString(text, 'text/html'))
    .catch((error: unknown) => {
      page = undefined
      throw error
    })
  return page
}

async function show(name: Element): Promise<void> {
  shown?.removeAttribute('aria-describedby')
  shown = name
  const entry = (await methods()).getElementById(anchorOf(name))?.cloneNode(true)
  if (shown !== name || !(entry instanceof Element) || !name.isConnected) return
  entry.removeAttribute('id')
  for (const one of entry.querySelectorAll('[id]')) one.removeAttribute('id')
  for (const link of entry.querySelectorAll('a')) link.replaceWith(...link.childNodes)
  const open = boxOf()
  open.replaceChildren(entry)
  open.showPopover()
  placed(open, name.getBoundingClientRect())
  name.setAttribute('aria-describedby', open.id)
}

function boxOf(): HTMLElement {
  if (box) return box
  box = document.createElement('div')
  box.id = 'meaning'
  box.className = 'meaning'
  box.popover = 'manual'
  box.setAttribute('role', 'tooltip')
  box.addEventListener('pointerenter', () => clearTimeout(timer))
  box.addEventListener('pointerleave', () => later(hide, GONE))
  // Within the page, whose theme it has.
  ;(document.querySelector('.page') ?? document.body).append(box)
  return box
}

/** Below the name, or above it where there is more room; never over it. */
function placed(open: HTMLElement, { left, top, bottom }: DOMRect): void {
  open.style.maxHeight = ''
  const { width, height } = open.getBoundingClientRect()
  const [above, below] = [top - 2 * GAP, innerHeight - bottom - 2 * GAP]
  const goesBelow = height <= below || below >= above
  const most = Math.min(height, Math.max(above, below))
  open.style.maxHeight = `${most}px`
  open.style.left = `${Math.max(GAP, Math.min(left, innerWidth - width - GAP))}px`
  open.style.top = `${goesBelow ? bottom + GAP : top - GAP - most}px`
}

/** It goes along with its name, as far as that is seen. */
function moved(): void {
  if (!box?.matches(':popover-open') || !shown) return
  const place = shown.getBoundingClientRect()
  if (place.bottom < 0 || place.top > innerHeight) hide()
  else placed(box, place)
}

function hide(): void {
  clearTimeout(timer)
  shown?.removeAttribute('aria-describedby')
  shown = null
  if (box?.matches(':popover-open')) box.hidePopover()
}

function later(what: () => void, after: number): void {
  clearTimeout(timer)
  timer = setTimeout(what, after)
}

const start = (name: Element, after: number) => later(() => void show(name).catch(() => undefined), after)

let watching = false

/** Listens on the whole page, so that names may come and go. */
export function watchMeanings(): void {
  if (watching) return
  watching = true
  document.addEventListener('pointerover', ({ target, pointerType }) => {
    const name = pointerType === 'mouse' ? nameAt(target) : null
    if (name && name === shown) clearTimeout(timer)
    else if (name) start(name, REST)
  })
  document.addEventListener('pointerout', ({ target }) => {
    if (nameAt(target)) later(hide, GONE)
  })
  document.addEventListener('focusin', ({ target }) => {
    const name = nameAt(target)
    if (name?.matches(':focus-visible')) start(name, 0)
    else hide()
  })
  document.addEventListener('keydown', ({ key }) => key === 'Escape' && hide())
  document.addEventListener('scroll', moved, { passive: true })
}
