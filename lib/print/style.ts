/** Classes of a drawing as attributes, so that it looks the same where there is no style sheet. */
import { type Attributes, type SvgNode, svg } from '../figures/svg'
import type { Palette } from './theme'

/** Colours by name; `hue` is that of the scenario, set by an ancestor's `slot-…`. */
type Style = Readonly<Record<string, string | number>>

/** As in app/styles/figure.css. Several classes of one element add up, the later ones here over the earlier. */
const STYLES: readonly (readonly [classes: string, style: Style])[] = [
  ['tint', { fill: 'tint' }],
  ['hatch', { fill: 'none', stroke: 'hatch', 'stroke-width': 1.2 }],
  ['veil', { fill: 'none', stroke: 'veil', 'stroke-width': 1.6 }],
  ['faster', { fill: 'hue' }],
  ['era radiation', { fill: 'radiation' }],
  ['era matter', { fill: 'matter' }],
  ['era curvature', { fill: 'curvature' }],
  ['era dark-energy', { fill: 'dark-energy' }],
  ['era-word', { fill: 'on-ribbon' }],
  ['era-word matter', { fill: 'on-ribbon' }],
  ['era-word curvature', { fill: 'on-ribbon' }],
  ['era-word dark-energy', { fill: 'on-dark-energy' }],
  ['era-word radiation', { fill: 'ground' }],
  ['grid', { stroke: 'rule' }],
  ['base', { stroke: 'edge' }],
  ['tick', { stroke: 'edge' }],
  ['now', { stroke: 'ink', 'stroke-width': 1.4 }],
  ['axis', { fill: 'soft' }],
  ['symbol', { 'font-style': 'italic' }],
  ['now-text', { fill: 'ink', 'font-weight': 600 }],
  ['curve', { fill: 'none', stroke: 'hue', 'stroke-linecap': 'round', 'stroke-linejoin': 'round' }],
  ['cross', { fill: 'none', stroke: 'hue', 'stroke-linecap': 'round' }],
  ['asymptote', { fill: 'none', stroke: 'hue' }],
  // Not `opacity`, which asks for a layer: the library that draws pixels dies of one that lies outside of the rows it draws.
  ['leader', { fill: 'none', stroke: 'hue', 'stroke-opacity': 0.55 }],
  ['ring', { fill: 'ground', stroke: 'hue' }],
  ['arrow', { fill: 'hue' }],
  ['name', { fill: 'hue', 'font-weight': 600, halo: 'ground' }],
  ['note', { fill: 'hue', halo: 'ground' }],
  ['reference', { stroke: 'edge', 'stroke-dasharray': '2 3' }],
  ['spot', { fill: 'hue', stroke: 'ground', 'stroke-width': 1.5 }],
  ['heading', { fill: 'ink', 'font-weight': 600 }],
  ['foot', { fill: 'soft' }],
]
const SCENARIO = /^(?:slot|ink)-(\d)$/
/** What is no scenario has a hue too, as in app/styles/views.css. */
const PARTS: Readonly<Record<string, string>> = {
  'part-cone': 'ink',
  'part-galaxy': 'soft',
  'part-level': 'soft',
  'part-event': 'hue-1',
  'part-particle': 'hue-2',
  'part-hubble': 'hue-3',
  'part-sent': 'hue-4',
  'part-dark': 'hue-4',
  'part-matter': 'ink',
  'part-radiation': 'hue-3',
  'part-neutrino': 'hue-5',
  'part-curvature': 'soft',
}
/** Marks of the drawing as such, which look like nothing. */
const BARE = new Set(['drawn', 'chart', 'quiet'])
const COLOURED = new Set(['fill', 'stroke', 'halo'])

export function styled(node: SvgNode, palette: Palette, hue = 'hue-0'): SvgNode {
  const { class: names = '', ...others } = node.attributes
  const classes = String(names)
    .split(' ')
    .filter((one) => one !== '' && !BARE.has(one))
  const own = classes.map(hueOf).find((one) => one !== undefined) ?? hue
  const looks = classes.filter((one) => hueOf(one) === undefined)
  const style = looks.length > 0 ? coloured(styleOf(looks), palette, own) : {}
  const children = node.children.map((child) => (typeof child === 'string' ? child : styled(child, palette, own)))
  return svg(node.tag, { ...style, ...others }, ...children)
}

function hueOf(name: string): string | undefined {
  const slot = SCENARIO.exec(name)?.[1]
  return slot === undefined ? PARTS[name] : `hue-${slot}`
}

const matching = (classes: readonly string[]) =>
  STYLES.filter(([names]) => names.split(' ').every((name) => classes.includes(name)))

const styleOf = (classes: readonly string[]): Style => Object.assign({}, ...matching(classes).map(([, style]) => style))

/** Classes without a look here, for a test: a new one must not be forgotten. */
export function plainClasses(node: SvgNode): readonly string[] {
  const classes = String(node.attributes.class ?? '').split(' ')
  const known = new Set(matching(classes).flatMap(([names]) => names.split(' ')))
  const own = classes.filter((one) => one !== '' && !BARE.has(one) && hueOf(one) === undefined && !known.has(one))
  return [...own, ...node.children.flatMap((child) => (typeof child === 'string' ? [] : plainClasses(child)))]
}

function coloured(style: Style, palette: Palette, hue: string): Attributes {
  const entries = Object.entries(style).map(([name, value]) => {
    const colour = COLOURED.has(name) && value !== 'none'
    return [name, colour ? palette(value === 'hue' ? hue : String(value)) : value] as const
  })
  return Object.fromEntries(entries)
}
