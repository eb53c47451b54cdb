/** Where a universe with a scalar field goes, by theorems on the potential where they hold, else by what the integration shows. */
import type { Budget } from '../../scenario/budget'
import type { Arm } from '../arm'
import type { Beginning } from '../origin'
import type { End, EndKind } from '../outcome'
import { finalExponent, type Outlook } from './ahead'
import type { Field } from './motion'

const exact = (x: number): string => String(Number(x.toPrecision(4)))

/** E² stays positive, and the expansion goes on as far as it is followed. */
export function endAhead(field: Field, outlook: Outlook): End {
  const [kind, because, proven] = verdict(field, outlook)
  const open = field.background.budget.curvature >= 0
  const doubt = open || !proven ? '' : ' That E² has no root ahead is seen by integration, not proven.'
  const scale = kind === 'crunch' ? 0 : null
  return { kind, time: null, scale, turnaround: null, proven: proven && open, because: because + doubt }
}

function verdict(field: Field, outlook: Outlook): readonly [EndKind, string, boolean] {
  const { potential, background } = field
  const { curvature } = background.budget
  if (potential.slope(potential.start) === 0)
    return ['exponential', 'On a flat potential the density stays constant, and so does H in the end.', true]
  switch (potential.kind) {
    case 'exponential':
      return exponentialEnd(field, curvature)
    case 'inverse':
      return [
        'accelerating',
        'The field rolls ever more slowly on a potential whose slope over its height dies out: w tends to −1, and H falls to zero more slowly than every power of a.',
        true,
      ]
    case 'linear':
      return [
        'crunch',
        'The potential becomes negative in the end and turns the expansion into contraction, at a scale factor that is beyond the range of floating-point numbers.',
        true,
      ]
    case 'cosine':
      return cosineEnd(curvature, outlook)
  }
}

function exponentialEnd(field: Field, curvature: number): readonly [EndKind, string, boolean] {
  const square = field.potential.parameter ** 2
  /* v8 ignore next -- an exponential potential has its final exponent */
  const n = curvature < 0 ? square : (finalExponent(field) ?? 0)
  const kind = n < 2 ? 'accelerating' : n === 2 ? 'coasting' : 'decelerating'
  const rule =
    n === square
      ? `The field comes to rule with n = slope² = ${exact(n)}`
      : `slope² = ${exact(square)} is above ${exact(n)}, so the field follows what thins out slowest beside it`
  return [kind, `${rule}; E² goes like a to the power −${exact(n)}.`, true]
}

function cosineEnd(curvature: number, outlook: Outlook): readonly [EndKind, string, boolean] {
  const swings = outlook.kind === 'swinging' ? 'swings' : 'rolls down in the end and swings'
  if (curvature > 0) {
    return [
      'coasting',
      `The field ${swings} about the minimum V = 0 and thins out like dust, and curvature is left.`,
      true,
    ]
  }
  if (curvature < 0) {
    const because = `The field ${swings} about the minimum V = 0 and thins out like dust, which a closed universe does not outlast.`
    return ['crunch', because, false]
  }
  return ['decelerating', `The field ${swings} about the minimum V = 0 and thins out like dust.`, true]
}

/** The expansion stops at N = `turn`, the end of `future`, and turns into contraction. */
export const crunchAfter = (future: Arm, turn: number, rest: number, turns: number): End =>
  crunch(future, turn, rest, crunchBecause(turn, turns))

/** The same, where the field swings as dust on the average. */
export const averagedCrunch = (future: Arm, turn: number, rest: number): End =>
  crunch(future, turn, rest, averagedBecause(turn))

export function crunchBecause(turn: number, turns: number): string {
  const times = turns === 1 ? '' : ` H changes its sign ${turns} times before the end.`
  return `Followed by integration: H vanishes at a = ${sizeAt(turn)}, and the contraction is driven by the motion of the field down to a = 0.${times}`
}

export const averagedBecause = (turn: number): string =>
  `The field swings too often to be followed and thins out like dust on the average: H vanishes about a = ${sizeAt(turn)}, and the contraction takes about as long as the expansion.`

const sizeAt = (N: number): string => Math.exp(N).toPrecision(4)

const crunch = (future: Arm, turn: number, rest: number, because: string): End => ({
  kind: 'crunch',
  time: future.time.total + rest,
  scale: 0,
  turnaround: { time: future.time.total, scale: Math.exp(turn) },
  proven: false,
  because,
})

/** Only where every density is positive E² has no root on the way back whatever the digits. */
export function fieldOrigin<T extends Beginning>({ curvature }: Budget, origin: T): T {
  if (curvature >= 0) return origin
  return { ...origin, proven: false, because: `${origin.because} This is seen by integration, not proven.` }
}
