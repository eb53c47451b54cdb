/** Words under a figure and in place of it. */
import type { Solution } from '../solve'
import { extrapolates } from '../words/beyond'
import { fixed, signed, significant } from '../words/number'
import { capital, joined, lowered } from '../words/sentence'
import type { Told } from '../words/told'
import { verdictOf } from '../words/verdict'
import type { Ribbon } from './chart'
import type { Eras } from './eras'
import type { Window } from './window'

type Named = Told & Pick<Solution, 'label'>

/** What a caption has to explain: the signs that are drawn. */
interface Shown {
  readonly marks: ReadonlySet<string>
  readonly ribbons: boolean
  readonly logarithmic: boolean
  /** False where nothing of the future is seen. */
  readonly future: boolean
}

const SIGNS = [
  ['ring', 'ring: origin'],
  ['cross', 'cross: ending'],
  ['arrow', 'arrow: goes on'],
] as const

export function longViewCaption(solutions: readonly Named[], { marks, ribbons, logarithmic, future }: Shown): string {
  const signs = SIGNS.filter(([kind]) => marks.has(kind)).map(([, words]) =>
    words.replace('origin', beginnings(solutions)),
  )
  const time = logarithmic ? 'time from now, logarithmic both ways' : 'time from now'
  const parts = [`Scale factor a against ${time}.`]
  if (signs.length > 0) parts.push(`${capital(signs.join('; '))}.`)
  if (ribbons) parts.push('Ribbons: what dominates; the line above them: the expansion accelerates.')
  const followed = solutions.filter(({ scenario }) => extrapolates(scenario)).map(({ label }) => label)
  if (future && followed.length > 0) parts.push(hatching(followed))
  return parts.join(' ')
}

/** What the rings mark: a history without a beginning has had its last bounce. */
function beginnings(solutions: readonly Named[]): string {
  const bounced = solutions.filter(({ origin: { kind } }) => kind === 'bounce' || kind === 'oscillating')
  if (bounced.length === 0) return 'origin'
  return bounced.length === solutions.length ? 'last bounce' : 'origin, or last bounce'
}

function hatching(labels: readonly string[]): string {
  const verb = labels.length > 1 ? 'follow' : 'follows'
  return `Hatched: ${joined(labels)} ${verb} a law of dark energy beyond the data it describes.`
}

export function longViewText(
  solutions: readonly Named[],
  { from, to, top }: Window,
  ribbons: readonly Pick<Ribbon, 'dash' | 'eras'>[],
): string {
  const frame = `Line chart of the scale factor from 0 to ${significant(top, 2)} (1 today) against time from ${timeText(from)} to ${timeText(to)} Gyr.`
  const curves = solutions.map(
    (one, i) =>
      `${one.label}: ${lowered(verdictOf(one, null).sentences[0] ?? '')}${erasText(ribbons.find(({ dash }) => dash === i)?.eras.dominant)}`,
  )
  return [frame, ...curves].join(' ')
}

/** ` What dominates: matter until −3.8 Gyr, then dark energy.` */
function erasText(spans: Eras['dominant'] = []): string {
  if (spans.length === 0) return ''
  const parts = spans.map(({ to, value }, i) => (i === spans.length - 1 ? value : `${value} until ${timeText(to)} Gyr`))
  return ` What dominates: ${parts.join(', then ')}.`
}

function timeText(time: number): string {
  return signed(Math.abs(time) < 10 ? significant(time, 2) : fixed(time, 0))
}
