/** How good the numbers are. What each statement rests on stands in the tests: closed forms, and a reference set in many digits. */

/** Algebra on densities of today. */
export const ROUNDING = 'To rounding: a few 10⁻¹⁶ of the largest term, or 10⁻⁹ where a scalar field enters.'
/** Times and distances; the field's equation is integrated in steps of 10⁻¹¹. */
export const INTEGRAL =
  'Within 10⁻¹² of itself, or 10⁻¹⁰ with a scalar field, and what the rounding of the parameters moves it by.'
/** Where an integral or a sum of densities has a given value. */
export const ROOT =
  'Within 10⁻¹² of 1 + z, or 10⁻¹⁰ with a scalar field, and more where the two sides run almost parallel.'
export const GROWTH = 'Within 10⁻¹⁰ of itself.'
/** Of a difference of two distances. */
export const DIFFERENCE = 'Within 10⁻¹² of the larger of the two that it lies between.'
export const LAST_SCATTERING =
  'Stated as ± 0.1 at the parameters of Planck 2018, where the fit strays 0.03 from the columns that it is calibrated on, and as more away from them, where it departs from an integration of recombination.'
export const DRAG_EPOCH =
  'Stated as ± 0.05 at the parameters of Planck 2018, so far as the fit strays from the columns there, and as more away from them, where it departs from an integration of recombination.'
export const FROM_DRAG_FIT =
  'The stated error follows from that of z_d: about 3 × 10⁻⁵ of itself at the parameters of Planck 2018.'
export const FROM_SCATTERING_FIT =
  'The stated error follows from that of z_*: about 10⁻⁴ of itself at the parameters of Planck 2018.'
export const ORDER_OF_MAGNITUDE =
  'An order of magnitude: a circular orbit loses its bound state already at (27/256)(2π/P)², about three times as long before a rip.'
