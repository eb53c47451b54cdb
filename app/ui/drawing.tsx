import { createElement, type ReactNode } from 'react'
import type { SvgNode } from '../../lib/figures/svg'

/** A drawing as elements of the page. */
export function Drawing({ node }: { readonly node: SvgNode }): ReactNode {
  return render(node, 0)
}

function render(node: SvgNode | string, key: number): ReactNode {
  if (typeof node === 'string') return node
  const attributes = Object.entries(node.attributes).map(([name, value]) => [propertyOf(name), value])
  return createElement(node.tag, { key, ...Object.fromEntries(attributes) }, ...node.children.map(render))
}

/** React's names of attributes: `stroke-width` is `strokeWidth`; those of ARIA stay. */
function propertyOf(name: string): string {
  if (name === 'class') return 'className'
  return name.startsWith('aria-') ? name : name.replace(/-([a-z])/g, (_, letter: string) => letter.toUpperCase())
}
