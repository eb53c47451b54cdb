/** What the long view asks of a solution, each time only once: a figure asks for the same times again while it is dragged. */
import { isEvent } from '../history/event'
import { eventAtGyr, type Solution } from '../solve'
import { courseOf, told } from './course'
import { erasOf } from './eras'
import { remembered } from './remembered'
import type { Entry } from './window'

export function entryOf(solution: Solution): Entry<Solution> {
  const eventAt = remembered((time) => eventAtGyr(solution, time))
  const course = courseOf(solution, eventAt)
  const scaleAt = (time: number) => {
    const event = eventAt(time)
    return isEvent(event) ? Math.exp(event.place.N) : null
  }
  return {
    solution,
    scales: (times) => times.map(scaleAt),
    eras: (x) => erasOf(course, told, x),
  }
}
