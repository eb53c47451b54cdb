/** Where a history goes, decided by the first root of E² ahead or by the component that rules as a → ∞. */

import type { Component } from '../components'
import type { Logarithmic } from '../dark-energy/law'
import { logarithmicIn } from '../model'
import type { Arm } from './arm'
import type { End, EndKind } from './outcome'
import { explodes, exponentIn, leadingExponent } from './tail'

/** `future` leads from today to larger a; `home` to smaller a by the same law: the way back after a turnaround. */
export function endOf(future: Arm, home: Arm): End {
  if (future.end.kind === 'root') return turned(future, home, future.end.N, future.end.certain)
  if (future.end.kind === 'double') {
    const because = 'E² and its slope vanish together at this scale factor: the expansion comes to rest there.'
    const proven = future.model.acting.length === 1
    return { kind: 'static', time: null, scale: scaleAt(future.end.N), turnaround: null, proven, because }
  }
  if (future.end.kind === 'singular') {
    const time = Number.isFinite(future.time.total) ? future.time.total : null
    const scale = scaleAt(future.end.N)
    return { kind: 'singular', time, scale, turnaround: null, proven: true, because: singularity(future) }
  }
  if (future.end.farRoot !== null) {
    const because = 'E² vanishes at a scale factor that is beyond the range of floating-point numbers.'
    if (home.end.kind === 'none')
      return { kind: 'crunch', time: null, scale: 0, turnaround: null, proven: true, because }
    const kind = home.end.kind === 'root' ? 'oscillating' : home.end.kind === 'double' ? 'static' : 'singular'
    const scale = kind === 'oscillating' ? null : scaleAt(home.end.N)
    return { kind, time: null, scale, turnaround: null, proven: true, because }
  }
  const [kind, because] = expanding(future)
  const time = Number.isFinite(future.time.total) ? future.time.total : null
  return { kind, time, scale: null, turnaround: null, proven: true, because }
}

/** e^N, or null where that is no double. */
function scaleAt(N: number): number | null {
  const scale = Math.exp(N)
  return Number.isFinite(scale) ? scale : null
}

/** What happens where the law of dark energy ends. */
export function singularity({ model, direction }: Arm): string {
  const diverges = (logarithmicIn(model, direction)?.power ?? 0) < 0
  return diverges
    ? 'The density of dark energy diverges at this scale factor, and E² with it.'
    : 'Dark energy is used up at this scale factor while its pressure, and with it ä, diverges.'
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
  if (home.end.kind === 'singular') {
    const because = `The expansion turns round. ${singularity(home)}`
    return { kind: 'singular', time, scale: Math.exp(home.end.N), turnaround, proven: certain, because }
  }
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
  const rulers = model.acting.filter((one) => exponentIn(one, 1) === n).map((one) => NAMES[one.key])
  const who = [...new Set(rulers)].join(' and ')
  const slow = n === 0 ? logarithmicIn(model, 1) : null
  if (slow) return logarithmicEnding(slow)
  return [
    kindOf(n),
    `As a grows, ${who} outlast${rulers.length > 1 || who.endsWith('s') ? '' : 's'} the rest; ${lawOf(n)}.`,
  ]
}

/** E² goes like a power p of ln a, so that t = ∫ d ln a/E is finite for p > 2. */
function logarithmicEnding({ power, overTwo }: Logarithmic): readonly [EndKind, string] {
  const law = `As a grows, E² goes like ln a to the power ${signed(power)}`
  if (power < 0) return ['accelerating', `${law}: the expansion accelerates, with H falling to zero.`]
  return overTwo > 0
    ? ['rip', `${law}, and a becomes infinite in finite time.`]
    : ['little-rip', `${law}: H grows without bound, but never becomes infinite in finite time.`]
}

function kindOf(n: number): EndKind {
  if (n < 0) return 'rip'
  if (n === 0) return 'exponential'
  return n < 2 ? 'accelerating' : n === 2 ? 'coasting' : 'decelerating'
}

function lawOf(n: number): string {
  if (n === 0) return 'its density stays constant, and so does H in the end'
  const power = `E² goes like a to the power ${signed(-n)}`
  return n < 0 ? `${power}, and a becomes infinite in finite time` : power
}

const signed = (x: number): string => `${x < 0 ? '−' : ''}${Number(Math.abs(x).toPrecision(4))}`
