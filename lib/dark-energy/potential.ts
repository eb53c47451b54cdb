/** Shapes v(φ) of a scalar field's potential V = height · v, with φ in reduced Planck masses, and where the field starts. */

export type PotentialKind = 'exponential' | 'linear' | 'inverse' | 'cosine'

export interface Potential {
  readonly kind: PotentialKind
  /** slope or width of the scenario code. */
  readonly parameter: number
  /** φ at rest in the early universe. */
  readonly start: number
  value(phi: number): number
  /** dv/dφ. */
  slope(phi: number): number
  /** Writes both, at the cost of one. */
  bothInto(out: Float64Array, phi: number): void
  /** By how much φ has to change for v to change by about itself: the size against which errors of φ are measured. */
  length(phi: number): number
  /** v is never negative, so that n = 3(1 + w) lies between 0 and 6. */
  readonly positive: boolean
}

/** v = e^(−slope φ): Ratra & Peebles 1988; Wetterich 1988. */
export function exponential(slope: number): Potential {
  return {
    kind: 'exponential',
    parameter: slope,
    start: 0,
    value: (phi) => Math.exp(-slope * phi),
    slope: (phi) => -slope * Math.exp(-slope * phi),
    bothInto(out, phi) {
      out[0] = Math.exp(-slope * phi)
      out[1] = -slope * out[0]
    },
    length: () => 1 / (1 + Math.abs(slope)),
    positive: true,
  }
}

/** v = 1 − slope φ, without a lower bound: Kallosh et al. 2003. */
export function linear(slope: number): Potential {
  return {
    kind: 'linear',
    parameter: slope,
    start: 0,
    value: (phi) => 1 - slope * phi,
    slope: () => -slope,
    bothInto(out, phi) {
      out[0] = 1 - slope * phi
      out[1] = -slope
    },
    length: (phi) => (1 + Math.abs(1 - slope * phi)) / (1 + Math.abs(slope)),
    positive: slope === 0,
  }
}

/** v = φ^(−slope), slope above 0: Ratra & Peebles 1988. */
export function inverse(slope: number, start: number): Potential {
  return {
    kind: 'inverse',
    parameter: slope,
    start,
    value: (phi) => phi ** -slope,
    slope: (phi) => -slope * phi ** (-slope - 1),
    bothInto(out, phi) {
      out[0] = phi ** -slope
      out[1] = (-slope * out[0]) / phi
    },
    length: (phi) => phi / (1 + slope),
    positive: true,
  }
}

/** v = 1 + cos(φ/width), as 2 cos² without cancellation at its zeros: Frieman, Hill, Stebbins & Waga 1995. */
export function cosine(width: number, start: number): Potential {
  return {
    kind: 'cosine',
    parameter: width,
    start,
    value: (phi) => 2 * Math.cos(phi / (2 * width)) ** 2,
    slope: (phi) => -Math.sin(phi / width) / width,
    bothInto(out, phi) {
      const [c, s] = [Math.cos(phi / (2 * width)), Math.sin(phi / (2 * width))]
      out[0] = 2 * c * c
      out[1] = (-2 * s * c) / width
    },
    length: () => width,
    positive: true,
  }
}
