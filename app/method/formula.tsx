import { createElement, type ReactNode } from 'react'
import { formulaTree, type MathNode } from '../../lib/words/formula'

/** A formula of the lists, typeset by the browser. */
export function Formula({ text }: { readonly text: string }) {
  return createElement('math', { display: 'block' }, element(formulaTree(text), 0))
}

function element(node: MathNode | string, key: number): ReactNode {
  if (typeof node === 'string') return node
  return createElement(node.tag, { key, ...node.attributes }, ...node.children.map(element))
}
