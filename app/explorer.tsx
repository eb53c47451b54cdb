'use client'

import { type ReactNode, useDeferredValue, useEffect, useState } from 'react'
import type { Explorer as View } from '../lib/answers/explorer'
import type { RulerView } from '../lib/answers/ruler-view'
import type { Shelf } from '../lib/answers/shelf'
import type { TakeAwayLists } from '../lib/answers/take-away'
import { useAddress } from './live/address'
import { follow } from './live/follow'
import { type Packed, unpacked } from './live/packed'
import { tellViewsSeen, useExplorer } from './live/use-explorer'
import { useKeptFocus } from './live/use-kept-focus'
import { useShownFrame } from './live/use-shown-frame'
import { useStill } from './live/use-still'
import { useUnhurried } from './live/use-unhurried'
import { Figure } from './ui/figure'
import { type Edition, Footer } from './ui/footer'
import { Header } from './ui/header'
import { InSight } from './ui/in-sight'
import { Ingredients } from './ui/ingredients'
import { Measures } from './ui/measures'
import { Moments } from './ui/moments'
import { Refusal } from './ui/refusal'
import { RulerPlace } from './ui/ruler-place'
import { Status } from './ui/status'
import { TakeAway } from './ui/take-away'
import { Verdicts } from './ui/verdicts'
import { Views } from './ui/views'

/** What comes with the page. */
export interface Load {
  readonly initial: View
  readonly ruler: RulerView
  readonly shelf: Shelf
  readonly lists: TakeAwayLists
  readonly edition: Edition
}

interface Props {
  readonly load: Packed<Load>
  /** The question that it answers. */
  readonly asked: string
  /** The ruler as the server draws it. */
  readonly children: ReactNode
}

/** The page: complete as the server draws it, and alive from then on. */
export function Explorer({ load, asked, children }: Props) {
  const [{ initial, ruler, shelf, lists, edition }] = useState(() => unpacked(load))
  const address = useAddress()
  const frame = useShownFrame()
  const { view, desk, waiting, busy, trouble } = useExplorer(address, initial, asked, frame)
  const moving = address?.moving ?? false
  // The figure follows a hand at once, the rest as soon as there is time, and while it drags as often as it can be read.
  const later = useDeferredValue(useUnhurried(view, moving))
  // The ruler follows its own fields at once, and scenarios when the hand lets go.
  const dragged = useStill(desk.links.data, moving) !== desk.links.data
  const ruled = { desk: useStill(desk, dragged), address: useStill(address, dragged) }
  useTitle(view.title)
  useMeanings()
  useKeptFocus(moving)
  return (
    // biome-ignore lint/a11y: links stay links; what is caught here is the click that they get
    <div className="page" data-theme={desk.place.theme} onClick={address ? follow : undefined}>
      <Header desk={ruled.desk} depth={address?.depth} />
      <main id="scenarios" tabIndex={-1} aria-busy={busy || later !== view || undefined} data-shown={view.links.here}>
        <h1 className={initial.titled || view.titled ? undefined : 'spoken'}>{view.title}</h1>
        {view.refusal && <Refusal refusal={view.refusal} />}
        <div className="workbench">
          <InSight of={later} moving={moving} className="first-words">
            {({ scenarios, place }) => <Verdicts scenarios={scenarios} focus={place.focus} />}
          </InSight>
          <Figure view={view} shown={address && frame} />
          <div className="columns">
            <Ingredients
              key={`${desk.place.focus} ${desk.scenarios.length}`}
              desk={desk}
              still={ruled.desk}
              sets={shelf.sets}
              live={address !== null}
            />
            <InSight of={later} moving={moving} className="far of-moments">
              {(shown) => <Moments view={shown} />}
            </InSight>
            <InSight of={later} moving={moving} className="far of-measures">
              {(shown) => <Measures view={shown} />}
            </InSight>
          </div>
        </div>
        <InSight of={later} moving={moving} className="far of-views" told={tellViewsSeen}>
          {(shown) => <Views view={shown} shown={address && frame} />}
        </InSight>
        <RulerPlace {...ruled} initial={ruler} shelf={shelf} changed={waiting || view !== initial}>
          {children}
        </RulerPlace>
        <TakeAway desk={ruled.desk} lists={lists} version={edition.version} live={address !== null} />
      </main>
      <Footer data={ruled.desk.links.data} edition={edition} theme={desk.place.theme ?? undefined} />
      {address && <Status view={view} moving={moving} waiting={waiting} trouble={trouble} />}
    </div>
  )
}

/** What names and numbers mean, once there is time. */
function useMeanings(): void {
  useEffect(() => {
    import('./live/meanings').then(({ watchMeanings }) => watchMeanings()).catch(() => undefined)
  }, [])
}

function useTitle(title: string): void {
  useEffect(() => {
    document.title = `${title} · Longhence`
  }, [title])
}
