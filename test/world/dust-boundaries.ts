/** Where the fate flips in universes of matter, Λ and curvature: Carroll, Press & Turner 1992, ARA&A 30, 499, eqs. 11 and 12. */

/** At and above this Ω_Λ there was no big bang. cosh where its argument is imaginary: Ω_m below 1/2. */
export function noBigBang(matter: number): number {
  const x = (1 - matter) / matter
  const root = matter < 0.5 ? Math.cosh(Math.acosh(x) / 3) : Math.cos(Math.acos(x) / 3)
  return 4 * matter * root ** 3
}

/** At and below this Ω_Λ the universe collapses again. */
export function recollapse(matter: number): number {
  if (matter <= 1) return 0
  return 4 * matter * Math.cos(Math.acos((1 - matter) / matter) / 3 + (4 * Math.PI) / 3) ** 3
}
