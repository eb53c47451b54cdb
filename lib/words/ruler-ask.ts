/** What is asked of the ruler: the keys of the address with what holds where they are silent, and back. */
import { EPOCH_KEYS, type EpochKey, USUAL_READINGS } from '../ruler/keys'
import type { RulerPlace } from './place'

export interface RulerAsk {
  readonly variable: EpochKey
  /** As typed. */
  readonly at: string
  /** Empty where there is but one epoch. */
  readonly until: string
  readonly read: readonly string[]
  readonly length: string
  readonly line: string
  readonly sky: string
  /** Lengths in units with h⁻¹. */
  readonly hubble: boolean
}

/** The line is Lyα in vacuum; the sky is in square degrees, the length in Mpc. */
const USUAL = { variable: 'z', at: '1', until: '', length: '1', line: '1215.67 Å', sky: '1000' } as const
const NOTHING = 'none'

export function rulerAskOf(place: RulerPlace): RulerAsk {
  return {
    variable: EPOCH_KEYS.find((one) => one === place.epoch) ?? USUAL.variable,
    at: place.at ?? USUAL.at,
    until: place.until ?? USUAL.until,
    read: readOf(place.read),
    length: place.length ?? USUAL.length,
    line: place.line ?? USUAL.line,
    sky: place.sky ?? USUAL.sky,
    hubble: place.units === 'h',
  }
}

function readOf(text: string | null): readonly string[] {
  if (text === null) return USUAL_READINGS
  return text === NOTHING ? [] : [...new Set(text.split(',').filter((one) => one !== ''))]
}

export function rulerPlaceOf(ask: RulerAsk): RulerPlace {
  const said = (key: 'at' | 'until' | 'length' | 'line' | 'sky') =>
    ask[key] === USUAL[key] || ask[key] === '' ? null : ask[key]
  const read = ask.read.join(',')
  return {
    epoch: ask.variable === USUAL.variable ? null : ask.variable,
    at: said('at'),
    until: said('until'),
    read: read === USUAL_READINGS.join(',') ? null : read || NOTHING,
    length: said('length'),
    line: said('line'),
    sky: said('sky'),
    units: ask.hubble ? 'h' : null,
  }
}
