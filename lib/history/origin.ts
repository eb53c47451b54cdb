/** Where a history comes from, decided by the first root of E² into the past or by the component that rules as a → 0. */
import { logarithmicIn, type Model } from '../model'
import type { Arm } from './arm'
import { AS_TYPED, singularity } from './ending'
import type { Origin, OriginKind } from './outcome'
import type { Search } from './search'
import { explodes, leadingExponent } from './tail'

/** What the search back and, before a bounce, the search to larger a by the same law say of the origin. */
export interface Beginning {
  readonly kind: OriginKind
  readonly proven: boolean
  readonly because: string
}

export function beginningOf(model: Model, past: Search, before: Search): Beginning {
  const told = (kind: OriginKind, because: string, doubt: string | null): Beginning => ({
    kind,
    proven: doubt === null,
    because: doubt === null ? because : `${because} ${doubt}`,
  })
  if (past.kind === 'double') return told('static', past.exact ? `${AT_REST} ${AS_TYPED}` : AT_REST, past.doubt)
  if (past.kind === 'singular') return told('singular', singularity(model, -1), past.doubt)
  if (past.kind === 'root' || past.farRoot !== null) {
    const swings = before.kind === 'root' || (before.kind === 'none' && before.farRoot !== null)
    const doubt = past.doubt ?? before.doubt
    return swings ? told('oscillating', SWINGS, doubt) : told('bounce', BOUNCE, doubt)
  }
  return reachesBack(model) ? told('big-bang', FINITE, past.doubt) : told('eternal', INFINITE, past.doubt)
}

const AT_REST = 'E² and its slope vanish together at this scale factor: the expansion emerges from a static state.'
const BOUNCE = 'E² vanishes in the past: before that moment the universe contracted.'
const SWINGS = 'E² vanishes at a smaller and at a larger scale factor, and the universe swings between them.'
const FINITE = 'E² stays positive down to a = 0, where the density diverges.'
const INFINITE = 'E² stays positive down to a = 0, which lies infinitely far back.'

/** Is a = 0 only a finite time away? */
function reachesBack(model: Model): boolean {
  const exponent = leadingExponent(model, -1)
  // Something that varies like a power of ln a may still reach back to a = 0 in finite time.
  const power = exponent === 0 ? (logarithmicIn(model, -1)?.overTwo ?? 0) : exponent
  return explodes(model, -1) || (power !== null && power > 0)
}

/** `past` leads from today to smaller a, `before` to larger a by the same law: what a bounce came in from. */
export function originOf(past: Arm, before: Arm): Origin {
  const beginning = beginningOf(past.model, past.end, before.end)
  const infinite = beginning.kind === 'static' || beginning.kind === 'eternal'
  const N = past.end.kind === 'none' ? (past.end.farRoot ?? Number.NEGATIVE_INFINITY) : past.end.N
  const { kind, proven, because } = beginning
  return { kind, proven, because, time: infinite ? null : -past.time.total, scale: Math.exp(N) }
}
