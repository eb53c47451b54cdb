/** Every measure of a scenario once, in the order of the page; values in the units shown, with error bounds. */
import { strayOf } from '../dark-energy/law'
import { type Event, eventAtScale, isEvent } from '../history/event'
import type { History } from '../history/history'
import { leadingExponent } from '../history/tail'
import { curvatureRadius } from '../measures/distances'
import { type Crossing, nearestToNow } from '../measures/epochs'
import { bounded, finiteOr, isMissing, type Missing, missing, type Outcome } from '../measures/outcome'
import { deceleration, jerk } from '../measures/rates'
import { eventHorizon, noFarthest, particleHorizon, redshiftAt } from '../measures/sight'
import { acousticAngle, dragRedshift, recombinationRedshift, soundHorizon } from '../measures/sound'
import { hubbleLengthGly, hubbleLengthMpc, hubbleTimeGyr } from '../units'
import { DRAG_EPOCH, FROM_DRAG_FIT, FROM_SCATTERING_FIT, INTEGRAL, LAST_SCATTERING, ROOT, ROUNDING } from './accuracy'
import { FRIEDMANN, fixed, HORIZONS, type Quantity, type Subject, significant } from './quantity'

export const MEASURE_KEYS = [
  'age',
  'hubbleTime',
  'hubbleRadius',
  'particleHorizon',
  'eventHorizon',
  'reachRedshift',
  'superluminalRedshift',
  'futureVisibility',
  'deceleration',
  'jerk',
  'accelerationOnset',
  'equalityMatterRadiation',
  'equalityMatterDark',
  'curvatureRadius',
  'recombinationRedshift',
  'dragRedshift',
  'soundHorizonDrag',
  'acousticAngle',
  'asymptoticHubble',
] as const
export type MeasureKey = (typeof MEASURE_KEYS)[number]
export type MeasureQuantity = Quantity & { readonly key: MeasureKey; readonly value: (subject: Subject) => Outcome }

const scaled = (outcome: Outcome, factor: number): Outcome =>
  isMissing(outcome) ? outcome : bounded(outcome.value * factor, outcome.error * factor)

const inGly = (outcome: Outcome, { scenario }: Subject): Outcome => scaled(outcome, hubbleLengthGly(scenario.h0))

const today = ({ history }: Subject): Event => {
  const event = eventAtScale(history, 0, 'expanding')
  if (!isEvent(event)) throw new Error('every history holds today')
  return event
}

const withError = (value: number | Missing, error: number): Outcome =>
  typeof value === 'number' ? bounded(value, error) : value

/** Rounding of a ratio of sums of densities: the bound follows the sizes of what was added. */
const rounding = ({ history }: Subject): number =>
  16 * Number.EPSILON * (1 + history.past.model.magnitude(0)) + 4 * noise(history)

/** Error of E² today that comes with the law of dark energy; those of its slopes are up to 6 and 36 times as large. */
const noise = ({ past: { model } }: History): number =>
  Number.EPSILON * Math.abs(model.budget.dark) * strayOf(model.law, 0)

const particle = (subject: Subject): Outcome => {
  const { past, before, origin } = subject.history
  const error =
    past.conformal.error * (origin.kind === 'bounce' ? 2 : 1) + (origin.kind === 'bounce' ? before.conformal.error : 0)
  return withError(particleHorizon(subject.history, today(subject)), error)
}

const event = (subject: Subject): Outcome => {
  const { future, descent, home, unfollowed, end } = subject.history
  const back = unfollowed ? unfollowed.error : descent.conformal.error + home.conformal.error
  const error = future.conformal.error + (end.turnaround ? back : 0)
  return withError(eventHorizon(subject.history, today(subject)), error)
}

/** z of a crossing; its error follows from the noise of the sums and is far below what the page shows. */
const redshiftOf = (crossing: Crossing | null, because: string): Outcome => {
  if (crossing === null) return missing(because)
  const relative = Math.max(64 * Number.EPSILON, crossing.blur)
  return bounded(Math.expm1(-crossing.N), relative * Math.exp(-crossing.N))
}

export const MEASURES: readonly MeasureQuantity[] = [
  {
    key: 'age',
    symbol: 't_0',
    label: 'age',
    unit: 'Gyr',
    digits: fixed(2),
    meaning: 'Time since the origin: the Big Bang, or the bounce.',
    formula: 't_0 = ∫ da/(a H), from the origin to today',
    source: FRIEDMANN,
    accuracy: INTEGRAL,
    value: ({ history, scenario }) =>
      scaled(
        finiteOr(history.past.time.total, history.past.time.error, 'the past is infinite'),
        hubbleTimeGyr(scenario.h0),
      ),
  },
  {
    key: 'hubbleTime',
    symbol: '1/H_0',
    label: 'Hubble time',
    unit: 'Gyr',
    digits: fixed(2),
    meaning: 'The age that a universe of constant expansion speed would have.',
    formula: '1/H_0',
    source: FRIEDMANN,
    accuracy: ROUNDING,
    value: ({ scenario }) => bounded(hubbleTimeGyr(scenario.h0)),
  },
  {
    key: 'hubbleRadius',
    symbol: 'c/H_0',
    label: 'Hubble radius',
    unit: 'Gly',
    digits: fixed(2),
    meaning: 'Proper distance at which recession today equals the speed of light.',
    formula: 'c/H_0',
    source: HORIZONS,
    accuracy: ROUNDING,
    value: ({ scenario }) => bounded(hubbleLengthGly(scenario.h0)),
  },
  {
    key: 'particleHorizon',
    symbol: 'χ_ph',
    label: 'particle horizon',
    unit: 'Gly',
    digits: fixed(2),
    meaning: 'Comoving distance to the farthest matter whose light can have reached us.',
    formula: 'χ_ph = ∫ c dt/a, from the beginning to today',
    source: HORIZONS,
    accuracy: INTEGRAL,
    value: (subject) => inGly(particle(subject), subject),
  },
  {
    key: 'eventHorizon',
    symbol: 'χ_eh',
    label: 'event horizon',
    unit: 'Gly',
    digits: fixed(2),
    meaning: 'Comoving distance that light sent today can cover before the end: what can still be reached.',
    formula: 'χ_eh = ∫ c dt/a, from today to the end',
    source: HORIZONS,
    accuracy: INTEGRAL,
    value: (subject) => inGly(event(subject), subject),
  },
  {
    key: 'reachRedshift',
    symbol: 'z_reach',
    label: 'light sent today reaches',
    unit: '',
    digits: fixed(3),
    meaning: 'Redshift of the farthest galaxies that a signal sent today can ever reach.',
    formula: 'χ(z) = χ_eh',
    source: HORIZONS,
    accuracy: ROOT,
    value: (subject) => {
      const horizon = event(subject)
      return isMissing(horizon) ? horizon : redshiftAt(subject.history, horizon.value, horizon.error)
    },
  },
  {
    key: 'superluminalRedshift',
    symbol: 'z_c',
    label: 'recession at c',
    unit: '',
    digits: fixed(3),
    meaning: 'Redshift beyond which galaxies recede faster than light today.',
    formula: 'χ(z) = c/H_0',
    source: HORIZONS,
    accuracy: ROOT,
    value: (subject) => redshiftAt(subject.history, 1, 0),
  },
  {
    key: 'futureVisibility',
    symbol: 'χ_vis',
    label: 'ever visible',
    unit: 'Gly',
    digits: fixed(2),
    meaning: 'Comoving distance to the farthest matter that will ever be seen from here.',
    formula: 'χ_vis = χ_ph + χ_eh',
    source: HORIZONS,
    accuracy: INTEGRAL,
    value: (subject) => {
      const [behind, ahead] = [particle(subject), event(subject)]
      if (isMissing(behind)) return behind
      if (isMissing(ahead)) return noFarthest(ahead)
      return inGly(bounded(behind.value + ahead.value, behind.error + ahead.error), subject)
    },
  },
  {
    key: 'deceleration',
    symbol: 'q_0',
    label: 'deceleration',
    unit: '',
    digits: fixed(3),
    meaning: 'Deceleration parameter today; negative while the expansion accelerates.',
    formula: 'q = −(ä a)/ȧ²',
    source: FRIEDMANN,
    accuracy: ROUNDING,
    value: (subject) => withError(deceleration(today(subject)), rounding(subject)),
  },
  {
    key: 'jerk',
    symbol: 'j_0',
    label: 'jerk',
    unit: '',
    digits: fixed(3),
    meaning: 'Third derivative of the scale factor today; 1 for matter and a cosmological constant in flat space.',
    formula: 'j = a² (d³a/dt³)/ȧ³',
    source: 'Visser 2004, Class. Quantum Grav. 21, 2603',
    accuracy: ROUNDING,
    value: (subject) => withError(jerk(today(subject)), 8 * rounding(subject)),
  },
  {
    key: 'accelerationOnset',
    symbol: 'z_acc',
    label: 'acceleration begins',
    unit: '',
    digits: fixed(3),
    meaning:
      'Redshift of the last change from deceleration to acceleration, or of the first one ahead (then negative).',
    formula: 'ä(z) = 0',
    source: FRIEDMANN,
    accuracy: ROOT,
    value: (subject) =>
      redshiftOf(
        nearestToNow(subject.epochs.acceleration.filter((one) => one.rising)),
        'the expansion never changes from deceleration to acceleration',
      ),
  },
  {
    key: 'equalityMatterRadiation',
    symbol: 'z_eq',
    label: 'matter equals radiation',
    unit: '',
    digits: fixed(0),
    meaning: 'Redshift at which cold matter equals photons and all neutrinos.',
    formula: 'ρ_{cb} = ρ_γ + ρ_ν, ρ_{cb} that of cold matter',
    source: FRIEDMANN,
    accuracy: ROOT,
    value: ({ epochs, budget }) => {
      const none = 'cold matter and radiation are never equal on the expansion that holds today'
      if (!(budget.coldMatter > 0 && budget.photons + budget.masslessNeutrinos + budget.massiveNeutrinos > 0)) {
        return missing('there is no cold matter or no radiation in this scenario')
      }
      return redshiftOf(nearestToNow(epochs.matterRadiation), none)
    },
  },
  {
    key: 'equalityMatterDark',
    symbol: 'z_mΛ',
    label: 'matter equals dark energy',
    unit: '',
    digits: fixed(3),
    meaning: 'Redshift at which cold matter equals dark energy.',
    formula: 'ρ_{cb} = ρ_{DE}, ρ_{cb} that of cold matter',
    source: FRIEDMANN,
    accuracy: ROOT,
    value: ({ epochs, budget }) => {
      if (!(budget.dark > 0 && budget.coldMatter > 0))
        return missing('there is no cold matter or no positive dark energy')
      const none = 'cold matter and dark energy are never equal on the expansion that holds today'
      return redshiftOf(nearestToNow(epochs.matterDark), none)
    },
  },
  {
    key: 'curvatureRadius',
    symbol: 'R_k',
    label: 'radius of curvature',
    unit: 'Gly',
    digits: fixed(1),
    meaning: 'Radius of curvature of space today.',
    formula: 'R_k = (c/H_0)/√|Ω_k|',
    source: FRIEDMANN,
    accuracy: ROUNDING,
    value: (subject) =>
      subject.budget.curvature === 0
        ? missing('space is flat')
        : inGly(bounded(curvatureRadius(subject.budget.curvature)), subject),
  },
  {
    key: 'recombinationRedshift',
    symbol: 'z_*',
    label: 'last scattering',
    unit: '',
    digits: fixed(1),
    meaning: 'Redshift at which photons were last scattered.',
    formula: 'fit in Ω_b h² and Ω_m h²',
    source: 'Hu & Sugiyama 1996, ApJ 471, 542, eq. E-1, times 0.99818 to meet Planck 2018, arXiv:1807.06209',
    accuracy: LAST_SCATTERING,
    value: ({ scenario }) => recombinationRedshift(scenario),
  },
  {
    key: 'dragRedshift',
    symbol: 'z_d',
    label: 'end of the drag epoch',
    unit: '',
    digits: fixed(1),
    meaning: 'Redshift at which baryons were released from the photons.',
    formula: 'fit in Ω_b h² and Ω_m h²',
    source: 'Aizpuru, Arjona & Nesseris 2021, Phys. Rev. D 104, 043521, eq. A2',
    accuracy: DRAG_EPOCH,
    value: ({ scenario }) => dragRedshift(scenario),
  },
  {
    key: 'soundHorizonDrag',
    symbol: 'r_d',
    label: 'sound horizon at drag',
    unit: 'Mpc',
    digits: fixed(2),
    meaning: 'Comoving distance that sound covered until the end of the drag epoch.',
    formula: 'r_d = ∫ c_s dt/a, c_s = c/√(3 (1 + 3ρ_b/4ρ_γ))',
    source: 'Eisenstein & Hu 1998, ApJ 496, 605',
    accuracy: FROM_DRAG_FIT,
    value: ({ history, scenario }) => {
      const z = dragRedshift(scenario)
      return isMissing(z) ? z : scaled(soundHorizon(history, scenario, z), hubbleLengthMpc(scenario.h0))
    },
  },
  {
    key: 'acousticAngle',
    symbol: 'θ_*',
    label: 'acoustic angle',
    unit: 'rad',
    digits: significant(5),
    meaning: 'Angle under which the sound horizon at last scattering is seen.',
    formula: 'θ_* = r_s(z_*)/D_M(z_*)',
    source: 'Planck Collaboration 2020, A&A 641, A6, arXiv:1807.06209',
    accuracy: FROM_SCATTERING_FIT,
    value: ({ history, scenario }) => acousticAngle(history, scenario),
  },
  {
    key: 'asymptoticHubble',
    symbol: 'H_∞',
    label: 'final expansion rate',
    unit: 'km/s/Mpc',
    digits: fixed(2),
    meaning: 'What H tends to when the universe expands for ever.',
    formula: 'H_∞ = lim H(t), t → ∞',
    source: FRIEDMANN,
    accuracy: ROUNDING,
    value: finalRate,
  },
]

/** √(Ω of what stays constant), 0 where everything thins out. */
function finalRate({ history, scenario }: Subject): Outcome {
  const { future, end } = history
  if (end.kind === 'rip') return missing('H grows without bound until the rip')
  if (end.kind === 'little-rip') return missing('H grows without bound')
  if (!['exponential', 'accelerating', 'coasting', 'decelerating'].includes(end.kind)) {
    return missing('the universe does not expand for ever')
  }
  if (leadingExponent(future.model, 1) !== 0) return { value: 0, error: 0 }
  const constant = future.model.acting.reduce((sum, one) => {
    const constantTerm = one.future.kind === 'power' && one.future.exponent === 0
    return constantTerm
      ? sum + Math.sign(one.omega) * Math.exp(one.future.kind === 'power' ? one.future.logCoefficient : 0)
      : sum
  }, 0)
  return bounded(scenario.h0 * Math.sqrt(constant), 0, 8)
}
