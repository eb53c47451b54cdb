/** Until when a place at rest in the expansion can be seen. */
import { eventAtConformal, eventAtScale, type Found, isEvent } from '../history/event'
import type { History } from '../history/history'
import { isMissing, missing } from './outcome'
import { eventHorizon } from './sight'

/**
 * The last event at comoving distance χ (c/H₀) from which light still reaches us, where χ_eh = χ: it crosses our event
 * horizon then. Missing where there is no event horizon, and where none of its light ever arrives.
 * Definition: Rindler 1956, MNRAS 116, 662.
 */
export function lastSight(history: History, chi: number): Found {
  const now = eventAtScale(history, 0, 'expanding')
  /* v8 ignore if -- every history has its today */
  if (!isEvent(now)) return now
  const left = eventHorizon(history, now)
  if (isMissing(left)) return left
  const event = eventAtConformal(history, left - chi)
  return isEvent(event) ? event : missing('none of its light reaches us before the end')
}
