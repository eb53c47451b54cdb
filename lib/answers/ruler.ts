/** What the ruler says of every scenario of an address: rows of readings in words, and the same as a table. */
import { isMissing, type Missing } from '../measures/outcome'
import { type Instant, isInstant } from '../quantities/instant'
import type { Quantity } from '../quantities/quantity'
import { BETWEEN } from '../ruler/between'
import { epochVariable } from '../ruler/epochs'
import type { Given } from '../ruler/given'
import { unitWithHubble, valueWithHubble, valueWithoutHubble } from '../ruler/hubble-units'
import { readingNamed } from '../ruler/readings'
import type { Solution } from '../solve'
import type { RulerAsk } from '../words/ruler-ask'
import { rulerTyped } from '../words/ruler-typed'

export interface RulerLine {
  readonly quantity: Pick<Quantity, 'key' | 'symbol' | 'label' | 'digits'>
  readonly unit: string
  /** One for each scenario. */
  readonly cells: readonly RulerCell[]
}

export interface RulerCell {
  readonly value: number | null
  /** Why there is none, or what has to be said beside it. */
  readonly because: string | null
}

export interface RulerLines {
  readonly at: readonly RulerLine[]
  readonly between: readonly RulerLine[]
}

/** Empty where something typed cannot be read. */
export function rulerLines(solutions: readonly Solution[], ask: RulerAsk): RulerLines {
  const { at, until, given } = rulerTyped(ask)
  if (at === null || given === null) return { at: [], between: [] }
  const marks = solutions.map((solution) => {
    const own = ownGiven(given, solution, ask)
    return {
      solution,
      given: own,
      one: found(solution, ask, at),
      other: until === null ? null : found(solution, ask, until),
    }
  })
  return { at: readingLines(marks, ask), between: until === null ? [] : betweenLines(marks, ask) }
}

interface Mark {
  readonly solution: Solution
  readonly given: Given
  readonly one: Instant | Missing
  readonly other: Instant | Missing | null
}

/** A length typed in h⁻¹ Mpc is another one in every scenario. */
function ownGiven(given: Given, { scenario }: Solution, { hubble }: RulerAsk): Given {
  return hubble ? { ...given, length: valueWithoutHubble(given.length, 'Mpc', scenario.h0) } : given
}

function found(solution: Solution, { variable, hubble }: RulerAsk, value: number): Instant | Missing {
  const { unit, at } = epochVariable(variable)
  return at(solution, hubble ? valueWithoutHubble(value, unit, solution.scenario.h0) : value)
}

function readingLines(marks: readonly Mark[], ask: RulerAsk): RulerLine[] {
  return ask.read.flatMap((key) => {
    const reading = readingNamed(key)
    if (!reading) return []
    const unit = marks[0] && reading.unitOf ? reading.unitOf(marks[0].given) : reading.unit
    const cells = marks.map(({ solution, given, one }) => {
      if (!isInstant(one)) return empty(one)
      const epoch = { subject: solution, instant: one, given }
      return cell(reading.value(epoch), reading.note?.(epoch) ?? null, unit, solution, ask)
    })
    return [lineOf(reading, unit, cells, ask)]
  })
}

function betweenLines(marks: readonly Mark[], ask: RulerAsk): RulerLine[] {
  return BETWEEN.map((reading) => {
    const cells = marks.map(({ solution, given, one, other }) => {
      if (!isInstant(one)) return empty(one)
      if (other === null || !isInstant(other)) return empty(other ?? one)
      return cell(reading.value({ subject: solution, one, other, given }), null, reading.unit, solution, ask)
    })
    return lineOf(reading, reading.unit, cells, ask)
  })
}

const empty = (why: Missing | Instant): RulerCell => ({ value: null, because: 'because' in why ? why.because : null })

function cell(
  value: number | Missing,
  note: string | null,
  unit: string,
  { scenario }: Solution,
  { hubble }: RulerAsk,
): RulerCell {
  if (isMissing(value)) return { value: null, because: value.because }
  return { value: hubble ? valueWithHubble(value, unit, scenario.h0) : value, because: note }
}

function lineOf(
  { key, symbol, label, digits }: Quantity,
  unit: string,
  cells: RulerCell[],
  { hubble }: RulerAsk,
): RulerLine {
  return { quantity: { key, symbol, label, digits }, unit: hubble ? unitWithHubble(unit) : unit, cells }
}
