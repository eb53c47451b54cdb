import { describe, expect, test } from 'vitest'
import { answerLine, LONGEST_LINE, linesOf } from '../../lib/answers/batch'
import { askHistory } from '../../lib/answers/history'
import { answerOf } from './ask'

const one = (text: string) => answerLine({ index: 0, text })

test('lines are counted with the blank ones, and those are passed over', () => {
  expect(linesOf('"a"\r\n\n  \n"b"')).toEqual([
    { index: 0, text: '"a"\r' },
    { index: 3, text: '"b"' },
  ])
  expect(linesOf('\n')).toEqual([])
})

test('a line answers as the history of its scenario does', () => {
  const [expected] = answerOf(askHistory, 's=h0:70,as:Steady%20light').scenarios
  expect(one('"h0:70,as:Steady light"')).toEqual({ ok: true, value: expected })
  expect(one('{"s":"h0:70,as:Steady light"}')).toEqual({ ok: true, value: expected })
  expect(one('"h0:70,as:Steady light"\r')).toEqual({ ok: true, value: expected })
})

describe('problems', () => {
  test.each([
    ['no JSON', 'h0:70', 's'],
    ['a number', '70', 's'],
    ['null', 'null', 's'],
    ['a list', '["h0:70"]', 's'],
    ['no code in it', '{"h0":70}', 's'],
    ['a code that is no text', '{"s":70}', 's'],
    ['a stranger beside it', '{"s":"h0:70","z":1}', 's'],
    ['an empty code', '""', 's'],
    ['a value outside its limits', '"h0:70,matter:-1"', 'matter'],
    ['an unknown key', '"size:1"', 'size'],
    ['nesting without end', '['.repeat(10_000), 's'],
    ['a line without end', `"${'a'.repeat(LONGEST_LINE)}"`, 's'],
  ])('%s', (_, text, parameter) => {
    expect(one(text)).toMatchObject({ ok: false, legal: false, problems: [{ parameter, scenario: null }] })
  })
  test('a legal scenario without a solution', () => {
    expect(one('"eos:field,v:linear,slope:15"')).toMatchObject({
      ok: false,
      legal: true,
      problems: [{ scenario: null }],
    })
  })
})
