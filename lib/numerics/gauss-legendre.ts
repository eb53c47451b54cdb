/** Gauss–Legendre quadrature with eight points (Abramowitz & Stegun 1964, table 25.4). */

const HALF: readonly (readonly [number, number])[] = [
  [0.1834346424956498, 0.362683783378362],
  [0.525532409916329, 0.31370664587788727],
  [0.7966664774136267, 0.22238103445337448],
  [0.9602898564975363, 0.10122853629037626],
]

/** ∫ f over [from, to]; exact for polynomials of degree 15, so meant for intervals on which f is nearly one. */
export function gaussLegendre(f: (x: number) => number, from: number, to: number): number {
  const [centre, half] = [(from + to) / 2, (to - from) / 2]
  let sum = 0
  for (const [node, weight] of HALF) sum += weight * (f(centre - half * node) + f(centre + half * node))
  return half * sum
}
