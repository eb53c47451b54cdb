/** Where a history goes, decided by the first root of E² ahead or by the component that rules as a → ∞. */
import type { Component } from '../model'
import type { Arm } from './arm'
import type { End, EndKind } from './outcome'
import { explodes, leadingExponent } from './tail'

/** `future` leads from today to larger a; `home` to smaller a by the same law: the way back after a turnaround. */
export function endOf(future: Arm, home: Arm): End {
  if (future.end.kind === 'root') return turned(future, home, future.end.N, future.end.certain)
  if (future.end.kind === 'double') {
    return {
      kind: 'static',
      time: null,
      scale: Math.exp(future.end.N),
      turnaround: null,
      proven: false,
      because:
        'E² and its slope vanish together at this scale factor: the expansion comes to rest there after infinite time.',
    }
  }
  const [kind, because] = expanding(future)
  const time = Number.isFinite(future.time.total) ? future.time.total : null
  return { kind, time, scale: null, turnaround: null, proven: true, because }
}

function turned(future: Arm, home: Arm, N: number, certain: boolean): End {
  const turnaround = { time: future.time.total, scale: Math.exp(N) }
  if (home.end.kind === 'root') {
    const because =
      'E² vanishes at a larger and at a smaller scale factor: expansion and contraction follow each other for ever.'
    return { kind: 'oscillating', time: null, scale: null, turnaround, proven: certain && home.end.certain, because }
  }
  if (home.end.kind === 'double') {
    const because =
      'The expansion turns round, and the contraction comes to rest where E² and its slope vanish together.'
    return { kind: 'static', time: null, scale: Math.exp(home.end.N), turnaround, proven: false, because }
  }
  const time = 2 * future.time.total + home.time.total
  const because = `E² vanishes at a = ${Math.exp(N).toPrecision(4)}: the expansion stops there and turns into contraction, down to a = 0.`
  return { kind: 'crunch', time: Number.isFinite(time) ? time : null, scale: 0, turnaround, proven: certain, because }
}

const NAMES: Readonly<Record<Component['key'], string>> = {
  radiation: 'radiation',
  matter: 'matter',
  neutrino: 'massive neutrinos',
  curvature: 'curvature',
  dark: 'dark energy',
}

function expanding(future: Arm): readonly [EndKind, string] {
  const { model } = future
  if (explodes(model, future.direction)) {
    return [
      'rip',
      'The density of dark energy grows faster than any power of a, so that a becomes infinite in finite time.',
    ]
  }
  const n = leadingExponent(model, future.direction)
  if (n === null) return ['decelerating', 'All that is left thins out faster than any power of a.']
  const rulers = model.components
    .filter((one) => one.future.kind === 'power' && one.future.exponent === n)
    .map((one) => NAMES[one.key])
  const who = [...new Set(rulers)].join(' and ')
  return [
    kindOf(n),
    `As a grows, ${who} outlast${rulers.length > 1 || who.endsWith('s') ? '' : 's'} the rest; ${lawOf(n)}.`,
  ]
}

function kindOf(n: number): EndKind {
  if (n < 0) return 'rip'
  if (n === 0) return 'exponential'
  return n < 2 ? 'accelerating' : n === 2 ? 'coasting' : 'decelerating'
}

function lawOf(n: number): string {
  if (n === 0) return 'its density stays constant, and so does H in the end'
  const power = `E² goes like a to the power ${n < 0 ? '' : '−'}${Number(Math.abs(n).toPrecision(4))}`
  return n < 0 ? `${power}, and a becomes infinite in finite time` : power
}
