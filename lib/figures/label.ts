/** A label of a curve, a spot or a line: what it says, and how much room it takes. */
import type { Curve } from './chart'
import type { Box } from './obstacles'
import type { Frame } from './plot'
import { fitted, textWidth } from './text-width'

export interface Label {
  readonly tone: string
  /** Empty where only the note is set. */
  readonly name: string
  readonly note: string
  readonly anchor: 'start' | 'middle' | 'end'
  readonly x: number
  /** Upper edge. */
  readonly y: number
  /** From the label to the end of its curve, where they are apart. */
  readonly leader: Leader | null
  /** The stroke of its curve, drawn before the name, where another curve is nearer. */
  readonly swatch?: Stroke
}

export type Stroke = Pick<Curve, 'dash' | 'strong'>

export type Leader = readonly [x1: number, y1: number, x2: number, y2: number]
export type Texts = Pick<Label, 'name' | 'note'>

/** Line heights and sizes in units of the type. */
export const NAME_LINE = 1.2
export const NOTE_LINE = 1.1
export const NOTE_SIZE = 0.86
/** A stroke before a name, and the gap after it. */
export const SWATCH = { length: 2.4, gap: 0.5 }
/** There is room for so much of a name. */
const LONGEST_NAME = 13

export function labelHeight({ name, note }: Texts, type: number): number {
  return type * ((name ? NAME_LINE : 0) + (note ? NOTE_LINE : 0))
}

export function labelWidth({ name, note }: Texts, type: number): number {
  return Math.max(textWidth(name, type), textWidth(note, type * NOTE_SIZE))
}

export const swatchWidth = (type: number): number => (SWATCH.length + SWATCH.gap) * type

/** What a curve is labelled with; on a phone its name alone. */
export function textsOf({ name, note }: Curve, { type, compact }: Frame): Texts {
  return { name: fitted(name, type, LONGEST_NAME * type), note: compact ? '' : note }
}

export const toneOf = ({ tone, strong }: Curve): string => (strong ? tone : `${tone} quiet`)

export function boxOf(label: Label, type: number): Box {
  const width = labelWidth(label, type) + (label.swatch ? swatchWidth(type) : 0)
  const shift = { start: 0, middle: width / 2, end: width }[label.anchor]
  return { x: label.x - shift, y: label.y, width, height: labelHeight(label, type) }
}
