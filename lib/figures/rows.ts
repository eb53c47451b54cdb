/** Names one below the other in the order of what they name: their places are chosen together, so that none runs out of room. */

export interface Row {
  readonly height: number
  /** What it costs to stand with its upper edge here; finite. */
  readonly cost: (y: number) => number
}

/** Distance of the places that are tried, in pixels. */
const STEP = 4
const NONE = -1

/** Upper edges from `top` on such that the costs add up to the least there is, while all end above `bottom`. */
export function rowsOf(rows: readonly Row[], top: number, bottom: number): readonly number[] {
  const tall = Math.max(...rows.map(({ height }) => height))
  const places = Array.from(
    { length: Math.max(1, Math.floor((bottom - tall - top) / STEP) + 1) },
    (_, k) => top + k * STEP,
  )
  let sums: readonly number[] = places.map(() => 0)
  const before = rows.map(({ cost }, i) => {
    const apart = i === 0 ? 0 : Math.ceil((rows[i - 1] as Row).height / STEP)
    const cheapest = cheapestUpTo(sums)
    const from = places.map((_, k) => cheapest[k - apart] ?? NONE)
    const last = sums
    sums = places.map((y, k) =>
      from[k] === NONE ? Number.POSITIVE_INFINITY : (last[from[k] as number] as number) + cost(y),
    )
    return from
  })
  return traced(before, cheapestUpTo(sums).at(-1) ?? 0).map((k) => places[k] as number)
}

/** For each place the cheapest of those up to it. */
function cheapestUpTo(sums: readonly number[]): readonly number[] {
  let best = 0
  return sums.map((sum, k) => {
    if (sum < (sums[best] as number)) best = k
    return best
  })
}

/** Back from the place of the last row; where there is no room for all, the rest share the first place. */
function traced(before: readonly (readonly number[])[], last: number): readonly number[] {
  const chosen: number[] = []
  let k = last
  for (const from of [...before].reverse()) {
    chosen.unshift(k)
    k = Math.max(0, from[k] as number)
  }
  return chosen
}
