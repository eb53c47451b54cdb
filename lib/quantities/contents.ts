/** Columns that say of what: the share of each component, the law of dark energy, the temperature. */
import type { Component } from '../components'
import { missing } from '../measures/outcome'
import { AT_REST } from '../measures/rates'
import { ROUNDING } from './accuracy'
import { type Block, expansionIn, nothing, overExpansion } from './block'
import type { ColumnKey, Definition } from './column'
import { FRIEDMANN, fixed, significant } from './quantity'

const share = (key: ColumnKey, symbol: string, label: string, meaning: string, of: Component['key']): Definition => ({
  key,
  symbol,
  label,
  unit: '',
  digits: fixed(5),
  meaning,
  formula: `${symbol} = ρ/ρ_c`,
  source: FRIEDMANN,
  accuracy: ROUNDING,
  values: (block) => {
    const out = block.take()
    block.arm.model.densitiesInto(out, of, block.N, block.inverseScale, block.count)
    return overExpansion(block, out)
  },
  why: (block, i) => (expansionIn(block)[i] <= 0 ? AT_REST : null),
})

/** By the law that rules there. */
function equationsOfState(block: Block): Float64Array {
  const { budget, law } = block.arm.model
  if (budget.dark === 0) return nothing(block)
  const out = block.take()
  for (let i = 0; i < block.count; i++) out[i] = law.w(block.N[i])
  return out
}

export const CONTENT_COLUMNS: readonly Definition[] = [
  share(
    'omegaMatter',
    'Ω_c',
    'share of cold matter',
    'Baryons and cold dark matter over the critical density.',
    'matter',
  ),
  share(
    'omegaRadiation',
    'Ω_r',
    'share of radiation',
    'Photons and massless neutrinos over the critical density.',
    'radiation',
  ),
  share(
    'omegaNeutrino',
    'Ω_ν',
    'share of massive neutrinos',
    'Neutrinos with mass, with their full energy, over the critical density.',
    'neutrino',
  ),
  share(
    'omegaCurvature',
    'Ω_k',
    'share of curvature',
    'What the densities leave to 1; positive in an open universe.',
    'curvature',
  ),
  share('omegaDark', 'Ω_DE', 'share of dark energy', 'Dark energy over the critical density.', 'dark'),
  {
    key: 'w',
    symbol: 'w',
    label: 'equation of state of dark energy',
    unit: '',
    digits: fixed(4),
    meaning: 'Pressure of dark energy over its energy density.',
    formula: 'w = p/(ρ c²)',
    source: 'Turner & White 1997, Phys. Rev. D 56, R4439',
    accuracy: ROUNDING,
    values: equationsOfState,
    why: ({ arm, N }, i) => {
      if (arm.model.budget.dark === 0) return missing('there is no dark energy in this scenario')
      return Number.isNaN(arm.model.law.w(N[i])) ? missing('dark energy is used up here') : null
    },
  },
]

export const TEMPERATURE: Definition = {
  key: 'temperature',
  symbol: 'T',
  label: 'photon temperature',
  unit: 'K',
  digits: significant(5),
  meaning: 'Temperature of the cosmic microwave background.',
  formula: 'T = T_0 (1 + z)',
  source: 'Tolman 1934, Relativity, Thermodynamics and Cosmology, Oxford',
  accuracy: ROUNDING,
  values: (block) => {
    const { radiation } = block.subject.scenario
    if (radiation.kind !== 'thermal') return nothing(block)
    const out = block.take()
    for (let i = 0; i < block.count; i++) out[i] = radiation.cmb * (1 + block.redshift[i])
    return out
  },
  why: ({ subject }) =>
    subject.scenario.radiation.kind === 'thermal' ? null : missing('the scenario gives no photon temperature'),
}
