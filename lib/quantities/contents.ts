/** Columns that say of what: the share of each component, the law of dark energy, the temperature. */
import { missing } from '../measures/outcome'
import { densityFraction, equationOfState, type Share } from '../measures/rates'
import { ROUNDING } from './accuracy'
import type { Column, ColumnKey } from './column'
import { FRIEDMANN, fixed, significant } from './quantity'

const share = (key: ColumnKey, symbol: string, label: string, meaning: string, of: Share): Column => ({
  key,
  symbol,
  label,
  unit: '',
  digits: fixed(5),
  meaning,
  formula: `${symbol} = ρ/ρ_c`,
  source: FRIEDMANN,
  accuracy: ROUNDING,
  value: (_, instant) => densityFraction(instant, of, instant.expansion),
})

export const CONTENT_COLUMNS: readonly Column[] = [
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
    value: (_, instant) => equationOfState(instant),
  },
]

export const TEMPERATURE: Column = {
  key: 'temperature',
  symbol: 'T',
  label: 'photon temperature',
  unit: 'K',
  digits: significant(5),
  meaning: 'Temperature of the cosmic microwave background.',
  formula: 'T = T_0 (1 + z)',
  source: 'Tolman 1934, Relativity, Thermodynamics and Cosmology, Oxford',
  accuracy: ROUNDING,
  value: ({ scenario }, { redshift }) =>
    scenario.radiation.kind === 'thermal'
      ? scenario.radiation.cmb * (1 + redshift)
      : missing('the scenario gives no photon temperature'),
}
