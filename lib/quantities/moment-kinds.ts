/** What each kind of moment is: the entries of the timetable explained. */
import { DRAG_EPOCH, INTEGRAL, LAST_SCATTERING, ORDER_OF_MAGNITUDE, ROOT, ROUNDING } from './accuracy'
import type { MomentKind } from './moments'
import { FRIEDMANN, type Quantity } from './quantity'

export type MomentEntry = Pick<Quantity, 'symbol' | 'label' | 'formula' | 'meaning' | 'accuracy' | 'source'>

const RIPS = 'Caldwell, Kamionkowski & Weinberg 2003, Phys. Rev. Lett. 91, 071301'
const unbinding = (label: string, period: string): MomentEntry => ({
  symbol: 't_{unb}',
  label,
  formula: 'ä/a = (2π/P)²',
  meaning: `When the expansion accelerates fast enough to part a system of period P = ${period}.`,
  accuracy: ORDER_OF_MAGNITUDE,
  source: `${RIPS}, for the criterion; the period is common practice`,
})

export const MOMENT_KINDS: Readonly<Record<MomentKind, MomentEntry>> = {
  origin: {
    symbol: 't_{or}',
    label: 'origin',
    formula: 'a → 0, or ȧ = 0 at the smallest a',
    meaning: 'Where the expansion that holds today began: a Big Bang, a bounce, or infinitely long ago.',
    accuracy: INTEGRAL,
    source: FRIEDMANN,
  },
  'matter-radiation-equality': {
    symbol: 't_{eq}',
    label: 'matter equals radiation',
    formula: 'ρ_{cb} = ρ_γ + ρ_ν, ρ_{cb} that of cold matter',
    meaning: 'When cold matter is as dense as photons and all neutrinos together.',
    accuracy: ROOT,
    source: FRIEDMANN,
  },
  recombination: {
    symbol: 't_*',
    label: 'last scattering',
    formula: 't_* = t(z_*)',
    meaning: 'When the photons of the microwave background were last scattered.',
    accuracy: LAST_SCATTERING,
    source: 'Hu & Sugiyama 1996, ApJ 471, 542, eq. E-1, times 0.99818 to meet Planck 2018, arXiv:1807.06209',
  },
  drag: {
    symbol: 't_d',
    label: 'end of the drag epoch',
    formula: 't_d = t(z_d)',
    meaning: 'When baryons were released from the photons.',
    accuracy: DRAG_EPOCH,
    source: 'Aizpuru, Arjona & Nesseris 2021, Phys. Rev. D 104, 043521, eq. A2',
  },
  'acceleration-start': {
    symbol: 't_{acc}',
    label: 'acceleration begins',
    formula: 'ä = 0, rising',
    meaning: 'When the expansion changes from deceleration to acceleration.',
    accuracy: ROOT,
    source: FRIEDMANN,
  },
  'acceleration-end': {
    symbol: 't_{dec}',
    label: 'acceleration ends',
    formula: 'ä = 0, falling',
    meaning: 'When the expansion changes from acceleration to deceleration.',
    accuracy: ROOT,
    source: FRIEDMANN,
  },
  'matter-dark-equality': {
    symbol: 't_{mΛ}',
    label: 'matter equals dark energy',
    formula: 'ρ_{cb} = ρ_{DE}, ρ_{cb} that of cold matter',
    meaning: 'When cold matter is as dense as dark energy.',
    accuracy: ROOT,
    source: FRIEDMANN,
  },
  now: {
    symbol: 't_0',
    label: 'today',
    formula: 'a = 1',
    meaning: 'The epoch to which all parameters belong.',
    accuracy: ROUNDING,
    source: FRIEDMANN,
  },
  turnaround: {
    symbol: 't_{turn}',
    label: 'expansion stops',
    formula: 'H = 0',
    meaning: 'When the expansion comes to rest and turns into contraction.',
    accuracy: INTEGRAL,
    source: FRIEDMANN,
  },
  'unbinding-cluster': unbinding('clusters of galaxies come apart', '3.6 Gyr'),
  'unbinding-galaxy': unbinding('large galaxies come apart', '225 Myr'),
  'unbinding-planet': unbinding('planets leave their stars', '1 yr'),
  'unbinding-earth': unbinding('rocky planets break up', '90 min'),
  'unbinding-atom': unbinding('atoms are torn apart', '1.5 × 10⁻¹⁶ s'),
  end: {
    symbol: 't_{end}',
    label: 'end',
    formula: 'a → 0 or a → ∞, or the density diverges',
    meaning: 'What the expansion comes to, and when, if it ever ends.',
    accuracy: INTEGRAL,
    source: FRIEDMANN,
  },
}
