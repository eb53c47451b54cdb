/** ψ(x) = eˣ − 1 − x, relative accuracy a few eps: by its series Σ xᵏ/k! from k = 2 where the difference would cancel. */
export function expm2(x: number): number {
  if (Math.abs(x) > 0.5) return Math.expm1(x) - x
  let [term, sum] = [(x * x) / 2, (x * x) / 2]
  for (let k = 3; k < 18; k++) {
    term *= x / k
    sum += term
  }
  return sum
}
