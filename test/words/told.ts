/** Hand-made outcomes: only what words and figures read, numbers chosen for the sentences and not computed. */
import type { EndKind, OriginKind } from '../../lib/history/outcome'
import type { MeasureKey } from '../../lib/quantities/measures'
import { MEASURE_KEYS } from '../../lib/quantities/measures'
import { budgetOf } from '../../lib/scenario/budget'
import type { Scenario } from '../../lib/scenario/scenario'
import type { Answer, Moment, MomentKind, Solution } from '../../lib/solve'

export const SCENARIO: Scenario = {
  h0: 70,
  matter: 0.3,
  baryons: 0.02242,
  closure: { given: 'curvature', value: 0 },
  radiation: { kind: 'none' },
  eos: 'lambda',
  law: {},
  beyond: 'follow',
  name: null,
}

type Told = Omit<Solution, 'history' | 'notices'>

interface Sketch {
  readonly scenario?: Partial<Scenario>
  readonly label?: string
  readonly origin?: Partial<Solution['origin']> & { readonly kind?: OriginKind }
  readonly end?: Partial<Solution['end']> & { readonly kind: EndKind }
  readonly measures?: Partial<Record<MeasureKey, number>>
  readonly moments?: readonly (readonly [MomentKind, number])[]
}

export function told({ scenario, label, origin, end, measures = {}, moments = [] }: Sketch): Told {
  const whole = { ...SCENARIO, ...scenario }
  return {
    scenario: whole,
    budget: budgetOf(whole),
    code: 'h0:70,matter:0.3',
    label: label ?? 'one',
    origin: { kind: 'big-bang', time: -13.789, scale: 0, ...origin },
    end: { kind: 'exponential', time: null, scale: null, turnaround: null, proven: true, because: 'by hand', ...end },
    measures: Object.fromEntries(MEASURE_KEYS.map((key) => [key, answer(measures[key])])) as Record<MeasureKey, Answer>,
    moments: moments.map(([kind, time]) => moment(kind, time, null, end?.time ?? null)),
  }
}

function answer(value: number | undefined): Answer {
  if (value === undefined) return { value: null, unit: '', error: null, because: 'by hand' }
  return { value, unit: '', error: 0, because: null }
}

/** In a history that began 13.789 Gyr ago and ends at `end`. */
export function moment(
  kind: MomentKind,
  time: number | null,
  scale: number | null = null,
  end: number | null = null,
): Moment {
  const age = time === null ? null : time + 13.789
  const remaining = time === null || end === null ? null : end - time
  return { kind, label: kind, time, scale, redshift: scale ? 1 / scale - 1 : null, age, remaining }
}
