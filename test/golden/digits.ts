/** The numbers of a scenario that are kept for ever, by name. */
import { readFileSync } from 'node:fs'
import { atAnswer } from '../../lib/answers/at'
import { COLUMNS } from '../../lib/quantities/columns'
import { readScenario } from '../../lib/scenario/read'
import { type Solution, solve } from '../../lib/solve'

/** A number, the word for what stands in its place, or nothing; and the bound on the error of a number, where one is stated. */
export interface Digit {
  readonly value: number | string | null
  readonly error: number
}
export type Digits = Readonly<Record<string, Digit>>

export const CODES: readonly string[] = readFileSync(new URL('codes.txt', import.meta.url), 'utf8')
  .split('\n')
  .filter((line) => line !== '' && !line.startsWith('#'))

const EPOCHS = [
  { variable: 'z', values: [0.5, 1100] },
  { variable: 'time', values: [5] },
] as const

export function digitsOf(code: string): Digits {
  const reading = readScenario(decodeURIComponent(code), 0)
  if (!reading.ok) throw new Error(`${code}: ${JSON.stringify(reading.problems)}`)
  const solution = solve(reading.value)
  return { ...whole(solution), ...Object.assign({}, ...EPOCHS.map((one) => columnsAt(solution, one))) }
}

function whole({ origin, end, measures, moments }: Solution): Digits {
  const bare = (value: Digit['value']): Digit => ({ value, error: 0 })
  return {
    origin: bare(origin.kind),
    'origin time': bare(origin.time),
    'origin scale': bare(origin.scale),
    end: bare(end.kind),
    'end time': bare(end.time),
    'end scale': bare(end.scale),
    'turnaround time': bare(end.turnaround?.time ?? null),
    'turnaround scale': bare(end.turnaround?.scale ?? null),
    ...Object.fromEntries(moments.map(({ kind, time }, i) => [`moment ${i + 1} ${kind}`, bare(time)])),
    ...Object.fromEntries(
      Object.entries(measures).map(([key, { value, error }]) => [key, { value, error: error ?? 0 }]),
    ),
  }
}

function columnsAt(solution: Solution, { variable, values }: (typeof EPOCHS)[number]): Digits {
  const asked = { variable, values, branch: 'expanding', columns: COLUMNS, bounds: true } as const
  const [{ columns, rows }] = atAnswer([solution], asked).scenarios
  const at = (row: readonly (number | null)[], name: string) => row[columns.findIndex((column) => column.name === name)]
  return Object.fromEntries(
    rows.flatMap((row, i) =>
      COLUMNS.map(({ key }) => [
        `${key} at ${variable} ${values[i]}`,
        { value: at(row, key), error: at(row, `${key}Error`) ?? 0 },
      ]),
    ),
  )
}
