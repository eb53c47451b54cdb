/** The hunt for the costliest legal scenario: everything that the limits allow, at their extremes. */
import { isUnsolvable } from '../../lib/history/field/unsolvable'
import { readScenario } from '../../lib/scenario/read'
import type { Scenario } from '../../lib/scenario/scenario'
import { solve } from '../../lib/solve'
import { drawn } from './any'
import { type Chance, chanceOf } from './chance'

export interface Cost {
  readonly code: string
  readonly milliseconds: number
  readonly outcome: string
}

const four = (x: number): number => Number(x.toPrecision(4))
const signed = (chance: Chance, least: number, most: number): number =>
  four(chance.pick([-1, 1]) * chance.size(least, most))

/** Twelve nodes as wild as they may be. */
function nodes(chance: Chance): string {
  const count = chance.pick([2, 5, 12, 12])
  const at = Array.from({ length: count }, () => four(chance.size(1e-6, 1e6))).sort((a, b) => a - b)
  const w = at.map(() => (chance.between(0, 1) < 0.5 ? chance.pick([-20, 20]) : four(chance.between(-20, 20))))
  return `eos:nodes,at:${at.join('_')},w:${w.join('_')}`
}

function field(chance: Chance): string {
  const slope = chance.pick([() => four(chance.between(-3, 3)), () => four(chance.between(-20, 20))])()
  const start = four(chance.pick([() => chance.between(0.01, 3), () => chance.size(0.001, 100)])())
  const width = four(chance.pick([() => chance.between(0.1, 3), () => chance.size(0.01, 100)])())
  return `eos:field,${chance.pick([
    `v:exponential,slope:${slope}`,
    `v:linear,slope:${slope}`,
    `v:inverse,slope:${Math.abs(slope) || 1},start:${start}`,
    `v:cosine,width:${width},start:${start}`,
  ])}`
}

function wild(chance: Chance): string {
  const matter = four(chance.pick([() => chance.between(0, 1.5), () => chance.size(1e-4, 1e4)])())
  const closure = chance.pick(['', `curvature:${signed(chance, 1e-6, 100)}`, `dark:${signed(chance, 1e-6, 100)}`])
  const masses = Array.from({ length: chance.pick([1, 3]) }, () => four(chance.size(0.01, 10))).join('_')
  const light = chance.pick(['', 'masses:0', 'cmb:0', `radiation:${four(chance.size(1e-6, 1e4))}`, `masses:${masses}`])
  const beyond = chance.pick(['', '', 'beyond:hold'])
  return [`matter:${matter}`, closure, light, chance.pick([nodes, field])(chance), beyond]
    .filter((one) => one !== '')
    .join(',')
}

/** A legal scenario of any law. */
export function anyScenario(chance: Chance): { readonly code: string; readonly scenario: Scenario } {
  for (;;) {
    if (chance.between(0, 1) < 0.4) return drawn(chance)
    const code = wild(chance)
    const reading = readScenario(code, 0)
    if (reading.ok) return { code, scenario: reading.value }
  }
}

/** How a scenario ends up: solved, refused with a reason, or given up. */
export function outcomeOf(scenario: Scenario): string {
  try {
    return solve(scenario).end.kind
  } catch (error) {
    if (isUnsolvable(error)) return 'refused'
    if (error instanceof RangeError) return `given up: ${error.message}`
    throw error
  }
}

const KEPT = 10

/** The costliest of `count` random scenarios; the better of two runs each, since the first may find a cold engine. */
export function costliest(count: number, seed: number): readonly Cost[] {
  let worst: Cost[] = []
  for (let i = 0; i < count; i++) {
    const { code, scenario } = anyScenario(chanceOf(seed + i + 2 ** 30))
    let milliseconds = timed(scenario)
    const least = worst.length < KEPT ? 0 : worst[worst.length - 1].milliseconds
    if (milliseconds > least) milliseconds = Math.min(milliseconds, timed(scenario))
    if (milliseconds <= least) continue
    worst = [...worst, { code, milliseconds, outcome: outcomeOf(scenario) }]
      .sort((one, other) => other.milliseconds - one.milliseconds)
      .slice(0, KEPT)
  }
  return worst
}

function timed(scenario: Scenario): number {
  const start = process.cpuUsage()
  outcomeOf(scenario)
  const { user, system } = process.cpuUsage(start)
  return (user + system) / 1000
}
