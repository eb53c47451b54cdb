/**
 * The pipeline in a few calls; read this first:
 * scenario → budget and model (E² of a) → history (t and η as functions of a, origin and end) → measures and moments.
 */
import { eventAtTime, type Found } from './history/event'
import type { History } from './history/history'
import type { EndKind, OriginKind } from './history/outcome'
import { earlyDarkNotices } from './measures/early-dark'
import { isMissing, type Outcome } from './measures/outcome'
import { MEASURES, type MeasureKey } from './quantities/measures'
import { type Moment, momentsOf } from './quantities/moments'
import { type Subject, subjectOf } from './quantities/quantity'
import type { Budget } from './scenario/budget'
import { type Notice, noticesOf } from './scenario/notices'
import type { Scenario } from './scenario/scenario'
import { writeScenario } from './scenario/write'
import { hubbleTimeGyr } from './units'

export type { Moment, MomentKind } from './quantities/moments'

/** Version of the numbers: it rises when the same code gives other digits, beyond rounding. */
export const ENGINE = '1'

/** A number with its unit and an absolute bound on its numerical error, or the reason why there is none. */
export type Answer =
  | { readonly value: number; readonly unit: string; readonly error: number; readonly because: null }
  | { readonly value: null; readonly unit: string; readonly error: null; readonly because: string }

export interface Solution {
  readonly scenario: Scenario
  /** Canonical scenario code. */
  readonly code: string
  /** The scenario's name, or its code without the name when it has none. */
  readonly label: string
  readonly budget: Budget
  /** Gyr from now. */
  readonly origin: { readonly kind: OriginKind; readonly time: number | null; readonly scale: number }
  /** Gyr from now. */
  readonly end: {
    readonly kind: EndKind
    readonly time: number | null
    readonly scale: number | null
    readonly turnaround: { readonly time: number; readonly scale: number } | null
    readonly proven: boolean
    readonly because: string
  }
  readonly measures: Readonly<Record<MeasureKey, Answer>>
  readonly moments: readonly Moment[]
  /** What the user may not have meant. */
  readonly notices: readonly Notice[]
  readonly history: History
}

export function solve(scenario: Scenario): Solution {
  const subject = subjectOf(scenario)
  const { budget, history } = subject
  const code = writeScenario(scenario)
  const { origin, end } = originAndEnd(history, hubbleTimeGyr(scenario.h0))
  return {
    scenario,
    code,
    label: scenario.name ?? code,
    budget,
    origin,
    end,
    measures: measuresOf(subject),
    moments: momentsOf(subject),
    notices: [...noticesOf(scenario, budget), ...earlyDarkNotices(history, scenario)],
    history,
  }
}

/** Every measure of the list. */
export const measuresOf = (subject: Subject): Readonly<Record<MeasureKey, Answer>> =>
  Object.fromEntries(MEASURES.map((one) => [one.key, answer(one.value(subject), one.unit)])) as Record<
    MeasureKey,
    Answer
  >

function originAndEnd({ origin, end }: History, gyr: number): Pick<Solution, 'origin' | 'end'> {
  const inGyr = (time: number | null) => (time === null ? null : time * gyr)
  const turnaround = end.turnaround && { time: end.turnaround.time * gyr, scale: end.turnaround.scale }
  return {
    origin: { kind: origin.kind, time: inGyr(origin.time), scale: origin.scale },
    end: { ...end, time: inGyr(end.time), turnaround, proven: origin.proven && end.proven },
  }
}

const answer = (outcome: Outcome, unit: string): Answer =>
  isMissing(outcome)
    ? { value: null, unit, error: null, because: outcome.because }
    : { value: outcome.value, unit, error: outcome.error, because: null }

/** At a time in Gyr from now. */
export const eventAtGyr = ({ scenario, history }: Pick<Solution, 'scenario' | 'history'>, time: number): Found =>
  eventAtTime(history, time / hubbleTimeGyr(scenario.h0))
