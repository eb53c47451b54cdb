import { Fragment, type ReactNode } from 'react'
import { runsOf } from '../../lib/words/symbol'

/** The markup of labels, with subscripts and superscripts; letters that stand alone are symbols and slanted. */
export function Symbols({ markup }: { readonly markup: string }) {
  return <Scripts markup={markup} plain={(text) => <Slanted text={text} />} />
}

/** The same within a sentence, where a letter that stands alone may be a word. */
export function Sentence({ text }: { readonly text: string }) {
  return <Scripts markup={text} plain={unbroken} />
}

/** Relations keep what they relate on one line. */
const unbroken = (run: string): string => run.replace(/ ([=<>≤≥]) /g, '\u00a0$1\u00a0')

function Scripts({ markup, plain }: { readonly markup: string; readonly plain: (text: string) => ReactNode }) {
  return runsOf(markup).map(({ kind, text }, i) => {
    const key = `${i}${text}`
    if (kind === 'sub') {
      return (
        <sub key={key} className={text === '*' ? 'star' : undefined}>
          {text}
        </sub>
      )
    }
    return kind === 'sup' ? <sup key={key}>{text}</sup> : <Fragment key={key}>{plain(text)}</Fragment>
  })
}

/** Upright here: the slanted face draws it as ϑ. */
const UPRIGHT = 'θ'

function Slanted({ text }: { readonly text: string }) {
  const parts = text.split(/(?<!\p{L})(\p{L})(?!\p{L})/u)
  return parts.map((part, i) => {
    const key = `${i}${part}`
    return i % 2 === 1 && part !== UPRIGHT ? <i key={key}>{part}</i> : part
  })
}
