/** What is asked again and again at the same places is computed once. */
export function remembered<T>(answer: (place: number) => T): (place: number) => T {
  const known = new Map<number, T>()
  return (place) => {
    const value = known.has(place) ? (known.get(place) as T) : answer(place)
    known.set(place, value)
    return value
  }
}
