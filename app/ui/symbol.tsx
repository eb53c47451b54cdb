import { runsOf } from '../../lib/words/symbol'

/** The markup of labels, with subscripts and superscripts; letters that stand alone are symbols and slanted. */
export function Symbols({ markup }: { readonly markup: string }) {
  return runsOf(markup).map(({ kind, text }, i) => {
    const key = `${i}${text}`
    if (kind === 'sub') return <sub key={key}>{text}</sub>
    return kind === 'sup' ? <sup key={key}>{text}</sup> : <Plain key={key} text={text} />
  })
}

function Plain({ text }: { readonly text: string }) {
  const parts = text.split(/(?<!\p{L})(\p{L})(?!\p{L})/u)
  return parts.map((part, i) => {
    const key = `${i}${part}`
    return i % 2 === 1 ? <i key={key}>{part}</i> : part
  })
}
