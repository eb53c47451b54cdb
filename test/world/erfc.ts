/** 1 − erf x by Laplace's continued fraction (Abramowitz & Stegun 1964, 7.1.14), to 1e-14 for x ≥ 2. */
export function erfc(x: number): number {
  let rest = 0
  for (let k = 200; k > 0; k--) rest = k / 2 / (x + rest)
  return Math.exp(-x * x) / (Math.sqrt(Math.PI) * (x + rest))
}
