/** The body of a request as text, or what keeps it from being that. What is too large is read to its end and forgotten, since
 * a client that is still sending does not see the answer. */
export async function readText(
  { body }: Request,
  most: number,
): Promise<{ readonly text: string } | 'too large' | 'no text'> {
  const decoder = new TextDecoder('utf-8', { fatal: true })
  let [size, text] = [0, '']
  const reader = (body ?? new Blob([]).stream()).getReader()
  try {
    for (let part = await reader.read(); !part.done; part = await reader.read()) {
      size += part.value.length
      text = size > most ? '' : text + decoder.decode(part.value, { stream: true })
    }
    return size > most ? 'too large' : { text: text + decoder.decode() }
  } catch (error) {
    if (error instanceof TypeError) return 'no text'
    throw error
  }
}
