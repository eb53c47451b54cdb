/**
 * The reference set: values to 25 digits for parameters at their exact double values, from two independent multiprecision routes
 * (refcore.py: MPFR; route2.py: mpmath; definitions.json says what each quantity means). Here: how one of its scenarios reads as ours.
 */
import { readFileSync } from 'node:fs'
import type { ParameterValues } from '../../lib/parameter'
import { radiationBudget } from '../../lib/scenario/radiation'
import type { Closure, Radiation, Scenario } from '../../lib/scenario/scenario'

export interface ReferenceValue {
  readonly value: string
  readonly unit: string
  readonly sens: number | null
}

interface DarkEnergy {
  readonly type?: string
  readonly kind?: string
  readonly w0?: number
  readonly wa?: number
  readonly a?: readonly number[]
  readonly w?: readonly number[]
  readonly As?: number
  readonly alpha?: number
  /** Of a scalar field: its parameter and where it starts. */
  readonly pv?: number
  readonly phi_i?: number
}

export interface Reference {
  readonly id: string
  readonly note: string
  readonly params: {
    readonly H0?: number
    readonly Om?: number
    readonly Or?: number
    readonly Ok?: number
    readonly Ode?: number
    readonly closure?: 'curvature' | 'dark-energy' | 'matter'
    readonly Tcmb?: number
    readonly Neff?: number
    readonly mnu?: readonly number[]
    readonly de?: DarkEnergy
  }
  readonly past: string
  readonly future: string
  readonly quantities: Readonly<Record<string, ReferenceValue>>
}

const FILE = new URL('./set-a.json', import.meta.url)
export const REFERENCES: readonly Reference[] = JSON.parse(readFileSync(FILE, 'utf8')).scenarios

/** Their laws as ours: key of the family and its parameters. */
const LAWS: Readonly<Record<string, (de: DarkEnergy) => readonly [string, ParameterValues]>> = {
  lambda: () => ['lambda', {}],
  w: (de) => ['constant', { w: de.w0 ?? -1 }],
  cpl: (de) => ['cpl', { w0: de.w0 ?? -1, wa: de.wa ?? 0 }],
  jbp: (de) => ['jbp', { w0: de.w0 ?? -1, wa: de.wa ?? 0 }],
  ba: (de) => ['ba', { w0: de.w0 ?? -1, wa: de.wa ?? 0 }],
  log: (de) => ['log', { w0: de.w0 ?? -1, wa: de.wa ?? 0 }],
  tab: (de) => ['nodes', { at: de.a ?? [], w: de.w ?? [] }],
  gcg: (de) => ['chaplygin', { b: de.As ?? 1, alpha: de.alpha ?? 0 }],
}

/** Their potentials as ours. Their linear V = φ from φ_i is our V = 1 − slope φ from 0, less its factor φ_i, with slope = 1/φ_i. */
const POTENTIALS: Readonly<Record<string, (de: DarkEnergy) => ParameterValues>> = {
  exp: (de) => ({ v: 'exponential', slope: de.pv ?? 1 }),
  ipl: (de) => ({ v: 'inverse', slope: de.pv ?? 1, start: de.phi_i ?? 1 }),
  pngb: (de) => ({ v: 'cosine', width: de.pv ?? 1, start: de.phi_i ?? 1 }),
  linear: (de) => ({ v: 'linear', slope: 1 / (de.phi_i ?? 1) }),
}

/** Scalar fields carry a `kind` in place of a `type`. */
const lawOf = ({ params }: Reference): string => params.de?.type ?? params.de?.kind ?? 'lambda'
export const lawIsKnown = (one: Reference): boolean => lawOf(one) in LAWS
export const isField = (one: Reference): boolean => lawOf(one) in POTENTIALS

function radiationOf({ params }: Reference): Radiation {
  if (params.Tcmb) {
    const masses = (params.mnu ?? []).filter((mass) => mass > 0).sort((one, other) => one - other)
    return { kind: 'thermal', cmb: params.Tcmb, nu: params.Neff ?? 0, masses }
  }
  return params.Or ? { kind: 'given', density: params.Or } : { kind: 'none' }
}

function closureOf({ params }: Reference): Closure {
  if (params.closure === 'curvature') return { given: 'dark', value: params.Ode ?? 0 }
  return { given: 'curvature', value: params.Ok ?? 0 }
}

/** Their Om counts no massive neutrinos; our `matter` does. */
export function scenarioOf(one: Reference): Scenario {
  const { params } = one
  const h0 = params.H0 ?? 70
  const radiation = radiationOf(one)
  const massive = radiationBudget(radiation, h0).states.reduce((sum, state) => sum + state.density, 0)
  const cold =
    params.closure === 'matter' ? 1 - (params.Or ?? 0) - (params.Ok ?? 0) - (params.Ode ?? 0) : (params.Om ?? 0)
  const de = params.de ?? {}
  const [eos, law] = isField(one) ? (['field', POTENTIALS[lawOf(one)](de)] as const) : LAWS[lawOf(one)](de)
  return {
    h0,
    matter: cold + massive,
    baryons: 0.02242,
    closure: closureOf(one),
    radiation,
    eos,
    law,
    beyond: 'follow',
    name: null,
  }
}
