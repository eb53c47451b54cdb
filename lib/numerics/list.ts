/**
 * As `list.map(make)`, for what loops read. Once V8 has optimized whoever calls `map`, it makes lists of another kind (with room
 * for holes) than before, and all that was compiled to read the one is thrown away when it meets the other.
 */
export function listOf<One, Made>(list: readonly One[], make: (one: One, index: number) => Made): Made[] {
  const made: Made[] = []
  for (const one of list) made.push(make(one, made.length))
  return made
}

/** 0 to 1 in so many even steps, both ends included. */
export function evenParts(steps: number): number[] {
  const parts: number[] = []
  for (let i = 0; i <= steps; i++) parts.push(i / steps)
  return parts
}
