/** The field as it is today, and which way it goes from there: what endings are told from, before any time or distance. */
import type { Law } from '../../dark-energy/law'
import type { Potential } from '../../dark-energy/potential'
import { powerLaw } from '../../dark-energy/power-law'
import { type Model, modelOf } from '../../model'
import type { Purse } from '../../numerics/ode'
import type { Budget } from '../../scenario/budget'
import { type Ahead, errorAhead, lookAhead, type Outlook } from './ahead'
import { backgroundOf } from './background'
import { FUTURE_BUDGET, fieldToday } from './height'
import { fieldLaw } from './law'
import { energyOf, type Field } from './motion'
import { FROZEN, PASSAGE_ERROR, passage } from './shot'
import type { Route } from './timed-arm'
import { trailByScale } from './trail'
import { overBudget } from './unsolvable'
import { travelOn, type Voyage } from './voyage'

/** Evaluations for a way on which the field swings; where they do not suffice, averages are told. */
const SWINGING_BUDGET = 40_000

/** The field as it is today. */
export interface Now extends Route {
  readonly state: Float64Array
  /** Of the past. */
  readonly law: Law
}

export function nowOf(budget: Budget, potential: Potential, purse: Purse): Now {
  const field = fieldToday({ potential, background: backgroundOf(budget), target: budget.dark, purse })
  const { steps, state } = passage(field, purse)
  const energy = energyOf(field, state[0], state[1])
  const law = fieldLaw(trailByScale(field, steps, 0), {
    today: energy,
    outside: { before: 0, after: 0 },
    breaks: [FROZEN],
    error: () => PASSAGE_ERROR,
  })
  return { field, budget, today: energy, state, law }
}

/** The search for the height leaves at least so much for the future, and a whole history costs no more than both. */
export const aheadOf = ({ left }: Purse): Purse => ({ left: Math.min(FUTURE_BUDGET, FUTURE_BUDGET / 2 + left) })

/** w of today for ever: an explicit law, whose contraction mirrors its expansion. */
export const heldModel = ({ budget, law }: Now): Model => modelOf(budget, powerLaw(law.w(0)))

/** E² is a sum of positive terms with V ≥ 0 in flat or open space. */
export const mayTurn = ({ potential, background }: Field): boolean =>
  !potential.positive || background.budget.curvature < 0

export type Way =
  | { readonly kind: 'expanding'; readonly outlook: Ahead }
  | { readonly kind: 'turning'; readonly voyage: Voyage }

/** What the field's own motion leads to. */
export function wayAhead({ field, state }: Now, purse: Purse): Way {
  const outlook = lookAhead(field, state, purse, mayTurn(field))
  // Swings thin out like dust, which a closed universe does not outlast.
  const swings = outlook.kind === 'swinging' && field.background.budget.curvature < 0
  if (outlook.kind !== 'shallow' && !swings) return expanding(outlook)
  const voyage = voyageOn({ field, state }, purse, swings ? SWINGING_BUDGET : purse.left)
  if (swings && voyage.end === 'spent') return expanding(outlook)
  /* v8 ignore if -- a shallow E² that goes on to grow for good: no scenario has been seen to do it */
  if (voyage.end === 'expanding' && voyage.turns.length === 0) return expanding(lookAhead(field, state, purse, false))
  return turning(voyage)
}

function voyageOn({ field, state }: Pick<Now, 'field' | 'state'>, purse: Purse, most: number): Voyage {
  const own = { left: Math.min(purse.left, most) }
  const before = own.left
  const voyage = travelOn(field, state, own)
  purse.left -= before - own.left
  return voyage
}

function expanding(outlook: Outlook): Way {
  if (outlook.kind === 'spent' || outlook.kind === 'shallow') throw tooLong()
  return { kind: 'expanding', outlook }
}

function turning(voyage: Voyage): Way {
  if (voyage.end === 'spent' || voyage.turns.length === 0) throw tooLong()
  /* v8 ignore if -- no scenario has been seen to bounce and grow for good */
  if (voyage.end === 'expanding')
    throw overBudget('This universe turns round, bounces and expands again, which is not followed.')
  return { kind: 'turning', voyage }
}

export const tooLong = (): Error => overBudget('The future of this field takes too many steps.')

/** The steps ahead as a law, and the last power of a from there on. */
export function modelAhead({ field, budget, today }: Now, outlook: Ahead): Model {
  const law = fieldLaw(trailByScale(field, outlook.steps, outlook.end), {
    today,
    outside: { before: 0, after: outlook.exponent },
    breaks: [outlook.end],
    error: (N) => errorAhead(outlook, N),
  })
  return modelOf(budget, law)
}
