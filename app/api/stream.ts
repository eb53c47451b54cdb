/** Text that is made while it is sent, no faster than it is taken. */

/** Characters sent at once: a few milliseconds of work, so that other requests get their turns in between. */
const CHUNK = 32 * 1024

export function streamOf(pieces: Iterable<string>): ReadableStream<Uint8Array> {
  const iterator = pieces[Symbol.iterator]()
  const encoder = new TextEncoder()
  return new ReadableStream({
    async pull(controller) {
      await new Promise((resolve) => setImmediate(resolve))
      let text = ''
      while (text.length < CHUNK) {
        const { done, value } = iterator.next()
        if (done) {
          if (text !== '') controller.enqueue(encoder.encode(text))
          controller.close()
          return
        }
        text += value
      }
      controller.enqueue(encoder.encode(text))
    },
    cancel() {
      iterator.return?.()
    },
  })
}
