import { createElement, type ReactNode } from 'react'
import { formulaTree, type MathNode } from '../../lib/words/formula'
import { Symbols } from '../ui/symbol'

/** Characters from which a formula is wider than a phone: it then scrolls, by keys too. */
const WIDE = 60

/** A formula of the lists, typeset by the browser; what it is said with is text, which can be wrapped. */
export function Formula({ text }: { readonly text: string }) {
  const [formula = '', ...said] = text.split(/, (?=with )/)
  return (
    <>
      <Typeset text={formula} />
      {said.map((words) => (
        <p key={words}>
          <Symbols markup={words} />
        </p>
      ))}
    </>
  )
}

function Typeset({ text }: { readonly text: string }) {
  const wide = text.length > WIDE ? { tabIndex: 0, 'aria-label': text } : {}
  return createElement('math', { display: 'block', ...wide }, element(formulaTree(text), 0))
}

function element(node: MathNode | string, key: number): ReactNode {
  if (typeof node === 'string') return node
  return createElement(node.tag, { key, ...node.attributes }, ...node.children.map(element))
}
