/** Facts for a press desk, with the three misunderstandings that come up each time. */

import { LIGHT_YEAR, PARSEC } from '../constants'
import { familyOf } from '../dark-energy'
import type { ColumnKey } from '../quantities/column'
import { columnOf } from '../quantities/columns'
import { type Instant, instantAt, isInstant } from '../quantities/instant'
import type { Solution } from '../solve'
import { significant } from '../words/number'
import { duration } from '../words/time'
import { type Known, sizeText } from './told'

export interface PressCard {
  readonly facts: readonly { readonly title: string; readonly text: string }[]
}

/** Redshifts of the example, the first that the scenario has. */
const EXAMPLES = [1, 0.5, 0.1]
/** Megaparsecs in a billion light years. */
const MPC_PER_GLY = (1e9 * LIGHT_YEAR) / (1e6 * PARSEC)
const DIGITS = 2

export function pressOf(known: Known): PressCard {
  const facts = [
    { title: 'Travel time is not distance', text: travel(known.solution) },
    { title: 'Faster than light', text: faster(known) },
    { title: 'What does not expand', text: bound(known.solution) },
    { title: 'What is assumed', text: assumed(known.solution) },
  ]
  return { facts: facts.filter(({ text }) => text !== '') }
}

function travel(solution: Solution): string {
  for (const z of EXAMPLES) {
    const instant = instantAt(solution, 'z', z)
    if (!isInstant(instant)) continue
    const distance = columnValue(solution, instant, 'comoving')
    if (distance === null) continue
    const light = significant(-instant.time, DIGITS)
    const gly = distance / MPC_PER_GLY
    return `Light that arrives from a galaxy at redshift ${z} has travelled for ${light} billion years. The galaxy is ${significant(gly, DIGITS)} billion light years away today, and was ${significant(gly / (1 + z), DIGITS)} billion light years away when the light left: space grew while the light was under way.`
  }
  return ''
}

function columnValue(solution: Solution, instant: Instant, key: ColumnKey): number | null {
  const value = columnOf(key).value(solution, instant)
  return typeof value === 'number' ? value : null
}

function faster(known: Known): string {
  const radius = sizeText(known, 'hubbleRadius', DIGITS)
  const z = sizeText(known, 'superluminalRedshift', DIGITS)
  const where = z === '' ? '' : ` (redshift ${z})`
  return `Galaxies that are now more than ${radius} billion light years away${where} recede faster than light. Nothing overtakes light there: the distance grows because space expands, and no rule of relativity limits that. Many such galaxies can be seen, by light that left them long ago.`
}

function bound({ end, moments }: Solution): string {
  const text =
    'Galaxies, the Solar System and atoms do not grow with the universe: what holds them together is stronger.'
  if (end.kind !== 'rip' || end.time === null) return text
  const galaxy = moments.find(({ kind }) => kind === 'unbinding-galaxy')?.time
  const when = galaxy === undefined || galaxy === null ? 'shortly' : duration(end.time - galaxy)
  return `${text} In this scenario that ends: galaxies like ours come apart ${when} before the Big Rip.`
}

const assumed = ({ scenario, budget }: Solution): string =>
  budget.dark === 0
    ? 'There is no dark energy in this scenario, so that its future follows from its contents alone.'
    : `The future rests on a law of dark energy (${familyOf(scenario.eos).label}). ${familyOf(scenario.eos).caution}`
