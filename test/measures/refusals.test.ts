/** Where a measure has no value it says why, and what is told at the borders of the doubles. */
import { describe, expect, it } from 'vitest'
import { eventAtScale, eventAtTime } from '../../lib/history/event'
import { growthAt, growthRateAt } from '../../lib/measures/growth'
import type { Bounded } from '../../lib/measures/outcome'
import { equationOfState } from '../../lib/measures/rates'
import { comovingDistance } from '../../lib/measures/sight'
import { known, universe } from '../world/universe'

const at = (code: string, N: number, branch: 'expanding' | 'contracting' = 'expanding') => {
  const { history } = universe(code)
  return { history, event: known(eventAtScale(history, N, branch)) }
}
const because = (part: string) => ({ because: expect.stringContaining(part) })

describe('lines of sight', () => {
  it('lead into the past of the expansion only', () => {
    const later = at('matter:0.3,cmb:0', 1)
    expect(comovingDistance(later.history, later.event)).toMatchObject(because('future'))
    const home = at('matter:2,dark:0,cmb:0', -1, 'contracting')
    expect(comovingDistance(home.history, home.event)).toMatchObject(because('expansion that holds today'))
  })
})

it('w ends where dark energy is used up', () => {
  // ρ = 0 where 1 + 3A(1 − α) ln a = 0, which is at ln a = 1/(0.3 · 0.25) = 13.33.
  const code = 'matter:0.3,cmb:0,eos:barotropic,excess:-0.1,alpha:0.75'
  expect(equationOfState(at(code, 13.2).event)).toBeTypeOf('number')
  expect(equationOfState(at(code, 13.4).event)).toMatchObject(because('used up'))
})

describe('growth', () => {
  it('has come to rest long before a rip, also where E² leaves the doubles', () => {
    // dD/dt ∝ a⁻²: with w = −3 time runs out like a⁻³, and D with it.
    const [late, last] = [60, 250].map((N) => {
      const { history, event } = at('matter:0.3,cmb:0,eos:constant,w:-3', N)
      return (growthAt(history, event) as Bounded).value
    })
    expect(Math.abs(last / late - 1)).toBeLessThan(1e-12)
  })
  it('goes on for ever where the universe comes to rest', () => {
    // Matter 6.75 and Λ = 1 come to rest at a = 1.5 (Λ = ½ρ_m there, Einstein 1917).
    const { history } = universe('matter:6.75,cmb:0,dark:1')
    expect(history.future.end.kind).toBe('double')
    const event = known(eventAtTime(history, 50))
    expect(growthAt(history, event)).toHaveProperty('because')
    expect(growthRateAt(history, event)).toHaveProperty('because')
  })
})
