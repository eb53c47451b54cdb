/** Random tests draw the same cases each time, so that a failure is a change; SEED=random, or a number, draws others. */
import fc from 'fast-check'

const { SEED } = process.env
if (SEED !== 'random') fc.configureGlobal({ seed: Number(SEED ?? 1) })
