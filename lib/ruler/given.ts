/** What a person gives beside the epochs: a length, a line of a spectrum, an area of the sky. */

export interface Given {
  /** Mpc. */
  readonly length: number
  readonly line: Line
  /** Square degrees. */
  readonly sky: number
}

/** A line at rest, by its wavelength or its frequency. */
export interface Line {
  readonly value: number
  readonly unit: LineUnit
}

export const LINE_UNITS = ['Å', 'nm', 'µm', 'mm', 'cm', 'm', 'MHz', 'GHz'] as const
export type LineUnit = (typeof LINE_UNITS)[number]

/** (180/π)² square degrees are a steradian. */
export const SQUARE_DEGREES = (180 / Math.PI) ** 2
export const WHOLE_SKY = 4 * Math.PI * SQUARE_DEGREES

const FREQUENCIES: readonly LineUnit[] = ['MHz', 'GHz']

/** In the unit of the line: wavelengths grow by 1 + z, frequencies fall. */
export function observed({ value, unit }: Line, redshift: number): number {
  return FREQUENCIES.includes(unit) ? value / (1 + redshift) : value * (1 + redshift)
}
