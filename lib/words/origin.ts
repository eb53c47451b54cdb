/** How a history begins, as a clause without a subject. */
import { duration, size } from './time'
import type { Told } from './told'

export function originClause({ origin }: Pick<Told, 'origin'>): string {
  const ago = origin.time === null ? 'infinitely long ago' : `${duration(-origin.time)} ago`
  const scale = `${size(origin.scale)} times today’s size`
  switch (origin.kind) {
    case 'big-bang':
      return `begins in a Big Bang ${ago}`
    case 'bounce':
      return `contracts from the infinite past, bounces ${ago} at ${scale}`
    case 'eternal':
      return 'has expanded for ever, without a beginning'
    case 'static':
      return `emerges from a state of rest at ${scale}, ${ago}`
    case 'oscillating':
      return `oscillates, its last bounce ${ago} at ${scale}`
    case 'singular':
      return `begins ${ago} in a singularity at ${scale}`
  }
}
