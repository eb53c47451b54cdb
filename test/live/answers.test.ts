/** Which answer is shown, whatever the order in which they come. */
import { describe, expect, it } from 'vitest'
import { type Answer, createAnswers } from '../../app/live/answers'
import type { Ask, Progress } from '../../app/live/asking'
import { type Asked, type Brief, brief, type Explorer, explorer, type Part } from '../../lib/answers/explorer'

/** A whole one. */
const viewOf = (text: string) =>
  ({ title: text, long: { figure: { readings: { places: [0] } } } }) as unknown as Explorer
const first: Answer = { asked: 'first', view: viewOf('first'), here: false }

/** A page whose server and worker answer when they are told to. */
async function page({ awake = false, loads = true } = {}) {
  const asked: string[] = []
  const computing: string[] = []
  let told: (progress: Progress) => void = () => {}
  const answers = createAnswers(first, {
    isAwake: () => awake,
    compute: (question) => void computing.push(question),
    load: async (listener): Promise<Ask> => {
      if (!loads) throw new Error('no network')
      told = listener
      return (question) => {
        asked.push(question)
        told({ asked: question, view: null, fetching: true, failing: false, error: null })
      }
    },
  })
  const settle = () => new Promise((resolve) => setTimeout(resolve))
  return {
    asked,
    computing,
    answers,
    settle,
    shown: () => answers.read().answer.view.title,
    server: (question: string) =>
      told({ asked: question, view: viewOf(question), fetching: false, failing: false, error: null }),
    fails: (question: string, finally_ = false) =>
      told({
        asked: question,
        view: null,
        fetching: !finally_,
        failing: true,
        error: finally_ ? new Error('gone') : null,
      }),
    worker: (question: string) => answers.computed(question, viewOf(question)),
  }
}

describe('in a gesture', () => {
  const asked = (...codes: string[]): Asked => ({ codes, keys: new Map() })
  const [before, after] = [asked('matter:0.3', 'matter:0.4'), asked('matter:0.3', 'matter:0.5')]
  const whole = explorer(before)

  async function afterwards(view: Brief) {
    const { answers } = await page({ awake: true })
    answers.want('before', true)
    answers.computed('before', whole)
    answers.want('after', true)
    answers.computed('after', view)
    return answers.read().answer.view
  }

  it.each<readonly Part[]>([[], ['words'], ['view'], ['view', 'words']])(
    'what is not asked for stays: %s %s',
    async (...parts) => {
      const [shown, then] = [await afterwards(brief(after, new Set(parts))), explorer(after)]
      const [words, panel] = [parts.includes('words') ? then : whole, parts.includes('view') ? then.panel : whole.panel]
      const { moments, measures } = words
      const scenarios = then.scenarios.map(({ slot, name, plainCode, link }, i) => ({
        ...words.scenarios[i],
        ...{ slot, name, plainCode, link },
      }))
      const figure = { ...then.long.figure, readings: whole.long.figure.readings }
      expect(shown).toEqual({ ...then, scenarios, moments, measures, panel, long: { ...then.long, figure } })
      expect(shown.long.figure.readings).toBe(whole.long.figure.readings)
    },
  )

  it('a scenario is not shown before there are words about it', async () => {
    const more = asked('matter:0.3', 'matter:0.4', 'matter:0.5')
    expect(await afterwards(brief(more, new Set()))).toBe(whole)
    expect((await afterwards(brief(more, new Set(['words'])))).scenarios).toEqual(explorer(more).scenarios)
  })
})

describe('without a worker', () => {
  it('asks one question at a time in a gesture, then the newest', async () => {
    const { asked, answers, settle, server, shown } = await page()
    answers.want('a', true)
    await settle()
    answers.want('b', true)
    answers.want('c', true)
    await settle()
    expect(asked).toEqual(['a'])
    server('a')
    await settle()
    expect(asked).toEqual(['a', 'c'])
    expect(shown()).toBe('a')
    server('c')
    expect(shown()).toBe('c')
    expect(answers.read()).toMatchObject({ wanted: 'c', fetching: false })
  })

  it('asks at once for a change that is made', async () => {
    const { asked, answers, settle, server, shown } = await page()
    answers.want('a', false)
    await settle()
    answers.want('b', false)
    await settle()
    expect(asked).toEqual(['a', 'b'])
    server('b')
    server('a')
    expect(shown()).toBe('b')
  })

  it('comes back to the first answer without a question', async () => {
    const { asked, answers, settle, server, shown } = await page()
    answers.want('a', false)
    await settle()
    answers.want('first', false)
    server('a')
    await settle()
    expect(shown()).toBe('first')
    expect(asked).toEqual(['a'])
    expect(answers.read().fetching).toBe(false)
  })
})

describe('with a worker', () => {
  it('computes in a gesture and asks the server when it is over, whose answer stands', async () => {
    const { asked, computing, answers, settle, server, worker, shown } = await page({ awake: true })
    answers.want('a', true)
    answers.want('b', true)
    worker('a')
    expect(shown()).toBe('a')
    worker('b')
    await settle()
    expect(asked).toEqual([])
    expect(computing).toEqual(['a', 'b'])
    answers.want('b', false)
    await settle()
    expect(asked).toEqual(['b'])
    expect(answers.read().answer.here).toBe(true)
    server('b')
    expect(answers.read().answer.here).toBe(false)
    worker('b')
    expect(answers.read().answer.here).toBe(false)
  })

  it('draws nothing old over something newer', async () => {
    const { answers, settle, server, worker, shown } = await page({ awake: true })
    answers.want('a', false)
    await settle()
    answers.want('b', true)
    worker('b')
    server('a')
    expect(shown()).toBe('b')
    answers.want('c', true)
    answers.want('b', true)
    worker('c')
    expect(shown()).toBe('b')
  })

  it('waits for nothing once a hand is back at what is shown', async () => {
    const { answers, worker } = await page({ awake: true })
    answers.want('a', true)
    worker('a')
    answers.want('b', true)
    expect(answers.read().computing).toBe(true)
    answers.want('a', true)
    expect(answers.read().computing).toBe(false)
  })

  it('keeps the object of a view that the server confirms', async () => {
    const { answers, settle, server, worker } = await page({ awake: true })
    answers.want('a', false)
    await settle()
    worker('a')
    const { view } = answers.read().answer
    server('a')
    expect(answers.read().answer).toEqual({ asked: 'a', view, here: false })
    expect(answers.read().answer.view).toBe(view)
  })
})

describe('without a server', () => {
  it('computes from the first try that fails on, and says why once it is given up', async () => {
    const { answers, computing, settle, fails, worker, shown, server } = await page()
    answers.want('a', false)
    await settle()
    fails('a')
    expect(computing).toEqual(['a'])
    expect(answers.read().computing).toBe(true)
    worker('a')
    fails('a', true)
    expect(shown()).toBe('a')
    expect(answers.read()).toMatchObject({ fetching: false, computing: false, error: new Error('gone') })
    server('a')
    expect(answers.read().error).toBe(null)
  })

  it('leaves the last picture where nothing can be computed', async () => {
    const { answers, settle, fails, shown } = await page()
    answers.want('a', false)
    await settle()
    fails('a', true)
    answers.computed('a', null)
    expect(shown()).toBe('first')
    expect(answers.read().computing).toBe(false)
  })

  it('computes where not even the means to ask can be had', async () => {
    const { answers, computing, settle } = await page({ loads: false })
    answers.want('a', false)
    await settle()
    expect(computing).toEqual(['a'])
    expect(answers.read().error).not.toBe(null)
  })
})
