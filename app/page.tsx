import type { Metadata } from 'next'
import { cache } from 'react'
import { type Explorer, explorer } from '../lib/answers/explorer'
import { Figure } from './ui/figure'
import { Footer } from './ui/footer'
import { Header } from './ui/header'
import { Ingredients } from './ui/ingredients'
import { Measures } from './ui/measures'
import { Moments } from './ui/moments'
import { Refusal } from './ui/refusal'
import { Verdicts } from './ui/verdicts'

interface Props {
  readonly searchParams: Promise<Readonly<Record<string, string | string[] | undefined>>>
}

export async function generateMetadata(props: Props): Promise<Metadata> {
  const view = await read(props)
  return { title: { absolute: `${view.title} · Longhence` }, description: view.figure.alternative }
}

export default async function Page(props: Props) {
  const view = await read(props)
  return (
    <div className="page" data-theme={view.place.theme}>
      <Header themes={view.links.themes} theme={view.place.theme} />
      <main>
        <h1 className={view.titled ? undefined : 'spoken'}>{view.title}</h1>
        {view.refusal && <Refusal refusal={view.refusal} />}
        <Verdicts scenarios={view.scenarios} focus={view.place.focus} />
        <Figure view={view.figure} />
        <div className="columns">
          <Ingredients view={view} />
          <Moments view={view} />
          <Measures view={view} />
        </div>
      </main>
      <Footer data={view.links.data} />
    </div>
  )
}

/** Once for a request: the page and its metadata read the same. */
const explorerOf = cache((codes: string, focus: string | undefined, theme: string | undefined) =>
  explorer({ codes: JSON.parse(codes), focus, theme }),
)

async function read({ searchParams }: Props): Promise<Explorer> {
  const { s, focus, theme } = await searchParams
  return explorerOf(JSON.stringify(all(s)), all(focus)[0], all(theme)[0])
}

function all(value: string | string[] | undefined): readonly string[] {
  return value === undefined ? [] : [value].flat()
}
