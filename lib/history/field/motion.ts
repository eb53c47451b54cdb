/**
 * The field's equation of motion beside Friedmann's: φ̈ + 3Hφ̇ + 3 dU/dφ = 0 with U = V/(3H₀²) and time in 1/H₀,
 * so that Ω_DE f = φ̇²/6 + U and Ḣ = ½ dB/dN − ½ φ̇², B the rest of E². (Ratra & Peebles 1988, Phys. Rev. D 37, 3406.)
 */
import type { Potential } from '../../dark-energy/potential'
import type { Motion } from '../../numerics/ode'
import type { Background } from './background'

/** The field with the height of its potential: U = height · v(φ). */
export interface Field {
  readonly potential: Potential
  readonly height: number
  readonly background: Background
}

/** Field energy φ̇²/6 + U over today's critical density. */
export const energyOf = ({ potential, height }: Field, phi: number, speed: number): number =>
  (speed * speed) / 6 + height * potential.value(phi)

const scratch = new Float64Array(3)
/** v and dv/dφ. */
const shape = new Float64Array(2)

/** E² from Friedmann's equation. */
export function expansionOf(field: Field, N: number, phi: number, speed: number): number {
  field.background.into(scratch, N)
  return scratch[0] + energyOf(field, phi, speed)
}

/** Places of the unknowns of `byScale`. */
export const [PHI, SPEED] = [0, 1]

/** Unknowns φ and φ̇ as functions of N, with H from the constraint: while the universe expands. */
export function byScale(field: Field): Motion {
  const { potential, height, background } = field
  return {
    size: 2,
    slopeInto(out, N, y) {
      const [phi, speed] = [y[0], y[1]]
      background.into(scratch, N)
      potential.bothInto(shape, phi)
      const H = Math.sqrt(scratch[0] + (speed * speed) / 6 + height * shape[0])
      out[0] = speed / H
      out[1] = -3 * (speed + (height * shape[1]) / H)
    },
    weightsInto(out, _, y) {
      out[0] = potential.length(y[0])
      out[1] = Math.abs(y[1]) + Math.sqrt(Math.abs(height * potential.value(y[0])))
    },
  }
}

/** Places of the unknowns of `byTime`. */
export const [SCALE, RATE, TIMED_PHI, TIMED_SPEED] = [0, 1, 2, 3]

/** Unknowns N, H, φ and φ̇ as functions of τ with dt = dτ/√(1 + H²): through turning points and towards a crunch. */
export function byTime(field: Field): Motion {
  const { potential, height, background } = field
  return {
    size: 4,
    slopeInto(out, _, y) {
      const [N, H, phi, speed] = [y[0], y[1], y[2], y[3]]
      const d = clockRate(H)
      background.into(scratch, N)
      out[0] = H * d
      out[1] = 0.5 * (scratch[1] - speed * speed) * d
      out[2] = speed * d
      out[3] = -3 * (H * speed + height * potential.slope(phi)) * d
    },
    weightsInto(out, _, y) {
      background.into(scratch, y[0])
      const energies = scratch[2] + (y[3] * y[3]) / 6 + Math.abs(height * potential.value(y[2]))
      out[0] = 1
      out[1] = Math.sqrt(energies)
      out[2] = potential.length(y[2])
      out[3] = Math.abs(y[3]) + Math.sqrt(Math.abs(height * potential.value(y[2])))
    },
  }
}

/** dt/dτ. */
export const clockRate = (H: number): number => 1 / Math.sqrt(1 + H * H)

/** Puts H back on the constraint where E² is not a small difference of large terms. */
export function project(field: Field, state: Float64Array): void {
  field.background.into(scratch, state[0])
  const potential = field.height * field.potential.value(state[2])
  const kinetic = (state[3] * state[3]) / 6
  const value = scratch[0] + kinetic + potential
  if (value > 0.1 * (scratch[2] + kinetic + Math.abs(potential))) state[1] = Math.sign(state[1]) * Math.sqrt(value)
}
