/** Where an axis has its marks, and what stands there. */
import { ticks } from 'd3-array'
import { fixed, powerOfTen, signed, significant, THIN } from '../words/number'
import type { Axis } from './chart'
import { fractionOf, type Range } from './scale'

export interface Tick {
  readonly at: number
  readonly text: string
}

/**
 * `count` is about how many there should be on an even axis; `gap` is the least distance of two in parts of the axis,
 * told their texts.
 */
export function ticksOf(
  axis: Axis,
  now: number | null,
  count: number,
  gap: (one: Tick, other: Tick) => number,
): Tick[] {
  const text = textOf(axis, now, count)
  const wanted = wishes(axis, now, count).filter((at) => at >= axis.from && at <= axis.to)
  const placed: Tick[] = []
  for (const at of wanted) {
    const tick = { at, text: text(at) }
    const free = placed.every((one) => Math.abs(fractionOf(axis, one.at) - fractionOf(axis, at)) >= gap(one, tick))
    if (free && tick.text !== '') placed.push(tick)
  }
  return placed.sort((one, other) => one.at - other.at)
}

/** The most wanted first. */
function wishes(axis: Range, now: number | null, count: number): number[] {
  const today = now === null ? [] : [now]
  if (axis.scaling === 'linear') return [...today, ...ticks(axis.from, axis.to, count)]
  if (axis.scaling === 'log') return [...today, ...decades(axis.from, axis.to)]
  const sides = decades(axis.linear, Math.max(Math.abs(axis.from), Math.abs(axis.to)))
  return [...today, 0, ...sides.flatMap((at) => [at, -at])]
}

/** So many powers of ten fill an axis. */
const ENOUGH = 6

/** Powers of ten, then their fives and twos where there are few. */
function decades(from: number, to: number): number[] {
  const [first, last] = [Math.floor(Math.log10(from)), Math.ceil(Math.log10(to))]
  const powers = Array.from({ length: last - first + 1 }, (_, i) => first + i)
  const of = (digit: number) => powers.map((power) => Number(`${digit}e${power}`))
  return powers.length > ENOUGH ? sparse(of(1)) : [...of(1), ...of(5), ...of(2)]
}

/** Where there are many decades every second or third of them comes first, so that what is left out is even. */
function sparse(powers: readonly number[]): number[] {
  const step = Math.ceil(powers.length / 9)
  return [...powers.filter((_, i) => i % step === 0), ...powers.filter((_, i) => i % step !== 0)]
}

function textOf(axis: Axis, now: number | null, count: number): (at: number) => string {
  const even = evenTextOf(axis, count)
  const plus = axis.quantity === 'time' || axis.quantity === 'conformal' ? signed : (text: string) => text
  return (at) => {
    if (at === now && (plus === signed || at === 1)) return 'now'
    if (at === 0) return '0'
    if (axis.scaling !== 'linear') return plus(shortest(at))
    return plus(even(at))
  }
}

/** All with the same decimals, and where some are too large or small for that in the same power of ten. */
function evenTextOf(axis: Range, count: number): (at: number) => string {
  if (axis.scaling !== 'linear') return shortest
  const all = ticks(axis.from, axis.to, count)
  const most = Math.max(...all.map(Math.abs))
  const power = most < LARGE && most >= SMALL ? 1 : 10 ** Math.floor(Math.log10(most || 1))
  const decimals = decimalsOf(all.map((at) => at / power))
  if (power === 1) return (at) => fixed(at, decimals)
  return (at) => `${fixed(at / power, decimals)}${THIN}×${THIN}${powerOfTen(power)}`
}

/** Digits of larger and smaller numbers are more than an axis has room for. */
const LARGE = 1e6
const SMALL = 1e-4

const shortest = (at: number): string => {
  const size = Math.abs(at)
  if (size >= 1e5 || size < 1e-3) return powerOfTen(at)
  return significant(at, 1 + Math.max(0, Math.floor(Math.log10(size))))
}

/** As many as the step needs. */
function decimalsOf(values: readonly number[]): number {
  const step = (values[1] ?? 1) - (values[0] ?? 0)
  return step === 0 ? 0 : Math.max(0, -Math.floor(Math.log10(step) + 1e-9))
}
