/** Names of downloaded files that every system takes: lower-case ASCII letters, digits and hyphens, never a device's name. */

const LONGEST = 60

/** `titles` may be anything that people type. */
export function fileName(titles: readonly string[], extension: string): string {
  const words = titles
    .join(' ')
    .normalize('NFKD')
    .toLowerCase()
    .replace(/\p{M}/gu, '')
    .replace(/[^a-z0-9]+/g, '-')
  const name = `longhence-${words}`.slice(0, LONGEST).replace(/-+/g, '-').replace(/-$/, '')
  return `${name}.${extension}`
}
