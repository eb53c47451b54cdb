/**
 * How far a number is known, given how far the parameters are: a parameter is taken to be uncertain by half a unit of the
 * last digit that its code shows. A code drops zeros at the end, so that each number counts with three digits at least.
 */
import { familyOf } from '../dark-energy'
import type { ParameterValue } from '../parameter'
import type { Radiation, Scenario } from '../scenario/scenario'
import { type Solution, solve } from '../solve'
import { numbersOf } from './numbers'

/** How far off each number may be; Infinity where it may not be there at all. */
export type Doubts = ReadonlyMap<string, number>

const LEAST_DIGITS = 3

export function doubtsOf(solution: Solution): Doubts {
  const numbers = numbersOf(solution)
  const doubts = new Map([...numbers].map(([key]) => [key, 0]))
  for (const scenario of neighbours(solution.scenario)) {
    const moved = solvedOrNull(scenario)
    if (!moved) continue
    const others = numbersOf(moved)
    for (const [key, value] of numbers) {
      const other = others.get(key)
      // A neighbour beyond the doubles is as good as none.
      const change = Number.isFinite(other) ? Math.abs((other as number) - value) : Number.POSITIVE_INFINITY
      doubts.set(key, (doubts.get(key) ?? 0) + change)
    }
  }
  return doubts
}

/** A scenario without a solution tells nothing about its neighbour. */
function solvedOrNull(scenario: Scenario): Solution | null {
  try {
    return solve(scenario)
  } catch {
    return null
  }
}

/** The same scenario with one parameter moved by half a unit of its last digit, for each in turn. */
function neighbours(scenario: Scenario): Scenario[] {
  const { h0, matter, baryons, closure, radiation } = scenario
  return [
    { ...scenario, h0: h0 + halfUnit(h0) },
    ...(matter === 0 ? [] : [{ ...scenario, matter: matter + halfUnit(matter) }]),
    { ...scenario, baryons: baryons + halfUnit(baryons) },
    ...(closure.value === 0
      ? []
      : [{ ...scenario, closure: { ...closure, value: closure.value + halfUnit(closure.value) } }]),
    ...radiationNeighbours(radiation).map((moved) => ({ ...scenario, radiation: moved })),
    ...lawNeighbours(scenario),
  ]
}

function radiationNeighbours(radiation: Radiation): Radiation[] {
  switch (radiation.kind) {
    case 'none':
      return []
    case 'given':
      return radiation.density === 0 ? [] : [{ ...radiation, density: radiation.density + halfUnit(radiation.density) }]
    case 'thermal': {
      const { cmb, nu, masses } = radiation
      const heavier = masses.map((mass, i) => masses.with(i, mass + halfUnit(mass)))
      return [
        { ...radiation, cmb: cmb + halfUnit(cmb) },
        ...(nu === 0 ? [] : [{ ...radiation, nu: nu + halfUnit(nu) }]),
        ...heavier.map((moved) => ({ ...radiation, masses: moved })),
      ]
    }
  }
}

function lawNeighbours(scenario: Scenario): Scenario[] {
  const { eos, law } = scenario
  const keys = new Set(familyOf(eos).parameters.map(({ key }) => key))
  return Object.entries(law).flatMap(([key, value]) => {
    const moved = movedValue(value)
    return keys.has(key) && moved !== null ? [{ ...scenario, law: { ...law, [key]: moved } }] : []
  })
}

/** Zero and minus one are choices, not measurements. */
function movedValue(value: ParameterValue): ParameterValue | null {
  if (typeof value === 'number') return value === 0 || value === -1 ? null : value + halfUnit(value)
  return null
}

/** Half of 10^(place of the last digit). */
export function halfUnit(value: number): number {
  const [mantissa = '', exponent = '0'] = value.toExponential().split('e')
  const digits = Math.max(LEAST_DIGITS, mantissa.replace(/[-.]/g, '').length)
  return 0.5 * 10 ** (Number(exponent) - digits + 1)
}
