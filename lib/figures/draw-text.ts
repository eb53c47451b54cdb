/** Text of axes: letters that stand alone are symbols and slanted; subscripts by markup, since most fonts miss their letters. */
import { type Run, runsOf } from '../words/symbol'
import type { Axis } from './chart'
import { type Attributes, px, type SvgNode, svg } from './svg'
import { textWidth } from './text-width'

const SCRIPT = 0.72
const DROP = 0.22

type Parts = Pick<Axis, 'label' | 'lead' | 'symbol' | 'unit'>

/** `scale factor a`, `time from now t − t_0, Gyr`. */
export function titleOf({ label, lead = '', symbol, unit }: Parts, size: number): (SvgNode | string)[] {
  const runs: (Run & { readonly upright?: true })[] = [...runsOf(symbol)]
  if (unit) runs.push({ kind: 'plain', text: `, ${unit}`, upright: true })
  let shift = 0
  const marked = runs.flatMap(({ kind, text, upright }) => {
    const wanted = shiftOf(kind, size)
    const dy = px(wanted - shift)
    shift = wanted
    const place: Attributes = dy === 0 ? {} : { dy }
    return upright ? [svg('tspan', place, text)] : run(kind, text, size, place)
  })
  const begin = runsOf(lead).flatMap(({ kind, text }) => run(kind, text, size, {}))
  return [...begin, `${label.slice(lead.length)}${symbol ? ' ' : ''}`, ...marked]
}

export function titleWidth({ label, symbol, unit }: Parts, size: number): number {
  return textWidth(`${label} ${symbol.replace(/[_^{}]/g, '')}${unit ? `, ${unit}` : ''}`, size)
}

function shiftOf(kind: Run['kind'], size: number): number {
  return kind === 'plain' ? 0 : px((kind === 'sub' ? DROP : -2 * DROP) * size)
}

function run(kind: Run['kind'], text: string, size: number, place: Attributes): SvgNode[] {
  if (kind !== 'plain') return [svg('tspan', { ...place, 'font-size': px(SCRIPT * size) }, text)]
  const parts = text.split(/(?<!\p{L})(\p{L})(?!\p{L})/u)
  const first = parts.findIndex((part) => part !== '')
  return parts.flatMap((part, i) => {
    const style: Attributes = i % 2 === 1 ? { class: 'symbol' } : {}
    return part === '' ? [] : [svg('tspan', { ...(i === first ? place : {}), ...style }, part)]
  })
}
