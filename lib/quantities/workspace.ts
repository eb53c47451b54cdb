/** Arrays that are used again for one block after another. */

export interface Workspace {
  /** An array that nobody else has before `clear`. */
  take(): Float64Array
  /** Everything taken may be taken anew. */
  clear(): void
}

const spare: Workspace[] = []

export const BLOCK_SIZE = 512

/** To be given back. */
export const borrowWorkspace = (): Workspace => spare.pop() ?? workspace()

export const returnWorkspace = (one: Workspace): void => void spare.push(one)

function workspace(): Workspace {
  const arrays: Float64Array[] = []
  let taken = 0
  return {
    take: () => {
      if (taken === arrays.length) arrays.push(new Float64Array(BLOCK_SIZE))
      return arrays[taken++]
    },
    clear: () => {
      taken = 0
    },
  }
}
