/** A sheet as PDF: real text in embedded fonts, lines as lines. Only what our drawings consist of is known here. */
import PDFDocument from 'pdfkit'
import type { Attributes, SvgNode } from '../figures/svg'
import { FACE_KEYS, type FaceKey, type Faces } from './face'
import { outlineOf } from './outline'
import { type Run, runsOfText } from './runs'
import type { Sheet } from './sheet'
import type { About } from './to-svg'

export interface PdfMeans {
  readonly faces: Faces
  /** The font files. */
  readonly files: Readonly<Record<FaceKey, Uint8Array>>
  readonly about: About
  /** Stands in the file as the time when it was made. */
  readonly date: Date
}

const HALO = 3

/** The same sheet gives the same bytes. */
export function toPdf(
  { node, width, height, scale }: Sheet,
  { faces, files, about, date }: PdfMeans,
): Promise<Uint8Array<ArrayBuffer>> {
  const pdf = new PDFDocument({
    size: [width * scale, height * scale],
    margin: 0,
    lang: 'en',
    displayTitle: true,
    info: {
      Title: about.title,
      Subject: about.description,
      Creator: 'Longhence',
      Producer: 'Longhence',
      CreationDate: date,
      ModDate: date,
    },
  })
  const chunks: Uint8Array[] = []
  pdf.on('data', (chunk: Uint8Array) => chunks.push(chunk))
  const done = new Promise<Uint8Array<ArrayBuffer>>((resolve) => pdf.on('end', () => resolve(joined(chunks))))
  for (const key of FACE_KEYS) pdf.registerFont(key, files[key] as never)
  pdf.scale(scale)
  draw(node, { pdf, faces, patterns: patternsIn(node) })
  pdf.end()
  return done
}

function joined(chunks: readonly Uint8Array[]): Uint8Array<ArrayBuffer> {
  const bytes = new Uint8Array(chunks.reduce((sum, { length }) => sum + length, 0))
  let at = 0
  for (const chunk of chunks) {
    bytes.set(chunk, at)
    at += chunk.length
  }
  return bytes
}

interface Page {
  readonly pdf: PDFKit.PDFDocument
  readonly faces: Faces
  readonly patterns: ReadonlyMap<string, SvgNode>
}

function patternsIn(node: SvgNode): Map<string, SvgNode> {
  const found = new Map<string, SvgNode>()
  if (node.tag === 'pattern') found.set(String(node.attributes.id), node)
  for (const child of node.children)
    if (typeof child !== 'string') for (const one of patternsIn(child)) found.set(...one)
  return found
}

function draw(node: SvgNode, page: Page): void {
  const { pdf } = page
  const { tag, attributes: of, children } = node
  if (tag === 'defs' || tag === 'title') return
  pdf.save()
  if (of.transform !== undefined) translate(pdf, String(of.transform))
  if (tag === 'text') for (const run of runsOfText(node, page.faces)) write(run, page)
  else if (tag === 'g' || tag === 'svg' || tag === 'a')
    for (const child of children) typeof child !== 'string' && draw(child, page)
  else shape(node, page)
  pdf.restore()
}

function translate(pdf: PDFKit.PDFDocument, transform: string): void {
  const [, x, y] = /^translate\(([-\d.]+)[ ,]([-\d.]+)\)$/.exec(transform) ?? []
  if (x === undefined) throw new RangeError(`the transform ${transform} is not known in files`)
  pdf.translate(Number(x), Number(y))
}

function write({ text, face, size, x, y, fill, halo }: Run, { pdf, faces }: Page): void {
  const outline = halo === null ? '' : outlineOf({ text, face, size, x, y, fill, halo }, faces[face])
  if (outline !== '')
    pdf
      .path(outline)
      .lineWidth(HALO)
      .lineJoin('round')
      .stroke(halo as string)
  pdf.font(face).fontSize(size).fillColor(fill)
  pdf.text(text, x, y, { lineBreak: false, baseline: 'alphabetic' })
}

function shape({ tag, attributes: of }: SvgNode, page: Page): void {
  const { pdf } = page
  const pattern = /^url\(#(.+)\)$/.exec(String(of.fill ?? ''))?.[1]
  if (pattern !== undefined) {
    hatch(of, page.patterns.get(pattern), page)
    return
  }
  trace(tag, of, pdf)
  const fills = tag !== 'line' && of.fill !== 'none'
  const strokes = of.stroke !== undefined && of.stroke !== 'none'
  if (strokes) line(of, pdf)
  if (fills) paint(String(of.fill ?? '#000000'), pdf.fillColor.bind(pdf))
  if (fills && strokes) pdf.fillAndStroke()
  else if (fills) pdf.fill()
  else if (strokes) pdf.stroke()
}

function trace(tag: string, of: Attributes, pdf: PDFKit.PDFDocument): void {
  const at = (name: string) => Number(of[name] ?? 0)
  if (tag === 'rect') pdf.rect(at('x'), at('y'), at('width'), at('height'))
  else if (tag === 'line') pdf.moveTo(at('x1'), at('y1')).lineTo(at('x2'), at('y2'))
  else if (tag === 'circle') pdf.circle(at('cx'), at('cy'), at('r'))
  else if (tag === 'path') pdf.path(String(of.d ?? ''))
  else throw new RangeError(`the element ${tag} is not known in files`)
}

function line(of: Attributes, pdf: PDFKit.PDFDocument): void {
  paint(String(of.stroke), pdf.strokeColor.bind(pdf))
  if (of['stroke-opacity'] !== undefined) pdf.strokeOpacity(Number(of['stroke-opacity']))
  pdf.lineWidth(Number(of['stroke-width'] ?? 1))
  pdf.lineCap((of['stroke-linecap'] ?? 'butt') as 'butt' | 'round')
  pdf.lineJoin((of['stroke-linejoin'] ?? 'miter') as 'miter' | 'round')
  const dash = String(of['stroke-dasharray'] ?? '')
    .split(/[ ,]+/)
    .filter((part) => part !== '')
    .map(Number)
  // A length of nothing is a dot where ends are round; pdfkit refuses it.
  if (dash.length > 0) pdf.dash(dash.map((part) => Math.max(part, 0.01)) as never, {})
}

/** `#rrggbb` or `#rrggbbaa`; without the last two the opacity stays as it is. */
function paint(colour: string, set: (colour: string, opacity?: number) => unknown): void {
  set(colour.slice(0, 7), colour.length === 9 ? Number.parseInt(colour.slice(7), 16) / 255 : undefined)
}

/** The tile of our hatching: lines that fall by one step for each step to the right. */
const TILE = 'M-2 10L10 -2M6 18L18 6'

/** The same lines drawn one by one within a rectangle. */
function hatch(of: Attributes, pattern: SvgNode | undefined, { pdf }: Page): void {
  const [tile] = pattern?.children ?? []
  if (typeof tile !== 'object' || tile.attributes.d !== TILE) throw new RangeError('this pattern is not known in files')
  const [x, y, width, height] = ['x', 'y', 'width', 'height'].map((name) => Number(of[name] ?? 0))
  const step = Number(pattern?.attributes.width)
  pdf.rect(x, y, width, height).clip()
  line(tile.attributes, pdf)
  const last = x + width + y + height
  for (let sum = Math.ceil((x + y) / step) * step; sum < last; sum += step) {
    pdf.moveTo(sum - y - height, y + height).lineTo(sum - y, y)
  }
  pdf.stroke()
}
