/** Words under a figure and in place of it. */
import type { Solution } from '../solve'
import { extrapolates } from '../words/beyond'
import { fixed, significant } from '../words/number'
import { capital, joined } from '../words/sentence'
import { verdictOf } from '../words/verdict'
import type { Window } from './window'

type Told = Pick<Solution, 'scenario' | 'label' | 'origin' | 'end' | 'measures' | 'moments'>

export function longViewCaption(solutions: readonly Told[], ribbons: boolean): string {
  const parts = ['Scale factor a against time from now.', marksOf(solutions)]
  if (ribbons) parts.push('Ribbons: what dominates; the line above them: the expansion accelerates.')
  const followed = solutions.filter(({ scenario }) => extrapolates(scenario)).map(({ label }) => label)
  if (followed.length > 0)
    parts.push(
      `Hatched: ${joined(followed)} ${followed.length > 1 ? 'follow' : 'follows'} a law of dark energy beyond the data it describes.`,
    )
  return parts.filter((part) => part !== '').join(' ')
}

function marksOf(solutions: readonly Told[]): string {
  const begins = solutions.some(({ origin }) => origin.time !== null)
  const ends = solutions.some(({ end }) => end.time !== null)
  const signs = [begins ? 'ring: origin' : '', ends ? 'cross: ending' : '', 'arrow: goes on'].filter(
    (sign) => sign !== '',
  )
  return `${capital(signs.join('; '))}.`
}

export function longViewText(solutions: readonly Told[], { from, to, top }: Window): string {
  const frame = `Line chart of the scale factor from 0 to ${significant(top, 2)} (1 today) against time from ${fixed(from, 0)} to +${fixed(to, 0)} Gyr.`
  const curves = solutions.map((one) => `${one.label}: ${lowered(verdictOf(one, null).sentences[0] ?? '')}`)
  return [frame, ...curves].join(' ')
}

function lowered(text: string): string {
  return `${text.charAt(0).toLowerCase()}${text.slice(1)}`
}
