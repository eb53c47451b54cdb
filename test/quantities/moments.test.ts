/** The timetable: in time order, complete, and bounded where the sign of ä keeps changing. */
import { expect, it } from 'vitest'
import { readScenario } from '../../lib/scenario/read'
import { solve } from '../../lib/solve'
import { momentWords } from '../../lib/words/moments'

function momentsOf(code: string) {
  const reading = readScenario(code, null)
  if (!reading.ok) throw new Error(reading.problems[0].message)
  return solve(reading.value).moments
}

it.each([
  'h0:70,matter:0.3',
  'matter:2,dark:0,cmb:0',
  'h0:70,matter:0.3,eos:constant,w:-1.5',
  'matter:0.1,dark:1.75,cmb:0',
])('%s has its moments in time order', (code) => {
  const times = momentsOf(code).flatMap(({ time }) => (time === null ? [] : [time]))
  expect(times).toEqual([...times].sort((one, other) => one - other))
  expect(momentsOf(code).map(({ kind }) => kind)).toEqual(expect.arrayContaining(['origin', 'now', 'end']))
})

it('a field that swings about its minimum tells twenty changes of the sign of ä and then says that it oscillates', () => {
  const changes = momentsOf('h0:70,matter:0.3,eos:field,v:cosine').filter(({ kind }) => kind.startsWith('acceleration'))
  expect(changes).toHaveLength(20)
  expect(changes.filter(({ label }) => label.includes('oscillates'))).toEqual([changes[19]])
})

it('in words the first changes ahead stand for those up to the last', () => {
  const moments = momentsOf('h0:70,matter:0.3,eos:field,v:cosine')
  const words = momentWords({ moments })
  const ahead = words.filter(({ kind, when }) => kind.startsWith('acceleration') && when.startsWith('+'))
  expect(moments.length - words.length).toBe(14)
  expect(ahead.map(({ label }) => label)).toEqual([
    'acceleration ends',
    'acceleration begins',
    'acceleration ends',
    'acceleration begins, and 14 changes more',
    'acceleration ends; from here on the sign of ä oscillates',
  ])
})
