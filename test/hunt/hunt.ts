/** The hunt for missed turning points: what the engine's search says against the other route, scenario by scenario. */
import { familyOf } from '../../lib/dark-energy/index'
import { type Search, searchTurning } from '../../lib/history/turning'
import { type Model, modelOf } from '../../lib/model'
import { budgetOf } from '../../lib/scenario/budget'
import { readScenario } from '../../lib/scenario/read'
import type { Scenario } from '../../lib/scenario/scenario'
import { drawn } from './any'
import { firstNegative, ROUNDING, shareOf } from './brute'
import { chanceOf } from './chance'
import { type Graze, grazesOf } from './graze'

export interface Miss {
  readonly seed: number
  readonly code: string
  readonly because: string
}

export interface Tally {
  readonly scenarios: number
  /** By family and by what the two searches found. */
  readonly counts: Readonly<Record<string, number>>
  readonly unproven: number
  readonly misses: readonly Miss[]
}

const DIRECTIONS = [-1, 1] as const

function modelFrom(scenario: Scenario): Model {
  return modelOf(budgetOf(scenario), familyOf(scenario.eos).law(scenario.law))
}

const DISTANT = 690

/** One random scenario against brute force. */
export function huntRandom(seed: number): {
  readonly kinds: string
  readonly proven: boolean
  readonly miss: Miss | null
} {
  const { code, family, scenario, law } = drawn(chanceOf(seed))
  const model = modelFrom(scenario)
  const share = shareOf(model.budget, law)
  const found = DIRECTIONS.map((direction) => searchTurning(model, direction))
  const complaints = DIRECTIONS.map((direction, i) => {
    const edge = law.edge !== null && direction * law.edge > 0 ? Math.abs(law.edge) : Number.POSITIVE_INFINITY
    return complaint(found[i], edge, firstNegative(model.budget, law, direction, edge * (1 - 1e-9)), share, direction)
  })
  const because = complaints.find((one) => one !== null) ?? null
  return {
    kinds: `${family}: ${found.map((one) => one.kind).join(' ← today → ')}`,
    proven: found.every((one) => one.doubt === null),
    miss: because === null ? null : { seed, code, because },
  }
}

function complaint(
  found: Search,
  edge: number,
  negative: number | null,
  share: (N: number) => number,
  direction: number,
): string | null {
  const N = found.kind === 'none' ? found.farRoot : found.N
  if (negative !== null && (N === null || Math.abs(negative) < Math.abs(N) * (1 - 1e-9) - 1e-9)) {
    return `E² < 0 at N = ${negative}, and the search found ${JSON.stringify({ ...found, narrows: [] })}`
  }
  if (found.kind !== 'root' || found.doubt !== null || Math.abs(found.N) > DISTANT) return null
  // Not invented: E² vanishes at the root and is no more than rounding above zero just beyond it.
  const there = Math.abs(share(found.N))
  // Next to the edge of a law doubles of N tell its density badly: to eps over the part of the way that is left.
  if (edge - Math.abs(found.N) < 1e-6) return null
  const beyond = share(found.N + direction * 1e-7)
  const noise = 1e3 * ROUNDING * (1 + Math.abs(found.N))
  return there > noise || beyond > noise ? `E² is ${there} at the root N = ${found.N}, and ${beyond} beyond` : null
}

/** One scenario that grazes. */
export function huntGraze(
  { code, N, least }: Graze,
  seed: number,
): { readonly proven: boolean; readonly miss: Miss | null } {
  const reading = readScenario(code, 0)
  if (!reading.ok) throw new Error(code)
  const found = searchTurning(modelFrom(reading.value), N > 0 ? 1 : -1)
  const root = found.kind === 'none' ? found.farRoot : found.N
  // Turning points nearer to today decide before the graze is met.
  const before = root !== null && Math.abs(root) < Math.abs(N) - 0.01
  const at = root !== null && Math.abs(root - N) < 0.01
  const proven = found.doubt === null
  if (before || !proven) return { proven, miss: null }
  const right = found.kind === 'double' ? least === 0 : least < 0 ? at && found.kind === 'root' : !at
  const because = `least E² ${least} at N = ${N}, and the search found ${JSON.stringify({ ...found, narrows: [] })}`
  return { proven, miss: right ? null : { seed, code, because } }
}

/** `count` random scenarios, and as many places to graze as `grazes`. */
export function hunt(count: number, grazes: number, first = 1): Tally {
  const counts: Record<string, number> = {}
  const misses: Miss[] = []
  let [scenarios, unproven] = [0, 0]
  const add = (name: string, proven: boolean, miss: Miss | null) => {
    scenarios++
    counts[name] = (counts[name] ?? 0) + 1
    if (!proven) unproven++
    if (miss) misses.push(miss)
  }
  for (let seed = first; seed < first + count; seed++) {
    const { kinds, proven, miss } = huntRandom(seed)
    add(kinds, proven, miss)
  }
  for (let seed = first; seed < first + grazes; seed++) {
    for (const one of grazesOf(chanceOf(seed + 2 ** 31))) {
      const { proven, miss } = huntGraze(one, seed)
      add(`graze ± ${Math.abs(one.offset)}${proven ? '' : ', unproven'}`, proven, miss)
    }
  }
  return { scenarios, counts, unproven, misses }
}
