/** What can be taken away, as data for the page: it needs names and keys, not what makes the files. */
import { VIEWS } from '../figures/views'
import { FORMATS } from '../formats'
import { SIZES } from '../print/sizes'
import { FIGURE_FORMATS } from './figure'
import { QR_FORMATS } from './qr'

const named = ({ key, label }: { readonly key: string; readonly label: string }) => ({ key, label })
const upper = ({ key }: { readonly key: string }) => ({ key, label: key.toUpperCase() })

export interface Choice {
  readonly key: string
  readonly label: string
}

export interface TakeAwayLists {
  /** What stands before the paths of links; empty where the server does not know it. */
  readonly base: string
  /** Views below the long one, the default first. */
  readonly views: readonly Choice[]
  readonly sizes: readonly Choice[]
  readonly figures: readonly Choice[]
  readonly tables: readonly Choice[]
  readonly codes: readonly Choice[]
}

export const takeAwayLists = (base: string): TakeAwayLists => ({
  base,
  views: VIEWS.map(({ key, title }) => ({ key, label: title })),
  sizes: SIZES.map(named),
  figures: FIGURE_FORMATS.map(upper),
  tables: FORMATS.map(named),
  codes: QR_FORMATS.map(upper),
})
