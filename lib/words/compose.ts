/** From the fields of the form back to an address; whatever was typed arrives there, good or not, and the page judges it. */
import * as own from '../scenario/parameters'
import { renamed } from '../scenario/published-names'
import { MOST_SCENARIOS } from '../scenario/query'
import { readScenario } from '../scenario/read'
import { writeScenario } from '../scenario/write'
import { familyTexts } from './compose-family'
import { CLOSES, LIGHT } from './fields'
import { type Place, placeKeys } from './place'
import { listText, numberText } from './typed'

/** Fields by name; `s` holds every scenario of the page, that in focus included. */
export interface Sent {
  readonly codes: readonly string[]
  readonly place: Place
  readonly fields: ReadonlyMap<string, string>
}

export function composedLink({ codes, place, fields }: Sent): string {
  const kept = codes.length > 0 ? codes.slice(0, MOST_SCENARIOS) : ['']
  const queries = kept.map((code, i) => `s=${i === place.focus ? changed(code, codeOf(fields)) : addressed(code)}`)
  return `/?${[...queries, ...placeKeys(place)].join('&')}`
}

/** The scenario in focus as it was, and as the fields say. */
function changed(before: string, after: string): string {
  const [one, other] = [readScenario(before, null), readScenario(after, null)]
  return one.ok && other.ok ? writeScenario(renamed(one.value, other.value)) : addressed(after)
}

/** Canonical where it can be read, as typed where not. */
export function addressed(code: string): string {
  const reading = readScenario(code, null)
  if (reading.ok) return writeScenario(reading.value)
  return encodeURIComponent(code).replace(/%(3A|2C)/g, decodeURIComponent)
}

/** A scenario code with the keys that the choices of the form leave in force; an empty field is its default. */
export function codeOf(fields: ReadonlyMap<string, string>): string {
  const texts = new Map([...fields, ...noLight(fields), ...familyTexts(fields)])
  const pairs = keysOf(fields).flatMap((key) => {
    const text = written(key, texts.get(key) ?? '')
    return text === '' ? [] : [`${key}:${text}`]
  })
  return pairs.join(',')
}

function keysOf(fields: ReadonlyMap<string, string>): string[] {
  return [
    own.H0.key,
    own.MATTER.key,
    own.BARYONS.key,
    fields.get(CLOSES) === 'curvature' ? own.DARK.key : own.CURVATURE.key,
    ...lightKeys(fields.get(LIGHT)),
    own.EOS.key,
    ...familyTexts(fields).keys(),
    own.BEYOND.key,
    own.AS.key,
  ]
}

function noLight(fields: ReadonlyMap<string, string>): [string, string][] {
  return fields.get(LIGHT) === 'none' ? [[own.CMB.key, '0']] : []
}

function lightKeys(light: string | undefined): string[] {
  if (light === 'given') return [own.RADIATION.key]
  return light === 'none' ? [own.CMB.key] : [own.CMB.key, own.NU.key, own.MASSES.key]
}

function written(key: string, text: string): string {
  if (key === own.AS.key) return text.trim().normalize('NFC')
  return key === own.MASSES.key ? listText(text) : numberText(text)
}
