/** Whether the ending hangs on what is assumed of dark energy after today. */
import { familyOf } from '../dark-energy'
import type { Scenario } from '../scenario/scenario'
import { endClause } from './ending'
import { duration } from './time'
import type { Told } from './told'

/** Two endings of one kind are told apart when their times differ by more than this part. A taste, not a law. */
const NOTEWORTHY = 0.01

/** True where w changes after today, so that following the law and holding w differ. */
export function variesAhead(scenario: Scenario): boolean {
  const [least, most] = familyOf(scenario.eos).law(scenario.law).exponentRange(0, Number.POSITIVE_INFINITY)
  return least !== most
}

/** True where the future of the scenario runs a law beyond the data that it was fitted to. */
export function extrapolates(scenario: Scenario): boolean {
  return scenario.beyond === 'follow' && variesAhead(scenario)
}

/** The same scenario with the other choice, null where there is no difference. */
export function otherBeyond(scenario: Scenario): Scenario | null {
  if (!variesAhead(scenario)) return null
  return { ...scenario, beyond: scenario.beyond === 'follow' ? 'hold' : 'follow' }
}

export function beyondSentence(told: Told, other: Told): string {
  const start = told.scenario.beyond === 'follow' ? 'Holding w at today’s value it' : 'Following its law after today it'
  if (told.end.kind === other.end.kind) return sameKind(start, told, other)
  return `${start} ${conditional(endClause({ end: { ...other.end, turnaround: null } }))}.`
}

function sameKind(start: string, told: Told, other: Told): string {
  const [here, there] = [told.end.time, other.end.time]
  if (here === null || there === null || Math.abs(here - there) <= NOTEWORTHY * Math.abs(here)) {
    return `${start} would end the same way.`
  }
  return `${start} would end the same way, in ${duration(there)}.`
}

/** `expands for ever` → `would expand for ever`: the clause's first verb is its first word. */
function conditional(clause: string): string {
  const [verb, ...rest] = clause.split(' ')
  const bare = verb === 'goes' ? 'go' : verb?.replace(/s$/, '')
  return ['would', bare, ...rest].join(' ')
}
