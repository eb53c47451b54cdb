/** Lengths and what is made of them in units with h⁻¹, h = H₀/(100 km/s/Mpc). */

/** Powers of h in the units that carry one. */
const POWERS: Readonly<Record<string, number>> = { Mpc: -1, kpc: -1, Gly: -1, 'Gpc³': -3, 'M☉/pc²': 1 }
const WRITTEN: Readonly<Record<number, string>> = { [-1]: 'h⁻¹ ', [-3]: 'h⁻³ ', 1: 'h ' }

export function unitWithHubble(unit: string): string {
  return `${WRITTEN[POWERS[unit] ?? 0] ?? ''}${unit}`
}

/** A value in `unit` as the number before the unit with h: 100 Mpc are 70 h⁻¹ Mpc where h = 0.7. */
export function valueWithHubble(value: number, unit: string, h0: number): number {
  return value * (h0 / 100) ** -(POWERS[unit] ?? 0)
}

/** The way back: a length typed in h⁻¹ Mpc, in Mpc. */
export function valueWithoutHubble(value: number, unit: string, h0: number): number {
  return value * (h0 / 100) ** (POWERS[unit] ?? 0)
}
