/** Dashes by the place in a list: a reader without colours can tell curves apart. */
import { px } from './svg'

/** In units of the line width; round ends make short ones dots. */
const DASHES = ['', '3.4 2.4', '0 2.2', '5 2.2 0 2.2', '1.6 2.4', '7 2.4']

export function dashOf(place: number, width: number): string | null {
  const dash = DASHES[place % DASHES.length]
  if (!dash) return null
  return dash
    .split(' ')
    .map((part) => px(Number(part) * width))
    .join(' ')
}

/** How a curve is stroked: that in a legend or in a margin is the same. */
export function strokeOf(place: number, width: number) {
  const dash = dashOf(place, width)
  return { class: 'curve', 'stroke-width': width, ...(dash === null ? {} : { 'stroke-dasharray': dash }) }
}
