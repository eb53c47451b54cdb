import type { Metadata } from 'next'
import { cache } from 'react'
import { explorer, type Explorer as View } from '../lib/answers/explorer'
import { rulerOf } from '../lib/answers/ruler-view'
import { SHELF } from '../lib/answers/shelf'
import { takeAwayLists } from '../lib/answers/take-away'
import { HOME } from './api/home'
import { EDITION } from './edition'
import { Explorer, type Load } from './explorer'
import { all, type PageProps, queryOf } from './keys'
import { linkCard } from './link-card'
import { askedOf } from './live/fetch-view'
import { packed } from './live/packed'
import { OlderEngine } from './ui/older-engine'
import { Ruler } from './ui/ruler'

const LISTS = takeAwayLists(HOME.base)

export async function generateMetadata(props: PageProps): Promise<Metadata> {
  const view = await read(props)
  return {
    title: { absolute: `${view.title} · Longhence` },
    description: view.long.figure.alternative,
    ...linkCard(view),
  }
}

export default async function Page(props: PageProps) {
  const { s, ...others } = await props.searchParams
  const ruler = rulerOf(all(s), (key) => all(others[key])[0])
  const view = await read(props)
  const asked = askedOf(`${await queryOf(props)}`, null)
  const load = packed<Load>({ initial: view, ruler, shelf: SHELF, lists: LISTS, edition: EDITION })
  return (
    <>
      <OlderEngine asked={all(others.engine)[0]} today={EDITION.engine} />
      <Explorer load={load} asked={asked}>
        <Ruler desk={view} view={ruler} shelf={SHELF} hand={null} />
      </Explorer>
    </>
  )
}

/** Once for a request: the page and its metadata read the same. */
const explorerOf = cache((codes: string, keys: string) =>
  explorer({ codes: JSON.parse(codes), keys: new Map(JSON.parse(keys)) }),
)

async function read({ searchParams }: PageProps): Promise<View> {
  const { s, ...others } = await searchParams
  const keys = Object.entries(others).map(([key, value]) => [key, all(value)[0] ?? ''])
  return explorerOf(JSON.stringify(all(s)), JSON.stringify(keys))
}
