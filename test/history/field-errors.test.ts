/**
 * Errors stated for a scalar field against what steps of a hundredth of the tolerance come to, with the height that these lead to.
 * The codes at the end are those that strayed farthest of some thousands: closed universes that nearly rest, fields that roll off a top.
 */
import '../chance'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { familyOf } from '../../lib/dark-energy/index'
import { armOf } from '../../lib/history/arm'
import { backgroundOf } from '../../lib/history/field/background'
import { nowOf } from '../../lib/history/field/course'
import { BUDGET, heightBeside, heightToday } from '../../lib/history/field/height'
import { fieldLaw } from '../../lib/history/field/law'
import { energyOf } from '../../lib/history/field/motion'
import { FINAL, FROZEN, fieldOf, passage } from '../../lib/history/field/shot'
import { trailByScale } from '../../lib/history/field/trail'
import { isUnsolvable } from '../../lib/history/field/unsolvable'
import { modelOf } from '../../lib/model'
import { budgetOf } from '../../lib/scenario/budget'
import { readScenario } from '../../lib/scenario/read'

const TIGHT = FINAL / 100

interface Stray {
  readonly name: string
  readonly off: number
  readonly stated: number
}

/** ρ along the way, and the age or the time since the bounce. */
function strays(code: string): Stray[] {
  const reading = readScenario(code, 0)
  if (!reading.ok) throw new Error(code)
  const [budget, potential] = [budgetOf(reading.value), familyOf('field').potential?.(reading.value.law)]
  if (!potential) throw new Error(code)
  const search = { potential, background: backgroundOf(budget), target: budget.dark, purse: { left: 100 * BUDGET } }
  const now = nowOf(budget, potential, search.purse)
  const field = fieldOf(search, heightBeside(search, heightToday(search), TIGHT))
  const { steps, state } = passage(field, search.purse, TIGHT)
  const law = fieldLaw(trailByScale(field, steps, 0), {
    today: energyOf(field, state[0], state[1]),
    outside: { before: 0, after: 0 },
    breaks: [FROZEN],
    least: () => 0,
    error: () => 0,
  })
  const densities = [-3, -2, -1, -0.5, -0.2, -0.05].map((N) => ({
    name: `${code} ρ at ${N}`,
    off: Math.abs(now.law.density(N) / law.density(N) - 1),
    stated: Number.EPSILON * (now.law.stray?.(N) ?? 0),
  }))
  const [past, tight] = [armOf(modelOf(budget, now.law), -1), armOf(modelOf(budget, law), -1)]
  if (!Number.isFinite(past.time.total)) return densities
  const times = (['time', 'conformal'] as const).map((clock) => ({
    name: `${code} ${clock}`,
    off: Math.abs(past[clock].total - tight[clock].total),
    stated: past[clock].error,
  }))
  return Number.isFinite(past.conformal.total) ? [...densities, ...times] : densities
}

const worse = (list: readonly Stray[]): string[] =>
  list.filter(({ off, stated }) => !(off <= stated)).map(({ name, off, stated }) => `${name}: ${off} above ${stated}`)

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true }).map((x) => Number(x.toPrecision(4)))
const potential = fc.oneof(
  fc.tuple(fc.constantFrom('exponential', 'linear'), between(0.001, 2)).map(([v, s]) => `v:${v},slope:${s}`),
  fc.tuple(between(0.01, 2), between(0.1, 5)).map(([s, start]) => `v:inverse,slope:${s},start:${start}`),
  fc.tuple(between(0.2, 5), between(0.1, 5)).map(([w, start]) => `v:cosine,width:${w},start:${start}`),
)
const code = fc
  .tuple(
    between(40, 90),
    fc.oneof(fc.constant(0), between(0.001, 1)),
    between(-1.5, 0.5),
    fc.constantFrom('cmb:0', 'masses:0'),
    potential,
  )
  .map(([h0, matter, k, light, v]) => `h0:${h0},matter:${matter},curvature:${k},${light},eos:field,${v}`)

it('no true error exceeds the stated one', { timeout: 120_000 }, () => {
  const ratios: number[] = []
  fc.assert(
    fc.property(code, (text) => {
      try {
        const list = strays(text)
        for (const { off, stated } of list) ratios.push(stated / Math.max(off, 4 * Number.EPSILON))
        expect(worse(list)).toEqual([])
      } catch (error) {
        if (!isUnsolvable(error)) throw error
      }
    }),
    { numRuns: 30 },
  )
  // Stated are at least 3e-11, ten times what the reference set shows of much longer ways: bounds of that size are not idle.
  ratios.sort((one, other) => one - other)
  expect(ratios.length).toBeGreaterThan(60)
  expect(Number.EPSILON * ratios[ratios.length >> 1]).toBeLessThan(1e-10)
})

describe('nor where errors of steps grow', () => {
  it.each([
    'h0:73.44,matter:0.08466,curvature:-0.9735,eos:field,v:exponential,slope:0.2911',
    'h0:73.78,matter:0.4398,curvature:-1.387,cmb:0,eos:field,v:cosine,width:3.237,start:0.3153',
    'h0:54.29,matter:0.3265,curvature:-1.274,masses:0,eos:field,v:inverse,slope:0.2134,start:0.686',
    'h0:70.27,matter:0,curvature:-0.4947,masses:0,eos:field,v:cosine,width:1.699,start:0.2961',
    'h0:88.76,matter:0,curvature:-1.284,masses:0,eos:field,v:linear,slope:0.3135',
    'h0:49.93,matter:0.07759,curvature:-0.596,masses:0,eos:field,v:linear,slope:0.1326',
    'h0:57.34,matter:0.02004,curvature:-0.6948,masses:0,eos:field,v:cosine,width:2.18,start:0.9516',
  ])('%s', (text) => expect(worse(strays(text))).toEqual([]))
})
