/** How a history ends: as a clause without a subject, as a short label, and what follows from it. */
import type { EndKind } from '../history/outcome'
import { significant, withUnit } from './number'
import { duration, fromNow, size } from './time'
import type { Told } from './told'

type Ended = Pick<Told, 'end'>

/** Kinds of ending that come at a finite time. */
const FINITE: ReadonlySet<EndKind> = new Set(['crunch', 'rip', 'singular'])

export function endsInTime(kind: EndKind): boolean {
  return FINITE.has(kind)
}

export function endClause({ end }: Ended): string {
  const inTime = end.time === null ? neverOrFar({ end }) : `in ${duration(end.time)}`
  const scale = end.scale === null ? 'a size beyond all numbers' : `${size(end.scale)} times today’s size`
  const turn = turnClause({ end })
  switch (end.kind) {
    case 'crunch':
      return `${turn}ends in a Big Crunch ${inTime}`
    case 'rip':
      return `ends in a Big Rip ${inTime}`
    case 'little-rip':
      return 'expands ever faster, without bound but also without a last moment (a little rip)'
    case 'exponential':
      return 'expands for ever'
    case 'accelerating':
      return 'expands for ever at a rising pace'
    case 'coasting':
      return 'expands for ever at a pace that becomes steady'
    case 'decelerating':
      return 'expands for ever at a falling pace'
    case 'static':
      return `${turn}comes to rest at ${scale}`
    case 'singular':
      return `${turn}ends ${inTime} in a singularity at ${scale}`
    case 'oscillating':
      return `${turn}goes on oscillating for ever`
  }
}

/** A turnaround that is not told lies at a size beyond all numbers. */
const neverOrFar = ({ end: { kind, turnaround } }: Ended): string =>
  kind === 'crunch' && turnaround === null ? 'later than can be computed' : 'in the infinite future'

function turnClause({ end: { turnaround } }: Ended): string {
  if (turnaround === null) return ''
  return `stops expanding in ${duration(turnaround.time)} at ${size(turnaround.scale)} times today’s size and `
}

/** Beside the end of a curve. */
export function endLabel({ end }: Ended): string {
  const name = END_NAMES[end.kind]
  return end.time === null ? name : `${name} ${fromNow(end.time)}`
}

/** The ending named in two or three words. */
export const END_NAMES: Readonly<Record<EndKind, string>> = {
  crunch: 'Big Crunch',
  rip: 'Big Rip',
  'little-rip': 'little rip',
  exponential: 'expands for ever',
  accelerating: 'accelerates for ever',
  coasting: 'coasts for ever',
  decelerating: 'slows down for ever',
  static: 'comes to rest',
  singular: 'singularity',
  oscillating: 'oscillates',
}

/** What H tends to, or what is torn apart before a rip. */
export function endTail(told: Told): string | null {
  if (told.end.kind === 'rip') return tornApart(told)
  const limit = told.measures.asymptoticHubble.value
  if (limit === null || told.end.kind !== 'exponential') return null
  return `H tends to ${withUnit(significant(limit, 3), 'km/s/Mpc')}.`
}

function tornApart({ moments }: Told): string | null {
  const galaxy = moments.find((one) => one.kind === 'unbinding-galaxy')
  return galaxy && galaxy.remaining !== null ? `Galaxies come apart ${duration(galaxy.remaining)} before.` : null
}
