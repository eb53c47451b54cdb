import { describe, expect, it } from 'vitest'
import { longView } from '../../lib/figures/long-view'
import { bounce, deSitter, einsteinDeSitter, flatLambda, milne, phantom, sinking } from './universes'

const SIX = [flatLambda(), sinking(), phantom(), bounce(), milne(), einsteinDeSitter()]

describe('what the cursor reads', () => {
  const { readings, x } = longView(SIX)

  it('is at most 300 times in order, with now, both edges and every end within the window', () => {
    const { places: times } = readings
    expect(times.length).toBeLessThanOrEqual(300)
    expect(times).toEqual([...new Set(times)].sort((one, other) => one - other))
    expect(times).toContain(0)
    expect(times[0]).toBeCloseTo(x.from, 4)
    expect(times.at(-1)).toBeCloseTo(x.to, 4)
    const crunch = sinking().solution.end
    for (const time of [crunch.time, crunch.turnaround?.time]) expect(times).toContain(Number(time?.toPrecision(7)))
  })

  it('has nothing else within half a step of now', () => {
    const { places } = readings
    const now = places.indexOf(0)
    const step = (x.to - x.from) / 279
    for (const beside of [places[now - 1], places[now + 1]]) expect(Math.abs(beside ?? 0)).toBeGreaterThan(0.499 * step)
  })

  it.each(SIX.map(({ solution, scales }, slot) => [solution.label, slot, scales] as const))(
    '%s is its closed form',
    (_, slot, scales) => {
      const exact = scales(readings.places)
      readings.values[slot]?.forEach((scale, i) => {
        const value = exact[i] ?? null
        // Five digits are kept: half a unit of the last is 5e-5 of the smallest mantissa.
        if (value === null) expect(scale).toBeNull()
        else expect(Math.abs((scale ?? Number.NaN) - value)).toBeLessThanOrEqual(5.01e-5 * Math.abs(value))
      })
    },
  )

  it('reads 1 now', () => {
    for (const view of [longView(SIX), longView([deSitter()])]) {
      const now = view.readings.places.indexOf(0)
      for (const scales of view.readings.values) expect(scales[now]).toBe(1)
    }
  })
})
