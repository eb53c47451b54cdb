/** The numbers of a scenario that may move it to another ending, and what it is with one of them changed. */
import { familyOf } from '../dark-energy/index'
import type { NumberParameter } from '../parameter'
import { isUsed } from '../scenario/family-keys'
import { CMB, CURVATURE, DARK, H0, MATTER, NU, RADIATION } from '../scenario/parameters'
import type { Scenario } from '../scenario/scenario'

export interface Free {
  /** Key in the scenario code. */
  readonly key: string
  /** Place in a list of numbers; null for a number of its own. */
  readonly index: number | null
  /** In the markup of labels. */
  readonly symbol: string
  readonly value: number
  readonly min: number
  readonly max: number
  /** What a slider offers: by how much people change it. */
  readonly slider: { readonly min: number; readonly max: number; readonly step: number }
  with(value: number): Scenario
}

/** Parameters that are left out, and why. */
export const LEFT_OUT: Readonly<Record<string, string>> = {
  baryons: 'Baryons count as matter; their own share moves no ending.',
  masses: 'Masses are part of matter: they move the far past and the turning points only as matter and radiation do.',
  at: 'Scale factors of nodes move no ending but through the values of w there.',
}

type Own = Pick<NumberParameter, 'key' | 'symbol' | 'min' | 'max' | 'slider'>

export function freeParameters(scenario: Scenario): readonly Free[] {
  return [...densities(scenario), ...light(scenario), ...ofLaw(scenario)]
}

const free = (
  { key, symbol, min, max, slider }: Own,
  value: number,
  change: (value: number) => Scenario,
  index: number | null = null,
): Free => ({
  key,
  index,
  symbol: index === null ? symbol : `${symbol.split('_')[0]}_${index + 1}`,
  value,
  min,
  max,
  slider,
  with: change,
})

function densities(scenario: Scenario): Free[] {
  const { matter, closure } = scenario
  const given = closure.given === 'dark' ? DARK : CURVATURE
  return [
    free(MATTER, matter, (value) => ({ ...scenario, matter: value })),
    free(given, closure.value, (value) => ({ ...scenario, closure: { given: closure.given, value } })),
  ]
}

/** H₀ matters where it sets what a temperature weighs. */
function light(scenario: Scenario): Free[] {
  const { radiation, h0 } = scenario
  if (radiation.kind === 'none') return []
  if (radiation.kind === 'given')
    return [free(RADIATION, radiation.density, (density) => ({ ...scenario, radiation: { kind: 'given', density } }))]
  const { cmb, nu } = radiation
  return [
    free(H0, h0, (value) => ({ ...scenario, h0: value })),
    // At 0 K there is neither light nor neutrinos: another kind of scenario.
    free({ ...CMB, min: 1e-3 }, cmb, (value) => ({ ...scenario, radiation: { ...radiation, cmb: value } })),
    free(NU, nu, (value) => ({ ...scenario, radiation: { ...radiation, nu: value } })),
  ]
}

const W_SLIDER = { min: -2, max: 0.4, step: 0.01 }

function ofLaw(scenario: Scenario): Free[] {
  const { law } = scenario
  return familyOf(scenario.eos).parameters.flatMap((parameter): Free[] => {
    const value = law[parameter.key]
    if (isUsed(parameter, law) !== true || parameter.key in LEFT_OUT) return []
    const changed = (other: number | readonly number[]) => ({ ...scenario, law: { ...law, [parameter.key]: other } })
    if (parameter.kind === 'number' && typeof value === 'number') {
      const min = parameter.above ? parameter.min + parameter.slider.step / 100 : parameter.min
      return [free({ ...parameter, min }, value, changed)]
    }
    if (parameter.kind !== 'list' || !Array.isArray(value)) return []
    const numbers: readonly number[] = value
    const own = { ...parameter, slider: W_SLIDER }
    return numbers.map((one, index) => free(own, one, (other) => changed(numbers.with(index, other)), index))
  })
}
