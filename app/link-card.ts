/** What other sites show of a pasted link: title, verdict and the figure. Only where the server knows its own address. */
import type { Metadata } from 'next'
import type { Explorer, ScenarioView } from '../lib/answers/explorer'
import { lowered } from '../lib/words/sentence'
import { HOME } from './api/home'

export function linkCard({ title, scenarios, links, place, long }: Explorer): Metadata {
  const { base } = HOME
  if (base === '') return {}
  const query = links.data.split('?')[1]
  const theme = place.theme === 'night' ? '&theme=night' : ''
  const focus = place.focus > 0 ? `&focus=${place.focus + 1}` : ''
  const image = {
    url: `${base}/api/figure?${query}&size=card&format=png${focus}${theme}`,
    width: 1200,
    height: 630,
    alt: long.figure.alternative,
  }
  const description = verdictIn(scenarios, place.focus)
  const page = `${base}/?${query}`
  return {
    openGraph: { type: 'website', siteName: 'Longhence', title, description, url: page, images: [image] },
    twitter: { card: 'summary_large_image', title, description, images: [image] },
    alternates: { types: { 'application/json+oembed': `${base}/api/oembed?url=${encodeURIComponent(page)}` } },
  }
}

/** On the scenario in focus, which is named where it is one of several. */
function verdictIn(scenarios: readonly ScenarioView[], focus: number): string {
  const chosen = scenarios[focus]
  const verdict = chosen?.verdict.sentences.join(' ') ?? ''
  return scenarios.length > 1 ? `${chosen?.name}: ${lowered(verdict)}` : verdict
}
