/** A label in the colour of its curve, with a rim of the ground so that it stays readable over lines. */
import { strokeOf } from './dash'
import { widthOf } from './draw-curve'
import { boxOf, type Label, NAME_LINE, NOTE_LINE, NOTE_SIZE, type Stroke, SWATCH } from './label'
import type { Frame } from './plot'
import { px, type SvgNode, svg } from './svg'

export function drawLabel(label: Label, { type }: Pick<Frame, 'type'>): SvgNode {
  const place = { x: px(label.x), 'text-anchor': label.anchor }
  const children: SvgNode[] = []
  let y = label.y
  if (label.leader) children.push(leader(label.leader))
  if (label.swatch) children.push(swatch(label.swatch, label, type))
  if (label.name) {
    children.push(svg('text', { ...place, y: px(y + 0.92 * type), 'font-size': type, class: 'name' }, label.name))
    y += NAME_LINE * type
  }
  if (label.note) {
    const size = px(NOTE_SIZE * type)
    children.push(svg('text', { ...place, y: px(y + 0.82 * type), 'font-size': size, class: 'note' }, label.note))
    y += NOTE_LINE * type
  }
  return svg('g', { class: label.tone }, ...children)
}

function swatch(stroke: Stroke, label: Label, type: number): SvgNode {
  const [x, y] = [boxOf(label, type).x, px(label.y + 0.6 * type)]
  const ends = { x1: px(x), x2: px(x + SWATCH.length * type), y1: y, y2: y }
  return svg('line', { ...ends, ...strokeOf(stroke.dash, widthOf(stroke, type)) })
}

function leader([x1, y1, x2, y2]: readonly [number, number, number, number]): SvgNode {
  return svg('line', { x1: px(x1), y1: px(y1), x2: px(x2), y2: px(y2), class: 'leader' })
}
