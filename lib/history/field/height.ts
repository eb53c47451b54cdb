/**
 * The height of the potential: the smallest positive one for which the field, at rest until a = 10⁻⁶, has today's Ω_DE at a = 1.
 *
 * The field's energy only falls while the universe expands (dρ/dN = −φ̇²), so heights below Ω_DE/v(start) cannot do: the search goes
 * up from there in ln(height), looking several times per swing of the field, and follows every peak in between to its top.
 */
import type { Field } from './motion'
import { FINAL, FROZEN, fieldOf, type Search, type Shot, shoot, tooNear } from './shot'
import { unsolvable } from './unsolvable'

/** Accuracy of looks, and at the top of a peak. */
const [COARSE, MIDDLE] = [1e-5, 1e-7]
/** Farthest apart looks lie in ln(height), and how many fall to half a swing of the field. */
const WIDEST = 0.35
const PER_SWING = 5
/** How far below the smallest conceivable height, in its logarithm, the largest Ω_DE is looked for. */
const LOWEST = 15
/** In ln(height), beyond what rounding adds to the energy. */
const WITHIN = 1e-4
/** How well today's Ω_DE is met, relative to it, and how well at least where no double does better. */
const [MET, NEARLY_MET] = [1e-11, 1e-8]
/** Steps in ln(height) below this tell no slope. */
const SECANT = 1e-7
/** First step in ln(height) by which a bracket is sought anew. */
const FIRST_STEP = 1e-11
/** Heights at which the field swings more often before today are not tried. */
const MOST_SWINGS = 12
/**
 * Evaluations of the equation of motion for the search and the way to today, and for the future: a whole history costs no more than
 * 190 000, which is some 40 ms on the machine that they were set on.
 */
export const BUDGET = 120_000
export const FUTURE_BUDGET = 140_000
/** Of these, what is kept for the largest Ω_DE, where the one wanted is not found. */
const RESERVE = 30_000

/** ln(height) over the smallest conceivable one, and d ln Ω_DE/d ln(height) there. */
export interface Height {
  readonly y: number
  readonly steepness: number
}

/** The smallest height, or a problem that says how much Ω_DE can be reached. */
export function heightToday(search: Search): Height {
  if (search.potential.slope(search.potential.start) === 0) return { y: 0, steepness: 1 }
  return polished(search, bracketOf(search))
}

export const fieldToday = (search: Search): Field => fieldOf(search, heightToday(search).y)

/** The height that the same search comes to with steps of another tolerance. */
export function heightBeside(search: Search, { y, steepness }: Height, tolerance: number): number {
  const shot = shoot(search, y, tolerance)
  const excess = excessOf(shot)
  if (Math.abs(excess) < NEARLY_MET) return y - excess / steepness
  return steepRoot(search, shot, tolerance).y
}

/** Throws the problem where no height will do: a part of the search, for those who need no height. */
export function requireHeight(search: Search): void {
  if (search.potential.slope(search.potential.start) !== 0) bracketOf(search)
}

/** Two heights between which Ω_DE passes its value, at coarse accuracy. */
function bracketOf(search: Search): readonly [Shot, Shot] {
  const top = highest(search)
  let before: Shot | null = null
  let last: Shot = firstLook(search)
  let best = last
  while (last.y < top && last.swings < MOST_SWINGS && search.purse.left > RESERVE) {
    const next = shoot(search, Math.min(top, last.y + strideAfter(last)), COARSE)
    if (excessOf(next) > excessOf(best)) best = next
    const pair = signChange(search, last, next)
    if (pair) return pair
    if (before && mayRise(before, last, next, best)) {
      best = peakOf(search, before.y, last, next.y)
      /* v8 ignore if -- only where Ω_DE lies between the top of a peak and the looks beside it */
      if (excessOf(best) >= 0) return [before, best]
    }
    ;[before, last] = [last, next]
  }
  throw unreachable(search, best, last)
}

/** The smallest conceivable height cannot be too great; where rounding says so the field hardly moves, and a lower one is below for sure. */
function firstLook(search: Search): Shot {
  const look = shoot(search, 0, COARSE)
  return excessOf(look) < 0 ? look : shoot(search, -WITHIN, COARSE)
}

/** A universe that does not arrive has less than any Ω_DE. */
const excessOf = (shot: Shot): number => shot.excess ?? Number.NEGATIVE_INFINITY

function signChange(search: Search, last: Shot, next: Shot): readonly [Shot, Shot] | null {
  if (next.excess === null) return null
  if (last.excess === null) return next.excess > 0 ? pastTurning(search, last, next) : null
  return last.excess < 0 === next.excess < 0 ? null : [last, next]
}

/** Whether the peak between three looks can be the highest so far: by the parabola through them, with as much again for its error. */
function mayRise(before: Shot, last: Shot, next: Shot, best: Shot): boolean {
  const [a, b, c] = [excessOf(before), excessOf(last), excessOf(next)]
  if (!(a < b && c < b) || b >= 0) return false
  /* v8 ignore if -- only where a look beside a peak does not arrive at all */
  if (!Number.isFinite(a + c)) return true
  const [p, q] = [(b - a) / (last.y - before.y), (c - b) / (next.y - last.y)]
  const bend = (p - q) / (next.y - before.y)
  const slope = p - bend * (last.y - before.y)
  return b + (slope * slope) / (2 * bend) >= Math.min(0, excessOf(best))
}

/** Between a height with which the universe turns round too early and one with too much Ω_DE: a lower one that arrives. */
function pastTurning(search: Search, turned: Shot, arrived: Shot): readonly [Shot, Shot] | null {
  let [low, high] = [turned.y, arrived]
  for (let i = 0; i < 40; i++) {
    const middle = shoot(search, (low + high.y) / 2, COARSE)
    if (middle.excess === null) low = middle.y
    else if (middle.excess < 0) return [middle, high]
    else high = middle
  }
  return null
}

/** First on the straight line to the target, then by steps that resolve the swings. */
function strideAfter({ excess, swings, y }: Shot): number {
  const widest = Math.min(WIDEST, 2 / PER_SWING / Math.max(1, swings))
  if (y > 0 || excess === null || excess <= -1) return widest
  return Math.min(widest, Math.max(1e-9, -1.5 * Math.log1p(excess)))
}

/** Top of a peak inside (from, to), by golden sections (Kiefer 1953) from three looks. */
function peakOf(search: Search, from: number, inner: Shot, to: number): Shot {
  let [low, high, best] = [from, to, inner]
  for (let i = 0; i < 16 && high - low > 1e-5; i++) {
    const right = high - best.y > best.y - low
    const y = best.y + 0.381966 * (right ? high - best.y : low - best.y)
    const shot = shoot(search, y, MIDDLE)
    if (excessOf(shot) > excessOf(best)) {
      ;[low, high] = right ? [best.y, high] : [low, best.y]
      best = shot
    } else if (right) high = y
    else low = y
    /* v8 ignore if -- as in bracketOf */
    if (best.excess !== null && best.excess >= 0) break
  }
  return best
}

/** The root in a bracket: false position at coarse accuracy (Dowell & Jarratt 1971), secants at full accuracy. */
function polished(search: Search, [one, other]: readonly [Shot, Shot]): Height {
  const [a, b] = narrowed(search, one, other)
  let [y0, f0] = [a.y, shoot(search, a.y, FINAL).excess]
  let [y1, f1] = [b.y, shoot(search, b.y, FINAL).excess]
  if (f0 === null || f1 === null) throw tooNear()
  if (Math.abs(f0) < Math.abs(f1)) [y0, f0, y1, f1] = [y1, f1, y0, f0]
  let steepness = (f1 - f0) / (y1 - y0)
  for (let i = 0; i < 12 && f1 !== 0 && f1 !== f0; i++) {
    const step: number = (f1 * (y1 - y0)) / (f1 - f0)
    if (Math.abs(step) <= 1e-16 * Math.max(1, y1)) break
    const y: number = y1 - step
    const f: number | null = shoot(search, y, FINAL).excess
    if (f === null || Math.abs(f) >= Math.abs(f1)) break
    ;[y0, f0, y1, f1] = [y1, f1, y, f]
    if (Math.abs(y1 - y0) > SECANT) steepness = (f1 - f0) / (y1 - y0)
  }
  return Math.abs(f1) <= MET ? { y: y1, steepness } : steepRoot(search, { y: y1, excess: f1, swings: 0 }, FINAL)
}

/**
 * Next to a height with which the universe turns round early it nearly rests, the longer the nearer: Ω_DE goes like the logarithm of
 * how near, and coarse accuracy puts it elsewhere. The root in a bracket that is sought anew at full accuracy.
 */
function steepRoot(search: Search, start: Shot, tolerance: number): Height {
  const at = (y: number): Shot => shoot(search, y, tolerance)
  let [low, high] = steepBracket(at, start)
  let side = 0
  for (;;) {
    const best = Math.abs(excessOf(low)) < Math.abs(excessOf(high)) ? low : high
    const steepness = (excessOf(high) - excessOf(low)) / (high.y - low.y)
    if (Math.abs(excessOf(best)) <= MET) return { y: best.y, steepness }
    const y = side === 0 ? (low.y + high.y) / 2 : secant(low, high)
    if (!(low.y < y && y < high.y)) {
      if (Math.abs(excessOf(best)) > NEARLY_MET) throw tooNear()
      return { y: best.y, steepness }
    }
    const middle = at(y)
    const above = excessOf(middle) > 0
    // A step that leaves the same end twice is followed by a halving.
    side = Number.isFinite(excessOf(low)) && side !== (above ? 1 : -1) ? (above ? 1 : -1) : 0
    if (above) high = middle
    else low = middle
  }
}

const secant = (low: Shot, high: Shot): number => {
  const [below, above] = [excessOf(low), excessOf(high)]
  return low.y - (below * (high.y - low.y)) / (above - below)
}

/** By steps that double: too little Ω_DE, or a universe that does not arrive, and too much. */
function steepBracket(at: (y: number) => Shot, start: Shot): [Shot, Shot] {
  const direction = excessOf(start) > 0 ? -1 : 1
  let before = start
  for (let step = FIRST_STEP; step < WIDEST; step *= 2) {
    const next = at(before.y + direction * step)
    if (excessOf(next) > 0 !== excessOf(before) > 0) return direction < 0 ? [next, before] : [before, next]
    before = next
  }
  throw tooNear()
}

function narrowed(search: Search, one: Shot, other: Shot): readonly [Shot, Shot] {
  let [a, b] = [one, other]
  let [fa, fb] = [excessOf(a), excessOf(b)]
  for (let i = 0; i < 60 && Math.abs(a.y - b.y) > 1e-4 && fa !== fb; i++) {
    const y = b.y - (fb * (b.y - a.y)) / (fb - fa)
    const c = shoot(search, y, COARSE)
    /* v8 ignore if -- both ends of the bracket arrive, and what lies between seldom does not */
    if (c.excess === null) throw tooNear()
    const fc = c.excess
    if (fc < 0 !== fb < 0) [a, fa] = [b, fb]
    else fa *= fb / (fb + fc)
    ;[b, fb] = [c, fc]
    if (Math.abs(fc) < 1e-5) break
  }
  return [a, b]
}

const scratch = new Float64Array(3)

/** ln of the greatest height that is tried: the field at rest then weighs as much as all the rest at a = 10⁻⁶. */
function highest({ background, target }: Search): number {
  background.into(scratch, FROZEN)
  // Alone it loses at most a factor a⁻⁶ = 10³⁶ until today.
  return scratch[0] > 0 ? Math.log(Math.max(scratch[0] / target, 1e12)) : Math.log(1e37 * Math.max(1, 1 / target))
}

/** Heights below the smallest that could do are looked at only to say how much Ω_DE can be reached. */
function largest(search: Search, best: Shot): Shot {
  if (best.y > 0) return best
  let [above, top] = [best, best]
  for (let y = -WIDEST; y > -LOWEST; y -= WIDEST) {
    const next = shoot(search, y, COARSE)
    if (excessOf(next) < excessOf(top)) return peakOf(search, y, top, Math.max(above.y, top.y + 1e-4))
    ;[above, top] = [top, next]
  }
  return top
}

function unreachable(search: Search, best: Shot, last: Shot): Error {
  const { excess } = largest(search, best)
  const wanted = Number(search.target.toPrecision(6))
  if (excess !== null && excess > 0)
    return unsolvable(
      `With Ω_DE = ${wanted} the universe would turn round before today; this field needs more than that.`,
    )
  if (excess === null)
    return unsolvable('With this field the universe does not grow to its present size, whatever the height of V.')
  const most = Number((search.target * (1 + excess)).toPrecision(3))
  const swings = ` Heights at which it swings more than ${MOST_SWINGS} times before today are not tried.`
  const costs = search.purse.left > RESERVE ? '' : ' Greater heights are over the budget of computation.'
  const far = last.swings < MOST_SWINGS ? costs : swings
  return unsolvable(`This field reaches Ω_DE = ${most} today at most, and ${wanted} is wanted.${far}`)
}
