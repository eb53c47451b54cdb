/** A drawing as a small tree, which a page renders and a file is written from. No inline styles: colours come by class. */

export type Attributes = Readonly<Record<string, string | number>>

export interface SvgNode {
  readonly tag: string
  readonly attributes: Attributes
  readonly children: readonly (SvgNode | string)[]
}

export function svg(tag: string, attributes: Attributes, ...children: readonly (SvgNode | string)[]): SvgNode {
  return { tag, attributes, children }
}

/** Two decimals of a pixel are finer than any screen, and the same text on every engine. */
export function px(value: number): number {
  return Math.round(value * 100) / 100
}

const ENTITIES: Readonly<Record<string, string>> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' }

function escaped(text: string): string {
  return text.replace(/[&<>"]/g, (sign) => ENTITIES[sign] ?? sign)
}

/** The tree as XML text. */
export function serialize(node: SvgNode | string): string {
  if (typeof node === 'string') return escaped(node)
  const attributes = Object.entries(node.attributes).map(([name, value]) => ` ${name}="${escaped(String(value))}"`)
  const opening = `<${node.tag}${attributes.join('')}`
  if (node.children.length === 0) return `${opening}/>`
  return `${opening}>${node.children.map(serialize).join('')}</${node.tag}>`
}
