import { memo, useState } from 'react'
import type { Picture, Shown } from '../../lib/figures/picture'
import { Cursor } from './cursor'
import { propertiesOf } from './drawing'

interface Props {
  readonly figure: Shown
  /** Class of each drawing's box. */
  readonly box: string
  /** What the cursor is called. */
  readonly label: string
  /** A link in which the ends of a range are missing, and one that leads back to the whole. */
  readonly template: string
  readonly reset: string | null
  /** For each curve where a click leads; null where it leads nowhere. */
  readonly links: readonly string[] | null
  /** Id of the frame that is seen; null until somebody can point at it. */
  readonly shown: string | null
}

/** A figure, drawn for some widths of which the page shows one. */
export const Plate = memo(function Plate({ figure, box, shown, ...rest }: Props) {
  return figure.pictures.map((picture) => (
    <Sheet key={picture.frame} figure={figure} picture={picture} box={box} live={picture.frame === shown} {...rest} />
  ))
})

type SheetProps = Omit<Props, 'shown'> & { readonly picture: Picture; readonly live: boolean }

const Sheet = memo(function Sheet({ figure, picture, box, live, ...rest }: SheetProps) {
  const [lit, light] = useState<number | null>(null)
  const tone = lit === null ? undefined : figure.curves[lit]?.tone
  return (
    <div className={`${box} ${picture.frame}`} data-lit={lit ?? undefined} data-tone={tone}>
      <Drawn picture={picture} />
      {live && <Cursor figure={figure} picture={picture} lit={lit} light={light} {...rest} />}
    </div>
  )
})

function Drawn({ picture: { attributes, parts } }: { readonly picture: Picture }) {
  return (
    // biome-ignore lint/a11y/noSvgWithoutTitle: its attributes say what it shows
    <svg {...propertiesOf(attributes)}>
      {parts.map((markup, i) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: they have no names, and their order stays
        <Part key={i} markup={markup} />
      ))}
    </svg>
  )
}

/** As text the browser reads it at once, and there is nothing in it for React to look after. What stays the same it leaves alone. */
const Part = memo(function Part({ markup }: { readonly markup: string }) {
  // biome-ignore lint/security/noDangerouslySetInnerHtml: our own drawing, in which every text is escaped
  return <g dangerouslySetInnerHTML={{ __html: markup }} />
})
