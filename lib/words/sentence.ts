/** Joining words. */

/** `one`, `one and two`, `one, two and three`; before a last part that has an `and` of its own stands a comma. */
export function joined(parts: readonly string[]): string {
  const last = parts.at(-1) ?? ''
  if (parts.length < 2) return last
  return parts.slice(0, -1).join(', ') + (last.includes(' and ') ? ', ' : ' and ') + last
}

export function capital(text: string): string {
  return `${text.charAt(0).toUpperCase()}${text.slice(1)}`
}

export function lowered(text: string): string {
  return `${text.charAt(0).toLowerCase()}${text.slice(1)}`
}
