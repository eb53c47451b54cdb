/** Rules of a scenario's name. */
import { AS } from './parameters'
import { type Fault, fault } from './problems'

/** Controls, halves of surrogate pairs, and the characters that embed, override or isolate a direction of writing. */
export const FORBIDDEN = /[\p{Cc}\p{Cs}\u202A-\u202E\u2066-\u2069]/u

const ALLOWED = `${AS.least} to ${AS.most} characters, composed (Unicode NFC), none of them a control or direction override`

/** What is wrong with a name, or null. A name that is not NFC is refused: what opens must be what was written. */
export function nameFault(name: string): Fault | null {
  const message = complaint(name)
  return message === null ? null : fault(AS.key, name, ALLOWED, message)
}

function complaint(name: string): string | null {
  const length = [...name].length
  if (length < AS.least) return 'The name after `as` is empty.'
  if (length > AS.most) return `The name has ${length} characters; at most ${AS.most} fit.`
  if (FORBIDDEN.test(name)) return 'The name holds a control character or one that overrides the direction of writing.'
  if (name !== name.normalize('NFC')) return 'The name is not in composed form (Unicode NFC).'
  return null
}
