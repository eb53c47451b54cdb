/** From the fields of the form back to an address; whatever was typed arrives there, good or not, and the page judges it. */
import { FAMILIES } from '../dark-energy'
import * as own from '../scenario/parameters'
import { MOST_SCENARIOS } from '../scenario/query'
import { readScenario } from '../scenario/read'
import { writeScenario } from '../scenario/write'
import { CLOSES, LIGHT } from './fields'
import { placeKeys, readPlace } from './link'

/** Fields by name; `s` holds every scenario of the page, that in focus included. */
export interface Sent {
  readonly codes: readonly string[]
  readonly focus: string | undefined
  readonly theme: string | undefined
  readonly fields: ReadonlyMap<string, string>
}

export function composedLink({ codes, focus, theme, fields }: Sent): string {
  const kept = codes.length > 0 ? codes.slice(0, MOST_SCENARIOS) : ['']
  const place = readPlace(focus, theme, kept.length)
  const queries = kept.map((code, i) => `s=${addressed(i === place.focus ? codeOf(fields) : code)}`)
  return `/?${[...queries, ...placeKeys(place)].join('&')}`
}

/** Canonical where it can be read, as typed where not. */
function addressed(code: string): string {
  const reading = readScenario(code, null)
  if (reading.ok) return writeScenario(reading.value)
  return encodeURIComponent(code).replace(/%(3A|2C)/g, decodeURIComponent)
}

/** A scenario code with the keys that the choices of the form leave in force; an empty field is its default. */
export function codeOf(fields: ReadonlyMap<string, string>): string {
  const texts = fields.get(LIGHT) === 'none' ? new Map([...fields, [own.CMB.key, '0']]) : fields
  const pairs = keysOf(fields).flatMap((key) => {
    const text = written(key, texts.get(key) ?? '')
    return text === '' ? [] : [`${key}:${text}`]
  })
  return pairs.join(',')
}

function keysOf(fields: ReadonlyMap<string, string>): string[] {
  const family = FAMILIES.find((one) => one.key === fields.get(own.EOS.key))
  const keys = new Set((family?.parameters ?? []).map((one) => one.key))
  return [
    own.H0.key,
    own.MATTER.key,
    own.BARYONS.key,
    fields.get(CLOSES) === 'curvature' ? own.DARK.key : own.CURVATURE.key,
    ...lightKeys(fields.get(LIGHT)),
    own.EOS.key,
    ...keys,
    own.BEYOND.key,
    own.AS.key,
  ]
}

function lightKeys(light: string | undefined): string[] {
  if (light === 'given') return [own.RADIATION.key]
  return light === 'none' ? [own.CMB.key] : [own.CMB.key, own.NU.key, own.MASSES.key]
}

function written(key: string, typed: string): string {
  if (key === own.AS.key) return typed.trim().normalize('NFC')
  if (key === own.MASSES.key) return lists(typed)
  const list = FAMILIES.some((one) => one.parameters.some((p) => p.key === key && p.kind === 'list'))
  return list ? lists(typed) : plain(typed)
}

/** A number as a person types it: decimal comma, true minus sign, blanks between thousands. No comma is left to end a pair. */
function plain(typed: string): string {
  return typed
    .replace(/[\s\u2009\u202f\u00a0]/g, '')
    .replaceAll('−', '-')
    .replace(/^([^,]*),([^,]*)$/, '$1.$2')
    .replaceAll(',', ';')
}

/** Numbers parted by blanks, semicolons or underscores. */
function lists(typed: string): string {
  return typed
    .split(/[\s;_]+/)
    .filter((part) => part !== '')
    .map(plain)
    .join('_')
}
