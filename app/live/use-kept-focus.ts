/** Keyboards go on from where they were: what takes the place of something that had the focus and is gone gets it. */
import { useEffect } from 'react'

const FOCUSABLE = 'a[href], button, input:not([type=hidden]), select, summary, [tabindex="0"]'

interface Last {
  readonly element: HTMLElement
  /** From its parent to the body. */
  readonly ancestors: readonly Element[]
  readonly place: string
  readonly text: string
}

let last: Last | null = null
let watching = false

/** Looks after each change of the page, but for the middle of a gesture. */
export function useKeptFocus(moving: boolean): void {
  useEffect(() => {
    if (!watching) document.addEventListener('focusin', remember)
    watching = true
  }, [])
  useEffect(() => {
    // What is only hidden keeps the focus until the page is drawn.
    if (!moving) requestAnimationFrame(() => requestAnimationFrame(restore))
  })
}

function remember({ target }: FocusEvent): void {
  if (!(target instanceof HTMLElement)) return
  const ancestors: Element[] = []
  for (let one = target.parentElement; one; one = one.parentElement) ancestors.push(one)
  last = { element: target, ancestors, place: placeOf(target), text: textOf(target) }
}

function restore(): void {
  if (!last || document.activeElement !== document.body || isThere(last.element)) return
  const next = successor(last)
  last = null
  next?.focus({ preventScroll: true })
}

/** The same thing drawn anew, else what comes first where it stood; of the page as a whole its main part. */
function successor({ element, ancestors, place, text }: Last): HTMLElement | null {
  const same = [...document.querySelectorAll<HTMLElement>(element.tagName)].find(
    (one) => textOf(one) === text && placeOf(one) === place && isThere(one),
  )
  if (same) return same
  const main = document.querySelector('main')
  for (const one of ancestors) {
    if (!one.isConnected) continue
    if (one.contains(main)) break
    const first = [...one.querySelectorAll<HTMLElement>(FOCUSABLE)].find(isThere)
    if (first) return first
  }
  return main
}

const isThere = (one: HTMLElement): boolean => one.isConnected && one.checkVisibility({ visibilityProperty: true })

/** The part of the page by its name. */
const placeOf = (one: Element): string => {
  const part = one.closest('section, nav, header, figure')
  return part?.getAttribute('aria-label') ?? part?.getAttribute('aria-labelledby') ?? part?.className ?? ''
}

const textOf = (one: Element): string =>
  one.getAttribute('aria-label') ?? one.getAttribute('name') ?? one.textContent ?? ''
