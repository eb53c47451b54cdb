/** Geometry of space: transverse distance and volume, flat, closed and open, and their limit towards flatness. */
import { describe, expect, test } from 'vitest'
import { antipode, comovingVolume, curvatureRadius, transverseDistance } from '../../lib/measures/distances'
import { expectRelative } from '../world/published'
import { quadrature } from '../world/second-route'

const EPS = Number.EPSILON
const CURVATURES = [
  -100, -3, -0.7, -0.01, -1e-4, -1e-8, -1e-12, -1e-16, -1e-200, 0, 1e-200, 1e-16, 1e-12, 1e-8, 1e-4, 0.01, 1, 50,
]
const DISTANCES = [1e-9, 1e-3, 0.1, 0.5, 1, 3]

test('radius and antipode', () => {
  expect(curvatureRadius(0)).toBe(Number.POSITIVE_INFINITY)
  expect(curvatureRadius(-0.25)).toBe(2)
  expect(curvatureRadius(0.25)).toBe(2)
  expect(antipode(0)).toBe(Number.POSITIVE_INFINITY)
  expect(antipode(1)).toBe(Number.POSITIVE_INFINITY)
  expect(antipode(-1)).toBe(Math.PI)
})

/** Σ of the common series of sin, sinh (odd) in κχ²: 1 + Ω_k χ²/6 + … */
function seriesOf(square: number, from: number): number {
  let [term, sum] = [1, 1]
  for (let k = from; Math.abs(term) > 1e-20; k += 2) {
    term *= square / (k * (k + 1))
    sum += term
  }
  return sum
}

describe.each(CURVATURES)('Ω_k = %s', (curvature) => {
  const within = DISTANCES.filter((chi) => chi <= antipode(curvature))

  test.each(within)('transverse distance of χ = %s is χ (1 + Ω_k χ²/6 + …)', (chi) => {
    const square = curvature * chi * chi
    // The series alternates in closed space and loses e^|x| there; χ/R carries two roundings, sin near π as often as χ/R over tan.
    const x = Math.sqrt(Math.abs(square))
    const condition = curvature < 0 ? 1 + Math.abs(x / Math.tan(x)) + Math.exp(x) / Math.abs(Math.sin(x)) : 1 + x
    expectRelative(transverseDistance(chi, curvature), chi * seriesOf(square, 2), 4 * EPS * condition)
  })
  test.each(within)('the volume out to χ = %s is ∫ 4π D² dχ', (chi) => {
    const shells = quadrature((x) => 4 * Math.PI * transverseDistance(x, curvature) ** 2, 0, chi)
    // The closed form subtracts ½ sin 2x from x where x > 0.7: there a factor of four.
    expectRelative(comovingVolume(chi, curvature), shells, 1e-13)
  })
})

test('volume and distance go over into flat space to eps as curvature goes to zero', () => {
  for (const chi of DISTANCES) {
    for (const tiny of [1e-300, 1e-100, 1e-20, 1e-17]) {
      for (const curvature of [tiny, -tiny]) {
        expectRelative(transverseDistance(chi, curvature), chi, 2 * EPS)
        expectRelative(comovingVolume(chi, curvature), (4 / 3) * Math.PI * chi ** 3, 4 * EPS)
      }
    }
    // First order, exactly: 1 ± Ω_k χ²/6 and 1 ± Ω_k χ²/5.
    expectRelative(
      transverseDistance(chi, 1e-9) / chi - 1,
      (1e-9 * chi * chi) / 6,
      1e-6 + (4 * EPS * 6) / (1e-9 * chi * chi),
    )
  }
})

test('the two forms of the volume meet where one hands over to the other', () => {
  for (const curvature of [-1, 1]) {
    const [below, above] = [comovingVolume(0.7 - 1e-12, curvature), comovingVolume(0.7 + 1e-12, curvature)]
    // 2e-12 in χ is 4.3e-12 in χ³, give or take the curvature.
    expect(above / below - 1).toBeGreaterThan(7e-12)
    expect(above / below - 1).toBeLessThan(10e-12)
  }
})

describe('past the antipode', () => {
  test('distance comes back, volume stays the whole sphere 2π²R³', () => {
    const radius = 2
    for (const beyond of [0.1, 1, 5]) {
      const chi = Math.PI * radius + beyond
      expect(transverseDistance(chi, -0.25)).toBeCloseTo(Math.abs(radius * Math.sin(beyond / radius)), 13)
      expectRelative(comovingVolume(chi, -0.25), 2 * Math.PI ** 2 * radius ** 3, 4 * EPS)
    }
    expect(transverseDistance(Math.PI * radius, -0.25)).toBeLessThan(1e-15)
    expectRelative(comovingVolume(Math.PI * radius, -0.25), 2 * Math.PI ** 2 * radius ** 3, 4 * EPS)
    expectRelative(comovingVolume((Math.PI * radius) / 2, -0.25), Math.PI ** 2 * radius ** 3, 4 * EPS)
  })
})

test('no distance, no volume', () => {
  for (const curvature of CURVATURES) {
    expect(transverseDistance(0, curvature)).toBe(0)
    expect(comovingVolume(0, curvature)).toBe(0)
  }
})
