/** `/api/oembed`: how a site that is given a link of ours shows it (oEmbed 1.0). */

import { FRAME_SIZE, frameHtml } from '../formats/frame'
import { DEMO } from '../scenario/demo'
import { type Fault, fault, problemsOf } from '../scenario/problems'
import { readQuery } from '../scenario/query'
import type { Reading } from '../scenario/scenario'
import { linkQuery } from '../scenario/write'
import { nameOf } from '../words/desk'
import { joined } from '../words/sentence'
import { count, oneOf, take, text } from './fields'
import { readKeys } from './keys'
import type { Pairs, Question } from './question'
import type { Home } from './table'

const FORMATS = [{ key: 'json' }] as const
const LARGEST = 10_000

export const OEMBED_FIELDS = {
  url: text('url', 'A link of this site.'),
  maxwidth: count('maxwidth', 1, LARGEST, 'Pixels that the frame may be wide.'),
  maxheight: count('maxheight', 1, LARGEST, 'Pixels that the frame may be high.'),
  format: oneOf('format', FORMATS, 'The format of the answer.'),
}

export interface OEmbed {
  readonly version: '1.0'
  readonly type: 'rich'
  readonly provider_name: string
  readonly provider_url: string
  readonly title: string
  readonly html: string
  readonly width: number
  readonly height: number
  readonly thumbnail_url: string
  readonly thumbnail_width: number
  readonly thumbnail_height: number
}

export function askOEmbed(pairs: Pairs, home: Home): Reading<Question<OEmbed>> {
  const keys = readKeys(pairs, Object.keys(OEMBED_FIELDS))
  const faults: Fault[] =
    keys.codes.length > 0
      ? [...keys.faults, fault('s', keys.codes[0], 'url', 'Scenarios stand within url.')]
      : [...keys.faults]
  const url = take(keys.values, 'url', OEMBED_FIELDS.url, faults)
  take(keys.values, 'format', OEMBED_FIELDS.format, faults)
  const width = Math.min(
    FRAME_SIZE.width,
    take(keys.values, 'maxwidth', OEMBED_FIELDS.maxwidth, faults) ?? FRAME_SIZE.width,
  )
  const height = Math.min(
    FRAME_SIZE.height,
    take(keys.values, 'maxheight', OEMBED_FIELDS.maxheight, faults) ?? FRAME_SIZE.height,
  )
  const link = url === undefined ? null : linkAt(url, home)
  if (link === null) faults.push(urlFault(url, home))
  if (faults.length > 0 || link === null) return { ok: false, problems: problemsOf(faults, null) }
  const value = answerOf(link, { width, height }, home)
  return {
    ok: true,
    value: {
      canonical: `${link.query}&width=${width}&height=${height}`,
      answer: () => ({ ok: true, value }),
    },
  }
}

function urlFault(url: string | undefined, { base }: Home): Fault {
  const allowed = `a link that begins with ${base === '' ? 'the address of this site' : base}`
  const why =
    base === '' ? 'The server does not know its own address.' : 'This is no link of scenarios that can be read.'
  return fault('url', url ?? '', allowed, url === undefined ? 'url is missing.' : why)
}

interface Link {
  readonly title: string
  /** The scenarios, as a query. */
  readonly query: string
}

/** Null for what is no link of ours. */
function linkAt(url: string, { base }: Home): Link | null {
  const [path, query = ''] = url.split(/\?(.*)/s)
  if (base === '' || ![base, `${base}/`, `${base}/embed`].includes(path)) return null
  const codes = new URLSearchParams(query.replace(/#.*/, '')).getAll('s')
  const reading = readQuery(codes)
  if (!reading.ok) return null
  const title = codes.length === 0 ? DEMO.title : joined(reading.value.map(nameOf))
  return { title, query: linkQuery(reading.value) }
}

function answerOf(
  { title, query }: Link,
  { width, height }: { width: number; height: number },
  { base }: Home,
): OEmbed {
  return {
    version: '1.0',
    type: 'rich',
    provider_name: 'Longhence',
    provider_url: `${base}/`,
    title,
    html: frameHtml(`${base}/embed?${query}`, title, { width, height }),
    width,
    height,
    thumbnail_url: `${base}/api/figure?${query}&format=png&size=card`,
    thumbnail_width: 1200,
    thumbnail_height: 630,
  }
}
