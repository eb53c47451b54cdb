/**
 * What the engine makes for every scenario has one shape (in the words of V8, one map), since code is compiled for the shapes that
 * it meets, and slow where it meets ever new ones.
 */
import { setFlagsFromString } from 'node:v8'
import { expect, test } from 'vitest'
import { isBlock, runsAlong } from '../lib/quantities/blocks'
import { borrowWorkspace } from '../lib/quantities/workspace'
import { type Solution, solve } from '../lib/solve'
import { read } from './bench/scenarios'

setFlagsFromString('--allow-natives-syntax')
const alike = new Function('one', 'other', 'return %HaveSameMap(one, other)') as (one: object, other: object) => boolean

const workspace = borrowWorkspace()

/** All that loops and searches read of a scenario. */
function partsOf(solution: Solution): Record<string, object> {
  const { scenario, budget, history, moments, origin, end } = solution
  const { past, future } = history
  const values = Float64Array.of(0.97, 0.98, 1)
  const [block] = runsAlong({ subject: solution, variable: 'scale', values, count: 3, workspace })
  if (!(block && isBlock(block))) throw new Error('no block')
  const [panel] = past.panels
  const parts = {
    scenario,
    budget,
    history,
    origin,
    end,
    past,
    future,
    panel,
    block,
    moment: moments[2],
    sums: past.time,
  }
  const inside = { model: past.model, law: past.model.law, zone: panel.zone, began: history.origin, ends: history.end }
  return past.tail ? { ...parts, ...inside, tail: past.tail, integral: past.tail.time } : { ...parts, ...inside }
}

/** Enough for the shapes to settle: a field that first holds a small integer changes its kind when it holds something else. */
const SETTLED = 20

test.each([
  ['a cosmological constant', (h0: number) => `h0:${h0},matter:0.3`],
  ['a constant w', (h0: number) => `h0:${h0},matter:0.3,eos:constant,w:-0.9`],
  ['w linear in a', (h0: number) => `h0:${h0},matter:0.3,masses:0,eos:cpl,w0:-0.9,wa:0.2`],
  ['a universe that turns round', (h0: number) => `h0:${h0},matter:2,dark:0,masses:0`],
  ['a bounce', (h0: number) => `h0:${h0},matter:0.1,dark:1.8,cmb:0`],
])('%s', (_, code) => {
  const many = Array.from({ length: SETTLED }, (_, i) => partsOf(solve(read(code(60 + i)))))
  const [one, other] = many.slice(-2)
  for (const [name, part] of Object.entries(one)) expect.soft(alike(part, other[name]), name).toBe(true)
})

/** Enough for whoever makes a list to be optimized: `map` makes lists of another kind from then on. */
const OPTIMIZED = 3000

test('lists that loops read stay of one kind', () => {
  const listsAt = (h0: number) => {
    const { budget, history } = solve(read(`h0:${h0},matter:0.3`))
    return [
      budget.states,
      history.past.model.components,
      history.past.panels,
      history.past.edges,
      history.past.time.toEnd,
    ]
  }
  const early = listsAt(70)
  let late = early
  for (let i = 0; i < OPTIMIZED; i++) late = listsAt(60 + 0.01 * i)
  for (const [i, list] of early.entries()) expect.soft(alike(list, late[i]), `list ${i}`).toBe(true)
})

test('and it can be told', () => {
  expect(alike({ a: 1 }, { a: 2 })).toBe(true)
  expect(alike({ a: 1 }, { b: 2 })).toBe(false)
})
