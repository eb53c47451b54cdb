/** From a scenario code to its history, a code never seen before in each run, so that nothing remembered can help. */
import { historyOf } from '../../lib/history/history'
import { budgetOf } from '../../lib/scenario/budget'
import { readScenario } from '../../lib/scenario/read'
import type { Scenario } from '../../lib/scenario/scenario'
import { solve } from '../../lib/solve'

const KINDS = {
  'flat, cosmological constant': '',
  'no massive neutrinos': ',masses:0',
  'bounce in the past': ',matter:0.1,dark:2,cmb:0',
  'turns round': ',dark:-0.1',
  'ends in a rip': ',eos:constant,w:-1.25',
  'w changes': ',eos:cpl,w0:-0.8,wa:-0.9',
}

let runs = 0

function code(kind: string) {
  const matter = kind.includes('matter') ? '' : ',matter:0.3'
  return `h0:${(67 + ++runs * 1e-8).toFixed(8)}${matter}${kind}`
}

function read(kind: string): Scenario {
  const reading = readScenario(code(kind), 0)
  if (!reading.ok) throw new Error(reading.problems.map(({ message }) => message).join(' '))
  return reading.value
}

function history(kind: string) {
  const scenario = read(kind)
  return historyOf(scenario, budgetOf(scenario))
}

const each = (what: string, run: (kind: string) => unknown) =>
  Object.entries(KINDS).map(([name, kind]) => [`${what}: ${name}`, () => run(kind)] as const)

export const benches: Readonly<Record<string, () => unknown>> = Object.fromEntries([
  ['read a code', () => read(KINDS['w changes'])],
  ...each('history', history),
  ...each('history, measures, moments', (kind) => solve(read(kind))),
])
