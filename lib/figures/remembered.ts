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

/** For what is asked again and again in the same words: the last answer. */
export function lastOf<Question, Answer>(
  textOf: (question: Question) => string,
  answer: (question: Question) => Answer,
): (question: Question) => Answer {
  let last: { readonly text: string; readonly answer: Answer } | null = null
  return (question) => {
    const text = textOf(question)
    if (last?.text !== text) last = { text, answer: answer(question) }
    return last.answer
  }
}
