/**
 * The pipeline in a few calls; read this first:
 * scenario → model (density budget and E²) → history (t and η as functions of a, origin and end) → measures and moments.
 */
import type { History } from './history/history'
import type { EndKind, OriginKind } from './history/outcome'
import type { MeasureKey } from './quantities/measures'
import type { Scenario } from './scenario/scenario'

/** A number with its unit and an absolute bound on its numerical error, or the reason why there is none. */
export type Answer =
  | { readonly value: number; readonly unit: string; readonly error: number; readonly because: null }
  | { readonly value: null; readonly unit: string; readonly error: null; readonly because: string }

export interface Moment {
  readonly kind: MomentKind
  readonly label: string
  /** Gyr from now; null when infinite. */
  readonly time: number | null
  readonly scale: number | null
  readonly redshift: number | null
}

export type MomentKind =
  | 'origin'
  | 'matter-radiation-equality'
  | 'recombination'
  | 'drag'
  | 'acceleration-start'
  | 'acceleration-end'
  | 'matter-dark-equality'
  | 'now'
  | 'turnaround'
  | 'unbinding-cluster'
  | 'unbinding-galaxy'
  | 'unbinding-planet'
  | 'unbinding-earth'
  | 'unbinding-atom'
  | 'end'

export interface Solution {
  readonly scenario: Scenario
  /** Canonical scenario code. */
  readonly code: string
  /** The scenario's name, or a short description of it when it has none. */
  readonly label: string
  readonly densities: {
    readonly photons: number
    readonly masslessNeutrinos: number
    readonly massiveNeutrinos: number
    readonly coldMatter: number
    readonly curvature: number
    readonly dark: number
  }
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
  /** Plain sentences about what the user may not have meant. */
  readonly notices: readonly string[]
  readonly history: History
}

/** a at the given times (Gyr from now, ascending); NaN-free: null where the history does not reach. */
export declare function scalesAt(solution: Solution, times: readonly number[]): (number | null)[]
export declare function solve(scenario: Scenario): Solution
