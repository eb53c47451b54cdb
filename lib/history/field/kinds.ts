/** How a universe with a scalar field begins and ends: by theorems alone where they decide, else by its trajectory. */
import type { Potential } from '../../dark-energy/potential'
import { type Model, modelOf } from '../../model'
import type { Purse } from '../../numerics/ode'
import type { Budget } from '../../scenario/budget'
import { fateOf } from '../ending'
import { beginningOf } from '../origin'
import type { EndKind, OriginKind } from '../outcome'
import { type Search, searchTurning } from '../turning'
import { backgroundOf } from './background'
import { aheadOf, heldModel, modelAhead, type Now, nowOf, wayAhead } from './course'
import { averagedBecause, crunchBecause, endAhead, fieldOrigin } from './endings'
import { BUDGET, requireHeight } from './height'

interface Kind<K> {
  readonly kind: K
  readonly because: string
  readonly proven: boolean
}

interface Kinds {
  readonly end: Kind<EndKind>
  readonly origin: Kind<OriginKind>
}

const FROM_REST = 'The field is at rest early on, and E² stays positive down to a = 0, where the density diverges.'

/** In flat and open universes that hold something that outweighs a field at rest early on; null elsewhere. */
export function fieldKinds(budget: Budget, potential: Potential): Kinds | null {
  const { dark, curvature, coldMatter, photons } = budget
  if (!(dark > 0 && curvature >= 0 && coldMatter + photons > 0)) return null
  // The height of the potential moves no ending.
  const field = { potential, height: dark, background: backgroundOf(budget) }
  return {
    end: endAhead(field, { kind: 'spent' }),
    origin: { kind: 'big-bang', because: FROM_REST, proven: true },
  }
}

/** What a whole history says, without its times. Throws where there is none; `tally` counts the evaluations down, and may go below 0. */
export function followedKinds(budget: Budget, potential: Potential, hold: boolean, tally: Purse): Kinds {
  const purse = { left: BUDGET }
  try {
    const known = hold ? null : fieldKinds(budget, potential)
    if (known) {
      requireHeight({ potential, background: backgroundOf(budget), target: budget.dark, purse })
      return known
    }
    return kindsAhead(nowOf(budget, potential, purse), hold, aheadOf(purse), tally)
  } finally {
    tally.left -= BUDGET - purse.left
  }
}

function kindsAhead(now: Now, hold: boolean, purse: Purse, tally: Purse): Kinds {
  const full = purse.left
  try {
    const model = modelOf(now.budget, now.law)
    const past = searchTurning(model, -1)
    const { end, search } = hold ? held(heldModel(now), past) : followed(now, purse)
    return { end, origin: fieldOrigin(now.budget, beginningOf(model, past, search)) }
  } finally {
    tally.left -= full - purse.left
  }
}

interface Future {
  readonly end: Kind<EndKind>
  readonly search: Search
}

function held(model: Model, past: Search): Future {
  const search = searchTurning(model, 1)
  const home = search.kind === 'none' ? past : searchTurning(model, -1)
  return { end: fateOf(model, search, home), search }
}

const crunch = (because: string): Kind<EndKind> => ({ kind: 'crunch', because, proven: false })

function followed(now: Now, purse: Purse): Future {
  const way = wayAhead(now, purse)
  if (way.kind === 'turning') {
    const { turns } = way.voyage
    const { N } = turns[0]
    const search: Search = { kind: 'root', N, narrows: [], doubt: null }
    return { end: crunch(crunchBecause(N, turns.length)), search }
  }
  const search = searchTurning(modelAhead(now, way.outlook), 1)
  const end = search.kind === 'root' ? crunch(averagedBecause(search.N)) : endAhead(now.field, way.outlook)
  return { end, search }
}
