/** Where a history goes, decided by the first root of E² ahead or by the component that rules as a → ∞. */

import type { Component } from '../components'
import type { Logarithmic } from '../dark-energy/law'
import { logarithmicIn, type Model } from '../model'
import type { Arm } from './arm'
import type { End, EndKind } from './outcome'
import type { Search } from './search'
import { explodes, exponentIn, leadingExponent } from './tail'

/** What the search ahead and, after a turnaround, the search back say of the end. */
export interface Fate {
  readonly kind: EndKind
  readonly proven: boolean
  /** One sentence, and another where it is not proven. */
  readonly because: string
}

/** `home` is the search to smaller a by the law of the future. */
export function fateOf(model: Model, future: Search, home: Search): Fate {
  const told = (kind: EndKind, because: string, doubt: string | null): Fate => ({
    kind,
    proven: doubt === null,
    because: doubt === null ? because : `${because} ${doubt}`,
  })
  if (future.kind === 'double') return told('static', future.exact ? `${AT_REST} ${AS_TYPED}` : AT_REST, future.doubt)
  if (future.kind === 'singular') return told('singular', singularity(model, 1), future.doubt)
  if (future.kind === 'none' && future.farRoot === null) return told(...expanding(model), future.doubt)
  const size = future.kind === 'root' ? Math.exp(future.N).toPrecision(4) : null
  return told(...afterTurning(model, size, home), future.doubt ?? home.doubt)
}

/** Of a double root that exact arithmetic has shown. */
export const AS_TYPED = 'Exactly so for the decimals of the densities as typed.'
const AT_REST = 'E² and its slope vanish together at this scale factor: the expansion comes to rest there.'
const FAR = 'E² vanishes where the scale factor or the densities are beyond the range of floating-point numbers.'

function afterTurning(model: Model, size: string | null, home: Search): readonly [EndKind, string] {
  const turns = size === null ? FAR : 'The expansion turns round.'
  switch (home.kind) {
    case 'root':
      return [
        'oscillating',
        size === null
          ? FAR
          : 'E² vanishes at a larger and at a smaller scale factor: expansion and contraction follow each other for ever.',
      ]
    /* v8 ignore next -- only numbers tuned to the last digit have a double root behind today and a simple one ahead */
    case 'double':
      return ['static', `${turns} The contraction comes to rest where E² and its slope vanish together.`]
    case 'singular':
      return ['singular', `${turns} ${singularity(model, -1)}`]
    case 'none':
      return [
        'crunch',
        size === null
          ? FAR
          : `E² vanishes at a = ${size}: the expansion stops there and turns into contraction, down to a = 0.`,
      ]
  }
}

/** `future` leads from today to larger a; `home` to smaller a by the same law: the way back after a turnaround. */
export function endOf(future: Arm, home: Arm): End {
  const fate = fateOf(future.model, future.end, home.end)
  const total = future.time.total
  if (future.end.kind === 'root') {
    const back = whenBack(fate.kind, 2 * total + home.time.total, home.end)
    return endFrom(fate, back.time, back.scale, { time: total, scale: Math.exp(future.end.N) })
  }
  const scale = future.end.kind === 'none' ? null : scaleAt(future.end.N)
  if (future.end.kind === 'none' && future.end.farRoot !== null) {
    const back = whenBack(fate.kind, Number.POSITIVE_INFINITY, home.end)
    return endFrom(fate, back.time, back.scale, null)
  }
  const time = future.end.kind !== 'double' && Number.isFinite(total) ? total : null
  return endFrom(fate, time, scale, null)
}

const endFrom = (
  { kind, proven, because }: Fate,
  time: number | null,
  scale: number | null,
  turnaround: End['turnaround'],
): End => ({ kind, proven, because, time, scale, turnaround })

/** When and where a universe that turns round ends. */
function whenBack(kind: EndKind, time: number, home: Search): Pick<End, 'time' | 'scale'> {
  if (kind === 'oscillating') return { time: null, scale: null }
  const scale = home.kind === 'none' ? 0 : scaleAt(home.N)
  return { time: kind !== 'static' && Number.isFinite(time) ? time : null, scale }
}

/** e^N, or null where that is no double. */
function scaleAt(N: number): number | null {
  const scale = Math.exp(N)
  return Number.isFinite(scale) ? scale : null
}

/** What happens where the law of dark energy ends. */
export function singularity(model: Model, direction: 1 | -1): string {
  const law = logarithmicIn(model, direction)
  const diverges = law !== null && law.power < 0
  return diverges
    ? 'The density of dark energy diverges at this scale factor, and E² with it.'
    : 'Dark energy is used up at this scale factor while its pressure, and with it ä, diverges.'
}

const NAMES: Readonly<Record<Component['key'], string>> = {
  radiation: 'radiation',
  matter: 'matter',
  neutrino: 'massive neutrinos',
  curvature: 'curvature',
  dark: 'dark energy',
}

function expanding(model: Model): readonly [EndKind, string] {
  if (explodes(model, 1)) {
    return [
      'rip',
      'The density of dark energy grows faster than any power of a, so that a becomes infinite in finite time.',
    ]
  }
  const n = leadingExponent(model, 1)
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
