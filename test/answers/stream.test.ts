import { expect, test } from 'vitest'
import { streamOf } from '../../app/api/stream'

/** Endless pieces of a kilobyte, and how many of them were made. */
function endless() {
  const state = { made: 0, ended: false }
  function* pieces() {
    try {
      for (;;) {
        state.made++
        yield 'x'.repeat(1024)
      }
    } finally {
      state.ended = true
    }
  }
  return { state, stream: streamOf(pieces()) }
}
const aMoment = () => new Promise((resolve) => setTimeout(resolve, 30))

test('no more is made than is taken, but for a chunk in waiting', async () => {
  const { state, stream } = endless()
  const reader = stream.getReader()
  const { value } = await reader.read()
  await aMoment()
  expect(state.made * 1024).toBeLessThanOrEqual(3 * (value?.length ?? 0))
  await reader.cancel()
})
test('who leaves ends the making', async () => {
  const { state, stream } = endless()
  const reader = stream.getReader()
  await reader.read()
  await reader.cancel()
  const { made } = state
  await aMoment()
  expect(state).toEqual({ made, ended: true })
})
test('all of it arrives, in order, as UTF-8', async () => {
  const pieces = Array.from({ length: 5000 }, (_, i) => `Ω${i},`)
  expect(await new Response(streamOf(pieces)).text()).toBe(pieces.join(''))
})
test('nothing is an empty text', async () => expect(await new Response(streamOf([])).text()).toBe(''))
test('a failure ends the stream with an error, not as if all were there', async () => {
  function* broken() {
    yield 'x'.repeat(100_000)
    throw new Error('broken')
  }
  await expect(new Response(streamOf(broken())).text()).rejects.toThrow('broken')
})
