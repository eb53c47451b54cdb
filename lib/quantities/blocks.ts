/** The instants at many values of a variable, block by block. */
import type { Arm } from '../history/arm'
import { type Event, isEvent } from '../history/event'
import { farthestOf } from '../history/place'
import { listOf } from '../numerics/list'
import { type Block, blockFrom } from './block'
import { type ColumnSubject, eventAt, type Variable } from './instant'
import type { Workspace } from './workspace'

/** Values that follow one another: a block, or so many that lie outside the history. */
export type Run = Block | { readonly count: number; readonly arm: null }

export const isBlock = (run: Run): run is Block => run.arm !== null

interface Sheet {
  readonly subject: ColumnSubject
  readonly variable: Variable
  readonly values: Float64Array
  readonly count: number
  readonly workspace: Workspace
}

/** Runs of the first `count` values, in their order, on the expanding branch; each is gone when the next is asked for. */
export function* runsAlong(sheet: Sheet): Generator<Run> {
  const next = sheet.variable === 'z' || sheet.variable === 'scale' ? nextByScale : nextByTime
  for (let i = 0; i < sheet.count; ) {
    sheet.workspace.clear()
    const run = next(sheet, i)
    yield run
    i += run.count
  }
}

/** The arrays of a block that is being made. */
function arraysOf({ workspace }: Sheet) {
  const take = workspace.take
  return { N: take(), inverseScale: take(), panel: take(), s: take(), scale: take(), redshift: take() }
}

/** What is known of a redshift or a scale factor, written at one place. */
type Reader = (arrays: ReturnType<typeof arraysOf>, values: Float64Array, from: number, count: number) => void

const readRedshifts: Reader = ({ N, scale, redshift, inverseScale }, values, from, count) => {
  for (let i = 0; i < count; i++) {
    const z = values[from + i]
    N[i] = -Math.log1p(z)
    redshift[i] = z
    scale[i] = 1 / (1 + z)
    inverseScale[i] = 1 + z
  }
}

const readScales: Reader = ({ N, scale, redshift, inverseScale }, values, from, count) => {
  for (let i = 0; i < count; i++) {
    const a = values[from + i]
    N[i] = Math.log(a)
    scale[i] = a
    redshift[i] = (1 - a) / a
    inverseScale[i] = 1 / a
  }
}

function nextByScale(sheet: Sheet, first: number): Run {
  const { subject, variable, values } = sheet
  const arrays = arraysOf(sheet)
  const { N } = arrays
  const read = variable === 'z' ? readRedshifts : readScales
  read(arrays, values, first, sheet.count - first)
  const past = N[0] <= 0
  const arm = past ? subject.history.past : subject.history.future
  const reach = farthestOf(arm)
  const outside = Math.abs(N[0]) > reach
  let count = 1
  while (first + count < sheet.count && N[count] <= 0 === past && Math.abs(N[count]) > reach === outside) count++
  if (outside) return { count, arm: null }
  placeInto(arrays.panel, arrays.s, N, arm, count)
  const { take } = sheet.workspace
  const phase = past ? 'past' : 'future'
  return blockFrom(arrays, { subject, phase, arm, sign: 1, swings: 0, count, given: {}, asked: null, take })
}

/** The panels of places and the variables there; from one place to the next the panel is seldom another. */
function placeInto(panel: Float64Array, s: Float64Array, N: Float64Array, arm: Arm, count: number): void {
  const { edges, panels } = arm
  const last = panels.length
  const plain = listOf(panels, ({ zone }) => zone.plain === true)
  let k = 0
  for (let i = 0; i < count; ) {
    let m = Math.abs(N[i])
    while (k > 0 && edges[k] > m) k--
    while (k < last && edges[k + 1] <= m) k++
    const inner = edges[k]
    const outer = k < last ? edges[k + 1] : Number.POSITIVE_INFINITY
    const isPlain = plain[k]
    do {
      panel[i] = k
      if (k === last) s[i] = m - inner
      else s[i] = isPlain ? m : panels[k].zone.variableAt(m)
      if (++i === count) return
      m = Math.abs(N[i])
    } while (m >= inner && m < outer)
  }
}

function nextByTime(sheet: Sheet, first: number): Run {
  const { subject, variable, values, count } = sheet
  const start = eventAt(subject, variable, values[first], 'expanding')
  const arrays = arraysOf(sheet)
  const asked = sheet.workspace.take()
  let [i, found] = [first, start]
  while (isEvent(start) ? isEvent(found) && goesOn(start, found) : !isEvent(found)) {
    if (isEvent(found)) write(arrays, i - first, found)
    asked[i - first] = values[i]
    if (++i === count) break
    found = eventAt(subject, variable, values[i], 'expanding')
  }
  if (!isEvent(start)) return { count: i - first, arm: null }
  const { phase, sign, swings, place } = start
  const given = { [variable]: asked }
  const { take } = sheet.workspace
  return blockFrom(arrays, {
    subject,
    phase,
    arm: place.arm,
    sign,
    swings,
    count: i - first,
    given,
    asked: variable as 'time' | 'age',
    take,
  })
}

const goesOn = (one: Event, next: Event): boolean =>
  one.phase === next.phase && one.place.arm === next.place.arm && one.sign === next.sign && one.swings === next.swings

function write(arrays: ReturnType<typeof arraysOf>, at: number, { place }: Event): void {
  arrays.N[at] = place.N
  arrays.panel[at] = place.panel
  arrays.s[at] = place.s
  arrays.scale[at] = Math.exp(place.N)
  arrays.redshift[at] = Math.expm1(-place.N)
  arrays.inverseScale[at] = Math.exp(-place.N)
}
