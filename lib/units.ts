/**
 * From the engine's units (time in 1/H₀, length in c/H₀, rate in H₀) to those of the page.
 * Units enter the numbers here and in the quantities' list, nowhere else.
 */
import { JULIAN_YEAR, PARSEC, SPEED_OF_LIGHT } from './constants'

const MEGAPARSEC = 1e6 * PARSEC

/** H₀ in s⁻¹ from km s⁻¹ Mpc⁻¹. */
export const perSecond = (h0: number): number => (h0 * 1e3) / MEGAPARSEC
/** 1/H₀ in Gyr (10⁹ Julian years). */
export const hubbleTimeGyr = (h0: number): number => 1 / perSecond(h0) / (1e9 * JULIAN_YEAR)
/** c/H₀ in Mpc. */
export const hubbleLengthMpc = (h0: number): number => SPEED_OF_LIGHT / 1e3 / h0
/** c/H₀ in Gly (10⁹ Julian light years): the same number as 1/H₀ in Gyr. */
export const hubbleLengthGly = hubbleTimeGyr
