import { createElement, type ReactNode } from 'react'
import type { Attributes, SvgNode } from '../../lib/figures/svg'

/** A drawing as elements of the page. */
export function Drawing({ node }: { readonly node: SvgNode }): ReactNode {
  return render(node, 0)
}

function render(node: SvgNode | string, key: number): ReactNode {
  if (typeof node === 'string') return node
  return createElement(node.tag, { key, ...propertiesOf(node.attributes) }, ...node.children.map(render))
}

/** As React names them. */
export const propertiesOf = (attributes: Attributes): Attributes =>
  Object.fromEntries(Object.entries(attributes).map(([name, value]) => [propertyOf(name), value]))

/** React's names of attributes: `stroke-width` is `strokeWidth`; those of ARIA stay. */
function propertyOf(name: string): string {
  if (name === 'class') return 'className'
  return name.startsWith('aria-') ? name : name.replace(/-([a-z])/g, (_, letter: string) => letter.toUpperCase())
}
