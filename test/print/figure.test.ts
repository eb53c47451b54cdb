/** Figures as files: the same bytes each time, nothing but what they bring along, no letter too small; read by other programs. */
import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import { Resvg } from '@resvg/resvg-js'
import { describe, expect, test } from 'vitest'
import { drawn } from '../../app/api/figure/draw'
import { askFigure, FIGURE_FORMATS, type FigureFile, MOST_PIXELS } from '../../lib/answers/figure'
import { COLLECTIONS, exhibitsOf } from '../../lib/answers/gallery'
import { drawChart } from '../../lib/figures/draw-chart'
import type { SvgNode } from '../../lib/figures/svg'
import { VIEWS } from '../../lib/figures/views'
import { crc32 } from '../../lib/print/png'
import { SIZES } from '../../lib/print/sizes'
import { plainClasses } from '../../lib/print/style'
import { COLOUR_NAMES, paletteOf, THEME_KEYS } from '../../lib/print/theme'
import { answerOf, problemsOf } from '../answers/ask'
import { needs, run } from '../tools'

const ask = (pairs: URLSearchParams) => askFigure(pairs, { version: '9.8.7', base: 'https://a.example' })
const fileOf = (query: string) => answerOf(ask, query)
const madeNow = async (query: string) => Buffer.from(await drawn(fileOf(query)))
const files = new Map<string, FigureFile>()
const made = new Map<string, Promise<Buffer>>()

/** Solved once for all formats. */
function fileFor(query: string): FigureFile {
  const pairs = new URLSearchParams(query)
  const format = FIGURE_FORMATS.find(({ key }) => key === pairs.get('format')) ?? FIGURE_FORMATS[0]
  const dpi = Number(pairs.get('dpi') ?? 96)
  for (const key of ['format', 'dpi']) pairs.delete(key)
  const file = files.get(`${pairs}`) ?? fileOf(`${pairs}`)
  files.set(`${pairs}`, file)
  return { ...file, format, dpi }
}

/** The same file serves several tests. */
async function bytesOf(query: string): Promise<Buffer> {
  const bytes = made.get(query) ?? drawn(fileFor(query)).then(Buffer.from)
  made.set(query, bytes)
  return bytes
}
const HARD = `s=${encodeURIComponent('h0:70,as:<b>&"Ω – 宇宙 🌌')}&s=h0:70,matter:0.3,eos:constant,w:-1.2&s=h0:70,matter:0.4,dark:0.85,eos:cpl,w0:-0.6,wa:-1.6&s=h0:70,matter:0.1,dark:1.7,cmb:0&s=h0:70,matter:1,cmb:0&s=eos:field,v:linear`
/** Every size, and every theme: one has nothing to do with the other. */
const CASES = [...SIZES.map(({ key }) => [key, THEME_KEYS[0]] as const), ['slide', THEME_KEYS[1]] as const]

describe('colours', () => {
  const css = readFileSync(new URL('../../app/styles/theme.css', import.meta.url), 'utf8')
  test.each(COLOUR_NAMES)('%s is that of the page', (name) => {
    const pair = `--${name}: light-dark(${paletteOf('paper')(name)}, ${paletteOf('night')(name)})`
    expect(css).toContain(pair)
  })
  test('every class of a drawing has its look', () => {
    // The long views of every collection; of the many others each in one of them.
    const wanted = (slot: number) => (index: number) => index < 3 || index % COLLECTIONS.length === slot
    const exhibits = COLLECTIONS.flatMap((one, slot) => exhibitsOf(one, wanted(slot)))
    expect(exhibits.length).toBeGreaterThan(90)
    for (const { chart } of exhibits) {
      for (const compact of [true, false]) {
        const node = drawChart(chart, { width: 900, height: 400, type: 15, compact, id: 'a' })
        expect(plainClasses(node)).toEqual([])
      }
    }
  })
})

describe.each(CASES)('%s on %s', (size, theme) => {
  const query = (format: string) => `${HARD}&size=${size}&theme=${theme}&format=${format}`

  test('no letter is smaller than the place allows', () => {
    const { least } = SIZES.find(({ key }) => key === size) ?? { least: 0 }
    const { sheet } = fileFor(query('svg'))
    const sizes = letterSizes(sheet.node).map((one) => one * sheet.scale)
    expect(sizes.length).toBeGreaterThan(10)
    expect(Math.min(...sizes)).toBeGreaterThanOrEqual(least)
  })
  test('the same bytes each time', async () => {
    for (const key of size === 'card' ? ['svg', 'pdf', 'png&dpi=96'] : ['svg', 'pdf']) {
      expect((await bytesOf(query(key))).equals(await madeNow(query(key))), key).toBe(true)
    }
  })
  test('SVG: no class, no style, no letters that need a font, and well formed', async (context) => {
    const text = (await bytesOf(query('svg'))).toString()
    expect(text).not.toMatch(/ class=|<style|<text|<script|undefined|NaN/)
    // What is drawn on a layer of its own ends the process of resvg where it lies outside of the band that is drawn.
    expect(text).not.toMatch(/ (opacity|mask|filter|clip-path|style)=/)
    expect(text).toContain('<title id="title">&lt;b&gt;&amp;&quot;Ω')
    expect(text).toContain('https://a.example/?s=')
    needs(context, 'xmllint')
    expect(run('xmllint', ['--noout', '--nonet', 'a.svg'], { 'a.svg': text })).toMatchObject({ status: 0 })
  })
  test('PDF: fonts embedded, real text', async (context) => {
    const pdf = await bytesOf(query('pdf'))
    needs(context, 'pdffonts', ['-v'])
    const fonts = run('pdffonts', ['a.pdf'], { 'a.pdf': pdf }).said.trim().split('\n').slice(2)
    expect(fonts.length).toBeGreaterThanOrEqual(2)
    for (const font of fonts) expect(font).toMatch(/LonghenceSans.* yes yes yes /)
    const text = run('pdftotext', ['a.pdf', '-'], { 'a.pdf': pdf })
    expect(text.said).toContain('time from now, Gyr')
    expect(text.complaint).toBe('')
    expect(run('pdfinfo', ['a.pdf'], { 'a.pdf': pdf }).said).toMatch(/Title: +<b>&"Ω/)
  })
  test('PNG: the size in pixels, the density, the words', async () => {
    const { sheet } = fileFor(query('png'))
    const png = await bytesOf(`${query('png')}&dpi=96`)
    const [width, height] = [png.readUInt32BE(16), png.readUInt32BE(20)]
    expect(Math.abs(width - (sheet.width * sheet.scale * 96) / 72)).toBeLessThanOrEqual(1)
    expect(Math.abs(height - (sheet.height * sheet.scale * 96) / 72)).toBeLessThanOrEqual(1)
    const chunks = chunksOf(png)
    expect(chunks.get('pHYs')?.readUInt32BE(0)).toBe(Math.round(96 / 0.0254))
    expect(chunks.get('iTXt')?.toString()).toContain('Longhence')
  })
})

/** Every chunk by its type; those with a wrong check value are left out. */
function chunksOf(png: Buffer): Map<string, Buffer> {
  const found = new Map<string, Buffer>()
  for (let at = 8; at < png.length; ) {
    const length = png.readUInt32BE(at)
    const body = png.subarray(at + 4, at + 8 + length)
    if (crc32(body) === png.readUInt32BE(at + 8 + length)) found.set(body.toString('latin1', 0, 4), body.subarray(4))
    at += 12 + length
  }
  return found
}

function letterSizes(node: SvgNode): number[] {
  const own = node.tag === 'text' ? [Number(node.attributes['font-size'])] : []
  return [...own, ...node.children.flatMap((child) => (typeof child === 'string' ? [] : letterSizes(child)))]
}

test('the check value of PNG (W3C, Portable Network Graphics, annex D; that of an empty IEND is AE 42 60 82)', () => {
  expect(crc32(Buffer.from('IEND'))).toBe(0xae426082)
})

describe('views', () => {
  test.each(VIEWS.flatMap(({ key, shows }) => shows.map((show) => [key, show.key] as const)))(
    '%s, %s',
    async (view, show) => {
      const query = `${HARD}&view=${view}&show=${show}&size=column`
      const text = (await bytesOf(query)).toString()
      expect(text).not.toMatch(/ (class|opacity|mask|filter|clip-path)=|undefined|NaN/)
      expect((await bytesOf(`${query}&format=pdf`)).length).toBeGreaterThan(10_000)
      expect(fileFor(query).fileName).toContain(`-${view}-column.svg`)
    },
  )
  test('the keys of the page say what is shown', () => {
    const words = (query: string) => fileOf(`s=h0:70&s=h0:60&${query}`).about.description
    expect(words('view=distances&show=luminosity')).not.toBe(words('view=distances'))
    expect(words('view=distances&compare=ratio')).not.toBe(words('view=distances'))
    expect(words('from=-5&to=5')).not.toBe(words(''))
  })
})

describe('what stands on a sheet', () => {
  const pair = 's=h0:70,as:First&s=h0:60,matter:0.4,dark:0.85,eos:cpl,w0:-0.6,wa:-1.6,as:Second'
  const wordsOf = (query: string) => textsIn(fileOf(query).sheet.node)
  test.each(['view=reach', 'view=reach&show=conformal', 'view=contents'])(
    '%s: the one scenario that is drawn, by its code, its name and its verdict',
    (view) => {
      const { fileName, about } = fileOf(`${pair}&${view}&focus=2`)
      const words = wordsOf(`${pair}&${view}&focus=2&size=card`)
      expect(words.filter((one) => one.includes('engine'))).toEqual([expect.stringMatching(/: h0:60,matter:0\.4/)])
      expect(words).toContain('Second')
      expect(words.join()).not.toMatch(/First|h0:70/)
      expect(words.join()).toContain('Begins in a Big Bang')
      expect(fileName).toMatch(/-second-/)
      expect(fileName).not.toContain('first')
      expect(about.description).toContain(`Scenarios: h0:60,matter:0.4,`)
    },
  )
  test.each(['', 'view=rate', 'view=contents&show=w'])('%s: all of them, and whose verdict it is', (view) => {
    const words = wordsOf(`${pair}&${view}&focus=2&size=card`).join('\n')
    expect(words).toContain('First and Second')
    // In two lines, where one is too short for it.
    expect(words).toMatch(/Second: begins in a Big Bang [\s\S]* Big Crunch in [\d.]+\u00a0Gyr\.$/m)
    expect(words).toMatch(/: h0:70,matter:0.3111,as:First; h0:60/)
  })
  test('the link opens the view', () => {
    const { description } = fileOf(`${pair}&view=rate&show=q&focus=2`).about
    expect(description).toMatch(/https:\/\/a\.example\/\?s=\S+&focus=2&view=rate&show=q&engine=\d+$/)
  })
})

function textsIn(node: SvgNode): string[] {
  const own = node.tag === 'text' ? [node.children.filter((one) => typeof one === 'string').join('')] : []
  return [...own, ...node.children.flatMap((child) => (typeof child === 'string' ? [] : textsIn(child)))]
}

test('a PNG of several bands holds the very pixels that were drawn', async () => {
  const query = `${HARD}&size=card&theme=night`
  const svg = (await bytesOf(query)).toString()
  const shown = (href: Buffer | string, type: string) => {
    const picture = `<image width="2400" height="1260" xlink:href="data:image/${type};base64,${Buffer.from(href).toString('base64')}"/>`
    const page = `<svg xmlns="http://www.w3.org/2000/svg" xmlns:xlink="http://www.w3.org/1999/xlink" width="2400" height="1260">${picture}</svg>`
    return new Resvg(page, { font: { loadSystemFonts: false } }).render().pixels
  }
  const [png, drawing] = [shown(await bytesOf(`${query}&format=png&dpi=192`), 'png'), shown(svg, 'svg+xml')]
  let off = 0
  for (let i = 0; i < png.length; i++) off += Math.abs(png[i] - drawing[i])
  // Edges may round otherwise where a picture stands in another. A band that is out of place shows in all rows below.
  expect(off / (255 * png.length)).toBeLessThan(1e-4)
})

test('letters stand once in a file, and every reference has its end', async () => {
  const text = (await bytesOf(HARD)).toString()
  const ids = [...text.matchAll(/ id="([^"]+)"/g)].map(([, id]) => id)
  expect(new Set(ids).size).toBe(ids.length)
  const ends = [...text.matchAll(/(?:xlink:href="#|url\(#)([^")]+)/g)].map(([, id]) => id)
  expect(ends.length).toBeGreaterThan(300)
  for (const one of ends) expect(ids).toContain(one)
  expect(text.length).toBeLessThan(60_000)
})

test('the preview card has 1200 × 630 pixels', async () => {
  const png = await madeNow('size=card&format=png')
  expect([png.readUInt32BE(16), png.readUInt32BE(20)]).toEqual([1200, 630])
})

test('a PDF looks like the SVG of the same figure', async (context) => {
  needs(context, 'pdftoppm', ['-v'])
  const pdf = await bytesOf(`${HARD}&format=pdf`)
  let page = Buffer.alloc(0)
  run('pdftoppm', ['-r', '72', '-singlefile', 'a.pdf', 'page'], { 'a.pdf': pdf }, (folder) => {
    page = readFileSync(join(folder, 'page.ppm'))
  })
  const seen = async (theme: string) => {
    const svg = (await bytesOf(`${HARD}&format=svg&theme=${theme}`)).toString()
    return new Resvg(svg, { fitTo: { mode: 'width', value: 960 }, font: { loadSystemFonts: false } }).render()
  }
  // Other programs smooth edges otherwise: those differ, areas do not.
  expect(difference(page, await seen('paper'))).toBeLessThan(0.02)
  expect(difference(page, await seen('night'))).toBeGreaterThan(0.3)
})

/** Mean difference of colours, from 0 to 1, of a PPM (three bytes a pixel after three lines) and a picture (four bytes). */
function difference(ppm: Buffer, { pixels, width, height }: { pixels: Buffer; width: number; height: number }): number {
  const [, w, h] = /^P6\s+(\d+)\s+(\d+)\s+255\s/.exec(ppm.toString('latin1', 0, 40)) ?? []
  expect(Math.abs(Number(w) - width) + Math.abs(Number(h) - height)).toBeLessThanOrEqual(2)
  const start = ppm.length - 3 * Number(w) * Number(h)
  let sum = 0
  const [columns, rows] = [Math.min(width, Number(w)), Math.min(height, Number(h))]
  for (let y = 0; y < rows; y++) {
    for (let x = 0; x < columns; x++) {
      for (let c = 0; c < 3; c++)
        sum += Math.abs(ppm[start + 3 * (y * Number(w) + x) + c] - pixels[4 * (y * width + x) + c])
    }
  }
  return sum / (255 * 3 * columns * rows)
}

describe('what is refused', () => {
  test.each([
    ['view=tall', 'view', 'tall'],
    ['show=comoving', 'show', 'comoving'],
    ['view=rate&show=comoving', 'show', 'comoving'],
    ['view=rate&from=1', 'from', '1'],
    ['view=reach&galaxy=0', 'galaxy', '0'],
    ['view=reach&galaxy=10001', 'galaxy', '10001'],
    ['from=-1000001', 'from', '-1000001'],
    ['view=rate&right=2e6', 'right', '2e6'],
    ['focus=4', 'focus', '4'],
    ['from=x', 'from', 'x'],
    ['format=gif', 'format', 'gif'],
    ['size=stamp', 'size', 'stamp'],
    ['theme=blue', 'theme', 'blue'],
    ['format=png&dpi=95', 'dpi', '95'],
    ['format=png&dpi=601', 'dpi', '601'],
    ['format=svg&dpi=300', 'dpi', '300'],
    ['size=poster&format=png&dpi=600', 'dpi', '600'],
    ['width=3', 'width', '3'],
  ])('%s', (query, parameter, value) => {
    expect(problemsOf(ask, query)).toMatchObject([{ parameter, value, scenario: null }])
  })
  test.each([HARD, '', 's=h0:70'])('the largest that is allowed has no more pixels than allowed: %s', (codes) => {
    const query = (dpi: number) => `${codes}&size=poster&format=png&dpi=${dpi}`
    const [{ allowed }] = problemsOf(ask, query(600))
    const most = Number(/up to (\d+)/.exec(allowed)?.[1])
    const { sheet, dpi } = fileOf(query(most))
    expect(dpi).toBe(most)
    expect(sheet.width * sheet.height * ((sheet.scale * most) / 72) ** 2).toBeLessThanOrEqual(MOST_PIXELS)
    expect(problemsOf(ask, query(most + 1))).toHaveLength(1)
  })
})
