/** The zone up to a turning point, where the expansion stands still for an instant. */
import { type Anchor, logExpansion, type Model } from '../model'
import { NODE_COUNT, NODES } from '../numerics/chebyshev'
import type { Direction } from './turning'
import { conditioningOf, expansionAbout, LARGEST, type Zone } from './zone'

/**
 * What the error δ of a law of steps does next to a turning point, relative to E² and in units of eps. E² = B + Ω f vanishes where
 * B = −Ω f, so that δ moves that place by x = δ Ω f/(dE²/dN), and E² at a distance from it by d (δ (Ω f)′ + x (E²)″) to first order in
 * d: by δ ((Ω f)′ + Ω f (E²)″/(E²)′)/(E²)′ of itself. The distance to today changes by x too, and with it, at most, 1/E by as much.
 */
function shakenBy(model: Model, N: number): number {
  const { law, budget } = model
  if (!law.stray) return 0
  const { first, second } = model.derivatives(N)
  const f = new Float64Array(3)
  law.derivativesInto(f, N)
  const [density, slope] = [Math.abs(budget.dark * f[0]), Math.abs(budget.dark * f[1])]
  const shift = density / Math.abs(first)
  return law.stray(N) * (shift + (slope + shift * Math.abs(second)) / Math.abs(first))
}

/**
 * s = −√(m_t − m): up to a turning point at N, where E² goes to zero linearly and dN/E like d√(m_t − m). With its slope there given,
 * next to a double root, from what E² bends.
 */
export function turningZone(
  model: Model,
  direction: Direction,
  N: number,
  slope: number | undefined,
  from: number,
  to: number,
): Zone {
  const anchor: Anchor = { N, value: 0 }
  const inverseScale = Math.exp(-N)
  const offset = (s: number) => -direction * s * s
  const expansion = (s: number) => {
    const d = offset(s)
    return slope === undefined ? model.expansionFrom(anchor, d) : expansionAbout(model, anchor, slope, d)
  }
  const size = slope === undefined ? null : model.magnitude(N)
  const shaken = shakenBy(model, N)
  const farthest = Math.abs(N)
  return {
    from: -Math.sqrt(farthest - from),
    to: -Math.sqrt(farthest - to),
    width: 0.3,
    distanceAt: (s) => farthest - s * s,
    variableAt: (m) => -Math.sqrt(Math.max(0, farthest - m)),
    expansion,
    // Four roundings in each term.
    conditioning: (s) =>
      size === null
        ? conditioningOf(4 * model.magnitudeFrom(anchor, offset(s)), expansion(s))
        : 2 + (size * offset(s) ** 2) / expansion(s),
    stray: () => shaken,
    sampleInto(out, centre, half) {
      for (let k = 0; k < NODE_COUNT; k++) {
        const s = centre + half * NODES[k]
        const squared = expansion(s)
        const root =
          squared < LARGEST
            ? 1 / Math.sqrt(squared)
            : /* v8 ignore next -- a turning point among densities near the end of the doubles */ Math.exp(
                -0.5 * logExpansion(model, N + offset(s)),
              )
        const rate = 2 * Math.abs(s) * root
        out.time[k] = rate
        out.conformal[k] = rate * inverseScale * Math.exp(-offset(s))
      }
    },
  }
}
