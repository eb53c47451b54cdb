/** Where a history comes from, decided by the first root of E² into the past or by the component that rules as a → 0. */
import { logarithmicIn } from '../model'
import type { Arm } from './arm'
import { singularity } from './ending'
import type { Origin } from './outcome'
import { explodes, leadingExponent } from './tail'

/** `past` leads from today to smaller a, `back` to larger a by the same law: what a bounce came in from. */
export function originOf(past: Arm, back: Arm): Origin {
  if (past.end.kind === 'double') {
    const because = 'E² and its slope vanish together at this scale factor: the expansion emerges from a static state.'
    const proven = past.model.acting.length === 1
    return { kind: 'static', time: null, scale: Math.exp(past.end.N), proven, because }
  }
  if (past.end.kind === 'singular') {
    const at = { time: -past.time.total, scale: Math.exp(past.end.N) }
    return { kind: 'singular', ...at, proven: true, because: singularity(past) }
  }
  const root = past.end.kind === 'root' ? past.end.N : past.end.farRoot
  if (root !== null) return turning(past, back, root, past.end.kind !== 'root' || past.end.certain)
  const exponent = leadingExponent(past.model, past.direction)
  // Something that varies like a power of ln a may still reach back to a = 0 in finite time.
  const power = exponent === 0 ? (logarithmicIn(past.model, past.direction)?.overTwo ?? 0) : exponent
  const finite = explodes(past.model, past.direction) || (power !== null && power > 0)
  return {
    kind: finite ? 'big-bang' : 'eternal',
    time: finite ? -past.time.total : null,
    scale: 0,
    proven: true,
    because: finite
      ? 'E² stays positive down to a = 0, where the density diverges.'
      : 'E² stays positive down to a = 0, which lies infinitely far back.',
  }
}

function turning(past: Arm, back: Arm, N: number, certain: boolean): Origin {
  const at = { time: -past.time.total, scale: Math.exp(N), proven: certain }
  const swings = back.end.kind === 'root' || (back.end.kind === 'none' && back.end.farRoot !== null)
  if (!swings) {
    return { kind: 'bounce', ...at, because: 'E² vanishes in the past: before that moment the universe contracted.' }
  }
  const because = 'E² vanishes at a smaller and at a larger scale factor, and the universe swings between them.'
  return { kind: 'oscillating', ...at, proven: certain && (back.end.kind !== 'root' || back.end.certain), because }
}
