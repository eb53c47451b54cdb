import type { Solution } from '../solve'

/** The part of a solution that the words need. */
export type Told = Pick<Solution, 'scenario' | 'budget' | 'origin' | 'end' | 'measures' | 'moments'>
