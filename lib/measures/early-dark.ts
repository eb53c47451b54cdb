/** Recombination and sound are fits without dark energy: what is said where it was no small matter then. */
import { eventAtScale, isEvent } from '../history/event'
import type { History } from '../history/history'
import type { Notice } from '../scenario/notices'
import type { Scenario } from '../scenario/scenario'
import { isMissing } from './outcome'
import { recombinationRedshift } from './sound'

/** Share of the density at last scattering from which on it matters; common practice, no source. */
const NOTICEABLE = 0.01

export function earlyDarkNotices(history: History, scenario: Scenario): readonly Notice[] {
  const z = recombinationRedshift(scenario)
  if (isMissing(z)) return []
  const N = -Math.log1p(z.value)
  if (!isEvent(eventAtScale(history, N, 'expanding'))) return []
  const { model } = history.past
  const dark = model.components.find(({ key }) => key === 'dark')?.density(N) ?? 0
  const share = dark / model.expansion(N, 1 + z.value)
  if (!(Math.abs(share) > NOTICEABLE)) return []
  const percent = Number((100 * share).toPrecision(2))
  const message = `Dark energy was ${percent}% of the density at last scattering: z_*, z_d and the sound horizon are fits that know none.`
  return [{ message, code: null }]
}
