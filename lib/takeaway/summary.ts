/** Two sentences for readers without the trade's words: how it began and goes on, and how it ends. */
import type { EndKind, OriginKind } from '../history/outcome'
import { goesRound } from '../words/reach'
import { capital } from '../words/sentence'
import { textOf } from './rounded'
import { type Known, rounded, sizeText } from './told'

export function summaryOf(known: Known): string {
  return `${capital(beginning(known))}${pace(known)}. ${capital(ending(known))}${reach(known)}.`
}

/** Numbers of more than three digits say nothing to a listener. */
const DIGITS = 3

const years = (known: Known, key: string): string => {
  const found = rounded(known, key, DIGITS)
  if (found === null) return ''
  const size = Math.abs(found.value)
  if (size >= 1e6) return `${textOf({ ...found, value: size })} billion years`
  if (size >= 0.1) return `${size} billion years`
  if (size >= 1e-6) return `${Number((size * 1e3).toPrecision(DIGITS))} million years`
  return 'less than a thousand years'
}

function beginning(known: Known): string {
  const ago = `${years(known, 'originTime')} ago`
  const begins: Readonly<Record<OriginKind, string>> = {
    'big-bang': `this universe began ${ago} in a Big Bang`,
    bounce: `this universe shrank until ${ago}, then bounced and has grown since`,
    eternal: 'this universe has always been expanding and has no beginning',
    static: 'this universe was at rest for an endless time before it began to expand',
    oscillating: `this universe swings between growing and shrinking, and last began to grow ${ago}`,
    singular: `this universe began ${ago} at a finite size`,
  }
  return begins[known.solution.origin.kind]
}

function pace(known: Known): string {
  const q = known.solution.measures.deceleration.value
  if (q === null || q === 0) return ''
  if (q > 0) return ', and its expansion is slowing down today'
  if (!known.numbers.has('speedingTime')) return ', and its expansion has been speeding up throughout'
  return `, and its expansion has been speeding up for ${years(known, 'speedingTime')}`
}

function ending(known: Known): string {
  const { end } = known.solution
  const when = end.time === null ? 'in the endless future' : `in ${years(known, 'endTime')}`
  const turn = end.turnaround ? `it stops growing in ${years(known, 'turnTime')}` : 'it goes on'
  const ends: Readonly<Record<EndKind, string>> = {
    crunch: end.turnaround ? `${turn} and falls back into a Big Crunch ${when}` : `it ends in a Big Crunch ${when}`,
    rip: `it ends ${when} in a Big Rip, which tears apart everything down to atoms`,
    'little-rip': 'it expands ever faster and tears apart one thing after the other, but never comes to a last moment',
    exponential: 'it expands for ever',
    accelerating: 'it expands for ever, faster and faster',
    coasting: 'it expands for ever at a pace that becomes steady',
    decelerating: 'it expands for ever, more and more slowly',
    static: 'it comes to rest',
    singular: `it breaks off ${when} in a sudden singularity`,
    oscillating: end.turnaround ? `${turn}, shrinks, and grows again, without end` : 'it swings for ever',
  }
  return ends[end.kind]
}

function reach(known: Known): string {
  if (goesRound(known.solution)) return ', and light that we send today can reach every place before the end'
  const far = rounded(known, 'eventHorizon', 2)
  if (far === null || far.value === 0) return ''
  return `, and light that we send today can reach places that are now up to ${sizeText(known, 'eventHorizon', DIGITS)} billion light years away`
}
