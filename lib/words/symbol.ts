/** The markup of labels: `_` and `^` start a subscript or superscript, of letters and digits or within braces. */

export interface Run {
  readonly kind: 'plain' | 'sub' | 'sup'
  readonly text: string
}

const SCRIPT = /([_^])(?:\{([^{}]*)\}|([−+-]?[\p{L}\p{N}*∞]+))/gu

/** `Ω_m h^2` as runs of plain text, subscripts and superscripts. */
export function runsOf(markup: string): readonly Run[] {
  const runs: Run[] = []
  let from = 0
  for (const match of markup.matchAll(SCRIPT)) {
    if (match.index > from) runs.push({ kind: 'plain', text: markup.slice(from, match.index) })
    runs.push({ kind: match[1] === '_' ? 'sub' : 'sup', text: match[2] ?? match[3] ?? '' })
    from = match.index + match[0].length
  }
  if (from < markup.length) runs.push({ kind: 'plain', text: markup.slice(from) })
  return runs
}
