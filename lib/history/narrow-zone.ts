/** The zone past a minimum of E² hardly above zero. */
import type { Model } from '../model'
import { NODE_COUNT, NODES } from '../numerics/chebyshev'
import type { Narrow } from './search'
import type { Direction } from './turning'
import { expansionAbout, type Zone } from './zone'

/**
 * d = √(2A/B) sinh s: past a minimum of E² that is A = `value` there, hardly above zero, so that E² = A + slope d + ½B d² + …
 * and dN/E ∝ ds.
 */
export function narrowZone(model: Model, direction: Direction, narrow: Narrow, from: number, to: number): Zone {
  const centre = Math.abs(narrow.N)
  const inverseScale = Math.exp(-narrow.N)
  const width = Math.sqrt((2 * narrow.value) / model.derivatives(narrow.N).second)
  const variableAt = (m: number) => Math.asinh((m - centre) / width)
  const offset = (s: number) => direction * width * Math.sinh(s)
  const squared = (d: number) => expansionAbout(model, narrow, narrow.slope, d)
  return {
    from: variableAt(from),
    to: variableAt(to),
    width: 0.5,
    distanceAt: (s) => centre + width * Math.sinh(s),
    variableAt,
    expansion: (s) => squared(offset(s)),
    conditioning: (s) => 2 + (model.magnitude(narrow.N) * offset(s) ** 2) / squared(offset(s)),
    sampleInto(out, middle, half) {
      for (let k = 0; k < NODE_COUNT; k++) {
        const s = middle + half * NODES[k]
        const d = offset(s)
        const rate = (width * Math.cosh(s)) / Math.sqrt(squared(d))
        out.time[k] = rate
        out.conformal[k] = rate * inverseScale * Math.exp(-d)
      }
    },
  }
}
