/** `/api/qr`: the link of scenarios as a QR code. */
import { fileName } from '../formats/file-name'
import { MOST_BYTES, type QrCode, qrCode } from '../print/qr'
import { type Fault, fault, problemsOf } from '../scenario/problems'
import type { Reading } from '../scenario/scenario'
import { linkQuery } from '../scenario/write'
import { ENGINE } from '../solve'
import { oneOf, site, take } from './fields'
import { readKeys, SCENARIO } from './keys'
import type { Pairs, Question } from './question'
import { scenariosOf } from './question'
import type { Home } from './table'

export const QR_FORMATS = [
  { key: 'svg', mediaType: 'image/svg+xml' },
  { key: 'png', mediaType: 'image/png' },
] as const

export const QR_FIELDS = {
  format: oneOf('format', QR_FORMATS, 'The format of the file.'),
  base: site('base', 'Where the link leads: the address of a site. Needed where the server does not know its own.'),
}

export interface QrFile {
  readonly mediaType: string
  readonly format: (typeof QR_FORMATS)[number]['key']
  readonly fileName: string
  readonly code: QrCode
}

export function askQr(pairs: Pairs, home: Home): Reading<Question<QrFile>> {
  const keys = readKeys(pairs, Object.keys(QR_FIELDS))
  const faults: Fault[] = [...keys.faults]
  const format = take(keys.values, 'format', QR_FIELDS.format, faults) ?? QR_FORMATS[0]
  const asked = take(keys.values, 'base', QR_FIELDS.base, faults)
  const base = asked ?? home.base
  if (base === '' && !keys.values.has('base')) {
    faults.push(fault('base', '', 'an address such as https://a.example', 'The server does not know its own address.'))
  }
  const scenarios = scenariosOf(keys.codes, faults)
  if (!scenarios.ok) return scenarios
  const link = `${base}/?${linkQuery(scenarios.value)}&engine=${ENGINE}`
  const code = qrCode(link)
  if (code === null) return { ok: false, problems: problemsOf([tooLong(link)], null) }
  const names = scenarios.value.flatMap(({ name }) => name ?? [])
  const file = { ...format, format: format.key, fileName: fileName([...names, 'qr'], format.key), code }
  return {
    ok: true,
    value: {
      canonical: `link=${encodeURIComponent(link)}&format=${format.key}`,
      answer: () => ({ ok: true, value: file }),
    },
  }
}

const tooLong = (link: string): Fault =>
  fault(
    SCENARIO,
    link,
    `a link of at most ${MOST_BYTES} characters`,
    `The link has ${link.length} characters, more than a QR code holds. Fewer or shorter scenarios fit.`,
  )
