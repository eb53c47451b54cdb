import { useEffect, useRef, useState } from 'react'

/** How long the confirmation stays, in milliseconds. */
const SHOWN = 2500

interface Props {
  readonly link: string
  readonly live: boolean
}

/** Puts the link of the page on the clipboard; where that is not allowed, shows it selected. */
export function CopyLink({ link, live }: Props) {
  const [state, setState] = useState<'ready' | 'copied' | 'by hand'>('ready')
  const button = useRef<HTMLButtonElement>(null)
  useEffect(() => {
    if (state !== 'copied') return
    const timer = setTimeout(() => setState('ready'), SHOWN)
    return () => clearTimeout(timer)
  }, [state])
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(whole(link))
      setState('copied')
    } catch {
      setState('by hand')
    }
  }
  return (
    <span className="copy">
      <button ref={button} type="button" className={live ? 'act' : 'act absent'} onClick={copy}>
        <span aria-hidden={state === 'copied'} className={state === 'copied' ? 'absent' : undefined}>
          Copy link
        </span>
      </button>
      <span role="status" className="answer">
        {state === 'copied' && 'Copied'}
      </span>
      {state === 'by hand' && (
        <ByHand link={whole(link)} close={() => setState('ready')} leave={() => button.current?.focus()} />
      )}
    </span>
  )
}

const whole = (link: string): string => new URL(link, location.href).href

interface ByHandProps {
  readonly link: string
  readonly close: () => void
  /** Back to where it was opened. */
  readonly leave: () => void
}

function ByHand({ link, close, leave }: ByHandProps) {
  return (
    <span className="by-hand">
      <label htmlFor="link-by-hand">The browser does not let this page use the clipboard. Copy from here:</label>
      <input
        id="link-by-hand"
        readOnly
        value={link}
        ref={(input) => input?.select()}
        onBlur={close}
        onKeyDown={({ key }) => key === 'Escape' && leave()}
      />
    </span>
  )
}
