/** One change at the desk: the address it leads to, or what is wrong with it. */
import { readScenario } from '../scenario/read'
import type { Problem } from '../scenario/scenario'
import { codeOf, composedLink } from './compose'
import type { Desk } from './desk'

export type Edited =
  | { readonly ok: true; readonly link: string }
  | { readonly ok: false; readonly problems: readonly Problem[] }

/** `name` is that of a field of the form, `text` as typed or chosen. */
export function edited(desk: Desk, name: string, text: string): Edited {
  const fields = new Map([...fieldsOf(desk), [name, text]])
  const reading = readScenario(codeOf(fields), null)
  if (!reading.ok) return reading
  const { place, scenarios } = desk
  const codes = scenarios.map(({ plainCode }) => plainCode)
  const focus = String(place.focus + 1)
  return { ok: true, link: composedLink({ codes, focus, theme: place.theme ?? undefined, fields }) }
}

function fieldsOf({ form }: Desk): [string, string][] {
  const shown = form.groups.flatMap(({ fields }) => fields)
  return [...form.hidden, ...shown].map(({ name, value }) => [name, value])
}
