/** Physical constants in SI units. Sources stand beside each value; "exact" by the definition of the SI or by resolution. */

/** Speed of light, m/s (exact). */
export const SPEED_OF_LIGHT = 299792458
/** Newton's constant, m³ kg⁻¹ s⁻² (CODATA 2018, ± 1.5e-15). */
export const GRAVITATION = 6.6743e-11
/** Boltzmann's constant, J/K (exact). */
export const BOLTZMANN = 1.380649e-23
/** Planck's constant over 2π, J s (exact). */
export const REDUCED_PLANCK = 6.62607015e-34 / (2 * Math.PI)
/** One electronvolt, J (exact). */
export const ELECTRONVOLT = 1.602176634e-19
/** One astronomical unit, m (IAU 2012 Resolution B2, exact). */
export const ASTRONOMICAL_UNIT = 149597870700
/** One parsec, m (IAU 2015 Resolution B2, exact). */
export const PARSEC = (ASTRONOMICAL_UNIT * 648000) / Math.PI
/** One Julian year, s (IAU, exact). */
export const JULIAN_YEAR = 31557600
/** One Julian light year, m (exact). */
export const LIGHT_YEAR = SPEED_OF_LIGHT * JULIAN_YEAR
