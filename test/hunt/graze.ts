/**
 * Scenarios that graze: densities for which E² and its slope vanish together at a chosen place, solved in decimals of 45 digits, then
 * rounded to doubles and moved by a little. What becomes of them is decided by the least E² thereabouts, again in decimals.
 */
import { Decimal } from 'decimal.js'
import { readScenario } from '../../lib/scenario/read'
import type { Chance } from './chance'
import { exactly, type OtherLaw, otherLaw } from './laws'

export interface Graze {
  readonly code: string
  readonly offset: number
  /** Where E² is least. */
  readonly N: number
  /** The least E² over the sizes of its terms: below zero there is a turning point. */
  readonly least: number
}

export const GRAZING = ['lambda', 'constant', 'cpl', 'jbp', 'ba', 'log', 'chaplygin']
const OFFSETS = [1e-6, -1e-6, 1e-8, -1e-8, 1e-10, -1e-10, 1e-12, -1e-12, 1e-14, -1e-14, 1e-16, -1e-16, 0]

/** One place and one law, and the scenarios about it; none where no legal densities graze there. */
export function grazesOf(chance: Chance): readonly Graze[] {
  const law = otherLaw(chance.pick(GRAZING), chance)
  const place = new Decimal(chance.between(0.05, 2.5)).times(chance.pick([-1, 1]))
  const radiation = chance.pick([0, 0, Number(chance.size(1e-6, 1).toPrecision(2))])
  const densities = tangent(law, place, radiation)
  if (!densities) return []
  const { matter, dark } = densities
  if (!(matter >= 0 && matter <= 10_000 && Math.abs(dark) <= 99)) return []
  return OFFSETS.flatMap((offset) => {
    const one = graze(law, place, radiation, matter, dark * (1 + offset), offset)
    return one ? [one] : []
  })
}

/** Ω_m and Ω_DE for which E² and dE²/dN vanish at N, with the curvature that closes the budget: two linear equations. */
function tangent(law: OtherLaw, N: Decimal, radiation: number): { matter: number; dark: number } | null {
  if (!law.exact) return null
  const [x, { log, n }] = [N.neg().exp(), law.exact(N)]
  const [x2, f] = [x.times(x), log.exp()]
  const [x3, x4] = [x2.times(x), x2.times(x2)]
  // r (x⁴ − x²) + m (x³ − x²) + d (f − x²) + x² = 0, and the same for its slope.
  const [m1, d1, c1] = [x3.minus(x2), f.minus(x2), x2.plus(x4.minus(x2).times(exactly(radiation)))]
  const [m2, d2] = [x2.times(2).minus(x3.times(3)), x2.times(2).minus(n.times(f))]
  const c2 = x2.times(-2).plus(x2.times(2).minus(x4.times(4)).times(exactly(radiation)))
  const determinant = m1.times(d2).minus(m2.times(d1))
  if (determinant.isZero() || !determinant.isFinite()) return null
  const matter = d1.times(c2).minus(d2.times(c1)).div(determinant).toNumber()
  const dark = m2.times(c1).minus(m1.times(c2)).div(determinant).toNumber()
  return Number.isFinite(matter + dark) ? { matter, dark } : null
}

function graze(
  law: OtherLaw,
  place: Decimal,
  radiation: number,
  matter: number,
  dark: number,
  offset: number,
): Graze | null {
  const light = radiation === 0 ? 'cmb:0' : `radiation:${radiation}`
  const code = `matter:${matter},dark:${dark},${light},${law.code}`
  if (!readScenario(code, 0).ok) return null
  const energy = energyOf(law, radiation, matter, dark)
  let N = place
  // Newton's method for the minimum of E²; a maximum or an inflexion is no graze.
  for (let step = 0; step < 60; step++) {
    const { first, second } = energy(N)
    if (!second.isPositive() || second.isZero()) return null
    const change = first.div(second)
    if (change.abs().greaterThan(0.1)) return null
    N = N.minus(change)
    if (change.abs().lessThan(1e-30)) break
  }
  if (N.minus(place).abs().greaterThan(0.1)) return null
  const { value, size } = energy(N)
  return { code, offset, N: N.toNumber(), least: value.div(size).toNumber() }
}

interface Energies {
  readonly value: Decimal
  readonly size: Decimal
  readonly first: Decimal
  readonly second: Decimal
}

/** E², the sizes of its terms, and its derivatives by N, for doubles as they are. */
function energyOf(law: OtherLaw, radiation: number, matter: number, dark: number): (N: Decimal) => Energies {
  const [r, m, d] = [radiation, matter, dark].map(exactly)
  const curvature = new Decimal(1).minus(r).minus(m).minus(d)
  const H = new Decimal('1e-15')
  const slopeOf = (N: Decimal) => {
    const { log, n } = law.exact?.(N) ?? { log: new Decimal(0), n: new Decimal(0) }
    return { density: log.exp().times(d), n }
  }
  return (N) => {
    const x = N.neg().exp()
    const x2 = x.times(x)
    const terms = [x2.times(x2).times(r), x2.times(x).times(m), x2.times(curvature)]
    const { density, n } = slopeOf(N)
    // n′ by a central difference: 1e-30 of its own.
    const nSlope = slopeOf(N.plus(H))
      .n.minus(slopeOf(N.minus(H)).n)
      .div(H.times(2))
    const all = [...terms, density]
    const exponents = [new Decimal(4), new Decimal(3), new Decimal(2), n]
    const sum = (list: readonly Decimal[]) => list.reduce((total, one) => total.plus(one), new Decimal(0))
    return {
      value: sum(all),
      size: sum(all.map((one) => one.abs())),
      first: sum(all.map((one, i) => one.times(exponents[i]).neg())),
      second: sum(all.map((one, i) => one.times(exponents[i].pow(2)))).minus(density.times(nSlope)),
    }
  }
}
