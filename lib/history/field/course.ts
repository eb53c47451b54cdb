/** The field as it is today, and which way it goes from there: what endings are told from, before any time or distance. */
import type { Law } from '../../dark-energy/law'
import type { Potential } from '../../dark-energy/potential'
import { powerLaw } from '../../dark-energy/power-law'
import { type Model, modelOf } from '../../model'
import { type Purse, valueIn } from '../../numerics/ode'
import type { Budget } from '../../scenario/budget'
import { type Ahead, errorAhead, isAhead, lookAhead, type Outlook } from './ahead'
import { backgroundOf } from './background'
import { BUDGET, FUTURE_BUDGET, heightToday } from './height'
import { fieldLaw } from './law'
import { energyOf, type Field, RATE, SCALE } from './motion'
import { FROZEN, fieldOf, PASSAGE_ERROR, passage } from './shot'
import { type Beside, beside, LOOSER, LOST, MARGIN, strayAt, straysOf } from './stray'
import type { Route } from './timed-arm'
import { type Trail, trailByScale } from './trail'
import { overBudget } from './unsolvable'
import { travelOn, VOYAGE_ERROR, type Voyage } from './voyage'

/** Evaluations for a way on which the field swings; where they do not suffice, averages are told. */
const SWINGING_BUDGET = 40_000

/** The field as it is today. */
export interface Now extends Route {
  readonly state: Float64Array
  /** Of the past. */
  readonly law: Law
  /** The same by looser steps, which tells errors; computed when first asked for, since endings are told without. */
  readonly beside: () => Beside | null
}

export function nowOf(budget: Budget, potential: Potential, purse: Purse): Now {
  const search = { potential, background: backgroundOf(budget), target: budget.dark, purse }
  const height = heightToday(search)
  const field = fieldOf(search, height.y)
  const { steps, state } = passage(field, purse)
  const looser = once(() => beside({ ...search, purse: { left: BUDGET } }, height))
  const trail = trailByScale(field, steps, 0)
  const today = energyOf(field, state[0], state[1])
  const missed = Math.abs(today / budget.dark - 1)
  const strays = once(() => {
    const other = looser()
    /* v8 ignore if -- looser steps have led to the same place in every scenario seen */
    if (other === null) return trail.edges.map(() => LOST)
    const way = trailByScale(other.field, other.steps, 0)
    const besides = pastLaw(way, energyToday(other), () => 0)
    return straysOf(trail.edges, law, besides, () => PASSAGE_ERROR)
  })
  const law = pastLaw(trail, today, (N) => strayAt(trail.edges, strays(), N) + missed)
  return { field, budget, today, state, law, beside: looser }
}

const once = <T>(make: () => T): (() => T) => {
  let made: { readonly value: T } | null = null
  return () => {
    made ??= { value: make() }
    return made.value
  }
}

const energyToday = ({ field, state }: Beside): number => energyOf(field, state[0], state[1])

const pastLaw = (trail: Trail, today: number, error: (N: number) => number): Law =>
  fieldLaw(trail, { today, outside: { before: 0, after: 0 }, breaks: [FROZEN], least: () => PASSAGE_ERROR, error })

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
export function modelAhead(now: Now, outlook: Ahead): Model {
  const { field, budget, today } = now
  const trail = trailByScale(field, outlook.steps, outlook.end)
  const strays = once(() => {
    const other = now.beside()
    const way = other && lookAhead(other.field, other.state, { left: FUTURE_BUDGET }, mayTurn(field), LOOSER)
    /* v8 ignore if -- as in nowOf */
    if (!(way && isAhead(way))) return trail.edges.map(() => LOST)
    const looser = trailByScale(other.field, way.steps, way.end)
    const besides = lawAhead(looser, energyToday(other), way, () => 0)
    return straysOf(trail.edges, law, besides, (N) => errorAhead(outlook, N))
  })
  const law = lawAhead(trail, today, outlook, (N) =>
    Math.max(errorAhead(outlook, N), strayAt(trail.edges, strays(), N)),
  )
  return modelOf(budget, law)
}

const lawAhead = (trail: Trail, today: number, outlook: Ahead, error: (N: number) => number): Law =>
  fieldLaw(trail, {
    today,
    outside: { before: 0, after: outlook.exponent },
    breaks: [outlook.end],
    least: (N) => errorAhead(outlook, N),
    error,
  })

/** The voyage by looser steps; null where that leads elsewhere. */
export function voyageBeside(now: Now, voyage: Voyage): Voyage | null {
  const other = now.beside()
  const looser = other && travelOn(other.field, other.state, { left: FUTURE_BUDGET }, LOOSER)
  return looser && looser.end === voyage.end && looser.turns.length === voyage.turns.length
    ? looser
    : /* v8 ignore next -- as in nowOf */ null
}

/** Relative error of dt, of a dη, and of both up to a turning point, on a voyage until τ. */
export function voyageError(voyage: Voyage, looser: Voyage | null, until: number): number {
  /* v8 ignore if -- as in nowOf */
  if (looser === null) return LOST
  let error = VOYAGE_ERROR
  voyage.turns.forEach(({ tau }, i) => {
    if (tau <= until) error = Math.max(error, MARGIN * Math.abs(looser.turns[i].tau / tau - 1))
  })
  let place = 0
  for (const step of voyage.steps) {
    if (step.to > until) break
    while (place < looser.steps.length && looser.steps[place].to < step.to) place++
    if (place === looser.steps.length) break
    const rate = valueIn(step, RATE, step.to)
    const off = (unknown: number) =>
      Math.abs(valueIn(step, unknown, step.to) - valueIn(looser.steps[place], unknown, step.to))
    error = Math.max(error, MARGIN * off(SCALE), (MARGIN * off(RATE)) / Math.sqrt(1 + rate * rate))
  }
  return error
}
