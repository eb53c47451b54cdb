import { describe, expect, it } from 'vitest'
import type { EndKind, OriginKind } from '../../lib/history/outcome'
import { endLabel } from '../../lib/words/ending'
import { verdictOf } from '../../lib/words/verdict'
import { told } from './told'

const plain = (words: string | null) => words?.replaceAll('\u00a0', ' ')
const text = (sketch: Parameters<typeof told>[0]) => plain(verdictOf(told(sketch), null).sentences.join(' '))

describe('a verdict', () => {
  it('tells origin, acceleration, ending, the limit of H and the reach', () => {
    const measures = { deceleration: -0.53, asymptoticHubble: 56.16, eventHorizon: 16.58, particleHorizon: 46.2 }
    expect(text({ measures, moments: [['acceleration-start', -6.104]] })).toBe(
      'Begins in a Big Bang 13.79 Gyr ago, has accelerated for 6.10 Gyr and expands for ever. H tends to 56.2 km/s/Mpc. Light sent today reaches 16.6 Gly at most.',
    )
  })

  it('tells of a turn before a crunch, and of light that gets beyond all that is seen', () => {
    const end = { kind: 'crunch', time: 120.3, scale: 0, turnaround: { time: 53.28, scale: 2.748 } } as const
    expect(text({ end, measures: { eventHorizon: 97.9, particleHorizon: 44 } })).toBe(
      'Begins in a Big Bang 13.79 Gyr ago, stops expanding in 53.28 Gyr at 2.75 times today’s size and ends in a Big Crunch in 120.30 Gyr. Light sent today reaches 97.9 Gly, beyond all that is seen today.',
    )
  })

  it('leaves no gap where the size at the end is no double', () => {
    expect(text({ end: { kind: 'static', time: null, scale: null } })).toContain(
      'comes to rest at a size beyond all numbers',
    )
  })

  it('tells when galaxies come apart before a rip', () => {
    const end = { kind: 'rip', time: 40.4 } as const
    expect(text({ end, moments: [['unbinding-galaxy', 40.34]] })).toContain(
      'ends in a Big Rip in 40.40 Gyr. Galaxies come apart 60.0 Myr before.',
    )
  })

  it.each<[OriginKind, string]>([
    ['big-bang', 'Begins in a Big Bang 9.67 Gyr ago'],
    ['bounce', 'Contracts from the infinite past, bounces 9.67 Gyr ago at 0.420 times today’s size'],
    ['eternal', 'Has expanded for ever, without a beginning'],
    ['static', 'Emerges from a state of rest at 0.420 times today’s size, infinitely long ago'],
    ['oscillating', 'Oscillates, its last bounce 9.67 Gyr ago at 0.420 times today’s size'],
    ['singular', 'Begins 9.67 Gyr ago in a singularity at 0.420 times today’s size'],
  ])('knows the origin %s', (kind, expected) => {
    const endless = kind === 'eternal' || kind === 'static'
    expect(text({ origin: { kind, time: endless ? null : -9.67, scale: 0.42 } })).toMatch(expected)
  })

  it.each<[EndKind, number | null, string]>([
    ['crunch', 12, 'ends in a Big Crunch in 12.00 Gyr.'],
    ['rip', 12, 'ends in a Big Rip in 12.00 Gyr.'],
    ['little-rip', null, 'expands ever faster, without bound but also without a last moment (a little rip).'],
    ['exponential', null, 'expands for ever.'],
    ['accelerating', null, 'expands for ever at a rising pace.'],
    ['coasting', null, 'expands for ever at a pace that becomes steady.'],
    ['decelerating', null, 'expands for ever at a falling pace.'],
    ['static', null, 'comes to rest at 3.10 times today’s size.'],
    ['singular', 12, 'ends in 12.00 Gyr in a singularity at 3.10 times today’s size.'],
    ['oscillating', null, 'goes on oscillating for ever.'],
  ])('knows the ending %s', (kind, time, expected) => {
    const end = { kind, time, scale: kind === 'static' || kind === 'singular' ? 3.1 : null }
    expect(text({ end })).toContain(expected)
    expect(endLabel({ end: { ...told({ end }).end } })).toMatch(time === null ? /[a-z]$/ : /\+12\.00\u00a0Gyr$/)
  })

  it.each([
    [{ deceleration: -1 }, [], 'has accelerated throughout'],
    [{ deceleration: 0.2 }, [['acceleration-start', 5]], 'slows down today, begins to accelerate in 5.00 Gyr'],
    [
      { deceleration: 0.2 },
      [
        ['acceleration-start', -7],
        ['acceleration-end', -1],
      ],
      'stopped accelerating 1.00 Gyr ago',
    ],
  ] as const)('tells of acceleration: %o', (measures, moments, expected) => {
    expect(text({ measures, moments })).toContain(expected)
  })

  it('says nothing of acceleration where the ending says it', () => {
    expect(text({ end: { kind: 'decelerating' }, measures: { deceleration: 0.5 } })).toBe(
      'Begins in a Big Bang 13.79 Gyr ago and expands for ever at a falling pace. Light sent today reaches any place in the end.',
    )
  })
})

describe('what hangs on the law beyond today', () => {
  const cpl = { eos: 'cpl', law: { w0: -0.6, wa: -1.6 } }
  const followed = told({ scenario: cpl, end: { kind: 'crunch', time: 120 } })
  const held = told({ scenario: { ...cpl, beyond: 'hold' }, end: { kind: 'accelerating' } })

  it('is said of a law that is followed', () => {
    expect(plain(verdictOf(followed, held).aside)).toBe(
      'Holding w at today’s value it would expand for ever at a rising pace.',
    )
  })

  it('is said of a w that is held', () => {
    expect(plain(verdictOf(held, followed).aside)).toBe(
      'Following its law after today it would end in a Big Crunch in 120.00 Gyr.',
    )
  })

  it('tells one time from another', () => {
    const later = told({ scenario: { ...cpl, beyond: 'hold' }, end: { kind: 'crunch', time: 200 } })
    expect(plain(verdictOf(followed, later).aside)).toBe(
      'Holding w at today’s value it would end the same way, in 200.00 Gyr.',
    )
    expect(verdictOf(followed, followed).aside).toMatch(/would end the same way\.$/)
  })
})

it('a crunch after a turnaround beyond all numbers is not said to be in the infinite future', () => {
  const end = { kind: 'crunch', time: null, scale: 0, turnaround: null } as const
  expect(text({ end })).toContain('ends in a Big Crunch later than can be computed')
})

describe('light in a closed space', () => {
  // πR with R = 14 Gly is 44 Gly: no place is farther away.
  const scenario = { closure: { given: 'curvature', value: -1 } } as const
  it('that goes farther than the antipode comes everywhere', () => {
    const measures = { eventHorizon: 65.7, curvatureRadius: 14, particleHorizon: 30 }
    expect(text({ scenario, end: { kind: 'crunch', time: 120 }, measures })).toContain(
      'reaches any place of the closed space before the end',
    )
  })
  it('that does not has its reach', () => {
    const measures = { eventHorizon: 43.9, curvatureRadius: 14, particleHorizon: 30 }
    expect(text({ scenario, end: { kind: 'crunch', time: 120 }, measures })).toContain('reaches 43.9 Gly, beyond')
  })
})
