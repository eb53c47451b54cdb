/** Second-order remainders of exponentials whose exponent is not linear. */
import { expm2 } from './exponential'
import { gaussLegendre } from './gauss-legendre'

/**
 * (g(N + d) − g(N) − d g′(N))/g(N) for g = e^(−∫n dN), without cancellation for small d, from L = ln g(N + d) − ln g(N) and
 * n′: it is expm2(L) + L + n d, and L + n d = −∫₀^d (d − t) n′(N + t) dt.
 */
export const relativeBend = (logChange: number, d: number, exponentSlope: (t: number) => number): number =>
  expm2(logChange) - gaussLegendre((t) => (d - t) * exponentSlope(t), 0, d)
