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
  'Stated as ± 0.3: the fit strays 0.03 from the columns of Planck 2018 that it is calibrated on, ten times that is allowed for elsewhere.'
export const DRAG_EPOCH = 'Stated as ± 0.05: so far the fit strays from the columns of Planck 2018.'
export const FROM_DRAG_FIT = 'The stated error follows from ± 0.05 in z_d: about 3 × 10⁻⁵ of itself.'
export const FROM_SCATTERING_FIT = 'The stated error follows from ± 0.3 in z_*: about 2 × 10⁻⁴ of itself.'
export const ORDER_OF_MAGNITUDE =
  'An order of magnitude: a circular orbit loses its bound state already at (27/256)(2π/P)², about three times as long before a rip.'
