/** The colours of app/styles/theme.css for files, which have no style sheet; a test holds both together. */

export const THEME_KEYS = ['paper', 'night'] as const
export type ThemeKey = (typeof THEME_KEYS)[number]

type Colours = Readonly<Record<string, readonly [paper: string, night: string]>>

const COLOURS: Colours = {
  ground: ['#fbfaf7', '#0e1116'],
  ink: ['#1b1d21', '#ebe9e4'],
  soft: ['#565b63', '#a2a8b1'],
  rule: ['#dcd8ce', '#2a303a'],
  edge: ['#8b8a84', '#6b7280'],
  tint: ['#f3f0e8', '#151a23'],
  hatch: ['#e4dfd2', '#222a37'],
  radiation: ['#5b4a6b', '#b8a3cc'],
  matter: ['#a9aeb6', '#5a626f'],
  curvature: ['#dad6ca', '#343b47'],
  'dark-energy': ['#ecc04e', '#b98d20'],
  'on-ribbon': ['#1b1d21', '#ffffff'],
  'on-dark-energy': ['#1b1d21', '#14110a'],
  veil: ['#ffffff66', '#0e111640'],
  'hue-0': ['#0067a8', '#6cb4f5'],
  'hue-1': ['#b84a00', '#ff9a5c'],
  'hue-2': ['#007a58', '#3cc898'],
  'hue-3': ['#a3387a', '#e99cca'],
  'hue-4': ['#8a6100', '#e8b93c'],
  'hue-5': ['#3f4248', '#d3d6da'],
}

/** Colours by name, as a theme has them. */
export type Palette = (name: string) => string

export const COLOUR_NAMES = Object.keys(COLOURS)

export const paletteOf =
  (theme: ThemeKey): Palette =>
  (name) => {
    const pair = COLOURS[name]
    if (pair === undefined) throw new RangeError(`no colour is called ${name}`)
    return pair[THEME_KEYS.indexOf(theme)]
  }
