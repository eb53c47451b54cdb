/** Numbers as people type them, in the form of the scenario code. Nothing is judged here. */

/** Decimal comma, true minus sign, blanks between thousands. No comma is left to end a pair. */
export function numberText(typed: string): string {
  return typed
    .replace(/[\s\u2009\u202f\u00a0]/g, '')
    .replaceAll('−', '-')
    .replace(/^([^,]*),([^,]*)$/, '$1.$2')
    .replaceAll(',', ';')
}

/** Numbers parted by blanks, semicolons or underscores. */
export function listText(typed: string): string {
  return typed
    .split(/[\s;_]+/)
    .filter((part) => part !== '')
    .map(numberText)
    .join('_')
}
