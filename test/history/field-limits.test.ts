/** The scalar field in its limits, and what cannot be. */
import { describe, expect, it } from 'vitest'
import { eventAtScale, eventAtTime, isEvent, sinceNow, untilEnd } from '../../lib/history/event'
import { equationOfState, hubbleRate } from '../../lib/measures/rates'
import { readScenario } from '../../lib/scenario/read'
import { type Solution, solve } from '../../lib/solve'

function solved(code: string): Solution {
  const reading = readScenario(code, 0)
  if (!reading.ok) throw new Error(JSON.stringify(reading.problems))
  return solve(reading.value)
}

function refusal(code: string): string {
  try {
    solved(code)
  } catch (error) {
    return error instanceof Error ? `${error.name}: ${error.message}` : ''
  }
  throw new Error('it is solved')
}

const wAt = ({ history }: Solution, scale: number): number => {
  const event = eventAtScale(history, Math.log(scale), 'expanding')
  const w = isEvent(event) ? equationOfState(event) : Number.NaN
  return typeof w === 'number' ? w : Number.NaN
}

describe('a flat potential is a cosmological constant', () => {
  const lambda = solved('matter:0.3')
  it.each(['exponential', 'linear'])('%s', (v) => {
    const flat = solved(`matter:0.3,eos:field,v:${v},slope:0`)
    expect(flat.end.kind).toBe('exponential')
    for (const key of ['age', 'eventHorizon', 'particleHorizon', 'asymptoticHubble'] as const) {
      const [one, other] = [flat.measures[key].value ?? 0, lambda.measures[key].value ?? 0]
      expect(Math.abs(one / other - 1)).toBeLessThan(1e-10)
    }
  })
  it.each(['v:linear,slope:1e-9', 'v:exponential,slope:1e-9', 'v:linear,slope:2e-12'])('nearly so: %s', (law) => {
    const [one, other] = [solved(`matter:0.3,eos:field,${law}`).measures.age.value ?? 0, lambda.measures.age.value ?? 0]
    // w + 1 is of the order of slope², far below the rounding.
    expect(Math.abs(one / other - 1)).toBeLessThan(1e-10)
  })
})

describe('thawing', () => {
  /**
   * For a nearly flat potential 1 + w = (slope²/3) F(x)², F = 1/√x − (1/x − 1) artanh √x, x = Ω_DE: Scherrer & Sen 2008,
   * Phys. Rev. D 77, 083515, eq. 27, for matter and a field from rest; its corrections are of relative order slope².
   */
  it.each([0.1, 0.03])('slope %f', (slope) => {
    const x = 0.7
    const F = 1 / Math.sqrt(x) - (1 / x - 1) * Math.atanh(Math.sqrt(x))
    const w = wAt(solved(`matter:0.3,cmb:0,eos:field,slope:${slope}`), 1)
    expect(Math.abs((1 + w) / ((slope * slope * F * F) / 3) - 1)).toBeLessThan(slope * slope)
  })
})

describe('exponential potentials end on their attractors (Copeland, Liddle & Wands 1998, Phys. Rev. D 57, 4686)', () => {
  it.each([
    [1, 'accelerating', 1 / 3 - 1],
    [1.6, 'decelerating', 1.6 ** 2 / 3 - 1],
    [1.8, 'decelerating', 0],
  ] as const)('slope %f', (slope, kind, w) => {
    const solution = solved(`matter:0.5,masses:0,eos:field,slope:${slope}`)
    expect(solution.end.kind).toBe(kind)
    expect(Math.abs(wAt(solution, 1e25) - w)).toBeLessThan(1e-6)
  })

  it('rules by the share 3/slope² where matter sets the pace', () => {
    const { history } = solved('matter:0.5,masses:0,eos:field,slope:1.8')
    const event = eventAtScale(history, Math.log(1e25), 'expanding')
    if (!isEvent(event)) throw new Error(event.because)
    const dark = event.place.arm.model.components.find((one) => one.key === 'dark')?.density(event.place.N) ?? 0
    expect(Math.abs(dark / hubbleRate(event) ** 2 / (3 / 1.8 ** 2) - 1)).toBeLessThan(1e-6)
  })

  it('coasts in open space where slope² is above 2', () => {
    expect(solved('matter:0.3,curvature:0.1,eos:field,slope:1.5').end.kind).toBe('coasting')
  })
})

describe('other endings', () => {
  it('inverse powers accelerate with H falling to zero', () => {
    const solution = solved('matter:0.3,eos:field,v:inverse,slope:1,start:1')
    expect(solution.end.kind).toBe('accelerating')
    // Slow roll: n = slope²/φ² and φ² grows by 2 slope per unit of ln a, so n → slope/(2 ln a) from above its next order.
    const n = 3 * (1 + wAt(solution, Math.exp(300)))
    expect(Math.abs(n * 600 - 1)).toBeLessThan(0.02)
    expect(Math.abs(3 * (1 + wAt(solution, Math.exp(600))) * 1200 - 1)).toBeLessThan(0.01)
  })

  it('a cosine swings about its minimum like dust', () => {
    const solution = solved('matter:0.3,eos:field,v:cosine')
    expect(solution.end.kind).toBe('decelerating')
    expect(solution.measures.eventHorizon.value).toBeNull()
  })

  it('holding w of today is a constant w from today on', () => {
    const followed = solved('matter:0.3,eos:field,slope:1.2')
    const held = solved('matter:0.3,eos:field,slope:1.2,beyond:hold')
    const constant = solved(`matter:0.3,eos:constant,w:${wAt(followed, 1)}`)
    expect(held.measures.age.value).toBe(followed.measures.age.value)
    const [one, other] = [held.measures.eventHorizon.value ?? 0, constant.measures.eventHorizon.value ?? 0]
    expect(Math.abs(one / other - 1)).toBeLessThan(1e-12)
    expect(wAt(held, 5)).toBeCloseTo(wAt(followed, 1), 12)
  })
})

describe('a collapse', () => {
  const { history, end } = solved('matter:0.3,cmb:0,eos:field,v:linear,slope:1')
  const [turn, last] = [history.end.turnaround?.time ?? 0, history.end.time ?? 0]

  it('is not the mirror of the expansion', () => {
    expect(end.kind).toBe('crunch')
    expect(last - turn).toBeLessThan(0.7 * (turn + history.past.time.total))
  })

  it.each([0.02, 0.3, 0.6, 0.9, 0.9999])('is found at %f of the way from turnaround to crunch', (part) => {
    const time = turn + part * (last - turn)
    const event = eventAtTime(history, time)
    if (!isEvent(event)) throw new Error(event.because)
    expect(event.sign).toBe(-1)
    expect(Math.abs(sinceNow(history, event, 'time') / time - 1)).toBeLessThan(1e-12)
    const again = eventAtScale(history, event.place.N, 'contracting')
    if (!isEvent(again)) throw new Error(again.because)
    expect(Math.abs(sinceNow(history, again, 'time') - time)).toBeLessThan(1e-11 * time)
    expect(untilEnd(history, event, 'time') / (last - time)).toBeCloseTo(1, 9)
  })

  it('ends stiff: H = 1/(3 × time left)', () => {
    const event = eventAtTime(history, last * (1 - 1e-9))
    if (!isEvent(event)) throw new Error(event.because)
    // The digits left of the time left: eps × 1e9.
    expect(Math.abs(-hubbleRate(event) * 3 * untilEnd(history, event, 'time') - 1)).toBeLessThan(1e-5)
  })

  it('H is the slope of ln a across the turnaround', () => {
    const at = (time: number) => {
      const event = eventAtTime(history, time)
      if (!isEvent(event)) throw new Error(event.because)
      return event
    }
    for (const time of [turn - 0.1, turn + 0.1, turn + 0.4]) {
      const h = 1e-4
      const slope = (at(time + h).place.N - at(time - h).place.N) / (2 * h)
      expect(Math.abs(slope - hubbleRate(at(time)))).toBeLessThan(1e-6)
    }
  })
})

describe('what cannot be', () => {
  /** Both numbers: a trial of this design by another program, for the default scenario. */
  it('says the largest density of an exponential that is too steep', () => {
    expect(refusal('eos:field,slope:2.5')).toMatch(/^Unsolvable: This field reaches Ω_DE = 0\.40\d? today at most/)
  })

  it('says the highest of several peaks for a narrow cosine', () => {
    expect(refusal('eos:field,v:cosine,width:0.5,start:0.5')).toContain('Ω_DE = 0.619 today at most')
  })

  it('says it where the field falls below zero before today', () => {
    expect(refusal('matter:0.3,eos:field,v:linear,slope:5')).toMatch(/reaches Ω_DE = 0\.0\d+ today at most/)
  })

  it('needs a positive density', () => {
    expect(refusal('matter:0.3,dark:-0.2,eos:field')).toContain('Ω_DE is -0.2')
  })

  it('says so where less would turn round before today, and more is needed', () => {
    expect(refusal('matter:0.07,cmb:0,curvature:-5.61,eos:field,slope:0.36')).toMatch(
      /turn round before today|turns round/,
    )
  })
})

describe('the constraint holds at H = 0, where the integration does not use it', () => {
  it.each([
    'eos:field,v:linear',
    'masses:0.3_0.3_0.3,eos:field,v:linear,slope:0.7',
    'matter:0.4,curvature:-0.2,eos:field,v:linear',
  ])('%s', (code) => {
    const { history } = solved(`${code}`)
    const { end, model } = history.future
    if (end.kind !== 'root') throw new Error('it does not turn round')
    const [sum, sizes] = model.components
      .map((one) => one.density(end.N))
      .reduce(([total, size], x) => [total + x, size + Math.abs(x)], [0, 0])
    expect(Math.abs(sum)).toBeLessThan(1e-9 * sizes)
  })
})
