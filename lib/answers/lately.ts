/** What was made lately, by its text: a hand changes one of several scenarios, and the others stay what they are. */
import { LRUCache } from 'lru-cache'

/** More than the six of a page and those that their links lead to. */
const MOST = 24

/** Equal texts must have equal answers. What throws is not kept. */
export function lately<Subject, Made>(textOf: (subject: Subject) => string, make: (subject: Subject) => Made) {
  const known = new LRUCache<string, { readonly made: Made }>({ max: MOST })
  return (subject: Subject): Made => {
    const text = textOf(subject)
    const found = known.get(text)
    if (found) return found.made
    const made = make(subject)
    known.set(text, { made })
    return made
  }
}
