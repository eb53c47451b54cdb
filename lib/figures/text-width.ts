/** How wide a text is set, without a browser: advance widths of Source Sans 3 Semibold in thousandths of the type size. */

const FIRST = 0x20
/** From the font's hmtx table, U+0020 to U+007E. */
const ADVANCES = [
  200, 315, 482, 513, 513, 841, 639, 275, 324, 324, 438, 513, 275, 322, 275, 344, 513, 513, 513, 513, 513, 513, 513,
  513, 513, 513, 275, 275, 513, 513, 513, 444, 875, 558, 597, 576, 625, 538, 510, 628, 663, 282, 494, 597, 502, 745,
  657, 674, 582, 674, 592, 545, 546, 655, 536, 800, 541, 501, 540, 324, 344, 324, 513, 500, 549, 516, 563, 462, 564,
  507, 317, 520, 558, 262, 263, 522, 271, 843, 560, 549, 564, 564, 373, 431, 361, 556, 495, 748, 481, 495, 443, 324,
  255, 324, 513,
] as const
/** Other letters: as wide as a figure; the ideographs of East Asia fill the square. */
const OTHER = 560
const SQUARE = 1000

/** Width in the unit of `size`. An upper estimate for the lighter weights. */
export function textWidth(text: string, size: number): number {
  let thousandths = 0
  for (const sign of text) thousandths += advance(sign.codePointAt(0) ?? FIRST)
  return (thousandths * size) / 1000
}

function advance(code: number): number {
  return ADVANCES[code - FIRST] ?? (code >= 0x2e80 ? SQUARE : OTHER)
}

/** The longest beginning of a text that fits, with an ellipsis where it is cut. */
export function fitted(text: string, size: number, width: number): string {
  if (textWidth(text, size) <= width) return text
  const signs = [...text]
  while (signs.length > 1 && textWidth(`${signs.join('')}…`, size) > width) signs.pop()
  return `${signs.join('').trimEnd()}…`
}

const AFTER_BLANKS = /(?<= )/
/** A code may be broken between its parts. */
export const AFTER_PARTS = /(?<=[ ,;])/

/** A text in as many lines as it needs, up to `most`; what is left then is cut. */
export function inLines(
  text: string,
  size: number,
  width: number,
  most: number,
  breaks = AFTER_BLANKS,
): readonly string[] {
  const lines: string[] = []
  let line = ''
  for (const piece of text.split(breaks)) {
    if (line !== '' && lines.length < most - 1 && textWidth((line + piece).trimEnd(), size) > width) {
      lines.push(line.trimEnd())
      line = ''
    }
    line += piece
  }
  return [...lines, fitted(line.trimEnd(), size, width)]
}
