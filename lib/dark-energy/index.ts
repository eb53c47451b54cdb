/** The list of dark-energy families. A new one is one file and one line here. */
import { constant } from './constant'
import { cpl } from './cpl'
import { lambda } from './lambda'
import type { Family } from './law'

export const FAMILIES: readonly Family[] = [lambda, constant, cpl]

/** The family of a key that the reader has checked. */
export function familyOf(key: string): Family {
  const family = FAMILIES.find((one) => one.key === key)
  if (!family) throw new RangeError(`no dark-energy family is called ${key}`)
  return family
}
