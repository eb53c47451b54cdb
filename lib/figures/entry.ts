/**
 * What the long view asks of a solution, each time only once: a figure asks for the same times again while it is dragged, and for
 * the same range while another scenario is.
 */
import { isEvent } from '../history/event'
import { eventAtGyr, type Solution } from '../solve'
import { courseOf, told } from './course'
import { erasOf } from './eras'
import { linesOf } from './lines'
import { lastOf, remembered } from './remembered'
import type { Range } from './scale'
import type { Entry, Scales, Seen } from './window'

export function entryOf(solution: Solution): Entry<Solution> {
  const eventAt = remembered((time) => eventAtGyr(solution, time))
  const course = courseOf(solution, eventAt)
  const scaleAt = (time: number) => {
    const event = eventAt(time)
    return isEvent(event) ? Math.exp(event.place.N) : null
  }
  const eras = lastOf(textOf, (x: Range) => erasOf(course, told, x))
  return { ...plainEntry(solution, (times) => times.map(scaleAt)), eras }
}

/** Of a history of which the scale factor alone is known. */
export const plainEntry = <S extends Seen>(solution: S, scales: Scales): Entry<S> => ({
  solution,
  scales,
  lines: lastOf(
    ({ x, y }) => `${textOf(x)} ${textOf(y)}`,
    (ranges) => linesOf(solution, scales, ranges),
  ),
})

const textOf = ({ scaling, from, to, linear }: Range): string => `${scaling} ${from} ${to} ${linear}`
