/** One change at the desk: the address it leads to, or what is wrong with it. */
import { readScenario } from '../scenario/read'
import type { Problem } from '../scenario/scenario'
import { codeOf, composedLink } from './compose'
import type { Desk } from './desk'
import { type Field, unitText } from './fields'
import { typeset } from './number'

export type Edited = { readonly ok: true; readonly link: string } | { readonly ok: false; readonly complaint: string }

/** `name` is that of a field of the form, `text` as typed or chosen. */
export function edited(desk: Desk, name: string, text: string): Edited {
  const fields = new Map([...fieldsOf(desk), [name, text]])
  const reading = readScenario(codeOf(fields), null)
  if (!reading.ok) return { ok: false, complaint: complaintOf(reading.problems[0] as Problem, shownFields(desk)) }
  const { place, scenarios } = desk
  const codes = scenarios.map(({ plainCode }) => plainCode)
  return { ok: true, link: composedLink({ codes, place, fields }) }
}

/** The same in the middle of a drag, which stops at the last step before what the other fields do not allow. */
export function dragged(desk: Desk, name: string, text: string): Edited {
  const asked = edited(desk, name, text)
  const field = shownFields(desk).find((one) => one.name === name)
  if (asked.ok || field?.kind !== 'number') return asked
  const { step } = field.slider
  let [stop, good, bad] = [asked as Edited, Number(field.value), Number(text)]
  while (Math.abs(bad - good) > 1.5 * step) {
    const middle = Number((Math.round((good + bad) / 2 / step) * step).toPrecision(12))
    const tried = edited(desk, name, String(middle))
    if (tried.ok) [stop, good] = [tried, middle]
    else bad = middle
  }
  return stop
}

function fieldsOf(desk: Desk): [string, string][] {
  return [...desk.form.hidden, ...shownFields(desk)].map(({ name, value }) => [name, value])
}

function shownFields({ form }: Desk): readonly Field[] {
  return form.groups.flatMap(({ fields }) => fields)
}

/** In the words of the form instead of those of the code. */
function complaintOf({ parameter, message, allowed }: Problem, fields: readonly Field[]): string {
  const label = fields.find(({ name }) => name === parameter)?.label
  const said = label && message.startsWith(`${parameter} `) ? `${label}${message.slice(parameter.length)}` : message
  return `${said.charAt(0).toUpperCase()}${said.slice(1)} Allowed: ${typeset(unitText(allowed)).replace(' joined by _', '')}.`
}
