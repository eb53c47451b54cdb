/** Places that are kept at most. */
const MOST = 4096

/** What is asked again and again at the same places is computed once. */
export function remembered<T>(answer: (place: number) => T): (place: number) => T {
  const known = new Map<number, T>()
  return (place) => {
    const found = known.get(place)
    if (found !== undefined) return found
    if (known.size === MOST) known.clear()
    const value = answer(place)
    known.set(place, value)
    return value
  }
}
