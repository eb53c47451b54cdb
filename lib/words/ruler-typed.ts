/** The numbers typed at the ruler, or what is wrong with each, to stand beside its field. */
import { type Given, LINE_UNITS, type Line, type LineUnit, WHOLE_SKY } from '../ruler/given'
import type { EpochKey } from '../ruler/keys'
import { plainDecimal } from '../scenario/values'
import type { RulerAsk } from './ruler-ask'
import { numberText } from './typed'

export type RulerField = 'at' | 'until' | 'length' | 'line' | 'sky'

export interface RulerTyped {
  /** Null where the text is no epoch. */
  readonly at: number | null
  /** Null also where there is no second epoch. */
  readonly until: number | null
  readonly given: Given | null
  readonly complaints: Readonly<Partial<Record<RulerField, string>>>
}

interface Limits {
  readonly least: number
  readonly most: number
  /** True where the lower limit itself is refused. */
  readonly above: boolean
  readonly allowed: string
}

const above = (least: number, unit = ''): Limits => ({
  least,
  most: Number.MAX_VALUE,
  above: true,
  allowed: `a number above ${String(least).replace('-', '−')}${unit && ` ${unit}`}`,
})
const any = (unit: string): Limits => ({
  least: -Number.MAX_VALUE,
  most: Number.MAX_VALUE,
  above: false,
  allowed: `a number of ${unit}`,
})

const EPOCHS: Readonly<Record<EpochKey, Limits>> = {
  z: above(-1),
  scale: above(0),
  time: any('Gyr'),
  age: any('Gyr'),
  lookback: any('Gyr'),
  temperature: above(0, 'K'),
  comoving: { ...above(0, 'Mpc'), above: false, allowed: 'a number from 0 Mpc on' },
}
const LENGTH = above(0, 'Mpc')
const SKY: Limits = { ...above(0), most: 41253, allowed: 'square degrees above 0, up to the whole sky of 41253' }
const LINE_ALLOWED = `a wavelength or frequency above 0 with one of the units ${LINE_UNITS.join(', ')}; Å where none is given`

export function rulerTyped(ask: RulerAsk): RulerTyped {
  const complaints: Partial<Record<RulerField, string>> = {}
  const read = (field: RulerField, limits: Limits): number | null => {
    const value = numberIn(ask[field], limits)
    if (value === null) complaints[field] = complaint(ask[field], limits.allowed)
    return value
  }
  const at = read('at', EPOCHS[ask.variable])
  const until = ask.until === '' ? null : read('until', EPOCHS[ask.variable])
  const [length, sky, line] = [read('length', LENGTH), read('sky', SKY), lineOf(ask.line)]
  if (line === null) complaints.line = complaint(ask.line, LINE_ALLOWED)
  const given =
    length === null || sky === null || line === null ? null : { length, sky: Math.min(sky, WHOLE_SKY), line }
  return { at, until, given, complaints }
}

function numberIn(text: string, { least, most, above: strict }: Limits): number | null {
  const value = plainDecimal(numberText(text))
  if (value === null || !Number.isFinite(value)) return null
  return (strict ? value > least : value >= least) && value <= most ? value : null
}

function complaint(text: string, allowed: string): string {
  const why = plainDecimal(numberText(text)) === null ? 'cannot be read here' : 'is out of range'
  return `${text} ${why}. Allowed: ${allowed}.`
}

/** Other ways in which people type the units. */
const SPELLINGS: ReadonlyMap<string, LineUnit> = new Map([
  ['', 'Å'],
  ['A', 'Å'],
  ['um', 'µm'],
  ['μm', 'µm'],
  ['Mhz', 'MHz'],
  ['Ghz', 'GHz'],
])

/** `1215.67`, `1215,67 Å`, `158um`, `1.42 GHz`. */
export function lineOf(text: string): Line | null {
  const [, number = '', written = ''] = /^(.*?[\d.,])\s*([\p{L}\u212b]*)$/u.exec(text.trim()) ?? []
  const unit = SPELLINGS.get(written) ?? LINE_UNITS.find((one) => one === written.normalize('NFC'))
  const value = numberIn(number, above(0))
  return value === null || unit === undefined ? null : { value, unit }
}
