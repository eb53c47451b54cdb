import type { Metadata } from 'next'
import { cache } from 'react'
import { explorer, type Explorer as View } from '../lib/answers/explorer'
import { EDITION } from './edition'
import { Explorer } from './explorer'

interface Props {
  readonly searchParams: Promise<Readonly<Record<string, string | string[] | undefined>>>
}

export async function generateMetadata(props: Props): Promise<Metadata> {
  const view = await read(props)
  return { title: { absolute: `${view.title} · Longhence` }, description: view.figure.alternative }
}

export default async function Page(props: Props) {
  return <Explorer initial={await read(props)} edition={EDITION} />
}

/** Once for a request: the page and its metadata read the same. */
const explorerOf = cache((codes: string, focus: string | undefined, theme: string | undefined) =>
  explorer({ codes: JSON.parse(codes), focus, theme }),
)

async function read({ searchParams }: Props): Promise<View> {
  const { s, focus, theme } = await searchParams
  return explorerOf(JSON.stringify(all(s)), all(focus)[0], all(theme)[0])
}

function all(value: string | string[] | undefined): readonly string[] {
  return value === undefined ? [] : [value].flat()
}
