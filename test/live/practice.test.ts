/** What the engine computes before it is asked. */
import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest'
import { nearby, practise } from '../../app/live/practice'
import { askExplorer } from '../../lib/answers/ask-explorer'

const ASKED = 's=h0:70,matter:0.3&s=h0:68,matter:0.3,eos:constant,w:-0.9&view=rate&frame=wide'

describe('a question near to another', () => {
  test('has one scenario with more or less matter, in turn, and all else as it was', () => {
    const matter = (round: number) =>
      [...(nearby(ASKED, round) ?? '').matchAll(/matter:([\d.]+)/g)].map(([, value]) => Number(value))
    const [first, second] = [matter(0), matter(1)]
    expect(first[0]).not.toBe(0.3)
    expect(first[1]).toBe(0.3)
    expect(second[0]).toBe(0.3)
    expect(second[1]).not.toBe(0.3)
    const parts = Array.from({ length: 60 }, (_, round) => (matter(round)[round % 2] ?? 0) / 0.3)
    expect(Math.min(...parts)).toBeLessThan(0.3)
    expect(Math.max(...parts)).toBeGreaterThan(2)
    for (const part of parts) expect(Math.abs(part - 1.2)).toBeLessThanOrEqual(1)
    expect(nearby(ASKED, 0)?.replace(/matter:[\d.]+/g, 'matter:0.3')).toBe(ASKED)
  })

  test('can be asked, also where an address names no scenario', () => {
    for (const asked of [ASKED, 'view=reach', '']) {
      const reading = askExplorer(new URLSearchParams(nearby(asked, 5) ?? 'unknown:1'))
      expect(reading.ok && reading.value.answer().ok).toBe(true)
    }
  })

  test('is none where the scenarios cannot be read', () => {
    expect(nearby('s=matter:much', 0)).toBeNull()
  })
})

describe('practice', () => {
  beforeEach(() => void vi.useFakeTimers())
  afterEach(() => void vi.useRealTimers())

  test('puts one question at a time, each another, and comes to an end', () => {
    const put = vi.fn()
    practise(ASKED, put)
    vi.advanceTimersToNextTimer()
    expect(put).toHaveBeenCalledOnce()
    vi.runAllTimers()
    const asked = put.mock.calls.map(([question]) => question)
    expect(asked.length).toBeGreaterThan(10)
    expect(new Set(asked).size).toBe(asked.length)
  })

  test('makes way for a question of the page, and goes on when there is none', () => {
    const put = vi.fn()
    const practice = practise(ASKED, put)
    vi.advanceTimersToNextTimer()
    practice.yield()
    vi.advanceTimersByTime(200)
    practice.yield()
    vi.advanceTimersByTime(200)
    expect(put).toHaveBeenCalledOnce()
    vi.advanceTimersByTime(200)
    expect(put.mock.calls.length).toBeGreaterThan(1)
  })
})
