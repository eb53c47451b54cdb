/** A legal scenario that has no solution, or whose solution costs more than it may. */

export interface Unsolvable extends Error {
  readonly name: 'Unsolvable'
  /** Key of the scenario code that the message speaks of. */
  readonly parameter: string
}

export function unsolvable(message: string, parameter = 'dark'): Unsolvable {
  return Object.assign(new Error(message), { name: 'Unsolvable' as const, parameter })
}

export const overBudget = (message: string): Unsolvable =>
  unsolvable(`${message} This scenario is over its budget of computation.`, COSTS)

/** What costs too much is the field. */
const COSTS = 'eos'

/** Whether there might be a solution, for all that is known. */
export const isOverBudget = ({ parameter }: Unsolvable): boolean => parameter === COSTS

export const isUnsolvable = (error: unknown): error is Unsolvable =>
  error instanceof Error && error.name === 'Unsolvable'
