/** Places of figures: how large a figure is there, and how small its letters may be. */

export interface Size {
  readonly key: string
  readonly label: string
  /** In points, 1/72 inch. */
  readonly width: number
  /** Of the sheet where it is `fixed`, else of the plot with its axes: what hangs below makes the sheet higher. */
  readonly height: number
  readonly fixed: boolean
  /** Points of the type; the smallest letters of a figure have 0.78 of it, subscripts less. */
  readonly type: number
  /** Points of the smallest letters that the place allows, and who says so. */
  readonly least: number
  readonly source: string
  /** True where labels have no room beside the plot. */
  readonly compact: boolean
  /** Dots an inch of PNG where none are asked for. */
  readonly dpi: number
  /** True where the scenarios' names and the verdict stand above: the figure travels alone. */
  readonly headed: boolean
}

const MILLIMETRE = 72 / 25.4

export const SIZES: readonly Size[] = [
  {
    key: 'slide',
    label: 'slide 16:9',
    width: 960,
    height: 540,
    fixed: true,
    type: 23.5,
    least: 18,
    source: 'Advice for slides: 18 points at least (common practice); 13.333 × 7.5 inches',
    compact: false,
    dpi: 144,
    headed: false,
  },
  {
    key: 'column',
    label: 'journal, one column',
    width: 88 * MILLIMETRE,
    height: 52 * MILLIMETRE,
    fixed: false,
    type: 7.8,
    least: 6,
    source: '88 mm: Astronomy & Astrophysics, author pages; 6 points: common practice (Nature’s guide allows 5)',
    compact: true,
    dpi: 600,
    headed: false,
  },
  {
    key: 'two-columns',
    label: 'journal, two columns',
    width: 180 * MILLIMETRE,
    height: 62 * MILLIMETRE,
    fixed: false,
    type: 8,
    least: 6,
    source: '180 mm: Astronomy & Astrophysics, author pages; 6 points: common practice (Nature’s guide allows 5)',
    compact: false,
    dpi: 300,
    headed: false,
  },
  {
    key: 'poster',
    label: 'poster',
    width: 600 * MILLIMETRE,
    height: 270 * MILLIMETRE,
    fixed: false,
    type: 31,
    least: 24,
    source: '24 points: common practice',
    compact: false,
    dpi: 150,
    headed: false,
  },
  {
    key: 'card',
    label: 'preview card',
    width: 900,
    height: 472.5,
    fixed: true,
    type: 20,
    least: 14,
    source: '1200 × 630 pixels at 96 dots an inch; 14 points: tuned by eye',
    compact: false,
    dpi: 96,
    headed: true,
  },
]
