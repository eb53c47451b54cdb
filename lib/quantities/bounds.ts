/**
 * An absolute bound on the numerical error of every column: what the series of the panels leave out, rounding times its conditioning,
 * and what the rounding of ln a, or of the place found for a time, moves the value by.
 */
import { GRAVITATION } from '../constants'
import { strayOf } from '../dark-energy/law'
import { type Event, type Span, spanSinceNow, spanSinceOrigin, spanUntilEnd } from '../history/event'
import type { History } from '../history/history'
import { growthAt, growthRateAt } from '../measures/growth'
import { isMissing, missing, type Outcome } from '../measures/outcome'
import { particleHorizonSpan } from '../measures/sight'
import { hubbleLengthGly, hubbleLengthMpc, hubbleTimeGyr, perSecond } from '../units'
import { type Block, eventIn, expansionIn, slopesIn } from './block'
import { type Column, type ColumnKey, columnFrom } from './column'
import { angularErrors, luminosityErrors, sightErrors, transverseErrors } from './distance-errors'
import { driftUnit, NEAR_TODAY } from './distances'
import {
  type At,
  EPS,
  errors,
  expansionErrors,
  FEW,
  isTimed,
  ofDensity,
  ofRate,
  placed,
  placeErrors,
  rateErrors,
  relative,
  roundings,
  scaledBy,
  spanErrors,
  valuesOf,
} from './errors'
import { significant } from './quantity'

const inGyr = (block: Block, span: Span): Float64Array =>
  errors(scaledBy(spanErrors(block, span, 'time'), hubbleTimeGyr(block.subject.scenario.h0)))(block)

/** What was asked for stands as it was given. */
const timeErrors = (block: Block): Float64Array =>
  block.asked === 'time' ? block.take().fill(0) : inGyr(block, spanSinceNow(block.subject.history, block, 'time'))
const ageErrors = (block: Block): Float64Array =>
  block.asked === 'age' ? block.take().fill(0) : inGyr(block, spanSinceOrigin(block.subject.history, block, 'time'))

const horizon = (spanOf: (block: Block) => Span | { readonly because: string }) => (block: Block) => {
  const span = spanOf(block)
  if ('because' in span) return block.take().fill(Number.NaN)
  return errors(scaledBy(spanErrors(block, span, 'conformal'), hubbleLengthGly(block.subject.scenario.h0)))(block)
}

/** Of q and j: their terms are rounded, and q′ = −½ [(E²)″/E² − ((E²)′/E²)²] tells how fast they vary. */
const ratios = (key: 'deceleration' | 'jerk', variation: number) => (block: Block) => {
  const [values, squared, { first, second }] = [valuesOf(key, block), expansionIn(block), slopesIn(block)]
  const [rounded, places] = [roundings(block), placeErrors(block)]
  return errors((_, i) => {
    const [one, two] = [first[i] / squared[i], second[i] / squared[i]]
    const size = 1 + Math.abs(values[i]) + Math.abs(one) + (key === 'jerk' ? Math.abs(two) : 0)
    return size * rounded[i] + variation * (1 + Math.abs(one)) * Math.abs(two - one * one) * places[i]
  })(block)
}

/** Shares: of E², and of a power n of a that is at most 4 but for dark energy. */
const share = (key: ColumnKey) => relative(key, (block, i) => ofDensity(block, i) + 4 * placeErrors(block)[i])

/** Of dark energy: its own exponent, and what rounds in ln f. */
const darkShare = relative('omegaDark', (block, i) => {
  const { law } = block.arm.model
  const N = block.N[i]
  const exponent = Math.abs(3 * (1 + law.w(N)))
  return (
    ofDensity(block, i) + exponent * placeErrors(block)[i] + EPS * (4 * Math.abs(law.logDensity(N)) + strayOf(law, N))
  )
})

const laws = new Float64Array(3)
const equationErrors = errors((block, i) => {
  const { law } = block.arm.model
  law.derivativesInto(laws, block.N[i])
  const n = -laws[1] / laws[0]
  const slope = Math.abs(n * n - laws[2] / laws[0]) / 3
  const size = 1 + Math.abs(law.w(block.N[i])) + Math.abs(law.w(0))
  return (
    EPS * (FEW * size + 4 * strayOf(law, block.N[i])) + (Number.isFinite(slope) ? slope : size) * placeErrors(block)[i]
  )
})

/** Of 1 − aE: near today from differences that are of the order of z. */
const driftErrors = errors((block, i) => {
  const { arm, N, scale, redshift, subject } = block
  const slope = Math.abs(slopesIn(block).first[i] / expansionIn(block)[i])
  const rate = Math.sqrt(Math.max(0, expansionIn(block)[i])) * scale[i]
  const near = Math.abs(N[i]) < NEAR_TODAY
  const rounding = near ? 4 * FEW * EPS * Math.abs(redshift[i]) * (1 + arm.model.magnitude(N[i])) : FEW * EPS
  const place = near && !isTimed(block) ? EPS * Math.abs(N[i]) : placeErrors(block)[i]
  const rates = near ? 0 : scale[i] * rateErrors(block)[i]
  const resting = scale[i] * rateErrors(block)[i] + rate * place
  const moved = rate > 0 ? Math.min(rate * (1 + slope) * place, resting) : resting
  return driftUnit(subject.scenario.h0) * (rounding + rates + moved)
})

const growthErrors = (read: (history: History, event: Event) => Outcome) =>
  errors((block, i) => {
    const one = read(block.subject.history, eventIn(block, i))
    return isMissing(one) ? Number.NaN : one.error + (isTimed(block) ? 4 * placeErrors(block)[i] * (1 + one.value) : 0)
  })

const scaled = (make: (block: Block) => Float64Array, factor: At) => (block: Block) => {
  const values = make(block)
  return errors((one, i) => values[i] * factor(one, i))(block)
}

const BOUNDS: Readonly<Record<ColumnKey, (block: Block) => Float64Array>> = {
  time: timeErrors,
  age: ageErrors,
  lookback: timeErrors,
  scale: relative('scale', placed),
  redshift: errors(
    (block, i) =>
      FEW * EPS * Math.abs(block.redshift[i]) + (isTimed(block) ? placeErrors(block)[i] / block.scale[i] : 0),
  ),
  hubble: errors((block, i) => {
    const { h0 } = block.subject.scenario
    return h0 * (rateErrors(block)[i] + FEW * EPS * Math.sqrt(Math.max(0, expansionIn(block)[i])))
  }),
  deceleration: ratios('deceleration', 1),
  jerk: ratios('jerk', 6),
  omegaMatter: share('omegaMatter'),
  omegaRadiation: share('omegaRadiation'),
  omegaNeutrino: share('omegaNeutrino'),
  omegaCurvature: share('omegaCurvature'),
  omegaDark: darkShare,
  w: equationErrors,
  comoving: scaled(sightErrors, ({ subject }) => hubbleLengthMpc(subject.scenario.h0)),
  transverse: transverseErrors,
  angular: angularErrors,
  luminosity: luminosityErrors,
  modulus: errors((block, i) => {
    const part = luminosityErrors(block)[i] / valuesOf('luminosity', block)[i]
    return (5 / Math.LN10) * part + FEW * EPS * (25 + Math.abs(valuesOf('modulus', block)[i]))
  }),
  arcsecond: scaled(angularErrors, () => (1e3 * Math.PI) / 648000),
  volume: errors((block, i) => {
    const mpc = hubbleLengthMpc(block.subject.scenario.h0)
    const area = 4 * Math.PI * valuesOf('transverse', block)[i] ** 2 * 1e-9
    return area * sightErrors(block)[i] * mpc + 4 * FEW * EPS * valuesOf('volume', block)[i]
  }),
  conformal: horizon((block) => spanSinceOrigin(block.subject.history, block, 'conformal')),
  particleHorizon: horizon((block) => particleHorizonSpan(block.subject.history, block)),
  eventHorizon: horizon((block) => spanUntilEnd(block.subject.history, block, 'conformal')),
  hubbleRadius: relative('hubbleRadius', ofRate),
  temperature: relative('temperature', placed),
  criticalDensity: errors((block, i) => {
    const today = (3 * perSecond(block.subject.scenario.h0) ** 2) / (8 * Math.PI * GRAVITATION)
    return today * (expansionErrors(block)[i] + FEW * EPS * Math.max(0, expansionIn(block)[i]))
  }),
  drift: driftErrors,
  growth: growthErrors(growthAt),
  growthRate: growthErrors(growthRateAt),
}

/** The column of the error bounds of another: no value where that has none. */
export const boundOf = ({ key, symbol, label, values, value, ...rest }: Column): Column => ({
  ...columnFrom({
    ...rest,
    key: `${key as ColumnKey}Error`,
    symbol: `δ${symbol}`,
    label: `error of ${label}`,
    meaning: `Absolute bound on the numerical error of the ${label}.`,
    formula: `δ${symbol}`,
    digits: significant(2),
    values: (block) => {
      const [known, bounds] = [values(block), BOUNDS[key as ColumnKey](block)]
      return errors((_, i) => (Number.isFinite(known[i]) ? bounds[i] : Number.NaN))(block)
    },
    why: (block, i) => (Number.isFinite(values(block)[i]) ? null : missing('there is no value that could err')),
  }),
})

/** Columns, each followed by that of its error bounds where these are asked for. */
export const withBounds = (columns: readonly Column[], asked: boolean): readonly Column[] =>
  asked ? columns.flatMap((one) => [one, boundOf(one)]) : columns
