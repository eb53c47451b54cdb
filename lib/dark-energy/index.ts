/** The list of dark-energy families. A new one is one file and one line here. */
import { ba } from './ba'
import { barotropic } from './barotropic'
import { chaplygin } from './chaplygin'
import { constant } from './constant'
import { cpl } from './cpl'
import { field } from './field'
import { jbp } from './jbp'
import { lambda } from './lambda'
import type { Family } from './law'
import { logarithmic } from './logarithmic'
import { nodes } from './nodes'

export const FAMILIES: readonly Family[] = [
  lambda,
  constant,
  cpl,
  jbp,
  ba,
  logarithmic,
  nodes,
  barotropic,
  chaplygin,
  field,
]

/** The family of a key that the reader has checked. */
export function familyOf(key: string): Family {
  const family = FAMILIES.find((one) => one.key === key)
  if (!family) throw new RangeError(`no dark-energy family is called ${key}`)
  return family
}
