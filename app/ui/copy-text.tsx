'use client'

import { type RefObject, useEffect, useRef, useState, useSyncExternalStore } from 'react'

/** How long the confirmation stays, in milliseconds. */
const SHOWN = 2500
const never = () => () => undefined

/** Puts a text on the clipboard; where that is not allowed, selects it. Absent until the page is alive. */
export function CopyText({ title, text }: { readonly title: string; readonly text: string }) {
  const [state, setState] = useState<'ready' | 'copied' | 'by hand'>('ready')
  const ref = useRef<HTMLButtonElement>(null)
  const alive = useSyncExternalStore(
    never,
    () => true,
    () => false,
  )
  useEffect(() => {
    if (state === 'ready') return
    const timer = setTimeout(() => setState('ready'), SHOWN)
    return () => clearTimeout(timer)
  }, [state])
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(text)
      setState('copied')
    } catch {
      select(ref)
      setState('by hand')
    }
  }
  return (
    <span className="copy">
      <button
        ref={ref}
        type="button"
        className={alive ? 'act' : 'act absent'}
        aria-label={`Copy: ${title}`}
        onClick={copy}
      >
        Copy
      </button>
      <span role="status" className="answer">
        {{ ready: '', copied: 'Copied', 'by hand': 'Selected: copy it by hand' }[state]}
      </span>
    </span>
  )
}

/** The text stands beside the button's heading. */
function select(button: RefObject<HTMLButtonElement | null>): void {
  const text = button.current?.closest('.text')?.querySelector('pre')
  if (text) getSelection()?.selectAllChildren(text)
}
