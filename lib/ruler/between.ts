/** Readings between two epochs, the nearer of which is the lens and the other the source. */
import { PARSEC, SPEED_OF_LIGHT } from '../constants'
import { transverseDistance } from '../measures/distances'
import { isMissing, type Missing, missing } from '../measures/outcome'
import { DIFFERENCE } from '../quantities/accuracy'
import type { ColumnSubject, Instant } from '../quantities/instant'
import { FRIEDMANN, HOGG, type Quantity, significant } from '../quantities/quantity'
import { hubbleLengthMpc } from '../units'
import { columnAt } from './extra'
import { type Given, WHOLE_SKY } from './given'
import type { BetweenKey } from './keys'

/** Two epochs of one history, in any order. */
export interface Pair {
  readonly subject: ColumnSubject
  readonly one: Instant
  readonly other: Instant
  readonly given: Given
}

export interface Between extends Quantity {
  readonly key: BetweenKey
  value(pair: Pair): number | Missing
}

/** G M of the sun is known to more digits than either: nominal value, IAU 2015 Resolution B3, m³ s⁻². */
const SUN = 1.3271244e20
/** c²/(4πG) in solar masses per parsec. */
const LENSING = (SPEED_OF_LIGHT ** 2 * PARSEC) / (4 * Math.PI * SUN)

interface Sight {
  /** Comoving distances in Mpc, and redshift of the farther. */
  readonly near: number
  readonly far: number
  readonly redshift: number
}

/** Both epochs on our past light path, the nearer first. */
function sightOf({ subject, one, other }: Pair): Sight | Missing {
  const [a, b] = [columnAt('comoving', { subject, instant: one }), columnAt('comoving', { subject, instant: other })]
  if (isMissing(a)) return a
  if (isMissing(b)) return b
  return a <= b ? { near: a, far: b, redshift: other.redshift } : { near: b, far: a, redshift: one.redshift }
}

/** D_M of a comoving distance along the line of sight, both in Mpc. */
function across({ scenario, budget }: ColumnSubject, distance: number): number {
  const unit = hubbleLengthMpc(scenario.h0)
  return transverseDistance(distance / unit, budget.curvature) * unit
}

const seen = (make: (sight: Sight, pair: Pair) => number | Missing) => (pair: Pair) => {
  const sight = sightOf(pair)
  return isMissing(sight as number | Missing) ? (sight as Missing) : make(sight as Sight, pair)
}

/** V(far) − V(near); in flat space by the difference of the distances, which keeps the digits of a thin shell. */
function shell({ near, far }: Sight, { subject, one, other, given }: Pair): number | Missing {
  const part = given.sky / WHOLE_SKY
  if (subject.budget.curvature === 0) {
    return (((4 * Math.PI) / 3) * part * (far - near) * (far * far + far * near + near * near)) / 1e9
  }
  const volumes = [one, other].map((instant) => columnAt('volume', { subject, instant }))
  const [a, b] = volumes
  if (typeof a !== 'number') return a
  return typeof b === 'number' ? part * Math.abs(a - b) : b
}

function criticalSurfaceDensity({ near, far, redshift }: Sight, { subject, one, other }: Pair): number | Missing {
  const lens = across(subject, near) / (1 + Math.min(one.redshift, other.redshift))
  const source = across(subject, far) / (1 + redshift)
  const apart = across(subject, far - near) / (1 + redshift)
  if (lens === 0 || apart === 0) return missing('the lens lies here, or where the source is: nothing is deflected')
  return ((LENSING * source) / (lens * apart)) * 1e-6
}

export const BETWEEN: readonly Between[] = [
  {
    key: 'interval',
    symbol: 'Δt',
    label: 'interval',
    unit: 'Gyr',
    digits: significant(5),
    meaning: 'Cosmic time between the two epochs.',
    formula: 'Δt = |t_1 − t_2|',
    source: FRIEDMANN,
    accuracy: DIFFERENCE,
    value: ({ one, other }) => Math.abs(one.time - other.time),
  },
  {
    key: 'comovingBetween',
    symbol: 'D_{C,12}',
    label: 'comoving distance between',
    unit: 'Mpc',
    digits: significant(6),
    meaning: 'Comoving distance along the line of sight from one to the other.',
    formula: 'D_{C,12} = D_{C,2} − D_{C,1}',
    source: `${HOGG}, eq. 15`,
    accuracy: DIFFERENCE,
    value: seen(({ near, far }) => far - near),
  },
  {
    key: 'angularBetween',
    symbol: 'D_{A,12}',
    label: 'angular diameter distance between',
    unit: 'Mpc',
    digits: significant(6),
    meaning: 'Angular diameter distance of the farther as seen from the nearer, as lensing needs it.',
    formula: 'D_{A,12} = S(D_{C,2} − D_{C,1})/(1 + z_2), with S the sine, the line or the hyperbolic sine of D_M',
    source: `${HOGG}, eq. 19`,
    accuracy: DIFFERENCE,
    value: seen(({ near, far, redshift }, { subject }) => across(subject, far - near) / (1 + redshift)),
  },
  {
    key: 'shellVolume',
    symbol: 'V_12',
    label: 'shell volume',
    unit: 'Gpc³',
    digits: significant(5),
    meaning: 'Comoving volume between the two epochs over the sky area.',
    formula: 'V_12 = (V_{C,2} − V_{C,1}) Ω/4π',
    source: `${HOGG}, eq. 29`,
    accuracy: DIFFERENCE,
    value: seen(shell),
  },
  {
    key: 'criticalSurfaceDensity',
    symbol: 'Σ_cr',
    label: 'lensing critical density',
    unit: 'M☉/pc²',
    digits: significant(5),
    meaning: 'Surface density of a lens at the nearer that can make several images of a source at the farther.',
    formula: 'Σ_cr = (c²/4πG) D_{A,2}/(D_{A,1} D_{A,12})',
    source: 'Schneider, Ehlers & Falco 1992, Gravitational Lenses, Springer',
    accuracy: DIFFERENCE,
    value: seen(criticalSurfaceDensity),
  },
]
