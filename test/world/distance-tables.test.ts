/**
 * Distances, times and volume elements of Hogg 1999, arXiv:astro-ph/9905116: the values of his figures, recomputed outside this project to
 * six decimals (HOGG of published.json).
 */
import { describe, test } from 'vitest'
import { comovingVolume } from '../../lib/measures/distances'
import { expectPrinted, expectRelative, PUBLISHED } from './published'
import { comoving, lookback, rate, transverse, universe } from './universe'

describe.each(Object.entries(PUBLISHED.HOGG.recomputed))('Ω_m and Ω_Λ = %s', (densities, table) => {
  const [matter, lambda] = densities.split(' ').map(Number)
  const solution = universe(`matter:${matter},cmb:0,dark:${lambda}`)

  test.each(Object.entries(table))('z = %s', (text, row) => {
    const z = Number(text)
    const across = transverse(solution, z)
    expectPrinted(across, row.transverse)
    expectPrinted(across / (1 + z), row.angular)
    expectPrinted(across * (1 + z), row.luminosity)
    expectPrinted(5 * Math.log10(across * (1 + z)), row.modulus)
    expectPrinted(lookback(solution, z), row.lookback)
    expectPrinted(solution.history.past.time.total, row.age)
    expectPrinted(across ** 2 / rate(solution, z), row.volumeElement)
  })
  test.each(Object.keys(table).map(Number))('the volume out to z = %s grows by the element', (z) => {
    const volume = (x: number) => comovingVolume(comoving(solution, x), solution.budget.curvature)
    // Central difference of V(z), and the same at half the step: Richardson's combination leaves h⁴ and rounding eps V/h.
    const h = 2e-3
    const slope = (step: number) => (volume(z + step) - volume(z - step)) / (2 * step)
    const richardson = (4 * slope(h / 2) - slope(h)) / 3
    expectRelative(richardson, (4 * Math.PI * transverse(solution, z) ** 2) / rate(solution, z), 1e-9)
  })
})
