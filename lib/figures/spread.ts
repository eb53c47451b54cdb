/** Moves things along a line as little as possible until none overlaps. */

export interface Wish {
  /** Where its middle wants to be. */
  readonly middle: number
  readonly length: number
}

/**
 * Middles in the order given, such that the things keep the order of their wishes, do not overlap and lie between
 * `low` and `high` where that fits. Least squares by pooling neighbours (Ayer et al. 1955, Ann. Math. Stat. 26, 641).
 */
export function spread(wishes: readonly Wish[], low: number, high: number): number[] {
  const order = wishes.map((_, i) => i).sort((i, j) => at(wishes, i).middle - at(wishes, j).middle)
  const starts: number[] = []
  let used = 0
  for (const i of order) {
    starts[i] = used
    used += at(wishes, i).length
  }
  const shifts = pooled(order.map((i) => at(wishes, i).middle - at(wishes, i).length / 2 - (starts[i] ?? 0)))
  const result: number[] = []
  order.forEach((i, rank) => {
    const shift = Math.max(low, Math.min(high - used, shifts[rank] ?? 0))
    result[i] = shift + (starts[i] ?? 0) + at(wishes, i).length / 2
  })
  return result
}

/** The nearest sequence that never falls. */
function pooled(values: readonly number[]): number[] {
  const blocks: { sum: number; count: number }[] = []
  for (const value of values) {
    blocks.push({ sum: value, count: 1 })
    for (let n = blocks.length; n > 1 && mean(at(blocks, n - 2)) > mean(at(blocks, n - 1)); n = blocks.length) {
      const last = blocks.pop()
      const kept = at(blocks, n - 2)
      if (last) blocks[n - 2] = { sum: kept.sum + last.sum, count: kept.count + last.count }
    }
  }
  return blocks.flatMap((block) => Array.from({ length: block.count }, () => mean(block)))
}

function mean({ sum, count }: { readonly sum: number; readonly count: number }): number {
  return sum / count
}

function at<T>(list: readonly T[], i: number): T {
  return list[i] as T
}
