/** How a universe with a scalar field begins and ends where theorems alone decide; null where only its trajectory could tell. */
import type { Potential } from '../../dark-energy/potential'
import type { Budget } from '../../scenario/budget'
import type { EndKind, OriginKind } from '../outcome'
import { backgroundOf } from './background'
import { endAhead } from './endings'

interface Kinds {
  readonly end: { readonly kind: EndKind; readonly because: string }
  readonly origin: { readonly kind: OriginKind; readonly because: string }
}

const FROM_REST = 'The field is at rest early on, and E² stays positive down to a = 0, where the density diverges.'

/** In flat and open universes that hold something that outweighs a field at rest early on. */
export function fieldKinds(budget: Budget, potential: Potential): Kinds | null {
  const { dark, curvature, coldMatter, photons } = budget
  if (!(dark > 0 && curvature >= 0 && coldMatter + photons > 0)) return null
  // The height of the potential moves no ending.
  const field = { potential, height: dark, background: backgroundOf(budget) }
  return { end: endAhead(field, { kind: 'spent' }), origin: { kind: 'big-bang', because: FROM_REST } }
}
