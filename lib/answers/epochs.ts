/** Which epochs and columns a request to `/api/at` asks for. */
import type { Branch } from '../history/event'
import type { Column } from '../quantities/column'
import { COLUMNS } from '../quantities/columns'
import { VARIABLES, type Variable } from '../quantities/instant'
import { type Fault, fault } from '../scenario/problems'
import { boundsFlag, columnList, numberList, oneOf, take } from './fields'
import { numberText } from './question'

const BRANCHES = [{ key: 'expanding' }, { key: 'contracting' }] as const satisfies readonly { key: Branch }[]
const ANY = Number.NEGATIVE_INFINITY
const ONE_VARIABLE = `exactly one of ${VARIABLES.join(', ')}`

export const AT_FIELDS = {
  z: numberList({ key: 'z', above: -1, unit: '' }, 'Redshifts.'),
  scale: numberList({ key: 'scale', above: 0, unit: '' }, 'Scale factors.'),
  time: numberList({ key: 'time', above: ANY, unit: 'Gyr' }, 'Times from now; the past is negative.'),
  age: numberList({ key: 'age', above: ANY, unit: 'Gyr' }, 'Times since the origin; negative before a bounce.'),
  branch: oneOf('branch', BRANCHES, 'With z or scale: the expansion that holds today, or the contraction.'),
  columns: columnList,
  bounds: boundsFlag,
}

export interface Epochs {
  readonly variable: Variable
  readonly values: readonly number[]
  readonly branch: Branch
  readonly columns: readonly Column[]
  /** Whether error bounds are asked for. */
  readonly bounds?: boolean
}

/** Adds to `faults`; where it does, the epochs are not those asked for. */
export function readEpochs(values: ReadonlyMap<string, string>, faults: Fault[]): Epochs {
  const asked = VARIABLES.filter((one) => values.has(one))
  const [variable = 'z', ...others] = asked
  if (asked.length === 0) faults.push(fault(variable, '', ONE_VARIABLE, 'The request names no epoch.'))
  for (const one of others)
    faults.push(fault(one, values.get(one) ?? '', ONE_VARIABLE, `${variable} is given already.`))
  const branch = take(values, 'branch', AT_FIELDS.branch, faults)
  if (branch && (variable === 'time' || variable === 'age')) {
    faults.push(fault('branch', branch.key, 'only with z or scale', `${variable} alone says which branch it is.`))
  }
  return {
    variable,
    values: take(values, variable, AT_FIELDS[variable], faults) ?? [],
    branch: branch?.key ?? 'expanding',
    columns: take(values, 'columns', AT_FIELDS.columns, faults) ?? COLUMNS,
    bounds: take(values, 'bounds', AT_FIELDS.bounds, faults)?.key === '1',
  }
}

export const epochsText = ({ variable, values, branch, columns, bounds }: Epochs): string =>
  `${variable}=${values.map(numberText).join(',')}&branch=${branch}&columns=${columns.map(({ key }) => key).join(',')}${bounds ? '&bounds=1' : ''}`
